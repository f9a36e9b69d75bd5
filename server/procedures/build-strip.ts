import type { Strip } from '../../shared/contract/procedure-row';
import { airKermaRate } from '../../shared/dosimetry/air-kerma-rate';
import type { SummaryEvent } from './summary-input';

const mostBins = 64;

type Bin = Strip['bins'][number];

const seconds = (value: number) => Math.round(value * 10) / 10;
const significant = (value: number) => Number(value.toPrecision(4));

function toBin(event: SummaryEvent, startMs: number, isByKerma: boolean): Bin | null {
  const rate = airKermaRate(isByKerma ? event : { ...event, referenceAirKermaGy: null });
  if (!rate || (rate.basis === 'kerma-area-product') === isByKerma) return null;
  const fromS = (event.startedAt.getTime() - startMs) / 1000;
  const durationS = event.irradiationDurationS ?? event.exposureTimeS ?? 0;
  return {
    fromS,
    toS: fromS + durationS,
    rate: rate.perS,
    kvp: event.kvpMean,
    part: event.type === 'fluoroscopy' ? 'fluoroscopy' : 'acquisition',
    plane: event.plane === 'B' ? 'B' : 'A',
  };
}

/** Two neighbours of one plane and part as one bin: the area under the rate stays. */
function merge(a: Bin, b: Bin): Bin {
  const [wa, wb] = [a.toS - a.fromS, b.toS - b.fromS];
  const [ka, kb] = [wa * a.rate, wb * b.rate];
  const weight = ka + kb || 1;
  const kvp = a.kvp === null || b.kvp === null ? (a.kvp ?? b.kvp) : (a.kvp * ka + b.kvp * kb) / weight;
  const toS = Math.max(a.toS, b.toS);
  return { ...a, toS, rate: (ka + kb) / Math.max(toS - a.fromS, 1e-6), kvp };
}

/** A bin and its neighbours of the same plane and part; what the bin and the one before it would span together. */
type Link = { bin: Bin; before: Link | null; after: Link | null; spanS: number };

const measure = (link: Link) => {
  link.spanS = link.before === null ? Infinity : link.bin.toS - link.before.bin.fromS;
};

function linkNeighbours(bins: Bin[]): Link[] {
  const lastOf = new Map<string, Link>();
  return bins.map((bin) => {
    const key = `${bin.plane}${bin.part}`;
    const link: Link = { bin, before: lastOf.get(key) ?? null, after: null, spanS: Infinity };
    if (link.before) link.before.after = link;
    measure(link);
    lastOf.set(key, link);
    return link;
  });
}

/** Merges the pair of one plane and part that spans least until at most 64 bins are left. */
function thin(bins: Bin[]): Bin[] {
  const links = linkNeighbours(bins);
  while (links.length > mostBins) {
    const least = links.reduce((best, link) => (link.spanS < best.spanS ? link : best));
    const { before, after } = least;
    if (before === null) break;
    before.bin = merge(before.bin, least.bin);
    before.after = after;
    measure(before);
    if (after) {
      after.before = before;
      measure(after);
    }
    links.splice(links.indexOf(least), 1);
  }
  return links.map(({ bin }) => bin);
}

/** The procedure in one picture: time along, rate up, kVp as shade. Null where no event has a rate. */
export function buildStrip(events: SummaryEvent[]): Strip | null {
  const sorted = events.toSorted((a, b) => a.startedAt.getTime() - b.startedAt.getTime());
  const startMs = sorted[0]?.startedAt.getTime();
  if (startMs === undefined) return null;
  const isByKerma = sorted.some((event) => event.referenceAirKermaGy !== null);
  const bins = sorted.map((event) => toBin(event, startMs, isByKerma)).filter((bin) => bin !== null);
  if (bins.length === 0) return null;
  const thinned = thin(bins).map((bin) => ({
    ...bin,
    fromS: seconds(bin.fromS),
    toS: seconds(bin.toS),
    rate: significant(bin.rate),
    kvp: bin.kvp === null ? null : Math.round(bin.kvp),
  }));
  return {
    spanS: Math.max(...thinned.map((bin) => bin.toS)),
    peakRate: Math.max(...thinned.map((bin) => bin.rate)),
    basis: isByKerma ? 'reference-air-kerma' : 'kerma-area-product',
    bins: thinned,
  };
}
