import { describe, expect, it } from 'vitest';
import {
  estimateStaffExposure,
  type ExposedPerson,
  type ExposureContext,
  type ExposureEvent,
  type StaffExposureEstimate,
} from './estimate-staff-exposure';
import { exampleContext, exampleEvent, exampleGarment, examplePerson } from './example-exposure';
import { estimatedQuantities } from './exposure-types';
import { placeFromPreset } from './room-positions';
import { eventFromTotals } from './totals-event';

function estimate(
  event: Partial<ExposureEvent> = {},
  person: Partial<ExposedPerson> = {},
  context: Partial<ExposureContext> = {},
) {
  return estimateStaffExposure([exampleEvent(event)], examplePerson(person), exampleContext(context));
}

const codes = (notes: { code: string }[]) => notes.map(({ code }) => code);

describe('what cannot be said stays null, with the reason', () => {
  const isNull = (result: StaffExposureEstimate) =>
    estimatedQuantities.filter((quantity) => result[quantity] === null);

  it('no P KA in any event', () => {
    const result = estimate({ kermaAreaProductGyCm2: null });
    expect(isNull(result)).toEqual([...estimatedQuantities]);
    expect(Object.values(result.byPart.fluoroscopy).every((value) => value === null)).toBe(true);
    expect(codes(result.gaps)).toEqual(['no-kerma-area-product']);
  });

  it('no events', () => {
    const result = estimateStaffExposure([], examplePerson(), exampleContext());
    expect(isNull(result)).toEqual([...estimatedQuantities]);
    expect(codes(result.gaps)).toEqual(['no-events']);
  });

  it('some events without P KA are counted in a warning', () => {
    const events = [exampleEvent(), exampleEvent({ kermaAreaProductGyCm2: null }), exampleEvent({ kermaAreaProductGyCm2: Number.NaN })]; // prettier-ignore
    const result = estimateStaffExposure(events, examplePerson(), exampleContext());
    expect(result.collarHp10USv).toEqual(estimate().collarHp10USv);
    expect(result.warnings).toContainEqual({
      code: 'kerma-area-product-missing',
      detail: '2 events without P KA are not in the estimate',
    });
  });

  it.each([
    ['an unknown garment', { garment: { answer: 'unknown' } }, 'garment-unknown'],
    ['a failed garment', { evidenceGrade: 'D' }, 'garment-failed'],
  ] as const)('%s: nothing behind it, the collar as before', (_, person, code) => {
    const result = estimate({}, person);
    expect(isNull(result)).toEqual(['underGarmentHp10USv', 'effectiveDoseUSv']);
    expect(codes(result.gaps)).toEqual([code]);
    expect(result.collarHp10USv).toEqual(estimate().collarHp10USv);
  });
});

describe('without protection of the trunk', () => {
  it.each([
    ['no garment', { garment: { answer: 'none' } }, 'no-garment'],
    ['turned away without a back panel', { isTurnedAway: true, garment: exampleGarment({ backLeadMm: null }) }, 'back-unprotected'],
  ] as const)('%s: 0.84 of the air kerma at the chest, the badge formulas refused', (_, person, code) => {
    const result = estimate({}, person);
    expect(result.effectiveDoseUSv?.nominal).toBeCloseTo(0.84 * (result.chestAirKermaUGy?.nominal ?? 0), 10);
    expect(result.effectiveDoseFormula).toBe('unprotected');
    expect(result.underGarmentHp10USv).toBeNull();
    expect(codes(result.gaps)).toEqual([code]);
  }); // prettier-ignore

  it('a back panel protects somebody turned away by its own lead', () => {
    const turned = estimate({}, { isTurnedAway: true, garment: exampleGarment({ backLeadMm: 0.25 }) });
    const facing = estimate({}, { garment: exampleGarment({ frontLeadMm: 0.25 }) });
    expect(turned.underGarmentHp10USv).toEqual(facing.underGarmentHp10USv);
    expect(codes(turned.warnings)).toContain('turned-away');
  });
});

describe('places and rotational runs', () => {
  it('counts nothing behind the barrier, and zero is not unknown', () => {
    const place = placeFromPreset('control-room');
    const result = estimate({}, { fluoroscopyPlace: place, acquisitionPlace: place });
    expect(result.collarHp10USv).toEqual({ nominal: 0, low: 0, high: 0 });
    expect(codes(result.warnings)).toContain('behind-barrier');
  });

  it('uses the place of each part and adds the parts up', () => {
    const events = [exampleEvent(), exampleEvent({ type: 'stationary-acquisition' })];
    const away = { preset: null, xM: -1.2, yM: -1, isBehindBarrier: false };
    const result = estimateStaffExposure(events, examplePerson({ acquisitionPlace: away }), exampleContext());
    const { fluoroscopy, acquisition } = result.byPart;
    expect(fluoroscopy.eyeHp3USv).toBeCloseTo(estimate().eyeHp3USv?.nominal ?? Number.NaN, 10);
    expect(acquisition.eyeHp3USv).toBeLessThan((fluoroscopy.eyeHp3USv ?? 0) / 2);
    for (const quantity of estimatedQuantities) {
      const sum = (fluoroscopy[quantity] ?? Number.NaN) + (acquisition[quantity] ?? Number.NaN);
      expect(sum).toBeCloseTo(result[quantity]?.nominal ?? Number.NaN, 9);
    }
  });

  const run = { type: 'rotational-acquisition', primaryAngleDeg: -100, primaryEndAngleDeg: 100, secondaryEndAngleDeg: 0 }; // prettier-ignore

  it('takes staff as outside the room during a rotational run', () => {
    const result = estimate(run);
    expect(result.eyeAirKermaUGy?.nominal).toBe(0);
    expect(codes(result.warnings)).toContain('outside-during-rotation');
  });

  it('integrates a run over its path for somebody who stayed: between its least and largest angle', () => {
    const stayed = estimate(run, { isPresentDuringRotation: true }).eyeAirKermaUGy?.nominal ?? 0;
    const still = [-100, -60, -30, 0, 30, 60, 100].map(
      (primaryAngleDeg) => estimate({ primaryAngleDeg }).eyeAirKermaUGy?.nominal ?? Number.NaN,
    );
    expect(stayed).toBeGreaterThan(Math.min(...still));
    expect(stayed).toBeLessThan(Math.max(...still));
    // Against a plain sum over 1° steps.
    const fine = Array.from({ length: 200 }, (_, step) =>
      estimate({ primaryAngleDeg: -99.5 + step }).eyeAirKermaUGy?.nominal ?? Number.NaN); // prettier-ignore
    expect(stayed / (fine.reduce((sum, value) => sum + value, 0) / 200)).toBeCloseTo(1, 3);
  });

  it('takes plane B without angles as lateral from either side', () => {
    const result = estimate({ plane: 'B', primaryAngleDeg: null, secondaryAngleDeg: null });
    const sides = [90, -90].map(
      (primaryAngleDeg) => estimate({ primaryAngleDeg }).collarAirKermaUGy?.nominal ?? 0,
    );
    expect(result.collarAirKermaUGy?.nominal).toBeCloseTo(((sides[0] ?? 0) + (sides[1] ?? 0)) / 2, 9);
  });
});

describe('tube, patient and side', () => {
  it('gives the head more with the tube over the table', () => {
    const [under, over] = [estimate(), estimate({}, {}, { tubePosition: 'over-table' })];
    expect(over.eyeAirKermaUGy?.nominal).toBeGreaterThan(2 * (under.eyeAirKermaUGy?.nominal ?? 0));
    expect(over.lowerLegAirKermaUGy?.nominal).toBeLessThan(under.lowerLegAirKermaUGy?.nominal ?? 0);
  });

  it('is the same for a mirrored person under a mirrored beam, and not for the same beam', () => {
    const mirrored = { preset: null, xM: 0.6, yM: -0.5, isBehindBarrier: false };
    const left = estimate({ primaryAngleDeg: -30 }, { fluoroscopyPlace: mirrored }).eyeAirKermaUGy;
    expect(left?.nominal).toBeCloseTo(estimate({ primaryAngleDeg: 30 }).eyeAirKermaUGy?.nominal ?? 0, 9);
    const ratio = (left?.nominal ?? 0) / (estimate({ primaryAngleDeg: -30 }).eyeAirKermaUGy?.nominal ?? 1);
    expect(Math.abs(ratio - 1)).toBeGreaterThan(0.3);
  });

  it('turns the beam with the patient: feet first, left oblique leans to the room’s other side', () => {
    const feetFirst = { patientPosition: { isFeetFirst: true, isProne: false } };
    const turned = estimate({ primaryAngleDeg: 30 }, {}, feetFirst).eyeAirKermaUGy?.nominal;
    expect(turned).toBeCloseTo(estimate({ primaryAngleDeg: -30 }).eyeAirKermaUGy?.nominal ?? 0, 9);
  });

  it('says what was assumed', () => {
    const preset = placeFromPreset('operator');
    const result = estimate(
      { type: null, kvp: 140 },
      { statureM: null, fluoroscopyPlace: preset },
      { accessSide: null, patientPosition: { isFeetFirst: false, isProne: false, isAssumed: true } },
    );
    expect(codes(result.warnings)).toEqual(
      expect.arrayContaining(['event-type-unknown', 'kvp-out-of-range', 'stature-assumed', 'preset-position', 'access-side-not-recorded', 'patient-position-assumed']),
    ); // prettier-ignore
  });

  it('says that it clamped distance and angle', () => {
    const close = estimate(
      {},
      { fluoroscopyPlace: { preset: null, xM: -0.05, yM: 0, isBehindBarrier: false } },
    );
    expect(codes(close.warnings)).toEqual(
      expect.arrayContaining(['distance-clamped', 'scatter-angle-clamped']),
    );
    expect(codes(estimate().warnings)).not.toContain('distance-clamped');
  });
});

describe('models and corrections', () => {
  it('multiplies KAP by the calibration factor', () => {
    const ratio =
      (estimate({ kapCalibrationFactor: 1.2 }).collarHp10USv?.nominal ?? 0) /
      (estimate().collarHp10USv?.nominal ?? 1);
    expect(ratio).toBeCloseTo(1.2, 12);
  });

  it('names the scatter model and the formula it was asked for', () => {
    const result = estimate(
      {},
      {},
      { scatterModel: 'ncrp-scatter-fraction', effectiveDoseFormula: 'niklason-simple' },
    );
    expect(result.scatterModel).toEqual({ id: 'ncrp-scatter-fraction', version: '2004' });
    expect(result.effectiveDoseFormula).toBe('niklason-simple');
    const [hu, ho] = [result.underGarmentHp10USv?.nominal ?? 0, result.collarHp10USv?.nominal ?? 0];
    expect(result.effectiveDoseUSv?.nominal).toBeCloseTo(hu + 0.02 * ho, 10);
    expect(result.collarAirKermaUGy?.nominal).not.toBe(estimate().collarAirKermaUGy?.nominal);
  });

  it('makes one event of totals: wide, at the fluoroscopy place', () => {
    const event = eventFromTotals({ kermaAreaProductGyCm2: 10, kvp: 80 });
    const result = estimateStaffExposure([event], examplePerson(), exampleContext());
    expect(result.collarAirKermaUGy?.nominal).toBeCloseTo(estimate().collarAirKermaUGy?.nominal ?? 0, 10);
    expect(codes(result.warnings)).toEqual(expect.arrayContaining(['angles-missing', 'event-type-unknown']));
    expect(result.collarAirKermaUGy?.high).toBeGreaterThan(estimate().collarAirKermaUGy?.high ?? Number.NaN);
  });

  it('lets defects through: 1 % of the area raises the value under the garment by 72 % at T = 0.0137', () => {
    const holed = estimate({}, { garment: exampleGarment({ defectAreaFraction: 0.01 }) });
    const ratio = (holed.underGarmentHp10USv?.nominal ?? 0) / (estimate().underGarmentHp10USv?.nominal ?? 1);
    expect(ratio).toBeCloseTo(0.99 + 0.01 / 0.013703, 3);
  });

  it('ranks what the interval comes from, together one', () => {
    const { contributions } = estimate({}, { hasCeilingScreen: true });
    const total = contributions.reduce((sum, { share }) => sum + share, 0);
    expect(total).toBeCloseTo(1, 10);
    expect(contributions[0]?.input).toBe('ceiling-screen');
    expect(contributions.map(({ share }) => share)).toEqual([...contributions.map(({ share }) => share)].sort((a, b) => b - a)); // prettier-ignore
  });
});
