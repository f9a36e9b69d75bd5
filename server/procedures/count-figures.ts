import type { SettledFigures } from '../../shared/contract/data-check';
import type { Together } from './total-together';

export type Counted = {
  fluoroscopyTimeS: number | null;
  referenceAirKermaGy: number | null;
  kermaAreaProductGyCm2: number | null;
  isCorrected: boolean;
};

/** The totals that count: what a physicist typed after a wrong one, else with the factor in force, else as displayed. */
export function countFigures(together: Together, settled: SettledFigures | null): Counted {
  const { referenceAirKerma, kermaAreaProduct } = together;
  return {
    fluoroscopyTimeS: settled?.fluoroscopyTimeS ?? together.fluoroscopyTimeS,
    referenceAirKermaGy:
      settled?.referenceAirKermaGy ?? referenceAirKerma.corrected ?? referenceAirKerma.displayed,
    kermaAreaProductGyCm2:
      settled?.kermaAreaProductGyCm2 ?? kermaAreaProduct.corrected ?? kermaAreaProduct.displayed,
    isCorrected:
      together.isCorrected ||
      (settled?.referenceAirKermaGy ?? null) !== null ||
      (settled?.kermaAreaProductGyCm2 ?? null) !== null,
  };
}
