import type { PlaneTotals, Procedure } from '../../../shared/contract/procedure';
import { formatKermaAreaProduct } from '../../../shared/units';
import { DataTable } from '../../ui/data-table';
import type { Column } from '../../ui/data-table.types';
import { DoubtWords } from '../../ui/doubt-words';
import {
  combinePlanes,
  isDoubted,
  readPlane,
  readSettled,
  totalQuantities,
  type TotalQuantity,
} from './combine-planes';
import { namePlane } from './procedure-words';
import { quantityNames, TotalSign } from './quantity-words';
import { TotalFigure } from './total-figure';
import { TotalRule } from './total-rule';

/** Quantity by plane and together, and in each row the ruler of its kind. */
export function TotalsTable({ procedure }: { procedure: Procedure }) {
  const { planes, comparisons, attention, isReferenceAirKermaUpperBound } = procedure;
  const machines = new Set(planes.map((plane) => plane.equipmentId)).size;
  const isOne = planes.length === 1;
  const planeColumns = planes.map((plane, place): Column<TotalQuantity> => ({
    key: `plane-${place}`,
    head: namePlane(plane.plane),
    unit: machines > 1 ? plane.equipmentLabel : undefined,
    align: 'end',
    cell: (quantity) => (
      <span className={isOne ? 'font-semibold' : undefined}>
        <TotalFigure
          figures={readPlane(plane, quantity)}
          quantity={quantity}
          settled={isOne ? readSettled(procedure, quantity) : null}
        />
        {isOne && <DoubtWords isInDoubt={isDoubted(procedure, quantity)} isLeftOut={procedure.isLeftOut} />}
        {quantity === 'kerma-area-product' && <Parts plane={plane} />}
      </span>
    ),
  }));
  const columns: Column<TotalQuantity>[] = [
    {
      key: 'quantity',
      head: 'Total',
      phone: 'title',
      cell: (quantity) => (
        <>
          {quantityNames[quantity]} <TotalSign of={quantity} />
        </>
      ),
    },
    ...planeColumns,
    {
      key: 'together',
      head: 'Together',
      align: 'end',
      className: isOne ? 'hidden' : undefined,
      cell: (quantity) => (
        <strong className="font-semibold">
          <TotalFigure
            figures={combinePlanes(procedure, quantity)}
            quantity={quantity}
            isUpperBound={quantity === 'reference-air-kerma' && isReferenceAirKermaUpperBound}
            settled={readSettled(procedure, quantity)}
          />
          <DoubtWords isInDoubt={isDoubted(procedure, quantity)} isLeftOut={procedure.isLeftOut} />
        </strong>
      ),
    },
    {
      key: 'rule',
      head: 'Among its kind: middle half, median, dashed the notification level',
      phone: 'wide',
      className: isOne ? 'md:w-[56%]' : 'md:w-[44%]',
      cell: (quantity) => {
        const { displayed, corrected } = combinePlanes(procedure, quantity);
        const settled = readSettled(procedure, quantity);
        return (
          <TotalRule
            quantity={quantity}
            value={settled ?? (displayed === null ? null : Math.max(displayed, corrected ?? displayed))}
            comparison={comparisons.find((one) => one.quantity === quantity)}
            isMarked={attention?.reasons.some((reason) => reason.code === quantity) ?? false}
            hasType={procedure.procedureType !== null}
          />
        );
      },
    },
  ];
  return (
    <DataTable
      caption="Totals of the procedure"
      columns={columns.filter((column) => column.key !== 'together' || !isOne)}
      rows={totalQuantities}
      rowKey={(quantity) => quantity}
      hasStickyHead={false}
      footer={<TotalsBasis procedure={procedure} />}
    />
  );
}

/** How much of it was fluoroscopy and how much acquisition, as displayed; nothing where neither is known. */
function Parts({ plane }: { plane: PlaneTotals }) {
  const { fluoroscopyKermaAreaProductGyCm2: seen, acquisitionKermaAreaProductGyCm2: acquired } = plane;
  if (seen === null && acquired === null) return null;
  return (
    <span className="block text-sm font-normal text-ink-2">
      fluoroscopy {formatKermaAreaProduct(seen)}
      <span className="md:block"> acquisition {formatKermaAreaProduct(acquired)}</span>
    </span>
  );
}

const basisOf = ({ planes, isManual }: Procedure): string => {
  if (isManual) return 'Totals as typed from the machine’s screen.';
  const bases = new Set(planes.map((plane) => plane.basis));
  if (bases.size > 1)
    return 'Totals as reported where the machine reported them, else summed over the events.';
  return bases.has('reported')
    ? 'Totals as the machine reported them.'
    : 'No totals were reported: summed over the irradiation events.';
};

const TotalsBasis = ({ procedure }: { procedure: Procedure }) => (
  <>
    {basisOf(procedure)}
    {procedure.settledFigures && (
      <>
        {' '}
        Totals typed by the physicist stand for the whole procedure: they alone count in statistics and decide
        about levels.
      </>
    )}
    {procedure.isReferenceAirKermaUpperBound && (
      <>
        {' '}
        Two planes do not irradiate the same skin: their <TotalSign of="reference-air-kerma" /> together is an
        upper bound, no measured value.
      </>
    )}
    {procedure.fieldsOverlap === false && procedure.planes.length > 1 && (
      <>
        {' '}
        The physicist recorded that the fields lie apart: the larger plane’s{' '}
        <TotalSign of="reference-air-kerma" /> stands for both.
      </>
    )}
  </>
);
