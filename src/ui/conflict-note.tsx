import type { ReactNode } from 'react';
import { Button } from './button';
import { DataTable } from './data-table';
import type { Column } from './data-table.types';

/** One field of both versions, in words. */
export type ConflictRow = { name: string; mine: ReactNode; theirs: ReactNode };

const columns: Column<ConflictRow>[] = [
  { key: 'name', head: 'Field', cell: (row) => row.name, phone: 'title' },
  { key: 'mine', head: 'Your entry', cell: (row) => row.mine },
  { key: 'theirs', head: 'Saved by the other', cell: (row) => row.theirs },
];

type ConflictNoteProps = {
  /** Only what differs. */
  rows: readonly ConflictRow[];
  /** Null when both changed the same fields. */
  onMerge: (() => void) | null;
  onKeepMine: () => void;
  onTakeTheirs: () => void;
  isBusy: boolean;
};

/** Two people edited the same record: both versions side by side, and the choice between them. */
export const ConflictNote = ({ rows, onMerge, onKeepMine, onTakeTheirs, isBusy }: ConflictNoteProps) => (
  <div role="alert" className="flex flex-col gap-3 border-l-3 border-beacon bg-surface px-4 py-3">
    <p className="font-semibold text-beacon">Somebody saved this after you opened it</p>
    <p>
      {rows.length === 0
        ? 'What they saved equals your entries.'
        : 'Nothing of yours is lost: it is still in the form, and has not been saved.'}
    </p>
    {rows.length > 0 && (
      <DataTable
        caption="Fields that differ"
        columns={columns}
        rows={rows}
        rowKey={(row) => row.name}
        hasStickyHead={false}
      />
    )}
    <div className="flex flex-wrap gap-3">
      {onMerge && (
        <Button onClick={onMerge} isBusy={isBusy}>
          Save my changes on top of theirs
        </Button>
      )}
      <Button onClick={onKeepMine} isBusy={isBusy}>
        Save all of mine over it
      </Button>
      <Button onClick={onTakeTheirs}>Take what was saved</Button>
    </div>
  </div>
);
