import type { IrradiationEvent } from '../../../shared/contract/irradiation-event';
import { convertGyPerSToMgyPerMin } from '../../../shared/units';
import type { StripBlock } from '../../charts/strip.types';
import { findShadeStep } from '../../charts/shade-step';
import { kvpShadeLimits } from '../../lib/kvp-shades';

export type RateBasis = 'reference-air-kerma' | 'kerma-area-product';

/** An event that says nothing about how long it took is drawn one second wide. */
const drawnAnywayS = 1;

export const findDurationS = (event: IrradiationEvent): number | null =>
  event.irradiationDurationS ?? event.exposureTimeS;

/** The height of a strip: K a,r rate in mGy/min where any event has one, else P KA rate in Gy·cm²/min. */
export const findRateBasis = (events: readonly IrradiationEvent[]): RateBasis =>
  events.some((event) => event.airKermaRateGyPerS !== null) ? 'reference-air-kerma' : 'kerma-area-product';

export function findRate(event: IrradiationEvent, basis: RateBasis): number | null {
  if (basis === 'reference-air-kerma')
    return event.airKermaRateGyPerS === null ? null : convertGyPerSToMgyPerMin(event.airKermaRateGyPerS);
  const durationS = findDurationS(event);
  return event.kermaAreaProductGyCm2 === null || durationS === null || durationS <= 0
    ? null
    : (event.kermaAreaProductGyCm2 / durationS) * 60;
}

/** Irradiation events as blocks of the large strip; plane B hangs below the line. */
export const buildEventBlocks = (events: readonly IrradiationEvent[], basis: RateBasis): StripBlock[] =>
  events.map((event) => ({
    from: event.offsetS,
    to: event.offsetS + Math.max(findDurationS(event) ?? drawnAnywayS, 0.1),
    height: findRate(event, basis) ?? 0,
    shade: findShadeStep(event.kvpMean, kvpShadeLimits),
    side: event.plane === 'B' ? 'below' : 'above',
    isPatterned: event.type !== 'fluoroscopy',
  }));

/** Where the strip's time begins and how long it runs, in seconds from the procedure's start. */
export function findSpanS(blocks: readonly StripBlock[]): number {
  const end = blocks.reduce((latest, block) => Math.max(latest, block.to), 0);
  return Math.max(end, drawnAnywayS);
}
