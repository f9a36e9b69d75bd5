import { expect, test } from 'vitest';
import { mergeVersions } from './merge-versions';

const opened = { code: 'R1', name: 'Suite', note: '', version: 1 };

test('my changes are laid on theirs, with their version', () => {
  const mine = { ...opened, note: 'Closed on Mondays' };
  const theirs = { code: 'R1', name: 'Hybrid suite', note: '', version: 2 };
  expect(mergeVersions(opened, mine, theirs)).toEqual({
    code: 'R1',
    name: 'Hybrid suite',
    note: 'Closed on Mondays',
    version: 2,
  });
});
test('where both changed the same field and nothing else, nothing can be brought together', () => {
  const mine = { ...opened, name: 'Mine' };
  expect(mergeVersions(opened, mine, { ...opened, name: 'Theirs', version: 2 })).toBeNull();
});
test('an empty field and a value not given are no difference', () => {
  const theirs = { ...opened, note: null as unknown as string, name: 'Theirs', version: 2 };
  expect(mergeVersions(opened, { ...opened, name: 'Mine' }, theirs)).toBeNull();
});
test('without a change of mine there is nothing to lay on', () => {
  expect(mergeVersions(opened, opened, { ...opened, name: 'Theirs', version: 2 })).toBeNull();
});
