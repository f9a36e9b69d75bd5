import type { EntityManager } from 'typeorm';
import { CheckSetting } from './check-setting.entity';

export type SettingInForce = Pick<CheckSetting, 'ruleCode' | 'severity' | 'owner' | 'low' | 'high'>;

/** The newest setting of each rule that has begun by a day. */
export const listSettingsInForce = (
  db: EntityManager,
  hospitalId: string,
  day: string,
): Promise<SettingInForce[]> =>
  db.query(
    `select distinct on (rule_code) rule_code as "ruleCode", severity, owner, low, high
       from check_setting where hospital_id = $1 and valid_from <= $2::date
      order by rule_code, valid_from desc, set_at desc, id desc`,
    [hospitalId, day],
  );

export type SettingRow = SettingInForce & {
  id: string;
  validFrom: string;
  reason: string;
  setBy: string;
  setAt: Date;
};

/** Every setting of the hospital, the newest first. */
export const listSettings = (db: EntityManager, hospitalId: string): Promise<SettingRow[]> =>
  db.query(
    `select setting.id, setting.rule_code as "ruleCode", setting.severity, setting.owner, setting.low, setting.high,
            setting.valid_from::text as "validFrom", setting."reason", person."name" as "setBy",
            setting.set_at as "setAt"
       from check_setting setting join person on person.id = setting.set_by_id
      where setting.hospital_id = $1
      order by setting.valid_from desc, setting.set_at desc, setting.id desc`,
    [hospitalId],
  );

/** One change of a hospital's rules after the other. */
export async function lockSettings(db: EntityManager, hospitalId: string): Promise<void> {
  await db.query('select pg_advisory_xact_lock(hashtextextended($1, 3))', [hospitalId]);
}

export async function addSetting(db: EntityManager, setting: Omit<CheckSetting, 'setAt'>): Promise<void> {
  await db.insert(CheckSetting, setting);
}
