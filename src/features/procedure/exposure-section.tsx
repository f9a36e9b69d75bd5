import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Caution } from '../../ui/caution';
import { EmptyState } from '../../ui/empty-state';
import { Section } from '../../ui/margin-note';
import { ProblemNote } from '../../ui/problem-note';
import { ExposureTable } from './exposure-table';
import { procedureQueries } from './queries';

type ExposureSectionProps = {
  procedureId: string;
  /** What leads on where nothing was estimated: the way to the record. */
  next: ReactNode;
};

/** Scatter that reached the staff, with what must be said beside it. */
export function ExposureSection({ procedureId, next }: ExposureSectionProps) {
  const { data, error } = useQuery(procedureQueries.exposures(procedureId));
  const people = data?.items ?? [];
  const latest = people
    .map((exposure) => exposure.garmentConfirmedOn)
    .filter((date) => date !== null)
    .sort()[0];
  return (
    <Section title="Staff exposure, estimated" note={people.length > 0 ? people.length : undefined}>
      <ProblemNote error={error} />
      {!data && !error && <p className="min-h-24 text-ink-2">Estimating …</p>}
      {data && people.length === 0 && (
        <EmptyState title={data.notEstimable?.detail ?? 'Nothing was estimated.'}>{next}</EmptyState>
      )}
      {people.length > 0 && (
        <>
          <ExposureTable exposures={people} />
          <div className="grid gap-3 lg:grid-cols-2">
            <Caution of="estimate-not-record" />
            <Caution of="scatter-interval" />
            {latest !== undefined && (
              <Caution of="garment-condition" values={{ date: `${latest} at the earliest` }} />
            )}
            <Caution of="staff-private" />
          </div>
        </>
      )}
    </Section>
  );
}
