import type { PlaneTotals } from '../../shared/contract/procedure';

type Figures = { displayed: number | null; corrected: number | null };

export type Together = {
  fluoroscopyTimeS: number | null;
  kermaAreaProduct: Figures;
  referenceAirKerma: Figures;
  /** The sum of two planes is more than any one patch of skin received. */
  isUpperBound: boolean;
  isCorrected: boolean;
};

const add = (values: (number | null)[]) =>
  values.every((value) => value === null)
    ? null
    : values.reduce<number>((total, value) => total + (value ?? 0), 0);
const largest = (values: (number | null)[]) => {
  const known = values.filter((value) => value !== null);
  return known.length === 0 ? null : Math.max(...known);
};

/**
 * Planes together. Kerma-area product and fluoroscopy time add up; reference air kerma of two planes is summed as an
 * upper bound, unless a physicist recorded that the fields do not overlap: then the larger plane stands.
 */
export function totalTogether(planes: PlaneTotals[], fieldsOverlap: boolean | null): Together {
  const irradiating = planes.filter((plane) => (plane.displayed.referenceAirKermaGy ?? 0) > 0);
  const areFieldsApart = irradiating.length > 1 && fieldsOverlap === false;
  const combine = areFieldsApart ? largest : add;
  const isCorrected = planes.some(
    ({ factors }) => factors.kermaAreaProduct !== null || factors.referenceAirKerma !== null,
  );
  const correctedOrShown = (quantity: 'kermaAreaProductGyCm2' | 'referenceAirKermaGy') =>
    planes.map((plane) => plane.corrected[quantity] ?? plane.displayed[quantity]);
  return {
    fluoroscopyTimeS: add(planes.map((plane) => plane.displayed.fluoroscopyTimeS)),
    kermaAreaProduct: {
      displayed: add(planes.map((plane) => plane.displayed.kermaAreaProductGyCm2)),
      corrected: isCorrected ? add(correctedOrShown('kermaAreaProductGyCm2')) : null,
    },
    referenceAirKerma: {
      displayed: combine(planes.map((plane) => plane.displayed.referenceAirKermaGy)),
      corrected: isCorrected ? combine(correctedOrShown('referenceAirKermaGy')) : null,
    },
    isUpperBound: irradiating.length > 1 && !areFieldsApart,
    isCorrected,
  };
}
