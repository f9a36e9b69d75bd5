import { describe, expect, it } from 'vitest';
import { ncrpScatterUGyPerGyCm2, williamsScatterUGyPerGyCm2 } from '../../shared/dosimetry/scatter-air-kerma';
import { wallMaximumScatterUGyPerGyCm2 } from '../../shared/dosimetry/wall-maximum-check';
import { numberIn, readTable } from './read-table';

const grid = readTable('scatter-formulas.csv');

describe('scatter per KAP over the whole grid of angle and kVp', () => {
  it('has the grid', () => expect(grid.length).toBeGreaterThan(100));

  // Williams, Br J Radiol 69 (1996) 1032–1037: six constants as in the shielding report of the
  // British Institute of Radiology (2012) and an independent public implementation.
  it.each(grid)('follows Williams at $kVp kV and $theta_deg°', (row) => {
    const value = williamsScatterUGyPerGyCm2(numberIn(row, 'theta_deg'), numberIn(row, 'kVp'));
    expect(value).toBeCloseTo(numberIn(row, 'williams_S_uGy_per_Gycm2'), 4);
  });

  // Simpkin and Dixon, Health Phys 74 (1998) 350 = NCRP 145 eq. F.12.
  it.each(grid)('follows the NCRP scatter fraction at $kVp kV and $theta_deg°', (row) => {
    const value = ncrpScatterUGyPerGyCm2(numberIn(row, 'theta_deg'), numberIn(row, 'kVp'));
    expect(value).toBeCloseTo(numberIn(row, 'ncrp147_a1_uGy_per_Gycm2'), 4);
  });
});

describe('the wall maximum', () => {
  // Williams 1996: 0.031·kV + 2.5 is the maximum over θ of S·sin²θ, within 0.4 %.
  it.each([60, 85, 120])('is the largest S·sin²θ of a vertical beam at %i kV', (kvp) => {
    const angles = Array.from({ length: 1201 }, (_, index) => 30 + index * 0.1);
    const values = angles.map(
      (theta) => williamsScatterUGyPerGyCm2(theta, kvp) * Math.sin((theta * Math.PI) / 180) ** 2,
    );
    const largest = Math.max(...values);
    expect(Math.abs(wallMaximumScatterUGyPerGyCm2(kvp) / largest - 1)).toBeLessThan(0.004);
    expect(angles[values.indexOf(largest)]).toBeCloseTo(116.7, 0);
  });

  // Published values of the fit at 85 kV; 9.99 at 161° is its maximum.
  it.each([
    [30, 2.41],
    [45, 2.32],
    [60, 2.4],
    [90, 3.79],
    [117, 6.48],
    [135, 8.46],
    [150, 9.68],
    [161, 9.99],
  ])(
    // prettier-ignore
    'leaves S at 85 kV and %i° at %f',
    (theta, value) => expect(williamsScatterUGyPerGyCm2(theta, 85)).toBeCloseTo(value, 2),
  );
});
