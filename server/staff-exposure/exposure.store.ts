import type { EntityManager } from 'typeorm';
import {
  exposureQuantities,
  type ExposedPerson,
  type ExposureQuantity,
} from '../../shared/contract/staff-exposure';
import { countedProcedures, quantityColumns, validEstimates } from './exposure-selection';

export type SummedMonth = Record<ExposureQuantity, { nominal: number; low: number; high: number } | null> & {
  month: string;
  procedures: number;
  withoutEstimate: number;
  /** How many people stand behind the sums. */
  people: number;
};

const sumOf = (quantity: ExposureQuantity): string => {
  const { nominal, low, high } = quantityColumns[quantity];
  return `case when count(${nominal}) > 0 then json_build_object(
    'nominal', sum(${nominal}), 'low', sum(${low}), 'high', sum(${high})) end as "${quantity}"`;
};

/**
 * The estimates of one person, or of everybody, summed by month of the hospital's calendar. The inputs that
 * are uncertain are systematic, shared by all of a person's procedures, so the ends of the intervals add up.
 */
export const sumMonths = (
  db: EntityManager,
  hospitalId: string,
  { personId, fromDay }: { personId: string | null; fromDay: string | null },
): Promise<SummedMonth[]> =>
  db.query(
    `select to_char(procedure.local_date, 'YYYY-MM') as month,
            count(distinct procedure.id)::int as procedures,
            (count(distinct procedure.id) filter (where estimate.collar_hp10_usv is null))::int as "withoutEstimate",
            count(distinct estimate.person_id)::int as people,
            ${exposureQuantities.map(sumOf).join(', ')}
       from procedure join staff_estimate estimate on ${validEstimates}
      where ${countedProcedures} and ($2::uuid is null or estimate.person_id = $2)
        and ($3::date is null or procedure.local_date >= $3)
      group by 1 order by 1`,
    [hospitalId, personId, fromDay],
  );

/** The people who are monitored or have estimates, by name. `personId`: only this one. */
export const listExposedPeople = (
  db: EntityManager,
  hospitalId: string,
  personId: string | null,
): Promise<ExposedPerson[]> =>
  db.query(
    `select person.id, person."name", person.job, coalesce(counted.procedures, 0)::int as procedures
       from person
       left join (select estimate.person_id, count(distinct procedure.id) as procedures
                    from procedure join staff_estimate estimate on ${validEstimates}
                   where ${countedProcedures} and ($2::uuid is null or estimate.person_id = $2)
                   group by 1) counted on counted.person_id = person.id
      where person.hospital_id = $1 and ($2::uuid is null or person.id = $2)
        and (person.is_monitored or counted.procedures > 0 or person.id = $2)
      order by person."name" collate "und-x-icu"`,
    [hospitalId, personId],
  );

export async function findPersonName(
  db: EntityManager,
  hospitalId: string,
  id: string,
): Promise<{ id: string; name: string } | null> {
  const rows = await db.query(`select id, "name" from person where hospital_id = $1 and id = $2`, [
    hospitalId,
    id,
  ]);
  return rows[0] ?? null;
}
