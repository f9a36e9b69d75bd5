import { expect, test } from 'vitest';
import { findDecades, findLogRange, findLogTicks, placeOnLogScale } from './log-scale';

test('ten lies halfway between one and a hundred', () => {
  expect(placeOnLogScale(10, 1, 100)).toBeCloseTo(0.5, 12);
});
test('zero and values beyond the scale are held at its ends', () => {
  expect([0, -1, 0.1, 1e6].map((value) => placeOnLogScale(value, 1, 100))).toEqual([0, 0, 0, 1]);
});
test('ticks are 1, 2 and 5 times powers of ten, ends included', () => {
  expect(findLogTicks(0.5, 20)).toEqual([0.5, 1, 2, 5, 10, 20]);
  expect(findDecades(0.1, 200)).toEqual([0.1, 1, 10, 100]);
});
test('a range leaves room beyond the extreme values and ignores zeros', () => {
  expect(findLogRange([0, 0.7, 62])).toEqual({ from: 0.5, to: 100 });
  expect(findLogRange([10])).toEqual({ from: 5, to: 20 });
  expect(findLogRange([0, 0])).toBeNull();
});
