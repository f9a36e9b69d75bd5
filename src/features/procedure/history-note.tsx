import { useState } from 'react';
import type { Procedure } from '../../../shared/contract/procedure';
import { formatInstant } from '../../lib/clock';
import { Button } from '../../ui/button';
import { MarginNote } from '../../ui/margin-note';

const firstShown = 6;
const lookAction = 'patient shown';

/** Who did what, when, and why; newest first. */
export function HistoryNote({ history, timeZone }: { history: Procedure['history']; timeZone: string }) {
  const [isWhole, setIsWhole] = useState(false);
  // Looks at the patient's identity change nothing: they are counted, not listed among the changes.
  const changes = history.filter(({ action }) => action !== lookAction);
  const looks = history.length - changes.length;
  const newestFirst = [...changes].sort((one, other) => other.at.localeCompare(one.at));
  const shown = isWhole ? newestFirst : newestFirst.slice(0, firstShown);
  if (history.length === 0) return null;
  return (
    <MarginNote title="History">
      <ol>
        {shown.map(({ at, by, action, reason }, place) => (
          <li key={`${at} ${place}`} className="border-b border-rule py-1.5 text-sm">
            <span className="block first-letter:uppercase">{action}</span>
            <span className="block text-ink-2">
              {formatInstant(at, timeZone)}, {by}
            </span>
            {reason && <span className="block">“{reason}”</span>}
          </li>
        ))}
      </ol>
      {changes.length > firstShown && !isWhole && (
        <Button isSmall onClick={() => setIsWhole(true)}>
          All {changes.length} entries
        </Button>
      )}
      {looks > 0 && (
        <p className="text-sm text-ink-2">
          The patient’s identity was shown {looks === 1 ? 'once' : `${looks} times`}.
        </p>
      )}
    </MarginNote>
  );
}
