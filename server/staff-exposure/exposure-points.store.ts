import type { EntityManager } from 'typeorm';
import type { ExposureFilter, ExposurePoint } from '../../shared/contract/staff-exposure';
import { countedProcedures, quantityColumns, validEstimates } from './exposure-selection';

export type PointScope = {
  hospitalId: string;
  /** Only this person's estimates; null: everybody's. */
  personId: string | null;
  /** Whose own procedures are told apart. */
  readerId: string;
  /** Beginning of the period; null: no beginning. */
  since: Date | null;
};

export type FoundPoint = Omit<ExposurePoint, 'procedureId' | 'estimate'> & {
  procedureId: string;
  personId: string | null;
  /** The reader is its operator or trainee. */
  isReaders: boolean;
  nominal: number | null;
  low: number | null;
  high: number | null;
  method: string;
  methodVersion: string;
};

function conditions(filter: ExposureFilter, scope: Omit<PointScope, 'readerId'>) {
  const values: unknown[] = [scope.hospitalId];
  const bind = (value: unknown) => `$${values.push(value)}`;
  const parts = [countedProcedures];
  if (scope.since) parts.push(`procedure.started_at >= ${bind(scope.since)}`);
  if (filter.type) parts.push(`procedure.procedure_type_id = ${bind(filter.type)}`);
  if (filter.room) parts.push(`procedure.room_id = ${bind(filter.room)}`);
  return { parts, values, bind };
}

/**
 * One row for each procedure in which somebody held the duty; where several did, the one with the highest
 * value. Highest first; rows without a value come last. Events are not read.
 */
export function findPoints(
  db: EntityManager,
  filter: ExposureFilter,
  scope: PointScope,
): Promise<FoundPoint[]> {
  const { parts, values, bind } = conditions(filter, scope);
  const { nominal, low, high } = quantityColumns[filter.quantity];
  if (filter.duty !== 'any') parts.push(`estimate.duty = ${bind(filter.duty)}`);
  if (scope.personId) parts.push(`estimate.person_id = ${bind(scope.personId)}`);
  return db.query(
    `select found.* from (
       select distinct on (procedure.id) procedure.id as "procedureId", procedure.case_number as "caseNumber",
              procedure.local_started_at as "startedAt", coalesce(kind."name", 'not recorded') as "procedureType",
              room.code as room, procedure.fluoroscopy_time_s as "fluoroscopyTimeS",
              procedure.kvp_mean as "kvpMean", procedure.kerma_area_product_gy_cm2 as "kermaAreaProductGyCm2",
              estimate.person_id as "personId", ${nominal} as nominal, ${low} as low, ${high} as high,
              estimate.method, estimate.method_version as "methodVersion",
              ${bind(scope.readerId)}::uuid in (procedure.primary_operator_id, procedure.second_operator_id,
                procedure.trainee_id) is true as "isReaders"
         from procedure
         join staff_estimate estimate on ${validEstimates}
         left join procedure_type kind on kind.id = procedure.procedure_type_id
         left join room on room.id = procedure.room_id
        where ${parts.join(' and ')}
        order by procedure.id, ${nominal} desc nulls last) found
      order by found.nominal desc nulls last, found."procedureId"`,
    values,
  );
}

const operatorColumns: Partial<Record<ExposureFilter['duty'], string>> = {
  'primary-operator': 'procedure.primary_operator_id',
  'second-operator': 'procedure.second_operator_id',
  trainee: 'procedure.trainee_id',
};

/**
 * Procedures of the selection that wait for their record. For one person only those that name the person in
 * the duty: before the record is complete nothing tells who else was in the room.
 */
export async function countIncomplete(
  db: EntityManager,
  filter: ExposureFilter,
  scope: Omit<PointScope, 'readerId'>,
): Promise<number> {
  const { parts, values, bind } = conditions(filter, scope);
  parts.push(`procedure.record_state = 'incomplete'`);
  if (scope.personId) {
    const columns = filter.duty === 'any' ? Object.values(operatorColumns) : [operatorColumns[filter.duty]];
    if (!columns[0]) return 0;
    parts.push(`${bind(scope.personId)} in (${columns.join(', ')})`);
  }
  const [row] = await db.query(
    `select count(*)::int as incomplete from procedure where ${parts.join(' and ')}`,
    values,
  );
  return row.incomplete;
}
