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

describe('screens', () => {
  const ratio = (
    screened: StaffExposureEstimate,
    open: StaffExposureEstimate,
    quantity: 'collarHp10USv' | 'underGarmentHp10USv',
  ) =>
    // prettier-ignore
    (screened[quantity]?.nominal ?? Number.NaN) / (open[quantity]?.nominal ?? Number.NaN);

  it('shield the values of the wearer, not the unshielded air kerma', () => {
    const [open, screened] = [estimate(), estimate({}, { hasMobileScreen: true })];
    expect(screened.waistAirKermaUGy).toEqual(open.waistAirKermaUGy);
    expect(ratio(screened, open, 'collarHp10USv')).toBeCloseTo(0.1, 12);
    expect(ratio(screened, open, 'underGarmentHp10USv')).toBeCloseTo(0.1, 12);
  });

  it('the table skirt shields the waist of a short person only', () => {
    const skirt = (statureM: number) =>
      ratio(
        estimate({}, { statureM, hasTableSkirt: true }),
        estimate({}, { statureM }),
        'underGarmentHp10USv',
      );
    expect(skirt(1.6)).toBeCloseTo(0.3, 12);
    expect(skirt(1.8)).toBe(1);
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
