import { describe, expect, it } from 'vitest';
import type { PlaneTotals } from '../../../shared/contract/procedure';
import { combinePlanes, findDifference } from './combine-planes';

const plane = (
  kermaGy: number | null,
  correctedGy: number | null,
  over: Partial<PlaneTotals> = {},
): PlaneTotals => ({
  equipmentId: null,
  equipmentLabel: null,
  plane: 'A',
  basis: 'reported',
  reported: null,
  summed: { kermaAreaProductGyCm2: null, referenceAirKermaGy: null, fluoroscopyTimeS: null },
  displayed: { kermaAreaProductGyCm2: 10, referenceAirKermaGy: kermaGy, fluoroscopyTimeS: 60 },
  corrected: { kermaAreaProductGyCm2: null, referenceAirKermaGy: correctedGy },
  factors: { kermaAreaProduct: null, referenceAirKerma: null, validFrom: null },
  fluoroscopyKermaAreaProductGyCm2: null,
  acquisitionKermaAreaProductGyCm2: null,
  ...over,
});

describe('planes together', () => {
  const planes = [plane(1, 1.1), plane(0.4, null)];

  it('adds air kerma up, and takes the displayed figure of a plane without factor into the corrected sum', () => {
    const { displayed, corrected } = combinePlanes({ planes, fieldsOverlap: null }, 'reference-air-kerma');
    expect(displayed).toBeCloseTo(1.4, 12);
    expect(corrected).toBeCloseTo(1.5, 12);
  });
  it('takes the larger plane where the fields lie apart, but still adds time and area product', () => {
    const apart = { planes, fieldsOverlap: false };
    expect(combinePlanes(apart, 'reference-air-kerma')).toEqual({ displayed: 1, corrected: 1.1 });
    expect(combinePlanes(apart, 'kerma-area-product').displayed).toBe(20);
    expect(combinePlanes(apart, 'fluoroscopy-time').displayed).toBe(120);
  });
  it('leaves missing missing', () => {
    expect(
      combinePlanes({ planes: [plane(null, null)], fieldsOverlap: null }, 'reference-air-kerma'),
    ).toEqual({
      displayed: null,
      corrected: null,
    });
    expect(combinePlanes({ planes: [], fieldsOverlap: null }, 'kerma-area-product').displayed).toBeNull();
  });
});

it('tells how far the events lie from the reported total', () => {
  const totals = { kermaAreaProductGyCm2: 8, referenceAirKermaGy: null, fluoroscopyTimeS: 0 };
  const one = plane(1, null, { reported: totals, summed: { ...totals, kermaAreaProductGyCm2: 10 } });
  expect(findDifference(one, 'kerma-area-product')).toBeCloseTo(0.25, 12);
  expect(findDifference(one, 'reference-air-kerma')).toBeNull();
  expect(findDifference(one, 'fluoroscopy-time')).toBeNull();
});
