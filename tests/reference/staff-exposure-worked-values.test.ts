import { describe, expect, it } from 'vitest';
import { effectiveDose } from '../../shared/dosimetry/effective-dose';
import { estimateStaffExposure } from '../../shared/dosimetry/estimate-staff-exposure';
import {
  exampleContext,
  exampleEvent,
  exampleGarment,
  examplePerson,
} from '../../shared/dosimetry/example-exposure';
import { defectiveTransmission } from '../../shared/dosimetry/garment-transmission';
import { hp10USv } from '../../shared/dosimetry/personal-quantities';
import { placeFromPreset } from '../../shared/dosimetry/room-positions';
import { checkWallMaximumAirKermaUGy } from '../../shared/dosimetry/wall-maximum-check';

// Own acceptance checks by hand of the simple formula 0.031·kV + 2.5 (Williams 1996).
describe('50 Gy·cm² at 80 kV by the wall-maximum check', () => {
  const input = { kermaAreaProductGyCm2: 50, kvp: 80 };
  it.each([
    [1, 249],
    [0.75, 443],
    [2, 62],
  ])('gives at %f m %i µGy', (distanceM, expected) => {
    // prettier-ignore
    expect(Math.round(checkWallMaximumAirKermaUGy({ ...input, distanceM }))).toBe(expected);
  });

  it('gives 54 µGy at 0.75 m with geometry 0.35 and screen 0.35, 81 µSv as Hp(10)', () => {
    const airKermaUGy = checkWallMaximumAirKermaUGy({
      ...input,
      distanceM: 0.75,
      geometryFactor: 0.35,
      screenFactor: 0.35,
    });
    expect(Math.round(airKermaUGy)).toBe(54);
    expect(Math.round(hp10USv(airKermaUGy))).toBe(81);
  });
});

// Own acceptance checks by hand; Niklason et al., Health Phys 67 (1994) 611; NCRP 122 (from memory).
describe('effective dose from 0.10 mSv under the garment and 3.0 mSv at the collar', () => {
  it.each([
    ['niklason-simple', true, 0.16],
    ['niklason-simple', false, 0.28],
    ['ncrp122-two-badges', true, 0.125],
  ] as const)('%s, thyroid collar %s: %f mSv', (formula, hasThyroidCollar, expected) => {
    expect(effectiveDose(formula, 0.1, 3, hasThyroidCollar)).toBeCloseTo(expected, 10);
  });
});

// Own acceptance checks by hand of Dixon's area-fraction argument.
describe('a defect at a transmission of 5 %', () => {
  it('of 1 % of the area lets 1.19 times as much through', () => {
    expect(defectiveTransmission(0.05, 0.01) / 0.05).toBeCloseTo(1.19, 10);
  });
  it('of 15 mm² in 0.6 m² changes it by 0.05 % only', () => {
    expect(defectiveTransmission(0.05, 15e-6 / 0.6) / 0.05).toBeCloseTo(1.0005, 4);
  });
});

// Own arithmetic, done apart in another language from the published formulas: three events, the
// acquisition from further away, copper 0.9 mm in the third.
it('adds three events up to the figures worked out by hand', () => {
  const events = [
    exampleEvent(),
    exampleEvent({ kermaAreaProductGyCm2: 5, kvp: 87.5, primaryAngleDeg: 30, secondaryAngleDeg: -20 }),
    exampleEvent({
      type: 'stationary-acquisition',
      kermaAreaProductGyCm2: 8,
      kvp: 72,
      copperMm: 0.9,
      primaryAngleDeg: -35,
      secondaryAngleDeg: 25,
    }),
  ];
  const person = examplePerson({
    acquisitionPlace: { preset: null, xM: -1.2, yM: -1, isBehindBarrier: false },
    garment: exampleGarment({ frontLeadMm: 0.5 }),
    hasCeilingScreen: true,
    hasGlasses: true,
  });
  const estimate = estimateStaffExposure(events, person, exampleContext());
  expect(estimate.eyeAirKermaUGy?.nominal).toBeCloseTo(48.501798, 5);
  expect(estimate.collarAirKermaUGy?.nominal).toBeCloseTo(63.27666, 5);
  expect(estimate.chestAirKermaUGy?.nominal).toBeCloseTo(85.54313, 5);
  expect(estimate.waistAirKermaUGy?.nominal).toBeCloseTo(119.061506, 5);
  expect(estimate.lowerLegAirKermaUGy?.nominal).toBeCloseTo(127.873045, 5);
  expect(estimate.collarHp10USv?.nominal).toBeCloseTo(33.220246, 5);
  expect(estimate.eyeHp3USv?.nominal).toBeCloseTo(12.307331, 5);
  expect(estimate.underGarmentHp10USv?.nominal).toBeCloseTo(3.624488, 5);
  expect(estimate.effectiveDoseUSv?.nominal).toBeCloseTo(2.64275, 5);
});

// Plausibility against published measurements per KAP (abstracts).
describe('the interval of a usual operator case', () => {
  const events = [0, 30, -30].map((primaryAngleDeg) =>
    exampleEvent({ kermaAreaProductGyCm2: 1 / 3, primaryAngleDeg, secondaryAngleDeg: 0 }),
  );
  const place = placeFromPreset('operator');
  const person = examplePerson({ fluoroscopyPlace: place, acquisitionPlace: place });

  // Kuon et al., unshielded head height, coronary angiography phantom: 1.09 ± 0.76 µGy/(Gy·cm²).
  it('contains the measured air kerma at head height, 1.09 µGy per Gy·cm²', () => {
    const { eyeAirKermaUGy } = estimateStaffExposure(events, person, exampleContext());
    expect(eyeAirKermaUGy?.low).toBeLessThan(1.09);
    expect(eyeAirKermaUGy?.high).toBeGreaterThan(1.09);
  });

  // Published eye values of operators per KAP: 0.8–2.2, median 1 µSv/(Gy·cm²), protection as used.
  it('contains the published median at the eye, 1 µSv per Gy·cm², with a ceiling screen', () => {
    const { eyeHp3USv } = estimateStaffExposure(
      events,
      { ...person, hasCeilingScreen: true },
      exampleContext(),
    );
    expect(eyeHp3USv?.low).toBeLessThan(1);
    expect(eyeHp3USv?.high).toBeGreaterThan(1);
  });
});
