import { DateTime } from 'luxon';
import type { SummaryInput } from './summary-input';

/** A device's wall-clock text as an instant: its own offset where it gives one, else the hospital's zone. */
export function toInstant(local: string, timeZone: string): Date | null {
  const moment = DateTime.fromISO(local, { zone: timeZone });
  return moment.isValid ? moment.toJSDate() : null;
}

/** The same for many texts: those of one wall-clock minute share its instant, and a zone's offset never changes within one. */
export function createInstantReader(timeZone: string): (local: string) => Date | null {
  const minutes = new Map<string, number | null>();
  return (local) => {
    const parts = /^(\d{4}-\d\d-\d\dT\d\d:\d\d):(\d\d(?:\.\d{1,6})?)$/.exec(local);
    if (!parts) return toInstant(local, timeZone);
    const [, minute = '', second = ''] = parts;
    let startMs = minutes.get(minute);
    if (startMs === undefined) {
      startMs = toInstant(minute, timeZone)?.getTime() ?? null;
      minutes.set(minute, startMs);
    }
    const seconds = Number(second);
    return startMs === null || seconds >= 60 ? null : new Date(startMs + Math.trunc(seconds * 1000 + 1e-6));
  };
}

export type PlacedInTime = {
  startedAt: Date;
  endedAt: Date | null;
  localStartedAt: string;
  localEndedAt: string | null;
  localDate: string;
  timeBasis: 'event' | 'study' | 'receipt';
};

const inZone = (instant: Date, timeZone: string) => DateTime.fromJSDate(instant, { zone: timeZone });
const wallClock = (moment: DateTime) => moment.toFormat("yyyy-MM-dd'T'HH:mm:ss");

/** When a procedure was: by its earliest event, else its study, else its receipt. The hospital's zone decides the day. */
export function placeInTime(input: SummaryInput): PlacedInTime {
  const { timeZone } = input;
  const timed = input.events
    .filter((event) => event.localStartedAt !== null)
    .toSorted((a, b) => a.startedAt.getTime() - b.startedAt.getTime());
  const first = timed[0];
  if (first) {
    const endMs = Math.max(
      ...timed.map(
        (event) =>
          event.startedAt.getTime() + 1000 * (event.irradiationDurationS ?? event.exposureTimeS ?? 0),
      ),
    );
    const endedAt = new Date(endMs);
    return {
      startedAt: first.startedAt,
      endedAt,
      localStartedAt: first.localStartedAt as string,
      localEndedAt: wallClock(inZone(endedAt, timeZone)),
      localDate: inZone(first.startedAt, timeZone).toISODate() as string,
      timeBasis: 'event',
    };
  }
  const study = input.studyStartedAt === null ? null : toInstant(input.studyStartedAt, timeZone);
  const startedAt = study ?? input.receivedAt;
  return {
    startedAt,
    endedAt: null,
    localStartedAt:
      study && input.studyStartedAt ? input.studyStartedAt : wallClock(inZone(startedAt, timeZone)),
    localEndedAt: null,
    localDate: inZone(startedAt, timeZone).toISODate() as string,
    timeBasis: study ? 'study' : 'receipt',
  };
}
