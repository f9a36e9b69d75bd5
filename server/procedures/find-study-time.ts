import type { DoseReport } from '../dose-reports/dose-report.entity';
import { toInstant } from './place-in-time';

/** The earliest time that any of the reports gives for its study, in the device's words; null where none does. */
export function findStudyTime(reports: Pick<DoseReport, 'context'>[], timeZone: string): string | null {
  const times = reports.flatMap(({ context }) => {
    const local = context?.startedAt ?? context?.studyAt;
    const instant = local ? toInstant(local, timeZone) : null;
    return local && instant ? [{ local, ms: instant.getTime() }] : [];
  });
  return times.toSorted((a, b) => a.ms - b.ms)[0]?.local ?? null;
}
