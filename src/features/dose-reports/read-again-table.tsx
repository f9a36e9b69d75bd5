import type { ReadAgainPreview } from '../../../shared/contract/read-again';
import { formatInteger, MISSING } from '../../../shared/units';
import { DataTable } from '../../ui/data-table';
import type { Column } from '../../ui/data-table.types';
import { compareSummaries, isToChoose, nameField, verdictWords } from './read-again-words';

type ReadAgainTableProps = {
  previews: readonly ReadAgainPreview[];
  chosen: ReadonlySet<string>;
  onChoose: (id: string, isChosen: boolean) => void;
  isLocked: boolean;
};

const listColumns = ({
  chosen,
  onChoose,
  isLocked,
}: Omit<ReadAgainTableProps, 'previews'>): Column<ReadAgainPreview>[] => [
  {
    key: 'choose',
    head: <span className="sr-only">Apply</span>,
    phone: 'wide',
    cell: (preview) =>
      isToChoose(preview) ? (
        <input
          type="checkbox"
          className="size-4.5 accent-lee"
          aria-label={`Apply to ${preview.fileName}`}
          checked={chosen.has(preview.doseReportId)}
          disabled={isLocked}
          onChange={(event) => onChoose(preview.doseReportId, event.target.checked)}
        />
      ) : null,
  },
  {
    key: 'file',
    head: 'File',
    phone: 'title',
    className: 'md:min-w-44',
    cell: ({ fileName }) => <span className="wrap-anywhere">{fileName}</span>,
  },
  {
    key: 'verdict',
    head: 'Read now',
    className: 'md:min-w-36',
    cell: ({ verdict }) => (
      <span className={verdict === 'fails' ? 'font-semibold text-beacon' : undefined}>
        {verdictWords[verdict]}
      </span>
    ),
  },
  {
    key: 'figures',
    head: 'Before and after',
    phone: 'wide',
    className: 'md:min-w-56',
    cell: ({ before, after, verdict }) =>
      after && verdict !== 'fails' ? (
        <ul className="text-sm">
          {compareSummaries(before, after).map((line) => (
            <li key={line.name}>
              {line.name}: {line.after}, before {line.before}
            </li>
          ))}
        </ul>
      ) : null,
  },
  {
    key: 'changes',
    head: 'Values that change',
    phone: 'wide',
    className: 'md:min-w-72',
    cell: (preview) => <Changes preview={preview} />,
  },
];

function Changes({ preview: { changedCount, changes, reason } }: { preview: ReadAgainPreview }) {
  if (reason) return <p className="text-sm">{reason}</p>;
  if (changedCount === 0) return null;
  const rest = changedCount - changes.length;
  return (
    <div className="text-sm">
      <p>{changedCount === 1 ? '1 value' : `${formatInteger(changedCount)} values`}</p>
      <ul className="ml-4 list-disc text-ink-2">
        {changes.map(({ where, field, before, after }) => (
          <li key={`${where} ${field}`} className="wrap-anywhere">
            {where}, {nameField(field)}: {after ?? MISSING}, before {before ?? MISSING}
          </li>
        ))}
      </ul>
      {rest > 0 && <p className="text-ink-2">and {formatInteger(rest)} more</p>}
    </div>
  );
}

/** The files for which reading again makes a difference, or cannot be done. */
export const ReadAgainTable = ({ previews, ...choice }: ReadAgainTableProps) => (
  <DataTable
    caption="Files that would not read as before"
    columns={listColumns(choice)}
    rows={previews.filter(({ verdict }) => verdict !== 'same')}
    rowKey={({ doseReportId }) => doseReportId}
    hasStickyHead={false}
  />
);
