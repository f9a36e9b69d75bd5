import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import type { ManualEntry, TypedQuantity } from '../../../shared/contract/manual-entry';
import { formatDateTime, formatInstant } from '../../lib/clock';
import { DefinitionList, DefinitionRow } from '../../ui/definition-row';
import { EnteredByHand } from '../../ui/entered-by-hand';
import { Section } from '../../ui/margin-note';
import { ProblemNote } from '../../ui/problem-note';
import { quantityNames, writeConverted, writeTyped } from './conversion-words';
import { EntryPhoto } from './entry-photo';
import { manualEntryQueries } from './queries';

type EnteredSectionProps = {
  procedureId: string;
  timeZone: string;
  /** All figures of the procedure were typed; else a report tells them and these stand back. */
  isCounted: boolean;
  /** Way to the correction of an entry; null for those who may not correct. */
  correct: ((entryId: string) => ReactNode) | null;
};

const nameFigure = ({ quantity, plane }: TypedQuantity) =>
  plane === 'single' ? quantityNames[quantity] : `${quantityNames[quantity]}, plane ${plane}`;

const Figures = ({ entry }: { entry: ManualEntry }) => (
  <DefinitionList>
    {entry.quantities.map((figure) => (
      <DefinitionRow
        key={`${figure.quantity} ${figure.plane}`}
        name={nameFigure(figure)}
        note={writeConverted(figure) && `is ${writeConverted(figure)}`}
      >
        {writeTyped(figure)}
      </DefinitionRow>
    ))}
  </DefinitionList>
);

function Entry({ entry, timeZone }: { entry: ManualEntry; timeZone: string }) {
  const by = entry.enteredBy ? ` by ${entry.enteredBy}` : '';
  return (
    <div className="flex flex-col gap-2">
      <p className="text-sm text-ink-2">
        Typed {formatInstant(entry.enteredAt, timeZone)}
        {by}; start of the procedure {formatDateTime(entry.localStartedAt)}
        {entry.reason && <>. Corrected, because: “{entry.reason}”</>}
      </p>
      <Figures entry={entry} />
      {entry.comment && <p>“{entry.comment}”</p>}
      {entry.photoId && <EntryPhoto entryId={entry.id} />}
    </div>
  );
}

/** What somebody typed from the machine's screen, to the letter, with the entries that were replaced. */
export function EnteredSection({ procedureId, timeZone, isCounted, correct }: EnteredSectionProps) {
  const { data: entries, error } = useQuery(manualEntryQueries.ofProcedure(procedureId));
  const current = entries?.filter(({ isCurrent }) => isCurrent) ?? [];
  const earlier = entries?.filter(({ isCurrent }) => !isCurrent) ?? [];
  return (
    <Section title={<EnteredByHand words="Entered by hand" />} aside={current[0] && correct?.(current[0].id)}>
      <p>
        {isCounted
          ? 'No report came. There are no irradiation events, so there is no strip and no kVp, and the staff estimate rests on the totals.'
          : 'A report came later and its figures count. What was typed stays readable.'}
      </p>
      <ProblemNote error={error} />
      {entries?.length === 0 && (
        <p className="text-ink-2">The typed text is not kept: this entry was generated for the demo.</p>
      )}
      <div className="flex max-w-xl flex-col gap-5">
        {current.map((entry) => (
          <Entry key={entry.id} entry={entry} timeZone={timeZone} />
        ))}
        {earlier.length > 0 && (
          <details>
            <summary className="cursor-pointer text-ink-2">
              {earlier.length === 1 ? '1 earlier entry' : `${earlier.length} earlier entries`}
            </summary>
            <div className="flex flex-col gap-5 pt-3">
              {earlier.map((entry) => (
                <Entry key={entry.id} entry={entry} timeZone={timeZone} />
              ))}
            </div>
          </details>
        )}
      </div>
    </Section>
  );
}
