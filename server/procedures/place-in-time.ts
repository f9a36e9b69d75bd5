import { DateTime } from 'luxon';
import type { SummaryInput } from './summary-input';

/** A device's wall-clock text as an instant: its own offset where it gives one, else the hospital's zone. */
export function toInstant(local: string, timeZone: string): Date | null {
  const moment = DateTime.fromISO(local, { zone: timeZone });
  return moment.isValid ? moment.toJSDate() : null;
}

const clockTime = /^(\d{4}-\d\d-\d\dT(?:[01]\d|2[0-3])):([0-5]\d):([0-5]\d(?:\.\d{1,6})?)$/;

/**
 * The same for many texts. Those of one wall-clock quarter of an hour share a conversion: where zones change their
 * offset today, they do so at a quarter.
 */
export function createInstantReader(timeZone: string): (local: string) => Date | null {
  const quarters = new Map<string, number | null>();
  return (local) => {
    const parts = clockTime.exec(local);
    if (!parts) return toInstant(local, timeZone);
    const [, hour = '', minute = '', second = ''] = parts;
    const minutesBefore = Number(minute) % 15;
    const quarter = `${hour}:${String(Number(minute) - minutesBefore).padStart(2, '0')}`;
    let startMs = quarters.get(quarter);
    if (startMs === undefined) {
      startMs = toInstant(quarter, timeZone)?.getTime() ?? null;
      quarters.set(quarter, startMs);
    }
    const millisecondsAfter = minutesBefore * 60_000 + Math.trunc(Number(second) * 1000 + 1e-6);
    return startMs === null ? null : new Date(startMs + millisecondsAfter);
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
