import type { Report } from '../../shared/contract/report';
import { createInstantReader, toInstant } from '../procedures/place-in-time';
import { spanOfAll, type Span } from '../regrouping/span';

/** When a report's exposures were: by its events, else by its study; null where it tells neither. */
export function spanOfReport(report: Report, timeZone: string): Span | null {
  const readInstant = createInstantReader(timeZone);
  const spans = report.events.flatMap((event): Span[] => {
    const startedAt = event.startedAt === null ? null : readInstant(event.startedAt);
    if (!startedAt) return [];
    const lastsS = event.irradiationDurationS ?? event.exposureTimeS ?? 0;
    return [{ startedAt, endedAt: new Date(startedAt.getTime() + 1000 * lastsS) }];
  });
  const local = report.startedAt ?? report.studyAt;
  const startedAt = local === null ? null : toInstant(local, timeZone);
  return spanOfAll(spans) ?? (startedAt && { startedAt, endedAt: null });
}
