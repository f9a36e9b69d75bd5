import type { Procedure as ProcedureContract } from '../../shared/contract/procedure';
import { scopeOf } from '../../shared/permissions';
import { describeChecks } from '../data-checks/describe-checks';
import { listHistory } from '../audit/audit.store';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { listLevels } from '../levels/level.store';
import { listQuartiles } from './comparison.store';
import { describeRecord } from './describe-record';
import { describeReports } from './describe-reports';
import { findRow } from './procedure-list.store';
import type { Procedure } from './procedure.entity';

/** One procedure as its page shows it. Other people's names in the record and the history are for those who see all. */
export async function describeProcedure(
  db: Db,
  actor: Actor,
  procedure: Procedure,
): Promise<ProcedureContract> {
  const { hospitalId, id } = procedure;
  const seesAll = scopeOf(actor, 'procedure.read') === 'all';
  const row = await findRow(db, hospitalId, id);
  const levels = await listLevels(db, hospitalId, procedure.procedureTypeId, procedure.localDate);
  const record = await describeRecord(db, procedure);
  return {
    ...row,
    endedAt: procedure.localEndedAt,
    planes: procedure.planes,
    fieldsOverlap: procedure.fieldsOverlap,
    comparisons: (await listQuartiles(db, procedure)).map((quartiles) => ({
      ...quartiles,
      notifyLevel:
        levels.find((level) => level.quantity === quartiles.quantity && level.strength === 'notify')?.value ??
        null,
    })),
    settledFigures: procedure.settledFigures,
    dataChecks: await describeChecks(db, actor, procedure, seesAll),
    reports: await describeReports(db, procedure),
    record: seesAll
      ? record
      : { ...record, presences: [], people: record.people.filter((person) => person.id === actor.id) },
    history: seesAll
      ? (await listHistory(db, hospitalId, id)).map(({ at, by, action, reason }) => ({
          at: at.toISOString(),
          by: by ?? 'Leeward',
          action,
          reason,
        }))
      : [],
  };
}
