import { describe, expect, it } from 'vitest';
import { beamDirection, type Vector } from '../../shared/dosimetry/beam-direction';
import { scatterSpread } from '../../shared/dosimetry/estimate-inputs';
import { scatterPerKap } from '../../shared/dosimetry/scatter-air-kerma';
import { crossesDetector, crossesTable, scatterAngleDeg } from '../../shared/dosimetry/scatter-geometry';
import { numberIn, readTable } from './read-table';

const heights: Record<string, number> = { eye: 0.5, collar: 0.35, chest: 0.15, waist: -0.1, knee: -0.6 };
const rows = readTable('scatter-reference-geometry.csv');
const pointOf = (row: Record<string, string>): Vector => [-0.6, -0.5, heights[row.point ?? ''] ?? Number.NaN];
const directionOf = (row: Record<string, string>) =>
  beamDirection(numberIn(row, 'primary_deg_LAO+'), numberIn(row, 'secondary_deg_CRA+'));

// Positioner angles by DICOM PS3.3 (left anterior oblique and cranial positive), an operator at
// (−0.6, −0.5) m; values computed apart in another language from Williams 1996.
describe('geometry of C-arm angles and body points', () => {
  it.each(rows)('${primary_deg_LAO+}/${secondary_deg_CRA+}, $point, scatter centre $origin', (row) => {
    const direction = directionOf(row);
    ['ux', 'uy', 'uz'].forEach((axis, index) => expect(direction[index]).toBeCloseTo(numberIn(row, axis), 5));
    // The other scatter centre: the beam's entrance surface, 10 cm towards the tube.
    const shiftM = row.origin === 'isocentre' ? 0 : 0.1;
    const point = pointOf(row).map((value, axis) => value + shiftM * (direction[axis] ?? 0));
    const vector: Vector = [point[0] ?? 0, point[1] ?? 0, point[2] ?? 0];
    const distanceM = Math.hypot(...vector);
    expect(distanceM).toBeCloseTo(numberIn(row, 'distance_m'), 4);
    const thetaDeg = scatterAngleDeg(direction, vector);
    expect(thetaDeg).toBeCloseTo(numberIn(row, 'theta_deg'), 2);
    const { scatterPerKapUGyPerGyCm2 } = scatterPerKap('williams-bir', thetaDeg, 80);
    expect(scatterPerKapUGyPerGyCm2).toBeCloseTo(numberIn(row, 'S_80kVp'), 3);
    const perKap = numberIn(row, 'Ka_per_KAP_uGy_per_Gycm2_80kVp');
    expect(scatterPerKapUGyPerGyCm2 / distanceM ** 2 / perKap).toBeCloseTo(1, 3);
  });
});

describe('the interval of the scatter model', () => {
  const isocentre = rows.filter((row) => row.origin === 'isocentre');
  it.each(isocentre)(
    'covers the choice of scatter centre at ${primary_deg_LAO+}/${secondary_deg_CRA+}, $point',
    (row) => {
      const other = rows.find(
        (candidate) =>
          candidate.origin !== 'isocentre' &&
          candidate.point === row.point &&
          candidate['primary_deg_LAO+'] === row['primary_deg_LAO+'] &&
          candidate['secondary_deg_CRA+'] === row['secondary_deg_CRA+'],
      );
      const column = 'Ka_per_KAP_uGy_per_Gycm2_80kVp';
      const ratio = numberIn(other ?? {}, column) / numberIn(row, column);
      const thetaDeg = numberIn(row, 'theta_deg');
      const crosses = crossesTable(pointOf(row)) || crossesDetector(thetaDeg);
      const { low, high } = scatterSpread((thetaDeg >= 105 ? 1 : 0) | (crosses ? 4 : 0));
      expect(ratio).toBeGreaterThan(low);
      expect(ratio).toBeLessThan(high);
    },
  );
});
