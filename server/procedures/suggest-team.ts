import type { SuggestedTeam } from '../../shared/contract/record';
import type { Db } from '../db/db';
import { toPresenceContract } from './describe-record';
import { findLastComplete } from './last-team.store';
import { listPresences } from './presence.store';
import type { Procedure } from './procedure.entity';

/** The people of the last complete record in the same room: of the same type where there is one. */
export async function suggestTeam(db: Db, procedure: Procedure): Promise<SuggestedTeam> {
  const last = await findLastComplete(db, procedure);
  if (!last) return { fromCaseNumber: null, procedureTypeId: null, presences: [] };
  const presences = await listPresences(db, last.id, last.recordRevision);
  return {
    fromCaseNumber: last.caseNumber,
    procedureTypeId: last.procedureTypeId,
    presences: presences.map(toPresenceContract),
  };
}
