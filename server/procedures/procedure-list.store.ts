import type { EntityManager } from 'typeorm';
import type { ProcedureFilter, ProcedureRow } from '../../shared/contract/procedure-row';
import type { Cursor } from '../kernel/cursor';

export type ListedProcedure = Omit<ProcedureRow, 'patient'> & {
  patientIdentityId: string | null;
  sortKey: string | number;
};

const sortColumns: Record<Exclude<ProcedureFilter['sort'], 'started'>, string> = {
  'fluoroscopy-time': 'procedure.fluoroscopy_time_s',
  'reference-air-kerma': 'procedure.reference_air_kerma_gy',
  'kerma-area-product': 'procedure.kerma_area_product_gy_cm2',
  kvp: 'procedure.kvp_mean',
};

/** What a list orders by; a missing quantity comes last, whichever end comes first. */
function sortKeyOf({ sort, order }: Pick<ProcedureFilter, 'sort' | 'order'>): { sql: string; type: string } {
  if (sort === 'started') return { sql: 'procedure.started_at', type: 'timestamptz' };
  const last = order === 'descending' ? '-1' : `'Infinity'::float8`;
  return { sql: `coalesce(${sortColumns[sort]}, ${last})`, type: 'float8' };
}

const kinds: Record<ProcedureFilter['kind'], string> = {
  fluoroscopy: `procedure.device_class = 'fluoroscopy' and procedure.procedure_class = 'clinical' and not procedure.is_withdrawn`,
  radiography: `procedure.device_class = 'radiography' and procedure.procedure_class = 'clinical' and not procedure.is_withdrawn`,
  'quality-control': `procedure.procedure_class <> 'clinical' and not procedure.is_withdrawn`,
  withdrawn: 'procedure.is_withdrawn',
};

/** A hard finding waits for a decision; without one a quarantined procedure was left out for good. */
const hasDoubt = `jsonb_path_exists(procedure.data_checks, '$[*] ? (@.result == "failed" && !(@.settlementId != null))')`;

const attentions: Record<ProcedureFilter['attention'], string> = {
  any: 'true',
  flagged: 'procedure.attention_level is not null',
  note: `procedure.attention_level = 'note'`,
  notify: `procedure.attention_level = 'notify'`,
  act: `procedure.attention_level = 'act'`,
  'in-doubt': `(procedure.is_quarantined and ${hasDoubt})`,
};

export type ListScope = {
  hospitalId: string;
  /** Only procedures that name this person as operator or trainee. */
  ownerId: string | null;
  /** May a search look at patient ids? */
  canFindPatients: boolean;
  /** Beginning of the period; null: no beginning. */
  since: Date | null;
};

/** Conditions of a filter and their parameters. */
function conditions(filter: ProcedureFilter, scope: ListScope) {
  const values: unknown[] = [scope.hospitalId];
  const bind = (value: unknown) => `$${values.push(value)}`;
  const parts = ['procedure.hospital_id = $1', kinds[filter.kind], attentions[filter.attention]];
  if (scope.ownerId) {
    const own = bind(scope.ownerId);
    parts.push(
      `${own} in (procedure.primary_operator_id, procedure.second_operator_id, procedure.trainee_id)`,
    );
  }
  if (scope.since) parts.push(`procedure.started_at >= ${bind(scope.since)}`);
  if (filter.type) parts.push(`procedure.procedure_type_id = ${bind(filter.type)}`);
  if (filter.room) parts.push(`procedure.room_id = ${bind(filter.room)}`);
  if (filter.operator) parts.push(`procedure.primary_operator_id = ${bind(filter.operator)}`);
  if (filter.record !== 'any') parts.push(`procedure.record_state = ${bind(filter.record)}`);
  if (filter.find) {
    const text = bind(`${filter.find.replace(/[\\%_]/g, '\\$&')}%`);
    parts.push(
      scope.canFindPatients
        ? `(procedure.case_number ilike ${text} or exists (select 1 from patient_identity identity
             where identity.id = procedure.patient_identity_id
               and (identity.patient_id ilike ${text} or identity.accession_number ilike ${text} or identity."name" ilike ${text})))`
        : `procedure.case_number ilike ${text}`,
    );
  }
  return { parts, values, bind };
}

/** What a row of the ledger shows, and where it comes from. */
const rowColumns = `
            procedure.id, procedure.case_number as "caseNumber", procedure.local_started_at as "startedAt",
            procedure.time_basis as "timeBasis", procedure.study_description as "studyDescription",
            case when kind.id is not null then json_build_object('id', kind.id, 'name', kind."name") end as "procedureType",
            case when room.id is not null then json_build_object('id', room.id, 'name', room.code) end as room,
            case when operator.id is not null then json_build_object('id', operator.id, 'name', operator."name") end as "primaryOperator",
            procedure.fluoroscopy_time_s as "fluoroscopyTimeS",
            procedure.reference_air_kerma_gy as "referenceAirKermaGy",
            procedure.is_reference_air_kerma_upper_bound as "isReferenceAirKermaUpperBound",
            procedure.is_corrected as "isCorrected", procedure.kerma_area_product_gy_cm2 as "kermaAreaProductGyCm2",
            procedure.kvp_mean as "kvpMean", procedure.event_count as "eventCount",
            procedure.device_class as "deviceClass", procedure.procedure_class as "procedureClass", procedure.strip,
            case when procedure.attention_level is not null then
              json_build_object('level', procedure.attention_level, 'reasons', procedure.attention_reasons) end as attention,
            procedure.record_state as "recordState", procedure.missing, procedure.is_withdrawn as "isWithdrawn",
            case when heir.id is not null then json_build_object('id', heir.id, 'caseNumber', heir.case_number) end as "mergedInto",
            procedure.is_manual as "isManual", 
            (procedure.is_quarantined and ${hasDoubt}) as "isInDoubt",
            (procedure.is_quarantined and not ${hasDoubt}) as "isLeftOut",
            not (procedure.is_generated or procedure.is_manual) as "hasOriginal", procedure.patient_identity_id as "patientIdentityId"`;

const rowJoins = `       left join procedure_type kind on kind.id = procedure.procedure_type_id
       left join room on room.id = procedure.room_id
       left join person operator on operator.id = procedure.primary_operator_id
       left join procedure heir on heir.id = procedure.merged_into_id`;

/** One page of the ledger by keyset; one row more than asked for tells whether there is a next page. */
export async function listProcedures(
  db: EntityManager,
  filter: ProcedureFilter,
  scope: ListScope,
  cursor: Cursor | null,
): Promise<ListedProcedure[]> {
  const { parts, values, bind } = conditions(filter, scope);
  const { sql, type } = sortKeyOf(filter);
  const [direction, comparison] = filter.order === 'descending' ? ['desc', '<'] : ['asc', '>'];
  if (cursor)
    parts.push(
      `(${sql}, procedure.id) ${comparison} (${bind(cursor.value)}::${type}, ${bind(cursor.id)}::uuid)`,
    );
  // The page is cut before the wide columns are read: sorting seven thousand strips would cost ten times as much.
  const rows = await db.query(
    `with page as materialized (
       select procedure.id as page_id, ${sql} as sort_key from procedure
        where ${parts.join(' and ')}
        order by ${sql} ${direction}, procedure.id ${direction}
        limit ${bind(filter.limit + 1)})
     select ${rowColumns}, page.sort_key::text as "sortKey"
       from page join procedure on procedure.id = page.page_id ${rowJoins}
      order by page.sort_key ${direction}, procedure.id ${direction}`,
    values,
  );
  return rows;
}

export async function countProcedures(
  db: EntityManager,
  filter: ProcedureFilter,
  scope: ListScope,
): Promise<{ total: number; incomplete: number; enteredByHand: number }> {
  const { parts, values } = conditions(filter, scope);
  const [counts] = await db.query(
    `select count(*)::int as total, count(*) filter (where procedure.record_state = 'incomplete')::int as incomplete,
            count(*) filter (where procedure.is_manual)::int as "enteredByHand"
       from procedure where ${parts.join(' and ')}`,
    values,
  );
  return counts;
}

/** One procedure as a row of the ledger. */
export async function findRow(
  db: EntityManager,
  hospitalId: string,
  id: string,
): Promise<Omit<ProcedureRow, 'patient' | 'strip'>> {
  const [row] = await db.query(
    `select ${rowColumns} from procedure ${rowJoins} where procedure.hospital_id = $1 and procedure.id = $2`,
    [hospitalId, id],
  );
  return row;
}
