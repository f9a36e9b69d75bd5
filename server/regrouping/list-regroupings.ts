import type { RegroupingLine } from '../../shared/contract/regrouping';
import type { Db } from '../db/db';
import type { Procedure } from '../procedures/procedure.entity';
import { listRegroupings } from './regrouping.store';

/** What was merged, split or moved to or from a procedure, newest first; the newest that holds can be taken back. */
export async function describeRegroupings(db: Db, { hospitalId, id }: Procedure): Promise<RegroupingLine[]> {
  const lines = await listRegroupings(db, hospitalId, id);
  const newest = lines.find(({ undoneAt }) => undoneAt === null);
  return lines.map((line) => ({
    id: line.id,
    kind: line.kind,
    source: { id: line.sourceId, name: line.sourceNumber },
    target: { id: line.targetId, name: line.targetNumber },
    reportCount: line.doseReportIds.length,
    reason: line.reason,
    doneBy: line.doneBy,
    doneAt: line.doneAt.toISOString(),
    isUndone: line.undoneAt !== null,
    canTakeBack: line === newest,
    sourceVersion: line.sourceVersion,
    targetVersion: line.targetVersion,
  }));
}
