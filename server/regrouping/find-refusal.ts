import type { Procedure } from '../procedures/procedure.entity';
import { longestPauseH, pauseBetweenH, type Span } from './span';

type Judged = Pick<
  Procedure,
  'id' | 'caseNumber' | 'patientKey' | 'procedureClass' | 'isWithdrawn' | 'startedAt' | 'endedAt'
>;

/** Why reports of one procedure may not go into another, in a sentence; null when they may. */
export function findRefusal(source: Judged, target: Judged, span: Span = source): string | null {
  if (source.id === target.id) return 'This is the same procedure. Choose another one.';
  const withdrawn = [source, target].find(({ isWithdrawn }) => isWithdrawn);
  if (withdrawn) return `${withdrawn.caseNumber} is withdrawn. Restore it first, if it is meant to count.`;
  if (source.patientKey !== target.patientKey)
    return 'The patient IDs differ, and exposures of two patients are never added. If an ID was mistyped, correct it where the report was made and send the report again.';
  if ((source.procedureClass === 'clinical') !== (target.procedureClass === 'clinical'))
    return 'One is a clinical procedure and the other is not. Set the class first, if it is wrong.';
  const pauseH = pauseBetweenH(span, target);
  return pauseH > longestPauseH
    ? `${Math.round(pauseH)} hours lie between them; within one procedure it may be ${longestPauseH} at most.`
    : null;
}
