import type { EntityManager } from 'typeorm';
import { Procedure } from './procedure.entity';

/** The newest complete record before a procedure in its room; one of its type goes before others. */
export const findLastComplete = (db: EntityManager, procedure: Procedure): Promise<Procedure | null> =>
  db
    .createQueryBuilder(Procedure, 'procedure')
    .where('procedure.hospital_id = :hospitalId and procedure.room_id = :roomId', procedure)
    .andWhere(`procedure.record_state = 'complete' and procedure.started_at < :startedAt`, procedure)
    .andWhere('not procedure.is_withdrawn')
    .orderBy('procedure.procedure_type_id is not distinct from :procedureTypeId', 'DESC')
    .addOrderBy('procedure.started_at', 'DESC')
    .setParameters(procedure)
    .take(1)
    .getOne();
