import type { Db } from '../db/db';
import type { Hospital } from '../hospital/hospital.entity';
import { findLocalDay } from '../kernel/local-day';
import type { Procedure } from '../procedures/procedure.entity';
import { findCheckContext } from './check-context.store';
import type { Checking } from './check-data';
import { listSettingsInForce } from './check-setting.store';
import { listSettlementsInForce } from './check-settlement.store';

/** What the checks of a procedure need: settings of today, decisions that stand, and the hospital's other procedures. */
export async function loadChecking(
  db: Db,
  hospital: Pick<Hospital, 'id' | 'timeZone'>,
  procedure: Pick<Procedure, 'id' | 'hospitalId' | 'procedureTypeId' | 'startedAt'>,
  equipmentIds: readonly string[],
  now: Date,
): Promise<Checking> {
  const settings = await listSettingsInForce(db, hospital.id, findLocalDay(now, hospital.timeZone));
  return {
    settings: new Map(settings.map(({ ruleCode, ...setting }) => [ruleCode, setting])),
    settlements: await listSettlementsInForce(db, hospital.id, procedure.id),
    context: await findCheckContext(db, procedure, equipmentIds),
  };
}
