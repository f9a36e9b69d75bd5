import { expect, test } from 'vitest';
import { binValues } from './bin-values';

test('both ends are counted, what lies outside is not', () => {
  expect(binValues([0, 1, 2.5, 5, 9.99, 10, 11, -1, Number.NaN], 0, 10, 4)).toEqual([2, 1, 1, 2]);
});
