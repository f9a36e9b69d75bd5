import type { MigrationInterface, QueryRunner } from 'typeorm';

const tables = `
create table hospital (
  id uuid not null,
  "name" text not null,
  time_zone text not null,
  is_demo boolean not null default false,
  demo_finished_at timestamptz,
  created_at timestamptz not null default now(),
  constraint pk_hospital primary key (id)
);
create table person (
  id uuid not null,
  hospital_id uuid not null,
  "name" text not null,
  job text not null,
  stature_m double precision,
  is_monitored boolean not null default false,
  is_active boolean not null default true,
  "version" integer not null default '1',
  created_at timestamptz not null default now(),
  constraint pk_person primary key (id)
);
create table audit_entry (
  id uuid not null,
  hospital_id uuid not null,
  "at" timestamptz not null default now(),
  actor_id uuid,
  "action" text not null,
  subject text not null,
  subject_id uuid,
  "before" jsonb,
  "after" jsonb,
  "reason" text,
  constraint pk_audit_entry primary key (id)
);
create table room (
  id uuid not null,
  hospital_id uuid not null,
  "code" text not null,
  "name" text not null,
  note text,
  is_active boolean not null default true,
  "version" integer not null default '1',
  constraint pk_room primary key (id)
);
create table equipment (
  id uuid not null,
  hospital_id uuid not null,
  room_id uuid,
  identity_key text not null,
  manufacturer text,
  model_name text,
  serial_number text,
  station_name text,
  label text not null,
  tube_position text not null default 'under-table',
  in_service_from date,
  in_service_to date,
  "version" integer not null default '1',
  created_at timestamptz not null default now(),
  constraint pk_equipment primary key (id)
);
create table procedure_type (
  id uuid not null,
  hospital_id uuid not null,
  "key" text not null,
  "name" text not null,
  body_region text not null,
  typical_kvp double precision,
  recognised_by text[] not null default '{}',
  is_active boolean not null default true,
  "version" integer not null default '1',
  constraint pk_procedure_type primary key (id)
);
create table patient_identity (
  id uuid not null,
  hospital_id uuid not null,
  patient_id text,
  "name" text,
  birth_date text,
  sex text,
  accession_number text,
  constraint pk_patient_identity primary key (id)
);
create table procedure (
  id uuid not null,
  hospital_id uuid not null,
  case_number text not null,
  study_instance_uid text not null,
  patient_key text not null,
  patient_identity_id uuid,
  room_id uuid,
  equipment_id uuid,
  study_description text,
  started_at timestamptz not null,
  ended_at timestamptz,
  local_started_at text not null,
  local_ended_at text,
  local_date date not null,
  time_basis text not null,
  device_class text not null default 'fluoroscopy',
  procedure_class text not null default 'clinical',
  fluoroscopy_time_s double precision,
  reference_air_kerma_gy double precision,
  displayed_reference_air_kerma_gy double precision,
  is_reference_air_kerma_upper_bound boolean not null default false,
  kerma_area_product_gy_cm2 double precision,
  displayed_kerma_area_product_gy_cm2 double precision,
  is_corrected boolean not null default false,
  kvp_mean double precision,
  event_count integer not null default '0',
  strip jsonb,
  planes jsonb not null default '[]',
  data_checks jsonb not null default '[]',
  is_quarantined boolean not null default false,
  attention_level text,
  attention_reasons jsonb not null default '[]',
  fields_overlap boolean,
  record_state text not null default 'incomplete',
  missing text[] not null default '{}',
  procedure_type_id uuid,
  primary_operator_id uuid,
  second_operator_id uuid,
  trainee_id uuid,
  access_side text,
  is_feet_first boolean,
  is_prone boolean,
  is_emergency boolean,
  patient_height_m double precision,
  patient_weight_kg double precision,
  from_file text[] not null default '{}',
  completed_at timestamptz,
  record_revision integer not null default '0',
  estimate_revision integer not null default '0',
  is_withdrawn boolean not null default false,
  is_generated boolean not null default false,
  "version" integer not null default '1',
  created_at timestamptz not null default now(),
  constraint pk_procedure primary key (id)
);
create table original_file (
  id uuid not null,
  hospital_id uuid not null,
  sha256 text not null,
  byte_count integer not null,
  deflated_bytes bytea not null,
  received_at timestamptz not null default now(),
  constraint pk_original_file primary key (id)
);
create table dose_report (
  id uuid not null,
  hospital_id uuid not null,
  original_file_id uuid,
  file_name text not null,
  channel text not null,
  received_by_id uuid,
  received_at timestamptz not null default now(),
  "outcome" text not null,
  settled_at timestamptz,
  reason_code text,
  reason_detail text,
  sop_instance_uid text,
  content_hash text,
  content_at text,
  procedure_id uuid,
  equipment_id uuid,
  event_count integer,
  event_keys text[] not null default '{}',
  reported_planes jsonb not null default '[]',
  warnings jsonb not null default '[]',
  constraint pk_dose_report primary key (id)
);
create table calibration_factor (
  id uuid not null,
  hospital_id uuid not null,
  equipment_id uuid not null,
  "plane" text not null,
  "quantity" text not null,
  "factor" double precision not null,
  uncertainty_percent double precision,
  valid_from date not null,
  source text not null,
  entered_by_id uuid not null,
  entered_at timestamptz not null default now(),
  constraint pk_calibration_factor primary key (id)
);
create table garment (
  id uuid not null,
  hospital_id uuid not null,
  "code" text not null,
  "kind" text not null,
  material text not null,
  front_lead_mm double precision,
  back_lead_mm double precision,
  lead_kvp double precision,
  is_measured boolean not null default false,
  owner_id uuid,
  "state" text not null,
  last_inspected_on date,
  next_due_on date,
  note text,
  "version" integer not null default '1',
  constraint pk_garment primary key (id)
);
create table level (
  id uuid not null,
  hospital_id uuid not null,
  "quantity" text not null,
  "strength" text not null,
  "value" double precision not null,
  procedure_type_id uuid,
  valid_from date not null,
  source text not null,
  constraint pk_level primary key (id)
);
create table account (
  person_id uuid not null,
  email text not null,
  password_hash text,
  roles text[] not null default '{}',
  constraint pk_account primary key (person_id)
);
create table sign_in_link (
  token_hash text not null,
  "purpose" text not null,
  person_id uuid,
  expires_at timestamptz not null,
  used_at timestamptz,
  constraint pk_sign_in_link primary key (token_hash)
);
create table irradiation_event (
  id uuid not null,
  started_at timestamptz not null,
  procedure_id uuid not null,
  dose_report_id uuid,
  event_key text not null,
  irradiation_event_uid text,
  "plane" text,
  "type" text,
  local_started_at text,
  protocol text,
  kvp_values double precision[] not null default '{}',
  kvp_mean double precision,
  tube_current_ma double precision,
  pulse_width_ms double precision,
  pulse_count double precision,
  pulse_rate_per_s double precision,
  exposure_time_s double precision,
  irradiation_duration_s double precision,
  kerma_area_product_gy_cm2 double precision,
  reference_air_kerma_gy double precision,
  primary_angle_deg double precision,
  secondary_angle_deg double precision,
  primary_end_angle_deg double precision,
  secondary_end_angle_deg double precision,
  source_to_detector_mm double precision,
  source_to_isocenter_mm double precision,
  source_to_reference_point_mm double precision,
  table_longitudinal_mm double precision,
  table_lateral_mm double precision,
  table_height_mm double precision,
  field_area_cm2 double precision,
  filters jsonb not null default '[]',
  reported jsonb not null default '{}',
  constraint pk_irradiation_event primary key (id, started_at)
);
create table presence (
  id uuid not null,
  procedure_id uuid not null,
  revision integer not null default '0',
  "position" integer not null default '0',
  person_id uuid,
  visitor_name text,
  duty text not null,
  fluoroscopy_place jsonb,
  acquisition_place jsonb,
  is_turned_away boolean not null default false,
  is_present_during_rotation boolean not null default false,
  garment_answer text not null,
  garment_id uuid,
  has_thyroid_collar boolean,
  has_glasses boolean not null default false,
  has_ceiling_screen boolean not null default false,
  has_table_skirt boolean not null default false,
  has_mobile_screen boolean not null default false,
  present_from_s double precision,
  present_to_s double precision,
  constraint pk_presence primary key (id)
);
create table staff_estimate (
  id uuid not null,
  procedure_id uuid not null,
  presence_id uuid not null,
  person_id uuid,
  revision integer not null default '0',
  duty text not null,
  computed_at timestamptz not null default now(),
  "reason" text,
  "method" text not null,
  method_version text not null,
  scatter_model text not null,
  effective_dose_formula text not null,
  collar_air_kerma_ugy double precision,
  collar_air_kerma_low_ugy double precision,
  collar_air_kerma_high_ugy double precision,
  eye_air_kerma_ugy double precision,
  eye_air_kerma_low_ugy double precision,
  eye_air_kerma_high_ugy double precision,
  waist_air_kerma_ugy double precision,
  waist_air_kerma_low_ugy double precision,
  waist_air_kerma_high_ugy double precision,
  collar_hp10_usv double precision,
  collar_hp10_low_usv double precision,
  collar_hp10_high_usv double precision,
  eye_hp3_usv double precision,
  eye_hp3_low_usv double precision,
  eye_hp3_high_usv double precision,
  under_garment_hp10_usv double precision,
  under_garment_hp10_low_usv double precision,
  under_garment_hp10_high_usv double precision,
  effective_dose_usv double precision,
  effective_dose_low_usv double precision,
  effective_dose_high_usv double precision,
  fluoroscopy_share double precision,
  inputs jsonb not null,
  contributions jsonb not null default '[]',
  gaps jsonb not null default '[]',
  warnings jsonb not null default '[]',
  constraint pk_staff_estimate primary key (id)
);
`;

const indexes = `
create index ix_person_hospital_id_name on person (hospital_id, "name");
create index ix_audit_entry_hospital_id_at on audit_entry (hospital_id, "at");
create index ix_audit_entry_subject_id_at on audit_entry (subject_id, "at");
create unique index ix_room_hospital_id_code on room (hospital_id, code);
create unique index ix_equipment_hospital_id_identity_key on equipment (hospital_id, identity_key);
create unique index ix_procedure_type_hospital_id_key on procedure_type (hospital_id, "key");
create index ix_patient_identity_hospital_id_patient_id on patient_identity (hospital_id, patient_id);
create index ix_procedure_primary_operator_id_started_at on procedure (primary_operator_id, started_at);
create index ix_procedure_procedure_type_id_started_at on procedure (procedure_type_id, started_at);
create unique index ix_procedure_hospital_id_case_number on procedure (hospital_id, case_number);
create index ix_procedure_hospital_id_started_at_id on procedure (hospital_id, started_at, id);
create unique index ix_procedure_hospital_id_study_instance_uid_patient_key on procedure (hospital_id, study_instance_uid, patient_key);
create index ix_dose_report_procedure_id on dose_report (procedure_id);
create index ix_dose_report_hospital_id_received_at_id on dose_report (hospital_id, received_at, id);
create unique index ix_dose_report_hospital_id_sop_instance_uid on dose_report (hospital_id, sop_instance_uid) where outcome = 'stored';
create index ix_calibration_factor_equipment_id_plane_quantity_valid_from on calibration_factor (equipment_id, plane, quantity, valid_from);
create unique index ix_garment_hospital_id_code on garment (hospital_id, code);
create unique index ix_account_email on account (email);
create unique index ix_irradiation_event_procedure_id_event_key_started_at on irradiation_event (procedure_id, event_key, started_at);
create index ix_presence_procedure_id_revision on presence (procedure_id, revision);
create index ix_staff_estimate_person_id_procedure_id on staff_estimate (person_id, procedure_id);
create index ix_staff_estimate_procedure_id_revision on staff_estimate (procedure_id, revision);
`;

const references = `
alter table person add constraint fk_person_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action;
alter table audit_entry add constraint fk_audit_entry_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action;
alter table audit_entry add constraint fk_audit_entry_actor_id foreign key (actor_id) references person(id) on delete no action on update no action;
alter table room add constraint fk_room_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action;
alter table equipment add constraint fk_equipment_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action;
alter table equipment add constraint fk_equipment_room_id foreign key (room_id) references room(id) on delete no action on update no action;
alter table procedure_type add constraint fk_procedure_type_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action;
alter table patient_identity add constraint fk_patient_identity_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action;
alter table procedure add constraint fk_procedure_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action;
alter table procedure add constraint fk_procedure_patient_identity_id foreign key (patient_identity_id) references patient_identity(id) on delete no action on update no action;
alter table procedure add constraint fk_procedure_room_id foreign key (room_id) references room(id) on delete no action on update no action;
alter table procedure add constraint fk_procedure_equipment_id foreign key (equipment_id) references equipment(id) on delete no action on update no action;
alter table procedure add constraint fk_procedure_procedure_type_id foreign key (procedure_type_id) references procedure_type(id) on delete no action on update no action;
alter table procedure add constraint fk_procedure_primary_operator_id foreign key (primary_operator_id) references person(id) on delete no action on update no action;
alter table procedure add constraint fk_procedure_second_operator_id foreign key (second_operator_id) references person(id) on delete no action on update no action;
alter table procedure add constraint fk_procedure_trainee_id foreign key (trainee_id) references person(id) on delete no action on update no action;
alter table original_file add constraint fk_original_file_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action;
alter table dose_report add constraint fk_dose_report_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action;
alter table dose_report add constraint fk_dose_report_original_file_id foreign key (original_file_id) references original_file(id) on delete no action on update no action;
alter table dose_report add constraint fk_dose_report_received_by_id foreign key (received_by_id) references person(id) on delete no action on update no action;
alter table dose_report add constraint fk_dose_report_procedure_id foreign key (procedure_id) references procedure(id) on delete no action on update no action;
alter table dose_report add constraint fk_dose_report_equipment_id foreign key (equipment_id) references equipment(id) on delete no action on update no action;
alter table calibration_factor add constraint fk_calibration_factor_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action;
alter table calibration_factor add constraint fk_calibration_factor_equipment_id foreign key (equipment_id) references equipment(id) on delete no action on update no action;
alter table calibration_factor add constraint fk_calibration_factor_entered_by_id foreign key (entered_by_id) references person(id) on delete no action on update no action;
alter table garment add constraint fk_garment_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action;
alter table garment add constraint fk_garment_owner_id foreign key (owner_id) references person(id) on delete no action on update no action;
alter table level add constraint fk_level_hospital_id foreign key (hospital_id) references hospital(id) on delete no action on update no action;
alter table level add constraint fk_level_procedure_type_id foreign key (procedure_type_id) references procedure_type(id) on delete no action on update no action;
alter table account add constraint fk_account_person_id foreign key (person_id) references person(id) on delete cascade on update no action;
alter table sign_in_link add constraint fk_sign_in_link_person_id foreign key (person_id) references person(id) on delete cascade on update no action;
alter table irradiation_event add constraint fk_irradiation_event_procedure_id foreign key (procedure_id) references procedure(id) on delete no action on update no action;
alter table irradiation_event add constraint fk_irradiation_event_dose_report_id foreign key (dose_report_id) references dose_report(id) on delete no action on update no action;
alter table presence add constraint fk_presence_procedure_id foreign key (procedure_id) references procedure(id) on delete no action on update no action;
alter table presence add constraint fk_presence_person_id foreign key (person_id) references person(id) on delete no action on update no action;
alter table presence add constraint fk_presence_garment_id foreign key (garment_id) references garment(id) on delete no action on update no action;
alter table staff_estimate add constraint fk_staff_estimate_procedure_id foreign key (procedure_id) references procedure(id) on delete no action on update no action;
alter table staff_estimate add constraint fk_staff_estimate_presence_id foreign key (presence_id) references presence(id) on delete no action on update no action;
alter table staff_estimate add constraint fk_staff_estimate_person_id foreign key (person_id) references person(id) on delete no action on update no action;
`;

/** Case numbers count up over the years; gaps are harmless. */
const sequences = `create sequence case_number;`;

/** The audit trail can be added to, never changed. */
const appendOnlyAudit = `
create function refuse_audit_change() returns trigger language plpgsql as $$
begin
  raise exception 'audit entries are never changed or deleted';
end $$;
create trigger audit_entry_is_append_only before update or delete on audit_entry
  for each row execute function refuse_audit_change();
create trigger audit_entry_is_never_emptied before truncate on audit_entry
  for each statement execute function refuse_audit_change();
`;

/** Sessions and sign-in tries live in the database, so that several server processes share them. */
const sessions = `
create table session (
  sid varchar primary key,
  sess json not null,
  expire timestamptz not null
);
create index ix_session_expire on session (expire);
create table rate_limit (
  key varchar(255) primary key,
  points integer not null default 0,
  expire bigint
);
`;

export class Foundation1764547200000 implements MigrationInterface {
  name = 'Foundation1764547200000';

  async up(runner: QueryRunner): Promise<void> {
    for (const script of [tables, indexes, references, sequences, appendOnlyAudit, sessions])
      await runner.query(script);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(
      `drop table session, rate_limit, hospital, person, audit_entry, room, equipment, procedure_type, patient_identity, procedure, original_file, dose_report, calibration_factor, garment, level, account, sign_in_link, irradiation_event, presence, staff_estimate cascade`,
    );
    await runner.query('drop sequence case_number');
    await runner.query('drop function refuse_audit_change');
  }
}
