import type { EntityManager } from 'typeorm';
import type { RegroupCandidate } from '../../shared/contract/regrouping';
import type { Procedure } from '../procedures/procedure.entity';

export type FoundCandidate = Omit<RegroupCandidate, 'refusal'> &
  Pick<Procedure, 'patientKey' | 'procedureClass' | 'isWithdrawn'> & {
    startedMoment: Date;
    endedMoment: Date | null;
  };

/**
 * Procedures that reports of this one may belong to: those of the patient within two weeks and those in the same room
 * within 24 hours; with a text, those whose case number begins with it.
 */
export const listCandidates = (
  db: EntityManager,
  procedure: Procedure,
  find: string | null,
): Promise<FoundCandidate[]> =>
  db.query(
    `select other.id, other.case_number as "caseNumber", other."version", other.local_started_at as "startedAt",
            case when room.id is not null then json_build_object('id', room.id, 'name', room.code) end as room,
            case when kind.id is not null then json_build_object('id', kind.id, 'name', kind."name") end as "procedureType",
            other.event_count as "eventCount", other.reference_air_kerma_gy as "referenceAirKermaGy",
            other.record_state as "recordState", other.patient_key = this.patient_key as "isSamePatient",
            coalesce(other.room_id = this.room_id, false) as "isSameRoom",
            other.patient_key as "patientKey", other.procedure_class as "procedureClass",
            other.is_withdrawn as "isWithdrawn", other.started_at as "startedMoment", other.ended_at as "endedMoment"
       from procedure this
       join procedure other on other.hospital_id = this.hospital_id and other.id <> this.id
       left join room on room.id = other.room_id
       left join procedure_type kind on kind.id = other.procedure_type_id
      where this.hospital_id = $1 and this.id = $2
        and case when $3::text is null then
              not other.is_withdrawn and (
                other.patient_key = this.patient_key
                  and other.started_at between this.started_at - interval '14 days' and this.started_at + interval '14 days'
                or other.room_id = this.room_id
                  and other.started_at between this.started_at - interval '24 hours' and this.started_at + interval '24 hours')
            else other.case_number like $3 end
      order by (other.patient_key = this.patient_key) desc,
               abs(extract(epoch from other.started_at - this.started_at)), other.id
      limit 20`,
    [procedure.hospitalId, procedure.id, find && `${find.replace(/[\\%_]/g, '\\$&')}%`],
  );
