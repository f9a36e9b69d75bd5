import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Why an entry was corrected; what a picture was taken for. */
export class EntriesByHand1796173000000 implements MigrationInterface {
  name = 'EntriesByHand1796173000000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      alter table manual_entry add "reason" text;
      create index ix_manual_entry_photo_id on manual_entry (photo_id);
      alter table attachment add purpose text not null default 'dose-screen';
      alter table attachment alter purpose drop default`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`
      alter table attachment drop purpose;
      drop index ix_manual_entry_photo_id;
      alter table manual_entry drop "reason"`);
  }
}
