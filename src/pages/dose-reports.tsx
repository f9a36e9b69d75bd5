import { useSuspenseInfiniteQuery } from '@tanstack/react-query';
import { useDeferredValue } from 'react';
import { useSearchParams } from 'react-router-dom';
import { doseReportFilterSchema, type DoseReportFilter } from '../../shared/contract/dose-report';
import { can } from '../../shared/permissions';
import { FileSearch } from '../features/dose-reports/file-search';
import { doseReportQueries } from '../features/dose-reports/queries';
import { ReadAgainSection } from '../features/dose-reports/read-again-section';
import { describeCounts, describeKeeping, outcomeChoices } from '../features/dose-reports/report-words';
import { ReportsTable } from '../features/dose-reports/reports-table';
import { useSession, useUser } from '../features/session/queries';
import { Page } from '../frame/page';
import { useUrlFilter } from '../lib/url-filter';
import { Button } from '../ui/button';
import { MarginNote } from '../ui/margin-note';
import { Sentence } from '../ui/sentence';
import { SentenceSelect } from '../ui/sentence-select';

/** Whether the part for reading again is open stands in the address, like the filter. */
function useReadAgainPart(): [boolean, (isOpen: boolean) => void] {
  const [query, setQuery] = useSearchParams();
  const setOpen = (isOpen: boolean) =>
    setQuery((current) => {
      const next = new URLSearchParams(current);
      if (isOpen) next.set('part', 'read-again');
      else next.delete('part');
      return next;
    });
  return [query.get('part') === 'read-again', setOpen];
}

export function Component() {
  const user = useUser();
  const { hospital } = useSession();
  const [filter, changeFilter] = useUrlFilter(doseReportFilterSchema);
  const [isReadingAgain, setReadingAgain] = useReadAgainPart();
  const shown = useDeferredValue(filter);
  const { data } = useSuspenseInfiniteQuery(doseReportQueries.pages(shown));
  const [first] = data.pages;
  const canHandle = can(user, 'dose-report.download');
  const canDecide = can(user, 'dose-report.decide');
  return (
    <Page
      title="Dose reports"
      heading={
        <Sentence label="Which files are shown">
          Files{' '}
          <SentenceSelect
            label="outcome"
            value={filter.outcome}
            choices={outcomeChoices}
            onChange={(outcome) => changeFilter({ outcome: outcome as DoseReportFilter['outcome'] })}
          />
          {filter.archive !== '' && (
            <>
              {' '}
              from{' '}
              <SentenceSelect
                label="archive"
                value={filter.archive}
                choices={[
                  { value: '', label: 'any archive or none' },
                  { value: filter.archive, label: first?.archiveName ?? 'one archive' },
                ]}
                onChange={(archive) => changeFilter({ archive })}
              />
            </>
          )}
          , newest first.
        </Sentence>
      }
      lead={
        <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-2">
          <span>{describeCounts(first?.counts ?? {}, filter.text !== '' || filter.archive !== '')}</span>
          {canHandle && <FileSearch found={filter.text} onFind={(text) => changeFilter({ text })} />}
        </div>
      }
      margin={
        <>
          {canDecide && !isReadingAgain && (
            <MarginNote title="Read again">
              <p className="text-sm">
                After the reader has learnt better, kept files can be read again: first what would change is
                shown, then it is applied.
              </p>
              <Button isSmall className="self-start" onClick={() => setReadingAgain(true)}>
                Read again …
              </Button>
            </MarginNote>
          )}
          <MarginNote title="What becomes of a file">
            <p className="text-sm">Stored: its procedure and events are here.</p>
            <p className="text-sm">Already here: the same report came before; nothing changed.</p>
            <p className="text-sm">Held: it may become readable, or needs a decision.</p>
            <p className="text-sm">Refused: it is no dose report of fluoroscopy or radiography.</p>
            <p className="text-sm">{describeKeeping(first?.refusedKeepDays ?? 0)}</p>
            {!canHandle && (
              <p className="text-sm">File names and reasons may name a patient and are not shown to you.</p>
            )}
          </MarginNote>
        </>
      }
    >
      {canDecide && isReadingAgain && <ReadAgainSection onClose={() => setReadingAgain(false)} />}
      <ReportsTable
        filter={shown}
        timeZone={hospital?.timeZone ?? 'UTC'}
        canHandle={canHandle}
        canDecide={canDecide}
      />
    </Page>
  );
}
