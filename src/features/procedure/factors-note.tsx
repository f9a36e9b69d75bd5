import type { PlaneTotals } from '../../../shared/contract/procedure';
import { formatDecimals, THIN_SPACE } from '../../../shared/units';
import { MarginNote } from '../../ui/margin-note';
import { TextLink } from '../../ui/text-link';
import { readPlane, type TotalQuantity } from './combine-planes';
import { midSentencePlane } from './procedure-words';
import { TotalSign, writeTotal } from './quantity-words';

const corrected = ['reference-air-kerma', 'kerma-area-product'] as const satisfies readonly TotalQuantity[];

const findFactor = (plane: PlaneTotals, quantity: (typeof corrected)[number]): number | null =>
  quantity === 'reference-air-kerma' ? plane.factors.referenceAirKerma : plane.factors.kermaAreaProduct;

/** From the displayed to the corrected figure, plane by plane, with the factor and its date. */
export function FactorsNote({
  planes,
  machineHref,
}: {
  planes: readonly PlaneTotals[];
  /** Where the factors are kept; null for readers who may not open it. */
  machineHref: ((equipmentId: string) => string) | null;
}) {
  const rows = planes.flatMap((plane) =>
    corrected.flatMap((quantity) => {
      const factor = findFactor(plane, quantity);
      return factor === null ? [] : [{ plane, quantity, factor, figures: readPlane(plane, quantity) }];
    }),
  );
  const machine = planes.find((plane) => plane.equipmentId !== null);
  return (
    <MarginNote title="Displayed and corrected †">
      {rows.length === 0 && (
        <p className="text-sm">No factor applies on this day: figures stand as displayed.</p>
      )}
      <ul>
        {rows.map(({ plane, quantity, factor, figures }) => (
          <li key={`${plane.equipmentId} ${plane.plane} ${quantity}`} className="border-b border-rule py-1.5">
            <TotalSign of={quantity} /> {midSentencePlane(plane.plane)}
            <span className="block">
              {writeTotal(figures.displayed, quantity)} × {formatDecimals(factor, 2)} ={' '}
              {writeTotal(figures.corrected, quantity)}
              {THIN_SPACE}†
            </span>
            <span className="block text-sm text-ink-2">factor valid from {plane.factors.validFrom}</span>
          </li>
        ))}
      </ul>
      {machine?.equipmentLabel && (
        <p className="text-sm text-ink-2">
          {machineHref && machine.equipmentId ? (
            <TextLink to={machineHref(machine.equipmentId)}>{machine.equipmentLabel}</TextLink>
          ) : (
            machine.equipmentLabel
          )}
        </p>
      )}
    </MarginNote>
  );
}
