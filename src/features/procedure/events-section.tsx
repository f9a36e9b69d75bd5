import { useQuery } from '@tanstack/react-query';
import type { Procedure } from '../../../shared/contract/procedure';
import { readClockS } from '../../lib/clock';
import { EmptyState } from '../../ui/empty-state';
import { Section } from '../../ui/margin-note';
import { ProblemNote } from '../../ui/problem-note';
import { UrlTabs, useUrlTab } from '../../ui/url-tabs';
import { findRateBasis } from './event-blocks';
import { EventStrip } from './event-strip';
import { EventsTable } from './events-table';
import { procedureQueries } from './queries';

const views = [
  { key: 'strip', name: 'Strip' },
  { key: 'table', name: 'Table' },
] as const;

/** Irradiation events: the strip, or the same events as a table. */
export function EventsSection({ procedure }: { procedure: Procedure }) {
  const view = useUrlTab(['strip', 'table'], 'events');
  const { data: events, error } = useQuery(procedureQueries.events(procedure.id));
  const basis = findRateBasis(events ?? []);
  return (
    <Section title="Irradiation events" note={procedure.eventCount}>
      <UrlTabs tabs={views} label="Events as" name="events" />
      <ProblemNote error={error} />
      {!events && !error && <p className="min-h-64 text-ink-2">Reading the events …</p>}
      {events?.length === 0 && (
        <EmptyState title="The report holds totals only.">
          No irradiation event was reported, so there is no strip, and no estimate follows angles or kVp.
        </EmptyState>
      )}
      {events && events.length > 0 && view === 'strip' && (
        <EventStrip events={events} basis={basis} originS={readClockS(procedure.startedAt)} />
      )}
      {events && events.length > 0 && view === 'table' && <EventsTable events={events} basis={basis} />}
    </Section>
  );
}
