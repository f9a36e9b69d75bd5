import type { StaffExposure } from '../../../shared/contract/staff-exposure';
import { formatScatter } from '../../../shared/units';
import { DataTable } from '../../ui/data-table';
import type { Column } from '../../ui/data-table.types';
import { ExplainPanel } from '../../ui/explain-panel';
import { explainExposure } from './exposure-explanation';
import { ExposureFigure } from './exposure-figure';
import {
  describeDuty,
  describeProtection,
  evidenceWords,
  exposureQuantities,
  findExposureScale,
  findRowRemarks,
  nameExposed,
} from './exposure-words';

/** Everybody in the room: what reached the collar, the eye, the body, and how sure that is. */
export function ExposureTable({ exposures }: { exposures: readonly StaffExposure[] }) {
  const scale = findExposureScale(exposures);
  const columns: Column<StaffExposure>[] = [
    {
      key: 'person',
      head: 'Person',
      phone: 'title',
      className: 'md:w-64',
      cell: (exposure) => <Person exposure={exposure} />,
    },
    ...exposureQuantities.map((quantity): Column<StaffExposure> => ({
      key: quantity.key,
      head: quantity.head,
      align: 'end',
      phone: 'labelled',
      cell: (exposure) => (
        <ExposureFigure figure={quantity.read(exposure)} quantity={quantity} scale={scale} />
      ),
    })),
    {
      key: 'explain',
      head: 'Basis',
      phone: 'wide',
      cell: (exposure) => <ExplainPanel explanation={explainExposure(exposure)}>How calculated</ExplainPanel>,
    },
  ];
  return (
    <DataTable
      caption="Staff exposure in this procedure"
      columns={columns}
      rows={exposures}
      rowKey={(exposure) => exposure.id}
      hasStickyHead={false}
      footer={
        scale &&
        `Dot: nominal value. Bar: interval of about 95 %, on one logarithmic scale from ${formatScatter(scale.from)} to ${formatScatter(scale.to)} µGy or µSv for the whole table.`
      }
    />
  );
}

const Person = ({ exposure }: { exposure: StaffExposure }) => (
  <span className="flex flex-col">
    <span>
      <span className="font-semibold">{nameExposed(exposure)}</span>{' '}
      <span className="text-ink-2 max-md:font-normal">{describeDuty(exposure)}</span>
    </span>
    <span className="text-sm font-normal text-ink-2">{describeProtection(exposure)}</span>
    {findRowRemarks(exposure).map((gap) => (
      <span key={gap.code} className="text-sm font-normal text-ink">
        {gap.detail}.
      </span>
    ))}
    {exposure.evidenceGrade === 'B' && (
      <span className="text-sm font-normal text-ink">Garment: {evidenceWords.B}.</span>
    )}
  </span>
);
