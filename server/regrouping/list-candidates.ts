import type { RegroupCandidate } from '../../shared/contract/regrouping';
import type { Db } from '../db/db';
import type { Procedure } from '../procedures/procedure.entity';
import { listCandidates } from './candidate.store';
import { findRefusal } from './find-refusal';

/** Where reports of a procedure could go, the likeliest first; one that cannot take them says why. */
export async function describeCandidates(
  db: Db,
  procedure: Procedure,
  find: string | null,
): Promise<RegroupCandidate[]> {
  const found = await listCandidates(db, procedure, find);
  return found.map(
    ({ patientKey, procedureClass, isWithdrawn, startedMoment, endedMoment, ...candidate }) => ({
      ...candidate,
      refusal: findRefusal(procedure, {
        id: candidate.id,
        caseNumber: candidate.caseNumber,
        patientKey,
        procedureClass,
        isWithdrawn,
        startedAt: startedMoment,
        endedAt: endedMoment,
      }),
    }),
  );
}
