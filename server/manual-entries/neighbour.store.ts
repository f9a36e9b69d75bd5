import type { EntityManager } from 'typeorm';
import type { Neighbour } from '../../shared/contract/manual-entry';

/** Procedures of a machine that began within an hour of a moment, the nearest first. */
export const listNeighbours = (
  db: EntityManager,
  hospitalId: string,
  equipmentId: string,
  at: Date,
): Promise<Neighbour[]> =>
  db.query(
    `select procedure.id, procedure.case_number as "caseNumber", procedure.local_started_at as "startedAt",
            coalesce(kind."name", procedure.study_description) as "name", procedure.is_manual as "isManual"
       from procedure left join procedure_type kind on kind.id = procedure.procedure_type_id
      where procedure.hospital_id = $1 and procedure.equipment_id = $2 and not procedure.is_withdrawn
        and procedure.started_at between $3::timestamptz - interval '1 hour' and $3::timestamptz + interval '1 hour'
      order by abs(extract(epoch from procedure.started_at - $3::timestamptz))
      limit 4`,
    [hospitalId, equipmentId, at],
  );
