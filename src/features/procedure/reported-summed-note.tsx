import type { PlaneTotals } from '../../../shared/contract/procedure';
import { formatDecimals } from '../../../shared/units';
import { MarginNote } from '../../ui/margin-note';
import { findDifference, totalQuantities } from './combine-planes';
import { midSentencePlane, namePlane } from './procedure-words';
import { TotalSign, writeTotal } from './quantity-words';

const fields = {
  'fluoroscopy-time': 'fluoroscopyTimeS',
  'reference-air-kerma': 'referenceAirKermaGy',
  'kerma-area-product': 'kermaAreaProductGyCm2',
} as const;

/** Below this share a difference is rounding. */
const roundingShare = 0.0005;

function describeDifference(share: number | null): string {
  if (share === null) return '';
  const percent = formatDecimals(share * 100, 1);
  return `: ${share > 0 ? '+' : ''}${percent} %`;
}

/** The machine's totals beside the sum of the events: only what is missing or differs, plane by plane. */
export const ReportedSummedNote = ({ planes }: { planes: readonly PlaneTotals[] }) => (
  <MarginNote title="Reported and summed">
    <ul>
      {planes.map((plane) => (
        <li key={`${plane.equipmentId} ${plane.plane}`} className="border-b border-rule py-1.5 text-sm">
          <PlaneComparison plane={plane} />
        </li>
      ))}
    </ul>
  </MarginNote>
);

function PlaneComparison({ plane }: { plane: PlaneTotals }) {
  const name = midSentencePlane(plane.plane);
  if (plane.reported === null) return <>The {name} has no reported totals: its events are summed.</>;
  const rows = totalQuantities.flatMap((quantity) => {
    const reported = plane.reported?.[fields[quantity]] ?? null;
    const summed = plane.summed[fields[quantity]];
    const difference = findDifference(plane, quantity);
    const isSame = difference !== null && Math.abs(difference) < roundingShare;
    return isSame || (reported === null && summed === null)
      ? []
      : [{ quantity, reported, summed, difference }];
  });
  if (rows.length === 0) return <>Reported totals of the {name} and the sum of its events agree.</>;
  return (
    <>
      {namePlane(plane.plane)}:
      {rows.map(({ quantity, reported, summed, difference }) => (
        <span key={quantity} className="block">
          <TotalSign of={quantity} /> reported{' '}
          {reported === null ? 'nowhere' : writeTotal(reported, quantity)}, events{' '}
          {summed === null ? 'tell none' : writeTotal(summed, quantity)}
          {describeDifference(difference)}
        </span>
      ))}
    </>
  );
}
