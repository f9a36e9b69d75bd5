import { expect, test } from 'vitest';
import { expectedFactorRange, isExpectedFactor } from './calibration-factor';

test('a display within 35 % of the true value has a factor from 0.74 to 1.54', () => {
  expect([expectedFactorRange.low.toFixed(2), expectedFactorRange.high.toFixed(2)]).toEqual(['0.74', '1.54']);
  expect([0.73, 0.75, 1, 1.53, 1.55].map(isExpectedFactor)).toEqual([false, true, true, true, false]);
});
