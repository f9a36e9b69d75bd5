import { expect, test } from 'vitest';
import { parseDecimal } from './parse-decimal';

test('comma, point and grouped digits are read', () => {
  expect(['1.75', '1,75', '1\u2009250,5', ' 80 ', '.5', '\u22120.6'].map(parseDecimal)).toEqual([
    1.75, 1.75, 1250.5, 80, 0.5, -0.6,
  ]);
});
test('nothing typed is null, not zero', () => {
  expect([parseDecimal(''), parseDecimal('  '), parseDecimal(undefined)]).toEqual([null, null, null]);
});
test('what is not a number is not guessed', () => {
  expect(['12 kg', '1.2.3', 'e5', '1e3'].map(parseDecimal)).toEqual([NaN, NaN, NaN, NaN]);
});
