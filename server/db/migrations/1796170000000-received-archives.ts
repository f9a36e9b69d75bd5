import type { MigrationInterface, QueryRunner } from 'typeorm';

const up = `
create table received_archive (
  id uuid not null,
  hospital_id uuid not null,
  file_name text not null,
  upload_key uuid,
  sha256 text not null,
  byte_count integer not null,
  received_by_id uuid,
  received_at timestamptz not null default now(),
  state text not null,
  entry_count integer,
  skipped jsonb not null default '[]',
  settled_at timestamptz,
  purged_at timestamptz,
  constraint pk_received_archive primary key (id),
  constraint fk_received_archive_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action,
  constraint fk_received_archive_received_by_id foreign key (received_by_id) references person(id) on delete no action on update no action
);
create unique index ix_received_archive_hospital_id_upload_key on received_archive (hospital_id, upload_key) where upload_key is not null;

create table archive_part (
  archive_id uuid not null,
  part_number integer not null,
  bytes bytea not null,
  constraint pk_archive_part primary key (archive_id, part_number),
  constraint fk_archive_part_archive_id foreign key (archive_id) references received_archive(id) on delete no action on update no action
);
alter table archive_part alter bytes set storage external;

alter table dose_report
  add archive_id uuid,
  add constraint fk_dose_report_archive_id foreign key (archive_id) references received_archive(id) on delete no action on update no action;
create index ix_dose_report_archive_id on dose_report (archive_id);
create index ix_dose_report_original_file_id on dose_report (original_file_id);
create index ix_original_file_hospital_id_sha256 on original_file (hospital_id, sha256);
`;

/** Zip archives as they came, in parts; and files found again by the hash of their bytes. */
export class ReceivedArchives1796170000000 implements MigrationInterface {
  name = 'ReceivedArchives1796170000000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(up);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`
      drop index ix_original_file_hospital_id_sha256, ix_dose_report_original_file_id;
      alter table dose_report drop archive_id;
      drop table archive_part, received_archive`);
  }
}
