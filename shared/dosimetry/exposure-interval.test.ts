import { describe, expect, it } from 'vitest';
import {
  estimateStaffExposure,
  type EstimatedQuantity,
  type ExposedPerson,
  type ExposureContext,
  type ExposureEvent,
  type StaffExposureEstimate,
} from './estimate-staff-exposure';
import { exampleContext, exampleEvent, exampleGarment, examplePerson } from './example-exposure';
import { placeFromPreset } from './room-positions';

function estimate(
  event: Partial<ExposureEvent> = {},
  person: Partial<ExposedPerson> = {},
  context: Partial<ExposureContext> = {},
) {
  return estimateStaffExposure([exampleEvent(event)], examplePerson(person), exampleContext(context));
}

const codes = (notes: { code: string }[]) => notes.map(({ code }) => code);

/** The ends of an interval as factors on the nominal value. */
function factors(result: StaffExposureEstimate, quantity: EstimatedQuantity): [number, number] {
  const value = result[quantity];
  if (!value) throw new Error(`${quantity} is null`);
  return [value.low / value.nominal, value.high / value.nominal];
}

function expectWider(
  wide: StaffExposureEstimate,
  narrow: StaffExposureEstimate,
  quantity: EstimatedQuantity,
) {
  const [[wideLow, wideHigh], [low, high]] = [factors(wide, quantity), factors(narrow, quantity)];
  expect(wideLow).toBeLessThanOrEqual(low);
  expect(wideHigh).toBeGreaterThan(high);
}

describe('what makes the interval wider', () => {
  const calibrated = { kapCalibrationFactor: 1 };

  it('a display that is not calibrated', () =>
    expectWider(estimate(), estimate(calibrated), 'collarAirKermaUGy'));

  it('C-arm angles that are missing: ÷4…×3', () => {
    const wide = estimate({ ...calibrated, primaryAngleDeg: null, secondaryAngleDeg: null });
    expectWider(wide, estimate(calibrated), 'collarAirKermaUGy');
    expect(wide.collarAirKermaUGy?.nominal).toBe(estimate(calibrated).collarAirKermaUGy?.nominal);
    const spread = wide.spreads.collarAirKermaUGy?.find(({ input }) => input === 'positioner-angles');
    expect(spread).toEqual({ input: 'positioner-angles', low: 0.25, high: 3 });
    expect(codes(wide.warnings)).toContain('angles-missing');
  });

  it('a kVp that is missing, less so where the procedure type has a usual one', () => {
    const known = estimate({ kvp: 80 });
    const typical = estimate({ kvp: null }, {}, { typicalKvp: 80 });
    const general = estimate({ kvp: null });
    expect(typical.collarAirKermaUGy?.nominal).toBe(known.collarAirKermaUGy?.nominal);
    expectWider(typical, known, 'underGarmentHp10USv');
    expectWider(general, typical, 'underGarmentHp10USv');
    expect(codes(general.warnings)).toContain('kvp-missing');
  });

  it('copper of 0.6 mm or more moves the interval behind the garment up, nothing before it', () => {
    const [thin, heavy] = [estimate({ copperMm: 0.5 }), estimate({ copperMm: 0.6 })];
    expect(heavy.underGarmentHp10USv?.low).toBeGreaterThan(1.5 * (thin.underGarmentHp10USv?.low ?? 0));
    expect(heavy.underGarmentHp10USv?.high).toBeGreaterThan(1.5 * (thin.underGarmentHp10USv?.high ?? 0));
    expect(heavy.collarHp10USv).toEqual(thin.collarHp10USv);
    expect(codes(heavy.warnings)).toContain('heavy-copper');
  });

  it('lead that is labelled but not measured: the upper end only', () => {
    const [labelled, measured] = [
      estimate({}, { garment: exampleGarment({ isMeasured: false }) }),
      estimate(),
    ];
    expectWider(labelled, measured, 'underGarmentHp10USv');
    expect(factors(labelled, 'underGarmentHp10USv')[0]).toBe(factors(measured, 'underGarmentHp10USv')[0]);
    expect(labelled.collarHp10USv).toEqual(measured.collarHp10USv);
  });

  it('a garment whose condition is not confirmed, most where it is unknown', () => {
    expectWider(estimate({}, { evidenceGrade: 'B' }), estimate(), 'underGarmentHp10USv');
    expectWider(
      estimate({}, { evidenceGrade: 'C' }),
      estimate({}, { evidenceGrade: 'B' }),
      'underGarmentHp10USv',
    );
    expect(codes(estimate({}, { evidenceGrade: 'C' }).warnings)).toContain('condition-unknown');
  });

  it('a place that comes from a preset', () => {
    const preset = placeFromPreset('operator');
    const given = { ...preset, preset: null };
    expectWider(
      estimate({}, { fluoroscopyPlace: preset, acquisitionPlace: preset }),
      estimate({}, { fluoroscopyPlace: given, acquisitionPlace: given }),
      'eyeAirKermaUGy',
    );
  });

  it('a place along the patient’s body: down to a twentieth', () => {
    const place = { preset: null, xM: -0.2, yM: -1.5, isBehindBarrier: false };
    const along = estimate(calibrated, { fluoroscopyPlace: place });
    const spread = along.spreads.chestAirKermaUGy?.find(({ input }) => input === 'scatter-model');
    expect(spread?.low).toBe(0.05);
  });

  it('the scatter model by where the ray goes: forward, and back-scatter through the table top', () => {
    const { spreads } = estimate(calibrated);
    const spreadOf = (quantity: EstimatedQuantity) =>
      spreads[quantity]?.find(({ input }) => input === 'scatter-model');
    // Waist at 96°: −78…+40 %. Leg at 128°: −45…+20 %, a further 40 % down.
    expect(spreadOf('waistAirKermaUGy')).toMatchObject({ low: 0.22, high: 1.4 });
    expect(spreadOf('lowerLegAirKermaUGy')).toMatchObject({ low: 0.33, high: 1.2 });
  });

  it('a missing kVp through the scatter before the garment, and its transmission behind it', () => {
    const { spreads } = estimate({ kvp: null });
    const highOf = (quantity: EstimatedQuantity) =>
      spreads[quantity]?.find(({ input }) => input === 'tube-voltage')?.high ?? Number.NaN;
    // By hand, 100 against 80 kV: scatter 1.08981/0.97007; lead 0.5 mm 0.047201/0.013703.
    expect(highOf('collarAirKermaUGy')).toBeCloseTo(1.12343, 4);
    expect(highOf('underGarmentHp10USv')).toBeCloseTo(1.12343 * 3.4446, 2);
  });

  it('a preset place of one part by that part only', () => {
    const preset = placeFromPreset('operator');
    const given = { ...preset, preset: null };
    const events = [exampleEvent(), exampleEvent({ type: 'stationary-acquisition' })];
    const both = { fluoroscopyPlace: preset, acquisitionPlace: given };
    const { spreads } = estimateStaffExposure(events, examplePerson(both), exampleContext());
    // Half of the sum stands at ×1.5, half where it was given.
    const position = spreads.eyeAirKermaUGy?.find(({ input }) => input === 'position');
    expect(position?.high).toBeCloseTo(1.25, 5);
  });

  it('nothing at all is left where everything is exact but the scatter model and the calibration', () => {
    const inputs = estimate(calibrated).spreads.collarAirKermaUGy?.map(({ input }) => input);
    expect(inputs).toEqual(['kap-calibration', 'scatter-model']);
  });
});
