import { describe, expect, it } from 'vitest';
import {
  clampDistanceM,
  clampScatterAngleDeg,
  crossesDetector,
  crossesTable,
  isNearLongAxis,
  scatterAngleDeg,
} from './scatter-geometry';

describe('the scatter angle', () => {
  it('is 0 towards the detector, 180 towards the tube, 90 beside', () => {
    expect(scatterAngleDeg([0, 0, 1], [0, 0, 2])).toBe(0);
    expect(scatterAngleDeg([0, 0, 1], [0, 0, -2])).toBe(180);
    expect(scatterAngleDeg([0, 0, 1], [-1, 0.4, 0])).toBe(90);
  });
  it('is kept to 30–165°', () => {
    expect([10, 30, 100, 165, 180].map(clampScatterAngleDeg)).toEqual([30, 30, 100, 165, 165]);
  });
});

it('takes no distance below 0.4 m', () => expect([0.1, 0.4, 2].map(clampDistanceM)).toEqual([0.4, 0.4, 2]));

describe('what a ray meets', () => {
  it('passes the table top on its way to a leg beside the table', () =>
    expect(crossesTable([-0.6, -0.45, -0.61])).toBe(true));
  it('passes over the table on its way to the waist', () =>
    expect(crossesTable([-0.6, -0.45, -0.084])).toBe(false));
  it('ends above the table top before it could pass it', () =>
    expect(crossesTable([-0.1, -0.2, -0.05])).toBe(false));
  it('misses the table far below its side', () => expect(crossesTable([-2, 0, -0.3])).toBe(false));
  it('meets the detector near the beam’s axis only', () =>
    expect([20, 33, 34.5, 90].map(crossesDetector)).toEqual([true, true, false, false]));
  it('runs along the patient towards somebody at the foot end', () => {
    expect(isNearLongAxis([-1, -1.35, 0.3])).toBe(false);
    expect(isNearLongAxis([0.5, -3.2, 0.2])).toBe(true);
    expect(isNearLongAxis([-0.6, -0.45, 0.3])).toBe(false);
  });
});
