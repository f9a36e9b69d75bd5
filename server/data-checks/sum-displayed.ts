import type { PlaneTotals } from '../../shared/contract/procedure';
import type { DisplayedTotals } from './check-context';

/** Totals that stood on the machine's screen: its planes added up. */
export function sumDisplayed(planes: readonly PlaneTotals[]): DisplayedTotals {
  const add = (field: keyof DisplayedTotals) =>
    planes.reduce<number | null>(
      (sum, { displayed }) => (displayed[field] === null ? sum : (sum ?? 0) + displayed[field]),
      null,
    );
  return {
    referenceAirKermaGy: add('referenceAirKermaGy'),
    kermaAreaProductGyCm2: add('kermaAreaProductGyCm2'),
  };
}
