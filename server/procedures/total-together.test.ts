import { expect, test } from 'vitest';
import type { PlaneTotals } from '../../shared/contract/procedure';
import { totalTogether } from './total-together';

const plane = (
  name: 'A' | 'B',
  kermaGy: number | null,
  productGyCm2: number | null,
  minutes: number | null,
  factor: number | null = null,
): PlaneTotals => {
  const displayed = {
    kermaAreaProductGyCm2: productGyCm2,
    referenceAirKermaGy: kermaGy,
    fluoroscopyTimeS: minutes === null ? null : minutes * 60,
  };
  return {
    equipmentId: null,
    equipmentLabel: null,
    plane: name,
    basis: 'reported',
    reported: displayed,
    summed: displayed,
    displayed,
    corrected: {
      kermaAreaProductGyCm2: null,
      referenceAirKermaGy: factor === null || kermaGy === null ? null : kermaGy * factor,
    },
    factors: { kermaAreaProduct: null, referenceAirKerma: factor, validFrom: null },
    fluoroscopyKermaAreaProductGyCm2: null,
    acquisitionKermaAreaProductGyCm2: null,
  };
};

// Own acceptance check: A 1.80 Gy, 130 Gy·cm², 21.0 min and B 1.20, 60, 13.5.
const biplane = [plane('A', 1.8, 130, 21), plane('B', 1.2, 60, 13.5)];

test('time and kerma-area product of two planes add up; air kerma only as an upper bound', () => {
  const together = totalTogether(biplane, null);
  expect(together.referenceAirKerma.displayed).toBeCloseTo(3, 12);
  expect(together.kermaAreaProduct.displayed).toBe(190);
  expect(together.fluoroscopyTimeS).toBeCloseTo(34.5 * 60, 9);
  expect(together.isUpperBound).toBe(true);
});

test('once a physicist says that the fields lie apart, the larger plane stands', () => {
  const together = totalTogether(biplane, false);
  expect([together.referenceAirKerma.displayed, together.isUpperBound]).toEqual([1.8, false]);
  expect(together.kermaAreaProduct.displayed).toBe(190);
});

test('an unused plane makes no upper bound, and missing is not zero', () => {
  expect(totalTogether([plane('A', 1.8, 130, 21), plane('B', 0, 0, 0)], null).isUpperBound).toBe(false);
  expect(totalTogether([plane('A', null, 1, null)], null)).toMatchObject({
    referenceAirKerma: { displayed: null, corrected: null },
    fluoroscopyTimeS: null,
  });
});

// Own acceptance check: 4,800 mGy and a factor of 1.12 give 5,376 mGy.
test('displayed and corrected stand side by side', () => {
  const together = totalTogether([plane('A', 4.8, 300, 40, 1.12)], null);
  expect(together.referenceAirKerma.displayed).toBe(4.8);
  expect(together.referenceAirKerma.corrected).toBeCloseTo(5.376, 12);
  expect(together.isCorrected).toBe(true);
});
