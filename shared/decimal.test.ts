import { expect, it } from 'vitest';
import { parseDecimal, scaleDecimal } from './decimal';

it.each([
  ['0.00125', 0.00125],
  [' +1.25E-3 ', 0.00125],
  ['.5', 0.5],
  ['5.', 5],
  ['-0012', -12],
  ['1e5', 100_000],
])('reads %j as a decimal string', (text, value) => {
  expect(parseDecimal(text)).toBe(value);
});

it.each(['', ' ', '0,00125', '12abc', 'NaN', 'INF', '1e', '--1', '0x10', '1 2', '1e999', '١٢'])(
  'does not make a number of %j',
  (text) => {
    expect(parseDecimal(text)).toBeNull();
  },
);

it.each([
  ['0.00015', 10_000, 1.5],
  ['1.2345E-3', 10_000, 12.345],
  ['558', 0.001, 0.558],
  ['-.7', 1e-6, -7e-7],
  ['2.5', 60, 150],
  ['0.57', 60, 34.2],
  ['-.1', 60, -6],
  ['+1.1', 60, 66],
])('moves the point of %j exactly when scaled by %d', (text, factor, value) => {
  expect(scaleDecimal(text, factor)).toBe(value);
});

it('does not scale what is no number', () => {
  expect(scaleDecimal('0,5', 10)).toBeNull();
});

it.each([
  ['1e-99999999999999999999999', 60, 0],
  ['0.0e99999999999999999999999', 10, 0],
  ['1e308', 10, null],
])('keeps to finite numbers with %j times %d', (text, factor, value) => {
  expect(scaleDecimal(text, factor)).toBe(value);
});

it('passes over a megabyte of digits at once', () => {
  const startedMs = performance.now();
  expect(scaleDecimal(`${'1'.repeat(1_000_000)}x`, 60)).toBeNull();
  expect(scaleDecimal('1'.repeat(1_000_000), 60)).toBeNull();
  expect(performance.now() - startedMs).toBeLessThan(500);
});
