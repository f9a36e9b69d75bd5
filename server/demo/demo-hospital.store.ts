import type { EntityManager } from 'typeorm';
import { CalibrationFactor } from '../equipment/calibration-factor.entity';
import { Equipment } from '../equipment/equipment.entity';
import { Hospital } from '../hospital/hospital.entity';
import { Level } from '../levels/level.entity';
import { demoHospital } from './hospital';

/** The demo hospital once it is whole. Seeding is one transaction, so a half one is never seen. */
export const findFinishedDemo = (db: EntityManager): Promise<Hospital | null> =>
  db
    .createQueryBuilder(Hospital, 'hospital')
    .where('hospital.is_demo and hospital.demo_finished_at is not null')
    .andWhere('hospital."name" = :name', { name: demoHospital.name })
    .getOne();

/** Two processes that start at once take turns; the second finds the demo finished. */
export async function waitForOtherSeeders(db: EntityManager): Promise<void> {
  await db.query('select pg_advisory_xact_lock(hashtextextended($1, 2))', ['demo hospital']);
}

export async function markFinished(db: EntityManager, hospitalId: string, at: Date): Promise<void> {
  await db.update(Hospital, { id: hospitalId }, { demoFinishedAt: at });
}

export const listFactors = (db: EntityManager, hospitalId: string): Promise<CalibrationFactor[]> =>
  db.findBy(CalibrationFactor, { hospitalId });

export async function labelMachines(db: EntityManager, hospitalId: string): Promise<Map<string, string>> {
  const machines = await db.findBy(Equipment, { hospitalId });
  return new Map(machines.map(({ id, label }) => [id, label]));
}

export const listAllLevels = (db: EntityManager, hospitalId: string): Promise<Level[]> =>
  db.findBy(Level, { hospitalId });

/** The next numbers of the hospital's case sequence, ascending. */
export async function drawCaseNumbers(db: EntityManager, count: number): Promise<number[]> {
  const rows: { number: string }[] = await db.query(
    `select nextval('case_number') as number from generate_series(1, $1)`,
    [count],
  );
  return rows.map((row) => Number(row.number));
}

/** Fresh statistics: without them the planner takes the new tables for empty. */
export async function analyseTables(db: EntityManager): Promise<void> {
  await db.query(
    'analyze procedure, irradiation_event, dose_report, presence, staff_estimate, patient_identity',
  );
}

/** The newest files came in minutes after their case, not at the moment when the demo was written. */
export async function settleArrivalTimes(db: EntityManager, hospitalId: string): Promise<void> {
  const arrival = `coalesce(procedure.ended_at, procedure.started_at) + interval '11 minutes'`;
  await db.query(
    `update dose_report report set received_at = ${arrival}, settled_at = ${arrival}
       from procedure
      where procedure.id = report.procedure_id and report.hospital_id = $1 and report.channel <> 'generated'`,
    [hospitalId],
  );
  await db.query(
    `update original_file file set received_at = report.received_at
       from dose_report report where report.original_file_id = file.id and file.hospital_id = $1`,
    [hospitalId],
  );
}
