import type { CheckSettlement, DataCheck } from '../../shared/contract/data-check';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import type { Procedure } from '../procedures/procedure.entity';
import { findRule } from './check-rules';
import { listSettlements, type SettlementRow } from './check-settlement.store';

/** A person's name for those who see every procedure, and for that person. */
const nameFor = (seesAll: boolean, actor: Actor, personId: string | null, name: string | null) =>
  seesAll || personId === actor.id ? name : null;

const toContract = (row: SettlementRow, seesAll: boolean, actor: Actor): CheckSettlement => ({
  id: row.id,
  finding: row.finding,
  decision: row.decision,
  corrected: row.corrected,
  reason: row.reason,
  decidedBy: nameFor(seesAll, actor, row.decidedById, row.decidedBy),
  decidedAt: row.decidedAt.toISOString(),
  endedBy: nameFor(seesAll, actor, row.endedById, row.endedBy),
  endedAt: row.endedAt?.toISOString() ?? null,
});

/** The checks of a procedure with what physicists decided about them. */
export async function describeChecks(
  db: Db,
  actor: Actor,
  procedure: Procedure,
  seesAll: boolean,
): Promise<DataCheck[]> {
  const rows = await listSettlements(db, procedure.hospitalId, procedure.id);
  return procedure.dataChecks.map(({ settlementId, ...check }) => {
    const ofRule = rows.filter(({ ruleCode }) => ruleCode === check.code);
    const standing = ofRule.find(({ id }) => id === settlementId);
    const rule = findRule(check.code);
    return {
      ...check,
      name: rule?.name ?? check.code,
      remedy: rule?.remedy ?? '',
      severity: check.severity ?? rule?.severity ?? 'note',
      owner: check.owner ?? rule?.owner ?? 'physicist',
      finding: check.finding ?? null,
      settlement: standing ? toContract(standing, seesAll, actor) : null,
      earlier: ofRule.filter((row) => row !== standing).map((row) => toContract(row, seesAll, actor)),
    };
  });
}
