import { expect, test } from 'vitest';
import { describeCounts, describeKeeping } from './report-words';

test('only outcomes that occurred are counted, in their fixed order', () => {
  expect(describeCounts({ refused: 1, stored: 7344, held: 0 })).toBe('7\u202f344 stored, 1 refused.');
});

test('no file at all is said, not counted', () => {
  expect(describeCounts({})).toBe('No file has come yet.');
});

test('a search that finds nothing does not say that nothing ever came', () => {
  expect(describeCounts({}, true)).toBe('No such file has come.');
});

test('how long refused bytes stay is told, and that others stay for good', () => {
  expect(describeKeeping(180)).toContain('for 180 days');
  expect(describeKeeping(0)).toBe('Every file is kept as it came, whatever its outcome.');
});
