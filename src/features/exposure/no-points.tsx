import type { ExposurePoints } from '../../../shared/contract/staff-exposure';
import { fewestUnnamedPeople } from '../../../shared/contract/staff-exposure';
import { EmptyState } from '../../ui/empty-state';

/** Why there is nothing to draw, and what to do. */
export function NoPoints({ found }: { found: ExposurePoints }) {
  if (found.isWithheld)
    return (
      <EmptyState title="Too few people stand behind these figures to show them without names.">
        At least {fewestUnnamedPeople} different people are needed. Widen the sentence: any type, any room, a
        longer period.
      </EmptyState>
    );
  if (found.incompleteRecords > 0)
    return (
      <EmptyState title="No procedure of this sentence has an estimate yet.">
        {found.incompleteRecords === 1 ? 'One waits' : `${found.incompleteRecords} wait`} for the record: once
        type, operator, places and garments are filled in, the estimate is made.
      </EmptyState>
    );
  if (found.withoutEstimate > 0)
    return (
      <EmptyState title="Nothing can be estimated for the procedures of this sentence.">
        The machine reported no KAP, or the garment is not known. The procedure’s own page tells which.
      </EmptyState>
    );
  return (
    <EmptyState title="No procedure fits this sentence.">
      Widen it above: another duty, any type, any room, a longer period.
    </EmptyState>
  );
}
