import type { ProcedureReport } from '../../../shared/contract/procedure';
import type { RegroupCandidate, RegroupingKind, RegroupingLine } from '../../../shared/contract/regrouping';
import { formatReferenceAirKerma } from '../../../shared/units';
import { formatDateTime, formatInstant } from '../../lib/clock';

export const countOf = (count: number, one: string, many: string): string =>
  `${count} ${count === 1 ? one : many}`;

/** "Report 2, written 2026-11-24 14:12: 52 exposures, Aster F2". */
export function nameReport(report: ProcedureReport, index: number, timeZone: string): string {
  const when = report.contentAt
    ? `written ${formatDateTime(report.contentAt)}`
    : `received ${formatInstant(report.receivedAt, timeZone)}`;
  const what =
    report.eventCount === null || report.eventCount === 0
      ? 'totals only'
      : countOf(report.eventCount, 'exposure', 'exposures');
  return [`Report ${index + 1}, ${when}: ${what}`, report.machine].filter(Boolean).join(', ');
}

/** "same patient, same room · Biliary drainage · 41 exposures · 812 mGy · record complete". */
export function describeCandidate(candidate: RegroupCandidate): string {
  const { value, unit } = formatReferenceAirKerma(candidate.referenceAirKermaGy);
  const ties = [
    candidate.isSamePatient ? 'same patient' : 'other patient',
    candidate.isSameRoom ? 'same room' : candidate.room?.name,
  ];
  return [
    ties.filter(Boolean).join(', '),
    candidate.procedureType?.name,
    countOf(candidate.eventCount, 'exposure', 'exposures'),
    candidate.referenceAirKermaGy === null ? null : `${value} ${unit}`,
    candidate.recordState === 'complete' ? 'record complete' : 'record incomplete',
  ]
    .filter(Boolean)
    .join(' · ');
}

export const kindTitles: Record<RegroupingKind, string> = {
  merge: 'Merge with another procedure',
  split: 'Split this procedure',
  move: 'Move reports to another procedure',
};

/** "Merged into 26-00412", seen from the one procedure or the other. */
export function describeLine(line: RegroupingLine, procedureId: string): string {
  const isSource = line.source.id === procedureId;
  const reports = countOf(line.reportCount, 'report', 'reports');
  if (line.kind === 'merge')
    return isSource ? `Merged into ${line.target.name}` : `Took in ${line.source.name}`;
  if (line.kind === 'split')
    return isSource ? `Split: ${reports} went to ${line.target.name}` : `Split off ${line.source.name}`;
  return isSource ? `${reports} moved to ${line.target.name}` : `${reports} came from ${line.source.name}`;
}
