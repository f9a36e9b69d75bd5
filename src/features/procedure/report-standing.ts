import type { ProcedureReport } from '../../../shared/contract/procedure';

const hasExposures = ({ eventCount }: ProcedureReport) => eventCount !== null && eventCount > 0;

/** What a report is worth beside the others, in words: "superseded by report 2". */
export function describeStanding(report: ProcedureReport, reports: readonly ProcedureReport[]): string {
  const other = `report ${reports.findIndex(({ id }) => id === report.byId) + 1}`;
  if (report.standing === 'counts') return 'counts: its totals are taken as reported';
  if (report.standing === 'adds')
    return hasExposures(report) ? 'adds its exposures to the sum' : 'adds its totals to the sum';
  if (report.standing === 'repeats') return `same exposures as ${other}, which counts`;
  if (report.isManual) return `superseded by ${other}, which the machine wrote`;
  return hasExposures(report)
    ? `superseded by ${other}, which holds all of its exposures`
    : `superseded by ${other}`;
}

const origins: Record<ProcedureReport['origin'], string> = {
  study: 'same study',
  order: 'same order of the same patient: the study was split, by a restart or a change of room',
  moved: 'moved here',
  followed: 'came after its study’s procedure was merged into this one',
};

/** Why a report is in this procedure: "moved here by Rowan Thistle". */
export const describeOrigin = ({ origin, movedBy }: ProcedureReport): string =>
  movedBy ? `${origins[origin]} by ${movedBy}` : origins[origin];
