import type { PlaneTotals, Procedure } from '../../../shared/contract/procedure';
import { formatDateTime, formatTime } from '../../lib/clock';

const planeNames: Record<'single' | 'A' | 'B' | 'all', string> = {
  single: 'Single plane',
  A: 'Plane A',
  B: 'Plane B',
  all: 'All planes',
};

export const namePlane = (plane: PlaneTotals['plane']): string =>
  plane === null ? 'Plane not told' : planeNames[plane];

/** "single plane", "plane A": the name inside a sentence. */
export const midSentencePlane = (plane: PlaneTotals['plane']): string =>
  namePlane(plane).replace(/^[A-Z]/, (first) => first.toLowerCase());

/** "single plane", "planes A and B"; null where no plane is known. */
export function describePlanes(planes: readonly Pick<PlaneTotals, 'plane'>[]): string | null {
  const known = [...new Set(planes.flatMap(({ plane }) => plane ?? []))].sort();
  if (known.length === 0) return null;
  if (known.length === 2 && known.includes('A') && known.includes('B')) return 'planes A and B';
  return known.map(midSentencePlane).join(', ');
}

const timeNotes: Record<Procedure['timeBasis'], string> = {
  event: '',
  study: ' (time of the study)',
  receipt: ' (time of receipt)',
};

/** "2026-11-24 14:12–15:31", with a word where the time is not that of the first event. */
export function describeTime({
  startedAt,
  endedAt,
  timeBasis,
  isManual,
}: Pick<Procedure, 'startedAt' | 'endedAt' | 'timeBasis'> & { isManual?: boolean }): string {
  const start = formatDateTime(startedAt);
  const note = isManual ? ' (as typed)' : timeNotes[timeBasis];
  if (endedAt === null || formatDateTime(endedAt) === start) return start + note;
  const isSameDay = endedAt.slice(0, 10) === startedAt.slice(0, 10);
  return `${start}–${isSameDay ? formatTime(endedAt) : formatDateTime(endedAt)}${note}`;
}

export const nameProcedure = ({
  procedureType,
  studyDescription,
}: Pick<Procedure, 'procedureType' | 'studyDescription'>): string =>
  procedureType?.name ?? studyDescription ?? 'Procedure of unknown type';

export const describePlace = (procedure: Procedure): string =>
  [
    procedure.room?.name ?? 'room not known',
    describePlanes(procedure.planes),
    describeTime(procedure),
    procedure.caseNumber,
  ]
    .filter(Boolean)
    .join(' · ');

export const classNames: Record<Procedure['procedureClass'], string> = {
  clinical: 'Clinical procedure',
  'quality-control': 'Quality control',
  phantom: 'Phantom',
  service: 'Service',
};
