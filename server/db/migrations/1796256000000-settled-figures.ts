import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Totals that a physicist typed in place of the reported ones; procedures that ask for attention are found at once. */
export class SettledFigures1796256000000 implements MigrationInterface {
  name = 'SettledFigures1796256000000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query('alter table procedure add settled_figures jsonb');
    await runner.query(
      'create index ix_procedure_hospital_id_started_at on procedure (hospital_id, started_at) where attention_level is not null',
    );
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('drop index ix_procedure_hospital_id_started_at');
    await runner.query('alter table procedure drop settled_figures');
  }
}
