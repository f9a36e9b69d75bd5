import type { MigrationInterface, QueryRunner } from 'typeorm';

/**
 * The staff exposure pages read a few columns of every procedure of a year. Both tables have wide rows; these
 * indexes hold what the pages need, so that the rows themselves are not touched.
 */
export class ExposureIndexes1796083200000 implements MigrationInterface {
  name = 'ExposureIndexes1796083200000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      create index ix_staff_estimate_exposure on staff_estimate (duty, procedure_id, revision) include (
        person_id, method, method_version,
        collar_hp10_usv, collar_hp10_low_usv, collar_hp10_high_usv,
        eye_hp3_usv, eye_hp3_low_usv, eye_hp3_high_usv,
        under_garment_hp10_usv, under_garment_hp10_low_usv, under_garment_hp10_high_usv,
        effective_dose_usv, effective_dose_low_usv, effective_dose_high_usv)`);
    await runner.query(`
      create index ix_procedure_exposure on procedure (hospital_id, started_at) include (
        id, estimate_revision, case_number, local_started_at, local_date, procedure_type_id, room_id,
        fluoroscopy_time_s, kvp_mean, kerma_area_product_gy_cm2,
        primary_operator_id, second_operator_id, trainee_id, record_state)
      where device_class = 'fluoroscopy' and procedure_class = 'clinical'
        and not is_withdrawn and not is_quarantined`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('drop index ix_staff_estimate_exposure, ix_procedure_exposure');
  }
}
