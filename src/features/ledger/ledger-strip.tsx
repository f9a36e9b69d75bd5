import type { ProcedureRow, Strip } from '../../../shared/contract/procedure';
import { findShadeStep } from '../../charts/shade-step';
import { StripChart } from '../../charts/strip-chart';
import type { StripBlock } from '../../charts/strip.types';
import { kvpShadeLimits } from '../../lib/kvp-shades';

const toBlock = (bin: Strip['bins'][number]): StripBlock => ({
  from: bin.fromS,
  to: bin.toS,
  height: bin.rate,
  shade: findShadeStep(bin.kvp, kvpShadeLimits),
  side: bin.plane === 'B' ? 'below' : 'above',
  isPatterned: bin.part === 'acquisition',
});

function describe({ spanS, bins }: Strip): string {
  const runs = bins.filter((bin) => bin.part === 'acquisition').length;
  const kvps = bins.flatMap(({ kvp }) => kvp ?? []);
  const range = kvps.length === 0 ? 'kVp not reported' : `${Math.min(...kvps)} to ${Math.max(...kvps)} kVp`;
  return `Strip over ${Math.max(1, Math.round(spanS / 60))} min: ${bins.length - runs} fluoroscopy and ${runs} acquisition parts, ${range}`;
}

/** A procedure in one picture, each at its own height: its shape, not its size, is compared. */
export const LedgerStrip = ({ strip }: Pick<ProcedureRow, 'strip'>) =>
  strip ? (
    <StripChart
      blocks={strip.bins.map(toBlock)}
      span={strip.spanS}
      peak={strip.peakRate}
      width={170}
      label={describe(strip)}
    />
  ) : (
    <span className="text-sm text-ink-2">no events with a rate</span>
  );
