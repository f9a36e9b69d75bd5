import { expect, test } from 'vitest';
import type { ExposurePoint } from '../../../shared/contract/staff-exposure';
import { readSort, sortPoints } from './sort-points';

const point = (caseNumber: string, nominal: number, kvpMean: number | null): ExposurePoint => ({
  procedureId: null,
  caseNumber,
  startedAt: null,
  procedureType: 'any',
  room: null,
  fluoroscopyTimeS: null,
  kvpMean,
  kermaAreaProductGyCm2: null,
  estimate: { nominal, low: nominal, high: nominal },
});
const points = [point('a', 5, 80), point('b', 9, null), point('c', 7, 90)];
const order = (query: string) =>
  sortPoints(points, readSort(new URLSearchParams(query))).map(({ caseNumber }) => caseNumber);

test('highest first unless the address says otherwise; a missing value comes last either way', () => {
  expect(order('')).toEqual(['b', 'c', 'a']);
  expect(order('order=ascending')).toEqual(['a', 'c', 'b']);
  expect(order('sort=kvp')).toEqual(['c', 'a', 'b']);
  expect(order('sort=kvp&order=ascending')).toEqual(['a', 'c', 'b']);
  expect(order('sort=patient')).toEqual(['b', 'c', 'a']);
});
