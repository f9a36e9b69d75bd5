import type { PlaneTotals } from '../../../shared/contract/procedure';
import { formatDecimals } from '../../../shared/units';
import { MarginNote } from '../../ui/margin-note';
import { findDifference, totalQuantities, type TotalQuantity } from './combine-planes';
import { namePlane } from './procedure-words';
import { TotalSign, writeTotal } from './quantity-words';

const fields = {
  'fluoroscopy-time': 'fluoroscopyTimeS',
  'reference-air-kerma': 'referenceAirKermaGy',
  'kerma-area-product': 'kermaAreaProductGyCm2',
} as const;

function describeDifference(share: number | null): string {
  if (share === null) return 'cannot be compared';
  const percent = share * 100;
  if (Math.abs(percent) < 0.05) return 'no difference';
  return `${percent > 0 ? '+' : ''}${formatDecimals(percent, 1)} %`;
}

/** The machine's totals beside the sum of the events, per plane. */
export const ReportedSummedNote = ({ planes }: { planes: readonly PlaneTotals[] }) => (
  <MarginNote title="Reported and summed">
    <ul>
      {planes.flatMap((plane) =>
        totalQuantities.map((quantity: TotalQuantity) => {
          const reported = plane.reported?.[fields[quantity]] ?? null;
          const summed = plane.summed[fields[quantity]];
          if (reported === null && summed === null) return null;
          return (
            <li
              key={`${plane.equipmentId} ${plane.plane} ${quantity}`}
              className="border-b border-rule py-1 text-sm"
            >
              <TotalSign of={quantity} />
              {planes.length > 1 &&
                ` ${namePlane(plane.plane)
                  .toLowerCase()
                  .replace(/ [ab]$/, (end) => end.toUpperCase())}`}
              <span className="block text-ink-2">
                {reported === null ? 'not reported' : writeTotal(reported, quantity)}; events{' '}
                {summed === null ? 'tell none' : writeTotal(summed, quantity)};{' '}
                {describeDifference(findDifference(plane, quantity))}
              </span>
            </li>
          );
        }),
      )}
    </ul>
  </MarginNote>
);
