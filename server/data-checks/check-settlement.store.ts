import { In, IsNull, type EntityManager } from 'typeorm';
import type { SettlementInForce } from './check-data';
import { CheckSettlement } from './check-settlement.entity';

/** Decisions about a procedure that nobody took back, the newest first. */
export const listSettlementsInForce = (
  db: EntityManager,
  hospitalId: string,
  procedureId: string,
): Promise<SettlementInForce[]> =>
  db.find(CheckSettlement, {
    where: { hospitalId, procedureId, endedAt: IsNull() },
    order: { decidedAt: 'DESC', id: 'DESC' },
  });

export type SettlementRow = Omit<CheckSettlement, 'hospitalId' | 'procedureId'> & {
  decidedBy: string;
  endedBy: string | null;
};

/** Every decision about a procedure with who took it, the newest first. */
export const listSettlements = (
  db: EntityManager,
  hospitalId: string,
  procedureId: string,
): Promise<SettlementRow[]> =>
  db.query(
    `select settlement.id, settlement.rule_code as "ruleCode", settlement.finding, settlement.decision,
            settlement.corrected, settlement."reason", settlement.decided_by_id as "decidedById",
            decider."name" as "decidedBy", settlement.decided_at as "decidedAt", settlement.ended_at as "endedAt",
            settlement.ended_by_id as "endedById", ender."name" as "endedBy"
       from check_settlement settlement
       join person decider on decider.id = settlement.decided_by_id
       left join person ender on ender.id = settlement.ended_by_id
      where settlement.hospital_id = $1 and settlement.procedure_id = $2
      order by settlement.decided_at desc, settlement.id desc`,
    [hospitalId, procedureId],
  );

export async function addSettlements(db: EntityManager, settlements: CheckSettlement[]): Promise<void> {
  await db.insert(CheckSettlement, settlements as never);
}

export const findSettlement = (
  db: EntityManager,
  hospitalId: string,
  procedureId: string,
  id: string,
): Promise<CheckSettlement | null> => db.findOneBy(CheckSettlement, { hospitalId, procedureId, id });

/** Ends decisions of a procedure that stand; what they said stays readable. */
export async function endSettlements(
  db: EntityManager,
  procedureId: string,
  which: { id: string } | { ruleCodes: string[] },
  endedById: string,
  endedAt: Date,
): Promise<void> {
  const chosen = 'id' in which ? { id: which.id } : { ruleCode: In(which.ruleCodes) };
  await db.update(CheckSettlement, { procedureId, ...chosen, endedAt: IsNull() }, { endedById, endedAt });
}
