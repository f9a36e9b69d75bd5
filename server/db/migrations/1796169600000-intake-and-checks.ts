import type { MigrationInterface, QueryRunner } from 'typeorm';

const columns = `
alter table dose_report
  add upload_key uuid,
  add archive_name text,
  add reader_version text,
  add context jsonb,
  add purged_at timestamptz;
create unique index ix_dose_report_hospital_id_upload_key on dose_report (hospital_id, upload_key) where upload_key is not null;
create index ix_dose_report_equipment_id on dose_report (equipment_id);

alter table procedure
  add accession_key text,
  add merged_into_id uuid,
  add is_manual boolean not null default false,
  add constraint fk_procedure_merged_into_id foreign key (merged_into_id) references procedure(id) on delete no action on update no action;
create index ix_procedure_hospital_id_accession_key on procedure (hospital_id, accession_key);
create index ix_procedure_equipment_id_started_at on procedure (equipment_id, started_at);

alter table irradiation_event add details jsonb not null default '{}';
create index ix_irradiation_event_irradiation_event_uid on irradiation_event (irradiation_event_uid);
`;

const tables = `
create table attachment (
  id uuid not null,
  hospital_id uuid not null,
  file_name text not null,
  media_type text not null,
  sha256 text not null,
  byte_count integer not null,
  bytes bytea not null,
  created_by_id uuid,
  created_at timestamptz not null default now(),
  constraint pk_attachment primary key (id),
  constraint fk_attachment_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action,
  constraint fk_attachment_created_by_id foreign key (created_by_id) references person(id) on delete no action on update no action
);

create table check_settlement (
  id uuid not null,
  hospital_id uuid not null,
  procedure_id uuid not null,
  rule_code text not null,
  finding text not null,
  decision text not null,
  corrected jsonb,
  "reason" text not null,
  decided_by_id uuid not null,
  decided_at timestamptz not null default now(),
  ended_at timestamptz,
  ended_by_id uuid,
  constraint pk_check_settlement primary key (id),
  constraint fk_check_settlement_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action,
  constraint fk_check_settlement_procedure_id foreign key (procedure_id) references procedure(id) on delete no action on update no action,
  constraint fk_check_settlement_decided_by_id foreign key (decided_by_id) references person(id) on delete no action on update no action,
  constraint fk_check_settlement_ended_by_id foreign key (ended_by_id) references person(id) on delete no action on update no action
);
create index ix_check_settlement_procedure_id_rule_code on check_settlement (procedure_id, rule_code);

create table check_setting (
  id uuid not null,
  hospital_id uuid not null,
  rule_code text not null,
  severity text not null,
  owner text not null,
  low double precision,
  high double precision,
  valid_from date not null,
  "reason" text not null,
  set_by_id uuid not null,
  set_at timestamptz not null default now(),
  constraint pk_check_setting primary key (id),
  constraint fk_check_setting_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action,
  constraint fk_check_setting_set_by_id foreign key (set_by_id) references person(id) on delete no action on update no action
);
create index ix_check_setting_hospital_id_rule_code_valid_from on check_setting (hospital_id, rule_code, valid_from);

create table regrouping (
  id uuid not null,
  hospital_id uuid not null,
  kind text not null,
  source_id uuid not null,
  target_id uuid not null,
  dose_report_ids uuid[] not null,
  evidence jsonb not null,
  "reason" text not null,
  done_by_id uuid not null,
  done_at timestamptz not null default now(),
  undone_at timestamptz,
  undone_by_id uuid,
  constraint pk_regrouping primary key (id),
  constraint fk_regrouping_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action,
  constraint fk_regrouping_source_id foreign key (source_id) references procedure(id) on delete no action on update no action,
  constraint fk_regrouping_target_id foreign key (target_id) references procedure(id) on delete no action on update no action,
  constraint fk_regrouping_done_by_id foreign key (done_by_id) references person(id) on delete no action on update no action,
  constraint fk_regrouping_undone_by_id foreign key (undone_by_id) references person(id) on delete no action on update no action
);
create index ix_regrouping_source_id on regrouping (source_id);
create index ix_regrouping_target_id on regrouping (target_id);

create table manual_entry (
  id uuid not null,
  hospital_id uuid not null,
  dose_report_id uuid not null,
  local_started_at text not null,
  quantities jsonb not null,
  photo_id uuid,
  comment text,
  replaces_id uuid,
  entered_by_id uuid not null,
  entered_at timestamptz not null default now(),
  constraint pk_manual_entry primary key (id),
  constraint fk_manual_entry_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action,
  constraint fk_manual_entry_dose_report_id foreign key (dose_report_id) references dose_report(id) on delete no action on update no action,
  constraint fk_manual_entry_photo_id foreign key (photo_id) references attachment(id) on delete no action on update no action,
  constraint fk_manual_entry_replaces_id foreign key (replaces_id) references manual_entry(id) on delete no action on update no action,
  constraint fk_manual_entry_entered_by_id foreign key (entered_by_id) references person(id) on delete no action on update no action
);
create index ix_manual_entry_dose_report_id on manual_entry (dose_report_id);
`;

/** Upload keys, what a report said beside its figures, settled findings, regroupings, entries by hand. */
export class IntakeAndChecks1796169600000 implements MigrationInterface {
  name = 'IntakeAndChecks1796169600000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(columns);
    await runner.query(tables);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`
      drop table manual_entry, regrouping, check_setting, check_settlement, attachment;
      drop index ix_irradiation_event_irradiation_event_uid;
      alter table irradiation_event drop details;
      drop index ix_procedure_equipment_id_started_at, ix_procedure_hospital_id_accession_key;
      alter table procedure drop is_manual, drop merged_into_id, drop accession_key;
      drop index ix_dose_report_equipment_id, ix_dose_report_hospital_id_upload_key;
      alter table dose_report drop purged_at, drop context, drop reader_version, drop archive_name, drop upload_key`);
  }
}
