import type { SummaryEvent } from '../procedures/summary-input';
import {
  arithmetic,
  found,
  isOutside,
  notChecked,
  passed,
  practice,
  write,
  writeBounds,
  type CheckFacts,
  type CheckRule,
} from './check-rule';

type RangeRule = Pick<CheckRule, 'code' | 'name' | 'looksAt' | 'remedy' | 'severity' | 'low' | 'high'> & {
  unit: string;
  sign: string;
  read: (event: SummaryEvent) => (number | null)[];
};

/** A quantity of every event within bounds. A missing value is a gap, not a fault. */
const rangeRule = ({ sign, read, ...rule }: RangeRule): CheckRule => ({
  ...rule,
  source: practice,
  owner: 'physicist',
  check({ input }: CheckFacts, bounds) {
    let [lowest, highest, silent, odd] = [Infinity, -Infinity, 0, 0];
    for (const event of input.events) {
      const values = read(event).filter((value) => value !== null);
      if (values.length === 0) silent += 1;
      if (values.some((value) => isOutside(value, bounds))) odd += 1;
      for (const value of values) {
        if (value < lowest) lowest = value;
        if (value > highest) highest = value;
      }
    }
    if (lowest === Infinity) return notChecked(`No event tells its ${sign}.`);
    const range = `${sign} ${write(lowest)} to ${write(highest)} ${rule.unit}`;
    if (odd > 0)
      return found(
        `${range} in ${odd} of ${input.events.length} events outside ${writeBounds(bounds)}`,
        lowest,
        highest,
      );
    return passed(silent > 0 ? `${range}; missing in ${silent} of ${input.events.length} events` : range);
  },
});

const readKvp = (event: SummaryEvent) => event.kvpValues;

const ranges = [
  rangeRule({
    code: 'kvp-range',
    name: 'Usual kVp',
    looksAt: 'Tube voltage of every event and pulse.',
    remedy: 'Look at the events; an unusual programme may explain it.',
    severity: 'note',
    low: 40,
    high: 125,
    unit: 'kV',
    sign: 'kVp',
    read: readKvp,
  }),
  rangeRule({
    code: 'kvp-possible',
    name: 'Possible kVp',
    looksAt: 'Tube voltage against what no tube for this work gives.',
    remedy: 'The voltage is in another unit: staff estimates follow it. Settle it, or leave the case out.',
    severity: 'hard',
    low: 20,
    high: 150,
    unit: 'kV',
    sign: 'kVp',
    read: readKvp,
  }),
  rangeRule({
    code: 'event-kerma',
    name: 'K a,r of one event',
    looksAt: 'K a,r of every event.',
    remedy: 'K a,r of an event is in another unit: compare with the total.',
    severity: 'hard',
    low: 0,
    high: 20,
    unit: 'Gy',
    sign: 'K a,r of an event',
    read: (event) => [event.referenceAirKermaGy],
  }),
  rangeRule({
    code: 'pulse-width',
    name: 'Pulse width',
    looksAt: 'Pulse width of every event.',
    remedy: 'Probably s or µs in place of ms; no figure here depends on it.',
    severity: 'note',
    low: 0.1,
    high: 500,
    unit: 'ms',
    sign: 'Pulse width',
    read: (event) => [event.pulseWidthMs],
  }),
  rangeRule({
    code: 'angles',
    name: 'Angles of the C-arm',
    looksAt: 'Primary and secondary angles, begin and end. Missing angles are a gap, not a fault.',
    remedy: 'Staff estimates follow the angles: have the machine’s display checked.',
    severity: 'note',
    low: -185,
    high: 185,
    unit: '°',
    sign: 'Angles',
    read: (event) => [
      event.primaryAngleDeg,
      event.secondaryAngleDeg,
      event.primaryEndAngleDeg,
      event.secondaryEndAngleDeg,
    ],
  }),
];

const neverNegative = [
  'kermaAreaProductGyCm2',
  'referenceAirKermaGy',
  'irradiationDurationS',
  'exposureTimeS',
  'tubeCurrentMa',
  'pulseCount',
  'pulseRatePerS',
  'fieldAreaCm2',
] as const;

const negativeValues: CheckRule = {
  code: 'negative-values',
  name: 'Negative values',
  looksAt: 'Totals, times, currents and areas that cannot be below zero.',
  remedy: 'Compare with the machine’s screen, and type the true total.',
  source: arithmetic,
  severity: 'hard',
  owner: 'physicist',
  low: null,
  high: null,
  unit: null,
  check({ input, planes }) {
    const totals = planes.flatMap(({ displayed, reported }) =>
      [displayed, reported].flatMap((figures) => (figures ? Object.values(figures) : [])),
    );
    const inTotals = totals.filter((value) => value !== null && value < 0).length;
    const inEvents = input.events.filter((event) =>
      neverNegative.some((field) => (event[field] ?? 0) < 0),
    ).length;
    if (inTotals + inEvents === 0) return passed('No value is negative');
    const places = [inTotals > 0 ? 'totals' : null, inEvents > 0 ? `${inEvents} events` : null];
    return found(`Negative values in ${places.filter(Boolean).join(' and ')}`, inTotals, inEvents);
  },
};

export const eventRules: CheckRule[] = [...ranges, negativeValues];
