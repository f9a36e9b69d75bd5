import { expect, test } from 'vitest';
import { findToneLimits, nameTones, roundTo125 } from './tone-limits';

test('limits are round values near the shares, and always ascend', () => {
  const values = Array.from({ length: 1000 }, (_, place) => 10 ** (place / 250));
  expect(findToneLimits(values)).toEqual([5, 100, 2000, 5000]);
  expect(findToneLimits(new Array<number>(50).fill(3))).toEqual([2, 5, 10, 20]);
});

test('zeros and nothing at all still give four limits', () => {
  expect(findToneLimits([0, 0])).toEqual([1, 2, 5, 10]);
  expect(findToneLimits([])).toEqual([1, 2, 5, 10]);
});

test('rounding looks at ratios', () => {
  expect([4, 0.13, 7.5, 1500].map(roundTo125)).toEqual([5, 0.1, 10, 2000]);
});

test('the legend names every tone', () => {
  expect(nameTones([2, 5, 10, 1000])).toEqual([
    'below 2',
    '2–5',
    '5–10',
    '10–1\u202f000',
    '1\u202f000 and above',
  ]);
});
