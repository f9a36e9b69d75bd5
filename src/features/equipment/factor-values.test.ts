import { expect, test } from 'vitest';
import { warnOfFactor } from './factor-values';

test('a factor that a display within 35 % cannot have is warned of, with the range', () => {
  expect(warnOfFactor(1.7)).toContain('0.74 to 1.54');
  expect(warnOfFactor(0.5)).toContain('0.50 lies outside');
});
test('an expected factor, none and a number not yet typed are not warned of', () => {
  expect([0.93, null, Number.NaN, 0].map(warnOfFactor)).toEqual([null, null, null, null]);
});
