import { useState } from 'react';
import type { ExposurePoints, ExposureQuantity } from '../../../shared/contract/staff-exposure';
import { paths } from '../../paths';
import { Button } from '../../ui/button';
import { EmptyState } from '../../ui/empty-state';
import { Section } from '../../ui/margin-note';
import { TextLink } from '../../ui/text-link';
import { PointsTable } from './points-table';
import { usePointsView } from './use-points-view';
import { sortPoints } from './sort-points';

const first = 12;

/** The procedures that the own figures come from; the few that weigh most come first. */
export function OwnProcedures({
  found,
  quantity,
  chartQuery,
}: {
  found: ExposurePoints;
  quantity: ExposureQuantity;
  chartQuery: string;
}) {
  const { sort, sortBy } = usePointsView();
  const [isAll, setIsAll] = useState(false);
  const { items } = found;
  const shown = isAll ? items : sortPoints(items, sort).slice(0, first);
  const share = shareOf(items.slice(0, first), items);
  return (
    <Section
      title="My procedures"
      note={`${items.length} with an estimate${found.withoutEstimate > 0 ? `, ${found.withoutEstimate} without` : ''}`}
      aside={
        items.length > 0 && (
          <TextLink to={`${paths.staffExposure}?${chartQuery}`}>By fluoroscopy time and kVp</TextLink>
        )
      }
    >
      {!isAll && items.length > first && share !== null && (
        <p className="text-sm text-ink-2">
          The {first} highest make up {share} % of the sum.
        </p>
      )}
      <PointsTable
        caption="My procedures with my estimated exposure"
        points={shown}
        quantity={quantity}
        sort={sort}
        onSort={sortBy}
        empty={
          <EmptyState title="No procedure of this period has an estimate for you.">
            An estimate is made when a technologist completes the record of a procedure that names you.
          </EmptyState>
        }
      />
      {!isAll && items.length > first && (
        <div>
          <Button isSmall onClick={() => setIsAll(true)}>
            Show all {items.length}
          </Button>
        </div>
      )}
    </Section>
  );
}

const sum = (points: ExposurePoints['items']) =>
  points.reduce((total, point) => total + point.estimate.nominal, 0);

function shareOf(part: ExposurePoints['items'], whole: ExposurePoints['items']): number | null {
  const total = sum(whole);
  return total > 0 ? Math.round((100 * sum(part)) / total) : null;
}
