import { expect, it } from 'vitest';
import type { TypedQuantity, TypedQuantityName } from './contract/manual-entry';
import { readTypedQuantity } from './read-typed-quantity';
import { findSecondEntries } from './second-entry';

// Source: SI prefixes, 1 m² = 10,000 cm², 1 min = 60 s; exact, without a last binary digit.
it.each<[TypedQuantityName, string, string, number]>([
  ['kerma-area-product', '1250', 'uGy.m2', 12.5],
  ['kerma-area-product', '1 250', 'cGy.cm2', 12.5],
  ['kerma-area-product', '0.00430', 'Gy.m2', 43],
  ['kerma-area-product', '12,5', 'Gy.cm2', 12.5],
  ['kerma-area-product', '7.1', 'mGy.m2', 71],
  ['kerma-area-product', '12345', 'mGy.cm2', 12.345],
  ['reference-air-kerma', '1419.7', 'mGy', 1.4197],
  ['reference-air-kerma', '.5', 'Gy', 0.5],
  ['reference-air-kerma', '0', 'mGy', 0],
  ['fluoroscopy-time', '12:30', 'min:s', 750],
  ['fluoroscopy-time', '0.57', 'min', 34.2],
  ['fluoroscopy-time', '390', 's', 390],
  ['frame-count', '1 024', '1', 1024],
])('%s typed as %j %s is %d', (quantity, text, unit, value) => {
  expect(readTypedQuantity({ quantity, text, unit })).toEqual({ value });
});

it.each<[TypedQuantityName, string, string, 'text' | 'unit']>([
  ['kerma-area-product', '1,250', 'uGy.m2', 'text'],
  ['kerma-area-product', '12.5', '', 'unit'],
  ['kerma-area-product', '12.5', 'Gy', 'unit'],
  ['kerma-area-product', '1e3', 'uGy.m2', 'text'],
  ['reference-air-kerma', '-1', 'mGy', 'text'],
  ['reference-air-kerma', '1.2.3', 'mGy', 'text'],
  ['reference-air-kerma', '12', 'constructor', 'unit'],
  ['fluoroscopy-time', '12:75', 'min:s', 'text'],
  ['fluoroscopy-time', '12.5', 'min:s', 'text'],
  ['fluoroscopy-time', '12:30', 'min', 'unit'],
  ['frame-count', '10.5', '1', 'text'],
])('%s typed as %j %j is not guessed: its %4$s is at fault', (quantity, text, unit, part) => {
  expect(readTypedQuantity({ quantity, text, unit }).fault?.part).toBe(part);
});

const figure = (
  quantity: TypedQuantityName,
  text: string,
  unit: string,
  plane: TypedQuantity['plane'] = 'single',
) => ({
  quantity,
  plane,
  text,
  unit,
});

it.each<[string, TypedQuantity[], number]>([
  ['3 Gy', [figure('reference-air-kerma', '3.000', 'Gy')], 0],
  ['3001 mGy', [figure('reference-air-kerma', '3001', 'mGy')], 1],
  [
    '1.4 and 1.6 Gy of two planes',
    [figure('reference-air-kerma', '1.4', 'Gy', 'A'), figure('reference-air-kerma', '1.6', 'Gy', 'B')],
    0,
  ],
  [
    '1.5 and 1.6 Gy of two planes',
    [figure('reference-air-kerma', '1.5', 'Gy', 'A'), figure('reference-air-kerma', '1.6', 'Gy', 'B')],
    2,
  ],
  ['300 Gy·cm²', [figure('kerma-area-product', '300', 'Gy.cm2')], 0],
  ['30 001 µGy·m²', [figure('kerma-area-product', '30001', 'uGy.m2')], 1],
  ['an hour and a half', [figure('fluoroscopy-time', '90', 'min')], 0],
])('%s: as many figures are typed twice as needed', (_name, figures, count) => {
  expect(findSecondEntries(figures)).toHaveLength(count);
});
