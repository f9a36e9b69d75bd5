import type { PlaneTotals } from '../../shared/contract/procedure';
import {
  arithmetic,
  found,
  isOutside,
  kermaQuantities,
  notChecked,
  ofPlane,
  passed,
  practice,
  write,
  writeBounds,
  writePercent,
  type CheckFacts,
  type CheckRule,
} from './check-rule';

/** Reported total and sum of events, wherever both are known and not zero. */
function pairsOf(planes: PlaneTotals[]) {
  return planes.flatMap((plane) =>
    kermaQuantities.flatMap(({ field, sign }) => {
      const [total, events] = [plane.reported?.[field] ?? null, plane.summed[field]];
      return total === null || events === null || total <= 0 || events <= 0
        ? []
        : [{ plane, field, sign, total, events }];
    }),
  );
}

/** The power of ten by which two values differ, when they differ by nothing else; 0 when they agree or just differ. */
function findDecade(ratio: number): number {
  const decades = Math.log10(ratio);
  const nearest = Math.round(decades);
  return Math.abs(decades - nearest) < Math.log10(1.1) ? nearest : 0;
}

const nothingToCompare = 'Totals or events are missing: nothing to compare.';

const totalsAgainstEvents: CheckRule = {
  code: 'totals-against-events',
  name: 'Totals against events',
  looksAt: 'Reported K a,r and P KA of each plane against the sum of its irradiation events.',
  remedy: 'Look whether the report lacks events, or holds events of another case.',
  source: practice,
  severity: 'note',
  owner: 'physicist',
  low: null,
  high: 5,
  unit: '%',
  check({ planes }, { high }) {
    const differences = pairsOf(planes).map((pair) => ({
      ...pair,
      share: Math.abs(pair.events - pair.total) / pair.total,
    }));
    const largest = differences.toSorted((a, b) => b.share - a.share)[0];
    if (!largest) return notChecked(nothingToCompare);
    return high !== null && largest.share * 100 > high
      ? found(
          `Events and reported totals differ by ${writePercent(largest.share)} in ${largest.sign}${ofPlane(largest.plane, planes)}`,
          largest.field,
          largest.share,
        )
      : passed(`Events add up to the totals within ${writePercent(largest.share)}`);
  },
};

const eventUnits: CheckRule = {
  code: 'event-units',
  name: 'Units of totals and events',
  looksAt: 'Whether reported totals and the sum of events differ by a factor of ten, a hundred, a thousand …',
  remedy: 'Compare with the machine’s screen or an image header, and correct the total.',
  source: arithmetic,
  severity: 'hard',
  owner: 'physicist',
  low: null,
  high: null,
  unit: null,
  check({ planes }) {
    const pairs = pairsOf(planes);
    if (pairs.length === 0) return notChecked(nothingToCompare);
    const slip = pairs
      .map((pair) => ({ ...pair, decade: findDecade(pair.total / pair.events) }))
      .find(({ decade }) => decade !== 0);
    return slip
      ? found(
          `${slip.sign}${ofPlane(slip.plane, planes)}: the reported total is ${write(10 ** slip.decade)} times the sum of events: a unit slip?`,
          slip.field,
          slip.decade,
        )
      : passed('Totals and events are in the same units');
  },
};

/** Total and sum of events of one machine, all planes. */
function excessOf(planes: PlaneTotals[], field: (typeof kermaQuantities)[number]['field']) {
  const pairs = planes.map((plane) => ({
    total: plane.reported?.[field] ?? null,
    events: plane.summed[field],
  }));
  if (pairs.some(({ total, events }) => total === null || events === null)) return null;
  const events = pairs.reduce((sum, pair) => sum + (pair.events ?? 0), 0);
  return { events, excess: pairs.reduce((sum, pair) => sum + (pair.total ?? 0), 0) - events };
}

/** Two figures from different readings of one counter agree within this share. */
const counterTolerance = 0.03;

const resetFailure: CheckRule = {
  code: 'reset-failure',
  name: 'Counter not reset',
  looksAt:
    'Whether the reported total exceeds the sum of events by just what the machine’s procedure before had displayed.',
  remedy: 'Take the sum of events as the total, and tell service that the counter was not reset.',
  source: arithmetic,
  severity: 'hard',
  owner: 'physicist',
  low: null,
  high: null,
  unit: null,
  check({ planes, context }) {
    let compared = 0;
    for (const [equipmentId, previous] of context.previousTotals) {
      const own = planes.filter((plane) => plane.equipmentId === equipmentId);
      for (const { field, sign, print } of kermaQuantities) {
        const before = previous[field];
        const excess = own.length === 0 ? null : excessOf(own, field);
        if (excess === null || before === null || before <= 0 || excess.events <= 0) continue;
        compared += 1;
        if (
          excess.excess > 0.05 * excess.events &&
          Math.abs(excess.excess - before) <= counterTolerance * before
        )
          return found(
            `${sign}: the reported total exceeds the sum of events by ${print(excess.excess)}, which is what the machine displayed at the procedure before (${print(before)}): not reset?`,
            field,
            excess.excess,
          );
      }
    }
    return compared === 0
      ? notChecked('No procedure before it on this machine, or no events to compare.')
      : passed('The total does not hold the procedure before');
  },
};

type Whole = { code: string; name: string; field: 'referenceAirKerma' | 'kermaAreaProduct'; sign: string };

const wholeRule = ({ code, name, field, sign }: Whole, unit: string, high: number): CheckRule => ({
  code,
  name,
  looksAt: `${sign} of the whole procedure against what no procedure reaches.`,
  remedy: 'Compare with the machine’s screen, and type the true total.',
  source: practice,
  severity: 'hard',
  owner: 'physicist',
  low: null,
  high,
  unit,
  check({ together }: CheckFacts, bounds) {
    const value = together[field].displayed;
    if (value === null) return notChecked(`${sign} is missing.`);
    return isOutside(value, bounds)
      ? found(
          `${sign} ${write(value)} ${unit}: more than any procedure; ${writeBounds(bounds)} ${unit}`,
          value,
        )
      : passed(`${sign} is of a size that occurs`);
  },
});

export const totalRules: CheckRule[] = [
  totalsAgainstEvents,
  eventUnits,
  resetFailure,
  wholeRule(
    { code: 'kerma-total', name: 'K a,r of the whole', field: 'referenceAirKerma', sign: 'K a,r' },
    'Gy',
    50,
  ),
  wholeRule(
    { code: 'area-product-total', name: 'P KA of the whole', field: 'kermaAreaProduct', sign: 'P KA' },
    'Gy·cm²',
    5000,
  ),
];
