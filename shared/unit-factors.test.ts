import { expect, it } from 'vitest';
import { unitFactor, type QuantityKind } from './unit-factors';

// Source: the UCUM prefixes; 1 uGy.m2 = 1 cGy.cm2 by arithmetic.
it.each<[QuantityKind, string, number, number]>([
  ['kermaAreaProduct', 'Gy.m2', 0.0012345, 12.345],
  ['kermaAreaProduct', 'uGy.m2', 1234.5, 12.345],
  ['kermaAreaProduct', 'cGy.cm2', 1234.5, 12.345],
  ['kermaAreaProduct', 'dGy.cm2', 123.45, 12.345],
  ['kermaAreaProduct', 'mGy.cm2', 12345, 12.345],
  ['airKerma', 'mGy', 45.77, 0.04577],
  ['time', 'min', 2.5, 150],
  ['time', 'ms', 558, 0.558],
  ['length', 'cm', 112, 1120],
  ['area', 'm2', 0.04125, 412.5],
  ['tubeCharge', 'uA.s', 31500, 31.5],
  ['angle', 'rad', Math.PI / 6, 30],
  ['rate', '{pulse}/s', 7.5, 7.5],
  ['rate', '/min', 450, 7.5],
  ['count', '{frames}', 24, 24],
])('%s in %s: %d is canonically %d', (kind, unit, given, canonical) => {
  const value = given * (unitFactor(kind, unit) ?? NaN);
  expect(Math.abs(value - canonical)).toBeLessThanOrEqual(1e-12 * canonical);
});

it.each<[QuantityKind, string]>([
  ['kermaAreaProduct', 'Gym2'],
  ['kermaAreaProduct', 'Gy'],
  ['kermaAreaProduct', 'gy.m2'],
  ['airKerma', 'Gy.m2'],
  ['airKerma', 'MGy'],
  ['airKerma', 'constructor'],
  ['time', '1'],
  ['tubeVoltage', ''],
])('never guesses: %s in %j has no factor', (kind, unit) => {
  expect(unitFactor(kind, unit)).toBeNull();
});
