import { useSuspenseQueries } from '@tanstack/react-query';
import { explainExposure } from '../features/exposure/explain-exposure';
import { dropEmptyEnd } from '../features/exposure/month-figures';
import { ExposureLead } from '../features/exposure/exposure-lead';
import { MonthsChart } from '../features/exposure/months-chart';
import { ownFilterSchema } from '../features/exposure/own-filter';
import { OwnNotes } from '../features/exposure/own-notes';
import { OwnProcedures } from '../features/exposure/own-procedures';
import { OwnSentence } from '../features/exposure/own-sentence';
import { OwnSummary } from '../features/exposure/own-summary';
import { exposureQueries } from '../features/exposure/queries';
import { GarmentsTable } from '../features/garments/garments-table';
import { garmentQueries } from '../features/garments/queries';
import { useUser } from '../features/session/queries';
import { Page } from '../frame/page';
import { useUrlFilter } from '../lib/url-filter';
import { withQuery } from '../lib/url-query';
import { EmptyState } from '../ui/empty-state';
import { ExplainPanel } from '../ui/explain-panel';
import { Section } from '../ui/margin-note';

export function Component() {
  const user = useUser();
  const [filter, changeFilter] = useUrlFilter(ownFilterSchema);
  const own = { ...filter, person: user.id };
  const [{ data: months }, { data: found }, { data: garments }] = useSuspenseQueries({
    queries: [
      exposureQueries.months(own),
      exposureQueries.points({ ...own, duty: 'any' }),
      garmentQueries.list(),
    ],
  });
  const shown = dropEmptyEnd(months.items);
  const mine = garments.filter(({ owner }) => owner?.id === user.id);
  const worn = mine.filter(({ state }) => state === 'in-service');
  const hasFigures = shown.some((month) => month[filter.quantity] !== null);
  return (
    <Page
      title="My exposure"
      heading={<OwnSentence filter={filter} onChange={changeFilter} />}
      lead={<ExposureLead found={found} />}
      margin={<OwnNotes garmentsConfirmedOn={findOldest(worn.map((garment) => garment.lastInspectedOn))} />}
    >
      {hasFigures ? (
        <>
          <OwnSummary months={shown} />
          <Section
            title="By month"
            aside={<ExplainPanel explanation={explainExposure(filter.quantity, found)} />}
          >
            <MonthsChart months={shown} quantity={filter.quantity} of={user.name} height={240} />
          </Section>
        </>
      ) : (
        <EmptyState title="There is no estimate for you in this period.">
          Estimates come from procedures whose complete record names you. Choose a longer period above, or ask
          a technologist whether the records are complete.
        </EmptyState>
      )}
      {hasFigures && (
        <OwnProcedures
          found={found}
          quantity={filter.quantity}
          chartQuery={withQuery('', { ...own, duty: 'any' }).slice(1)}
        />
      )}
      <Section title="My garments" note="with the day their inspection is due">
        <GarmentsTable
          garments={mine}
          hrefOf={null}
          hasOwners={false}
          empty={
            <EmptyState title="No garment is registered in your name.">
              If you wear one, tell a technologist or the physicist its code: an unknown garment leaves the
              estimate behind it open.
            </EmptyState>
          }
        />
      </Section>
    </Page>
  );
}

/** The earliest day; null when any garment has none, for then the condition is not confirmed. */
function findOldest(days: readonly (string | null)[]): string | null {
  const known = days.flatMap((day) => day ?? []);
  return known.length === days.length ? (known.sort()[0] ?? null) : null;
}
