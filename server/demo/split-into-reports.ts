import type { DemoIrradiationEvent, DemoPlaneTotals, DemoProcedure } from './demo-types';
import { totalPlanes } from './total-planes';

/** What one report of a procedure holds. */
export interface ReportPart {
  /** Instance number: the same report sent twice has it twice. */
  number: number;
  events: readonly DemoIrradiationEvent[];
  planes: readonly DemoPlaneTotals[];
}

/**
 * The reports that the machine sent of a procedure, in order: one; the same one twice; a partial one
 * and the full one; or two halves after a restart in the middle of the case.
 */
export function splitIntoReports(procedure: DemoProcedure): ReportPart[] {
  const { events, planes } = procedure;
  const whole = (number: number): ReportPart => ({ number, events, planes });
  const part = (number: number, some: readonly DemoIrradiationEvent[]): ReportPart => ({
    number,
    events: some,
    planes: totalPlanes(some),
  });
  // Events of two planes fire together: a cut must not part them.
  const middleUid = events[Math.floor(events.length / 2)]?.irradiationEventUid;
  const cut = events.findIndex((event) => event.irradiationEventUid === middleUid);
  switch (procedure.defect) {
    case 'duplicate-report':
      return [whole(1), whole(1)];
    case 'superseded-report':
      return [part(1, events.slice(0, cut)), whole(2)];
    case 'split-study':
      return [part(1, events.slice(0, cut)), part(2, events.slice(cut))];
    default:
      return [whole(1)];
  }
}

export const sopInstanceUidOf = (procedure: DemoProcedure, part: ReportPart): string =>
  `${procedure.studyInstanceUid}.0.${part.number}`;

/** Seconds from the procedure's first irradiation to the end of the part's last. */
export function endOf({ events }: Pick<ReportPart, 'events'>): number {
  const last = events.at(-1);
  return last ? last.offsetS + last.irradiationDurationS : 0;
}
