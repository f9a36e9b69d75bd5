import type { ProcedureRow, Strip } from '../../../shared/contract/procedure-row';
import { findShadeStep } from '../../charts/shade-step';
import { StripChart } from '../../charts/strip-chart';
import type { StripBlock } from '../../charts/strip.types';
import { kvpShadeLimits } from '../../lib/kvp-shades';
import { describePeak, describeSpan } from './strip-words';

const toBlock = (bin: Strip['bins'][number]): StripBlock => ({
  from: bin.fromS,
  to: bin.toS,
  height: bin.rate,
  shade: findShadeStep(bin.kvp, kvpShadeLimits),
  side: bin.plane === 'B' ? 'below' : 'above',
  isPatterned: bin.part === 'acquisition',
});

function describe(strip: Strip): string {
  const { spanS, bins } = strip;
  const runs = bins.filter((bin) => bin.part === 'acquisition').length;
  const kvps = bins.flatMap(({ kvp }) => kvp ?? []);
  const range = kvps.length === 0 ? 'kVp not reported' : `${Math.min(...kvps)} to ${Math.max(...kvps)} kVp`;
  return `Strip over ${describeSpan(spanS)}: ${bins.length - runs} fluoroscopy and ${runs} acquisition parts, ${range}, ${describePeak(strip)}`;
}

/** A procedure in one picture, drawn to its own scale, which stands below it. */
export const LedgerStrip = ({ strip, isManual }: Pick<ProcedureRow, 'strip' | 'isManual'>) =>
  strip ? (
    // Narrower where the page has no margin column yet.
    <div className="md:w-[8.5rem] margin:w-[10.5rem] [&>svg]:w-full">
      <StripChart
        blocks={strip.bins.map(toBlock)}
        span={strip.spanS}
        peak={strip.peakRate}
        width={168}
        label={describe(strip)}
      />
      <span
        aria-hidden="true"
        className="condensed flex justify-between gap-1 text-xs whitespace-nowrap text-ink-2"
      >
        <span>{describePeak(strip)}</span>
        <span>{describeSpan(strip.spanS)}</span>
      </span>
    </div>
  ) : (
    <span className="text-sm text-ink-2">{isManual ? 'none, entered by hand' : 'no events with a rate'}</span>
  );
