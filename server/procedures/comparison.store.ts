import type { EntityManager } from 'typeorm';
import type { Comparison } from '../../shared/contract/procedure';
import type { Procedure } from './procedure.entity';

type Quartiles = Omit<Comparison, 'notifyLevel'>;

/**
 * Quartiles (R type 7, as percentile_cont) of a type's clinical procedures in the two years before a procedure's day;
 * withdrawn and quarantined ones are left out.
 */
export async function listQuartiles(db: EntityManager, procedure: Procedure): Promise<Quartiles[]> {
  if (procedure.procedureTypeId === null) return [];
  const rows = await db.query(
    `select quantity, count(value)::int as n,
            percentile_cont(0.25) within group (order by value) as "lowerQuartile",
            percentile_cont(0.5) within group (order by value) as median,
            percentile_cont(0.75) within group (order by value) as "upperQuartile"
       from procedure,
            lateral (values ('fluoroscopy-time', fluoroscopy_time_s),
                            ('reference-air-kerma', reference_air_kerma_gy),
                            ('kerma-area-product', kerma_area_product_gy_cm2)) as figure(quantity, value)
      where hospital_id = $1 and procedure_type_id = $2 and device_class = 'fluoroscopy' and procedure_class = 'clinical'
        and not is_withdrawn and not is_quarantined
        and started_at > $3::timestamptz - interval '2 years' and started_at <= $3::timestamptz
      group by quantity`,
    [procedure.hospitalId, procedure.procedureTypeId, procedure.startedAt],
  );
  return rows;
}
