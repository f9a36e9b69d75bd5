import { describe, expect, it } from 'vitest';
import {
  estimateStaffExposure,
  type ExposedPerson,
  type ExposureContext,
  type ExposureEvent,
} from './estimate-staff-exposure';
import { exampleContext, exampleEvent, examplePerson } from './example-exposure';
import { estimatedQuantities } from './exposure-types';
import { placeFromPreset } from './room-positions';

function estimate(
  event: Partial<ExposureEvent> = {},
  person: Partial<ExposedPerson> = {},
  context: Partial<ExposureContext> = {},
) {
  return estimateStaffExposure([exampleEvent(event)], examplePerson(person), exampleContext(context));
}

const codes = (notes: { code: string }[]) => notes.map(({ code }) => code);

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

  it('takes a tube over the table as over it where the angles are missing', () => {
    const known = estimate({}, {}, { tubePosition: 'over-table' });
    const missing = estimate(
      { primaryAngleDeg: null, secondaryAngleDeg: null },
      {},
      { tubePosition: 'over-table' },
    );
    expect(missing.eyeAirKermaUGy?.nominal).toBeCloseTo(known.eyeAirKermaUGy?.nominal ?? 0, 9);
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
