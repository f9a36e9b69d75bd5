import type { ProcedureRow } from '../../../shared/contract/procedure-row';
import {
  formatFluoroscopyTime,
  formatKermaAreaProduct,
  formatKvp,
  formatReferenceAirKermaMgy,
} from '../../../shared/units';
import { formatDate, formatTime } from '../../lib/clock';
import { AttentionMark } from '../../ui/attention-mark';
import type { Column } from '../../ui/data-table.types';
import { DoubtWords } from '../../ui/doubt-words';
import { Quantity } from '../../ui/quantity';
import { EnteredByHand } from '../../ui/entered-by-hand';
import { QuantitySign } from '../../ui/quantity-sign';
import { LedgerStrip } from './ledger-strip';
import { describeRecordState, describeTimeBasis } from './ledger-words';

// An upright tablet has no room for them; they stand on the procedure's own page.
const tooWideForTablets = 'md:max-lg:hidden';

const started: Column<ProcedureRow> = {
  key: 'started',
  head: 'Started',
  sortKey: 'started',
  firstOrder: 'descending',
  cell: ({ startedAt, timeBasis, caseNumber, isManual }) => (
    <span className="whitespace-nowrap">
      {formatDate(startedAt)} <span className="text-ink-2">{formatTime(startedAt)}</span>
      <span className="text-sm text-ink-2 max-md:ml-3 md:block">{caseNumber}</span>
      {timeBasis !== 'event' && (
        <span className="block text-xs text-ink-2">{describeTimeBasis(timeBasis, isManual)}</span>
      )}
    </span>
  ),
};

/** Who it was, for those whose answer names the patient. */
const PatientLine = ({ patient }: Required<Pick<ProcedureRow, 'patient'>>) => (
  <span className="block text-sm font-normal text-ink-2">
    {patient.name?.replaceAll('^', ' ').trim() || 'no name'} ·{' '}
    <span className="whitespace-nowrap">{patient.id ?? 'no ID'}</span>
  </span>
);

const procedure: Column<ProcedureRow> = {
  key: 'procedure',
  head: 'Procedure',
  phone: 'title',
  className: 'md:min-w-36 margin:min-w-52',
  cell: ({ procedureType, studyDescription, procedureClass, patient, isManual }) => (
    <>
      {procedureType?.name ?? studyDescription ?? 'Type not recorded'}
      {procedureClass !== 'clinical' && (
        <span className="block text-sm font-normal text-ink-2">{procedureClass.replace('-', ' ')}</span>
      )}
      {isManual && (
        <span className="block text-sm font-normal">
          <EnteredByHand />
        </span>
      )}
      {patient && <PatientLine patient={patient} />}
    </>
  ),
};

const figures: Column<ProcedureRow>[] = [
  {
    key: 'room',
    head: 'Room',
    cell: ({ room }) => room?.name ?? <span className="text-ink-2">no room</span>,
  },
  {
    key: 'operator',
    head: 'Operator',
    className: tooWideForTablets,
    cell: ({ primaryOperator }) => primaryOperator?.name ?? <span className="text-ink-2">–</span>,
  },
  {
    key: 'time',
    head: <QuantitySign of="fluoroscopyTime" />,
    unit: 'min',
    align: 'end',
    sortKey: 'fluoroscopy-time',
    cell: ({ fluoroscopyTimeS }) => <Quantity value={formatFluoroscopyTime(fluoroscopyTimeS)} />,
  },
  {
    key: 'kerma',
    head: <QuantitySign of="referenceAirKerma" />,
    unit: 'mGy',
    align: 'end',
    sortKey: 'reference-air-kerma',
    cell: (row) => (
      <>
        <Quantity
          value={formatReferenceAirKermaMgy(row.referenceAirKermaGy)}
          isUpperBound={row.isReferenceAirKermaUpperBound}
          isCorrected={row.isCorrected}
        />
        <DoubtWords {...row} />
      </>
    ),
  },
  {
    key: 'area-product',
    head: <QuantitySign of="kermaAreaProduct" />,
    unit: 'Gy·cm²',
    align: 'end',
    sortKey: 'kerma-area-product',
    cell: (row) => (
      <>
        <Quantity value={formatKermaAreaProduct(row.kermaAreaProductGyCm2)} isCorrected={row.isCorrected} />
        <DoubtWords {...row} />
      </>
    ),
  },
  {
    key: 'kvp',
    className: 'md:max-margin:hidden',
    head: 'kVp',
    align: 'end',
    sortKey: 'kvp',
    cell: ({ kvpMean }) => <Quantity value={formatKvp(kvpMean)} />,
  },
];

const strip: Column<ProcedureRow> = {
  key: 'strip',
  head: 'Procedure strip',
  unit: 'time along, rate up',
  phone: 'wide',
  className: tooWideForTablets,
  cell: (row) => <LedgerStrip strip={row.strip} isManual={row.isManual} />,
};

const attention: Column<ProcedureRow> = {
  key: 'attention',
  head: 'Attention',
  cell: ({ attention: flagged }) => flagged && <AttentionMark strength={flagged.level} />,
};

const record: Column<ProcedureRow> = {
  key: 'record',
  head: 'Record',
  className: 'lg:min-w-28',
  cell: (row) => (
    <span
      className={row.recordState === 'complete' ? 'text-sm text-ink-2' : 'text-sm font-semibold text-lee'}
    >
      {describeRecordState(row)}
    </span>
  ),
};

export const ledgerColumns: readonly Column<ProcedureRow>[] = [
  started,
  procedure,
  ...figures,
  strip,
  attention,
  record,
];
