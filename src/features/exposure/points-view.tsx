import { useMemo } from 'react';
import { isInArea } from '../../charts/scatter.types';
import type { ExposurePoints, ExposureQuantity } from '../../../shared/contract/staff-exposure';
import { formatInteger } from '../../../shared/units';
import { Button } from '../../ui/button';
import { ExplainPanel, type Explanation } from '../../ui/explain-panel';
import { Section } from '../../ui/margin-note';
import { placePoint } from './chosen-area';
import { ExposureChart } from './exposure-chart';
import { quantityWords } from './exposure-words';
import { NoPoints } from './no-points';
import { PointsTable } from './points-table';
import { usePointsView } from './use-points-view';

type PointsViewProps = {
  found: ExposurePoints;
  quantity: ExposureQuantity;
  explanation: Explanation;
  onOpen: (procedureId: string) => void;
};

/** Fewer points than these make no picture: the list says more. */
const fewestDrawn = 5;

/** The chart, what was chosen in it, and the list of it. */
export function PointsView({ found, quantity, explanation, onOpen }: PointsViewProps) {
  const { area, chooseArea, sort, sortBy } = usePointsView();
  const { items } = found;
  const chosen = useMemo(() => {
    if (!area) return items;
    return items.filter((point) => {
      const place = placePoint(point);
      return place !== null && isInArea(place, area);
    });
  }, [items, area]);
  if (items.length === 0) return <NoPoints found={found} />;
  const drawn = items.filter((point) => placePoint(point) !== null).length;
  const { plainSign } = quantityWords[quantity];
  return (
    <>
      <Section
        title="Fluoroscopy time, kVp and scatter"
        note="a dot: one procedure; bars at the edges: how many"
        aside={<ExplainPanel explanation={explanation} />}
      >
        {drawn >= fewestDrawn ? (
          <ExposureChart points={items} quantity={quantity} area={area} onArea={chooseArea} onOpen={onOpen} />
        ) : (
          <p className="text-ink-2">
            {drawn === 1 ? 'One procedure makes' : `${drawn} procedures make`} no picture: they stand in the
            list.
          </p>
        )}
        {drawn < items.length && (
          <p className="text-sm text-ink-2">
            {items.length - drawn} without fluoroscopy time or kVp: in the list only.
          </p>
        )}
      </Section>
      <Section
        title={area ? `${formatInteger(chosen.length)} chosen` : `All ${formatInteger(items.length)}`}
        note={sort.key === 'estimate' && sort.order === 'descending' ? 'highest first' : undefined}
        aside={
          area ? (
            <Button isSmall onClick={() => chooseArea(null)}>
              Choose all again
            </Button>
          ) : (
            drawn >= fewestDrawn && (
              <span className="text-ink-2">Draw a rectangle in the chart to choose some.</span>
            )
          )
        }
      >
        <PointsTable
          caption={`Procedures with the estimated ${plainSign}`}
          points={chosen}
          quantity={quantity}
          sort={sort}
          onSort={sortBy}
          empty={<p className="py-4 text-ink-2">No procedure lies in the chosen rectangle.</p>}
        />
      </Section>
    </>
  );
}
