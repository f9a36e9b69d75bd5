import { toInstant } from '../procedures/place-in-time';
import {
  arithmetic,
  found,
  notChecked,
  passed,
  practice,
  write,
  type CheckFacts,
  type CheckRule,
} from './check-rule';

const hourMs = 3_600_000;
const timedEvents = ({ input }: CheckFacts) => input.events.filter((event) => event.localStartedAt !== null);
const noTimes = notChecked('No event tells when it was.');

const eventTimes: CheckRule = {
  code: 'event-times',
  name: 'Events within the procedure',
  looksAt: 'How far the events lie apart from one another and from the time of the study.',
  remedy: 'Look whether another case got into the report, or the machine’s clock was set in between.',
  source: practice,
  severity: 'note',
  owner: 'physicist',
  low: null,
  high: 24,
  unit: 'h',
  check(facts, { high }) {
    const times = timedEvents(facts).map((event) => event.startedAt.getTime());
    if (times.length === 0) return noTimes;
    const [first, last] = [Math.min(...times), Math.max(...times)];
    const limitMs = (high ?? Infinity) * hourMs;
    if (last - first > limitMs)
      return found(`Events lie ${write((last - first) / hourMs)} hours apart`, (last - first) / hourMs);
    const studies = facts.input.reports.flatMap(({ context }) => {
      const studyAt = context?.studyAt ? toInstant(context.studyAt, facts.input.timeZone) : null;
      return studyAt ? [studyAt.getTime()] : [];
    });
    const farMs = Math.max(
      0,
      ...studies.map((study) => Math.max(Math.abs(first - study), Math.abs(last - study))),
    );
    return farMs > limitMs
      ? found(`Events lie ${write(farMs / hourMs)} hours from the time of the study`, farMs / hourMs)
      : passed('Events lie within the procedure');
  },
};

const clockAhead: CheckRule = {
  code: 'clock-ahead',
  name: 'Clock ahead',
  looksAt:
    'Events that began later than their report came in: the machine’s clock is ahead, or the date is wrong.',
  remedy: 'Have the machine’s clock set by a time server. Day and order of its procedures may be wrong.',
  source: arithmetic,
  severity: 'note',
  owner: 'technologist',
  low: null,
  high: 10,
  unit: 'min',
  check(facts, { high }) {
    const events = timedEvents(facts);
    if (events.length === 0) return noTimes;
    const received = new Map(
      facts.input.reports.map(({ id, receivedAt }) => [id as string | null, receivedAt]),
    );
    const aheadMs = Math.max(
      ...events.map((event) => {
        const receivedAt = received.get(event.doseReportId) ?? facts.input.receivedAt;
        return event.startedAt.getTime() - Math.min(receivedAt.getTime(), facts.input.now.getTime());
      }),
    );
    const minutes = aheadMs / 60_000;
    return high !== null && minutes > high
      ? found(
          minutes > 2880
            ? `An event lies ${write(minutes / 1440)} days after its report came in: in the future`
            : `An event began ${write(minutes)} min after its report came in: the machine’s clock is ahead`,
          minutes,
        )
      : passed('Events began before their report came in');
  },
};

const clockReset: CheckRule = {
  code: 'clock-reset',
  name: 'Clock reset',
  looksAt: 'Dates before there were dose reports of this kind: a clock that began anew.',
  remedy: 'Have the machine’s clock set; the day of the procedure is wrong.',
  source: 'DICOM Supplement 94 of 2005, from memory',
  severity: 'note',
  owner: 'technologist',
  low: 2005,
  high: null,
  unit: 'year',
  check(facts, { low }) {
    const years = timedEvents(facts).map((event) => event.startedAt.getUTCFullYear());
    if (years.length === 0) return noTimes;
    const first = Math.min(...years);
    return low !== null && first < low
      ? found(`An event is dated ${first}: the machine’s clock was reset`, String(first))
      : passed('Dates are of this time');
  },
};

export const clockRules: CheckRule[] = [eventTimes, clockAhead, clockReset];
