import { plausibleKermaRateMgyPerMin } from '../../shared/dosimetry/field-plausibility';
import {
  arithmetic,
  found,
  isOutside,
  notChecked,
  ofPlane,
  passed,
  practice,
  write,
  writeBounds,
  type CheckFacts,
  type CheckRule,
} from './check-rule';

const isFluoroscopy = ({ type }: { type: string | null }) => type === 'fluoroscopy';

const kermaMissing: CheckRule = {
  code: 'kerma-missing',
  name: 'Fluoroscopy without K a,r',
  looksAt: 'A K a,r of zero although fluoroscopy went on for longer than this.',
  remedy:
    'The machine did not measure or did not write it: type K a,r from its screen, or leave the case out.',
  source: practice,
  severity: 'hard',
  owner: 'physicist',
  low: null,
  high: 0.5,
  unit: 'min',
  check({ together }, { high }) {
    const [time, kerma] = [together.fluoroscopyTimeS, together.referenceAirKerma.displayed];
    if (time === null || kerma === null) return notChecked('Fluoroscopy time or K a,r is missing.');
    return kerma === 0 && high !== null && time > high * 60
      ? found(`K a,r is 0 although there were ${write(time / 60)} min of fluoroscopy`, time)
      : passed('K a,r goes with the fluoroscopy time');
  },
};

const timeMissing: CheckRule = {
  code: 'fluoroscopy-time-missing',
  name: 'Fluoroscopy time of zero',
  looksAt: 'A fluoroscopy time of zero although there are fluoroscopy events with a duration or with K a,r.',
  remedy: 'Type the fluoroscopy time from the machine’s screen.',
  source: practice,
  severity: 'hard',
  owner: 'physicist',
  low: null,
  high: null,
  unit: null,
  check({ input, together }) {
    if (together.fluoroscopyTimeS === null) return notChecked('Fluoroscopy time is missing.');
    const seen = input.events.filter(
      (event) =>
        isFluoroscopy(event) &&
        ((event.irradiationDurationS ?? event.exposureTimeS ?? 0) > 0 ||
          (event.referenceAirKermaGy ?? 0) > 0),
    );
    return together.fluoroscopyTimeS === 0 && seen.length > 0
      ? found(`Fluoroscopy time is 0 although there are ${seen.length} fluoroscopy events`, seen.length)
      : passed('Fluoroscopy time goes with the events');
  },
};

/** Units that are taken for one another, as reported over true. */
const slips = [
  { factor: 60, words: 'seconds written as minutes' },
  { factor: 1 / 60, words: 'minutes written as seconds' },
  { factor: 1000, words: 'milliseconds written as seconds' },
  { factor: 1 / 1000, words: 'seconds written as milliseconds' },
  { factor: 60_000, words: 'milliseconds written as minutes' },
];

const timeUnit: CheckRule = {
  code: 'fluoroscopy-time-unit',
  name: 'Unit of fluoroscopy time',
  looksAt:
    'Reported fluoroscopy time over the summed durations of the fluoroscopy events: a factor of 60 or 1,000 is a unit.',
  remedy: 'Type the fluoroscopy time in minutes from the machine’s screen.',
  source: arithmetic,
  severity: 'hard',
  owner: 'physicist',
  low: null,
  high: null,
  unit: null,
  check({ input, planes }) {
    // Exposure times are beam-on times of pulses, many times shorter: only durations can be compared.
    const isTimed = input.events.filter(isFluoroscopy).every((event) => event.irradiationDurationS !== null);
    const compared = planes.flatMap((plane) => {
      const [total, events] = [plane.reported?.fluoroscopyTimeS ?? 0, plane.summed.fluoroscopyTimeS ?? 0];
      return isTimed && total > 0 && events > 0 ? [{ plane, ratio: total / events }] : [];
    });
    if (compared.length === 0) return notChecked('Fluoroscopy time or durations of events are missing.');
    for (const { plane, ratio } of compared) {
      const slip = slips.find(({ factor }) => Math.abs(Math.log(ratio / factor)) < Math.log(1.15));
      if (slip)
        return found(
          `Fluoroscopy time${ofPlane(plane, planes)} is ${write(ratio)} times the durations of its events: ${slip.words}?`,
          slip.factor,
        );
    }
    return passed('Fluoroscopy time and durations are in the same unit');
  },
};

const timeRange: CheckRule = {
  code: 'fluoroscopy-time-range',
  name: 'Length of fluoroscopy time',
  looksAt: 'Fluoroscopy time against what no procedure reaches.',
  remedy: 'Type the fluoroscopy time in minutes from the machine’s screen.',
  source: practice,
  severity: 'hard',
  owner: 'physicist',
  low: null,
  high: 600,
  unit: 'min',
  check({ together: { fluoroscopyTimeS } }, bounds) {
    if (fluoroscopyTimeS === null) return notChecked('Fluoroscopy time is missing.');
    const minutes = fluoroscopyTimeS / 60;
    return isOutside(minutes, bounds)
      ? found(
          `Fluoroscopy time ${write(minutes)} min: more than any procedure; ${writeBounds(bounds)} min`,
          minutes,
        )
      : passed('Fluoroscopy time is of a length that occurs');
  },
};

/** Seconds by which a counter may run beyond the last event without meaning anything. */
const spanToleranceS = 60;

function spansOf({ input, planes }: CheckFacts) {
  return planes.flatMap((plane) => {
    const events = input.events.filter(
      (event) => event.localStartedAt !== null && (planes.length === 1 || event.plane === plane.plane),
    );
    const timeS = plane.displayed.fluoroscopyTimeS;
    if (events.length === 0 || timeS === null) return [];
    const from = Math.min(...events.map((event) => event.startedAt.getTime()));
    const to = Math.max(
      ...events.map(
        (event) =>
          event.startedAt.getTime() + 1000 * (event.irradiationDurationS ?? event.exposureTimeS ?? 0),
      ),
    );
    return [{ plane, timeS, spanS: (to - from) / 1000 }];
  });
}

const timeAgainstSpan: CheckRule = {
  code: 'fluoroscopy-time-span',
  name: 'Fluoroscopy longer than the procedure',
  looksAt: 'Fluoroscopy time of a plane against the time from its first to its last event.',
  remedy: 'Events are missing from the report, or the time is in another unit or holds another case.',
  source: arithmetic,
  severity: 'note',
  owner: 'physicist',
  low: null,
  high: 5,
  unit: '%',
  check(facts, { high }) {
    const spans = spansOf(facts);
    if (spans.length === 0) return notChecked('No event tells when it was.');
    const odd = spans.find(
      ({ timeS, spanS }) => high !== null && timeS > spanS * (1 + high / 100) + spanToleranceS,
    );
    return odd
      ? found(
          `Fluoroscopy time${ofPlane(odd.plane, facts.planes)} ${write(odd.timeS / 60)} min, but its events lie within ${write(odd.spanS / 60)} min`,
          odd.timeS,
        )
      : passed('Fluoroscopy time fits into the procedure');
  },
};

const kermaRate: CheckRule = {
  code: 'kerma-rate',
  name: 'K a,r over fluoroscopy time',
  looksAt: 'K a,r of the whole over fluoroscopy time.',
  remedy: 'Many acquisitions explain a high figure; else one of the two is wrong.',
  source: practice,
  severity: 'note',
  owner: 'physicist',
  low: 0.05,
  high: plausibleKermaRateMgyPerMin,
  unit: 'mGy/min',
  check({ together }, bounds) {
    const [time, kerma] = [together.fluoroscopyTimeS, together.referenceAirKerma.displayed];
    if (!time || !kerma || time < 0) return notChecked('Fluoroscopy time or K a,r is missing or zero.');
    const rate = (kerma * 1000) / (time / 60);
    return isOutside(rate, bounds)
      ? found(`K a,r over fluoroscopy time is ${write(rate)} mGy/min: outside ${writeBounds(bounds)}`, rate)
      : passed(`K a,r over fluoroscopy time ${write(rate)} mGy/min`);
  },
};

export const fluoroscopyTimeRules: CheckRule[] = [
  kermaMissing,
  timeMissing,
  timeUnit,
  timeRange,
  timeAgainstSpan,
  kermaRate,
];
