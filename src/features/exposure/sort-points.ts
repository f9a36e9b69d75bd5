import type { ExposurePoint } from '../../../shared/contract/staff-exposure';
import type { Sort } from '../../ui/data-table.types';

export const highestFirst: Sort = { key: 'estimate', order: 'descending' };

const keys: Record<string, (point: ExposurePoint) => number | string | null> = {
  estimate: (point) => point.estimate.nominal,
  'fluoroscopy-time': (point) => point.fluoroscopyTimeS,
  kvp: (point) => point.kvpMean,
  'kerma-area-product': (point) => point.kermaAreaProductGyCm2,
  started: (point) => point.startedAt,
};

/** The order that an address asks for; highest estimate first where it asks for none, or for nonsense. */
export function readSort(query: URLSearchParams): Sort {
  const key = query.get('sort');
  const order = query.get('order') === 'ascending' ? 'ascending' : 'descending';
  return { key: key !== null && key in keys ? key : highestFirst.key, order };
}

/** Sorted by one column; a missing value comes last in either order. */
export function sortPoints(points: readonly ExposurePoint[], { key, order }: Sort): ExposurePoint[] {
  const read = keys[key] ?? ((point: ExposurePoint) => point.estimate.nominal);
  const sign = order === 'ascending' ? 1 : -1;
  return [...points].sort((one, other) => {
    const [a, b] = [read(one), read(other)];
    if (a === null || b === null) return Number(a === null) - Number(b === null);
    return a < b ? -sign : Number(a > b) * sign;
  });
}
