// @vitest-environment jsdom
import { beforeEach, expect, it } from 'vitest';
import { dropDraft, readDraft } from './record-draft';

const key = 'leeward-record-draft-one';

beforeEach(() => sessionStorage.clear());

it('gives back entries of the record’s own fields, and nothing else', () => {
  const entries = { primaryOperatorId: 'ana', presences: [], reason: '', version: 3 };
  sessionStorage.setItem(key, JSON.stringify(entries));
  expect(readDraft('one')).toEqual(entries);
  expect(readDraft('two')).toBeNull();
});

it('ignores what it cannot read: broken text, a list, fields of an older page', () => {
  for (const text of ['{', '[1]', '"text"', '{"presences":1}', '{"presences":[],"operatorName":"Ana"}']) {
    sessionStorage.setItem(key, text);
    expect(readDraft('one')).toBeNull();
  }
});

it('is gone once it is dropped', () => {
  sessionStorage.setItem(key, '{"presences":[]}');
  dropDraft('one');
  expect(readDraft('one')).toBeNull();
});
