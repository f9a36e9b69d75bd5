import { expect, test } from 'vitest';
import type { ExposurePoint } from '../../../shared/contract/staff-exposure';
import { fewestInBand, findEqualExposures, findRateBands } from './equal-exposure';

const point = (kvpMean: number | null, minutes: number | null, nominal: number): ExposurePoint => ({
  procedureId: null,
  caseNumber: null,
  startedAt: null,
  procedureType: 'any',
  room: null,
  fluoroscopyTimeS: minutes === null ? null : minutes * 60,
  kvpMean,
  kermaAreaProductGyCm2: null,
  estimate: { nominal, low: nominal, high: nominal },
});
/** Procedures of one kVp at a constant rate, with a fifth of them ten times as high. */
const band = (kvp: number, perMin: number) =>
  Array.from({ length: fewestInBand }, (_, place) => {
    const minutes = 1 + (place % 20);
    return point(kvp, minutes, perMin * minutes * (place % 5 === 0 ? 10 : 1));
  });
const points = [...band(71, 1), ...band(75, 2), ...band(79, 4)];

test('the rate of a band is its median: the few high procedures do not move it', () => {
  expect(findRateBands(points)).toEqual([
    { kvp: 70, medianPerMin: 1, procedures: fewestInBand },
    { kvp: 74, medianPerMin: 2, procedures: fewestInBand },
    { kvp: 78, medianPerMin: 4, procedures: fewestInBand },
  ]);
});

test('a value is reached after value / rate minutes, and not beyond the longest procedure', () => {
  expect(findEqualExposures(points, [16])).toEqual([
    {
      valueUSv: 16,
      points: [
        { x: 4, y: 78 },
        { x: 8, y: 74 },
        { x: 16, y: 70 },
      ],
    },
  ]);
  expect(findEqualExposures(points, [60])[0]?.points).toEqual([{ x: 15, y: 78 }]);
});

test('thin bands, and procedures without time or kVp, say nothing; two bands draw no line', () => {
  const thin = band(83, 8).slice(1);
  expect(findRateBands([...points, ...thin, point(null, 3, 9), point(71, 0, 9), point(71, null, 9)])).toEqual(
    findRateBands(points),
  );
  expect(findEqualExposures([...band(71, 1), ...band(75, 2), ...thin], [16])).toEqual([]);
});
