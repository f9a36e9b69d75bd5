import { useSuspenseInfiniteQuery } from '@tanstack/react-query';
import { useDeferredValue } from 'react';
import { doseReportFilterSchema, type DoseReportFilter } from '../../shared/contract/dose-report';
import { can } from '../../shared/permissions';
import { doseReportQueries } from '../features/dose-reports/queries';
import { describeCounts, outcomeChoices } from '../features/dose-reports/report-words';
import { ReportsTable } from '../features/dose-reports/reports-table';
import { useSession, useUser } from '../features/session/queries';
import { Page } from '../frame/page';
import { useUrlFilter } from '../lib/url-filter';
import { MarginNote } from '../ui/margin-note';
import { Sentence } from '../ui/sentence';
import { SentenceSelect } from '../ui/sentence-select';

export function Component() {
  const user = useUser();
  const { hospital } = useSession();
  const [filter, changeFilter] = useUrlFilter(doseReportFilterSchema);
  const shown = useDeferredValue(filter);
  const { data } = useSuspenseInfiniteQuery(doseReportQueries.pages(shown));
  const canHandle = can(user, 'dose-report.download');
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
          , newest first.
        </Sentence>
      }
      lead={describeCounts(data.pages[0]?.counts ?? {})}
      margin={
        <MarginNote title="What becomes of a file">
          <p className="text-sm">Stored: its procedure and events are here.</p>
          <p className="text-sm">Already here: the same report came before; nothing changed.</p>
          <p className="text-sm">Held: it may become readable, or needs a decision.</p>
          <p className="text-sm">Refused: it is no dose report of fluoroscopy or radiography.</p>
          <p className="text-sm">Every file is kept as it came, whatever its outcome.</p>
          {!canHandle && (
            <p className="text-sm">File names and reasons may name a patient and are not shown to you.</p>
          )}
        </MarginNote>
      }
    >
      <ReportsTable filter={shown} timeZone={hospital?.timeZone ?? 'UTC'} canHandle={canHandle} />
    </Page>
  );
}
