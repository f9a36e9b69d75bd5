import { useMemo, useState } from 'react';
import type { IrradiationEvent } from '../../../shared/contract/irradiation-event';
import { StripExplorer } from '../../charts/strip-explorer';
import { StripLegend } from '../../charts/strip-legend';
import { buildEventBlocks, findSpanS, type RateBasis } from './event-blocks';
import { kvpShadeLimits } from '../../lib/kvp-shades';
import { EventDetail } from './event-detail';
import { describeEvent, describeRateBasis, formatRate, rateUnits } from './event-words';

type EventStripProps = {
  events: readonly IrradiationEvent[];
  basis: RateBasis;
  /** Second of the day at which the procedure began. */
  originS: number;
};

/** The large strip with its legend; a picked event tells everything about itself below. */
export function EventStrip({ events, basis, originS }: EventStripProps) {
  const [picked, setPicked] = useState<number | null>(null);
  const blocks = useMemo(() => buildEventBlocks(events, basis), [events, basis]);
  const hasBelow = blocks.some((block) => block.side === 'below');
  const pickedEvent = picked === null ? undefined : events[picked];
  return (
    <div className="flex flex-col gap-3">
      <StripExplorer
        blocks={blocks}
        span={findSpanS(blocks)}
        originS={originS}
        label="Irradiation events in time: arrow keys walk, plus and minus zoom, Enter opens"
        rateTitle={`Rate, ${rateUnits[basis]}. Point at an event, or walk with the arrow keys.`}
        formatRate={(rate) => formatRate(rate, basis)}
        describe={(place) => {
          const event = events[place];
          return event ? describeEvent(event, place, basis) : '';
        }}
        onPick={setPicked}
        height={hasBelow ? 280 : 220}
      />
      <StripLegend
        plainName="fluoroscopy"
        patternedName="acquisition"
        shadeTitle="kVp"
        shadeLimits={kvpShadeLimits}
        sidesNote={hasBelow ? 'plane A above the line, plane B below' : undefined}
      />
      <p className="text-sm text-ink-2">{describeRateBasis(events, basis)}</p>
      {pickedEvent && picked !== null && (
        <EventDetail event={pickedEvent} place={picked} onClose={() => setPicked(null)} />
      )}
    </div>
  );
}
