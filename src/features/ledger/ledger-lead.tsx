import { describeIncomplete, describeTotal } from './ledger-words';

type LedgerLeadProps = {
  count: { total: number; incomplete: number; enteredByHand: number };
  /** Null where they are all that is shown already. */
  onShowIncomplete: (() => void) | null;
};

/** "918 procedures. 2 need details." The second leads to them. */
export function LedgerLead({ count, onShowIncomplete }: LedgerLeadProps) {
  const incomplete = describeIncomplete(count.incomplete);
  return (
    <p>
      <span role="status">{describeTotal(count.total, count.enteredByHand)}</span>{' '}
      {incomplete && onShowIncomplete && (
        <button type="button" className="link-line target" onClick={onShowIncomplete}>
          {incomplete}
        </button>
      )}
      {incomplete && !onShowIncomplete && incomplete}
      {incomplete && '.'}
    </p>
  );
}
