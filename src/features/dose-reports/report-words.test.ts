import { expect, test } from 'vitest';
import { describeCounts } from './report-words';

test('only outcomes that occurred are counted, in their fixed order', () => {
  expect(describeCounts({ refused: 1, stored: 7344, held: 0 })).toBe('7\u202f344 stored, 1 refused.');
});

test('no file at all is said, not counted', () => {
  expect(describeCounts({})).toBe('No file has come yet.');
});
