import { useState } from 'react';
import type { Procedure } from '../../../shared/contract/procedure';
import { formatInstant } from '../../lib/clock';
import { Button } from '../../ui/button';
import { MarginNote } from '../../ui/margin-note';

const firstShown = 6;

/** Who did what, when, and why; newest first. */
export function HistoryNote({ history, timeZone }: { history: Procedure['history']; timeZone: string }) {
  const [isWhole, setIsWhole] = useState(false);
  const newestFirst = [...history].sort((one, other) => other.at.localeCompare(one.at));
  const shown = isWhole ? newestFirst : newestFirst.slice(0, firstShown);
  if (history.length === 0) return null;
  return (
    <MarginNote title="History">
      <ol>
        {shown.map(({ at, by, action, reason }, place) => (
          <li key={`${at} ${place}`} className="border-b border-rule py-1.5 text-sm">
            {action}
            <span className="block text-ink-2">
              {formatInstant(at, timeZone)}, {by}
            </span>
            {reason && <span className="block">“{reason}”</span>}
          </li>
        ))}
      </ol>
      {history.length > firstShown && !isWhole && (
        <Button isSmall onClick={() => setIsWhole(true)}>
          All {history.length} entries
        </Button>
      )}
    </MarginNote>
  );
}
