import { expect, test } from 'vitest';
import type { ReadAgainPreview, ReadingSummary } from '../../../shared/contract/read-again';
import { compareSummaries, describeCandidates, describePreviews, nameField } from './read-again-words';

const summary: ReadingSummary = {
  outcome: 'stored',
  reasonCode: null,
  readerVersion: '1',
  eventCount: 4,
  kermaAreaProductGyCm2: 12.5,
  referenceAirKermaGy: 0.8,
  fluoroscopyTimeS: 390,
};
const preview = (verdict: ReadAgainPreview['verdict']): ReadAgainPreview => ({
  doseReportId: '01a23224-9820-77e4-98cc-2d1097811b84',
  fileName: 'a.dcm',
  verdict,
  before: summary,
  after: summary,
  changedCount: 0,
  changes: [],
  reason: null,
});

test('a field is told in words, its unit after it', () => {
  expect(nameField('kermaAreaProductGyCm2')).toBe('kerma area product, Gy·cm²');
  expect(nameField('primaryAngleDeg')).toBe('primary angle, degrees');
  expect(nameField('kvpMean')).toBe('kVp mean');
  expect(nameField('filters.1.material')).toBe('filters 1 material');
});

test('only what differs between two readings is set side by side', () => {
  expect(compareSummaries(summary, { ...summary, eventCount: 5 })).toEqual([
    { name: 'events', before: '4', after: '5' },
  ]);
});

test('what may be read again is told with what is left out', () => {
  const counts = { stored: 344, held: 1, refused: 0, withoutBytes: 7000 };
  expect(describeCandidates({ counts, readerVersion: '3', items: [], nextCursor: null })).toBe(
    'The reader is at version 3. It may read again: 344 stored reports read by an earlier version, 1 held file. 7\u202f000 files without kept bytes cannot be read again.',
  );
});

test('previews are counted by what would happen', () => {
  expect(describePreviews([preview('same'), preview('changes'), preview('same')])).toBe(
    '3 files looked at: 1 with other values, 2 as before.',
  );
});
