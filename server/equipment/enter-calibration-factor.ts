import type { CalibrationFactor, CalibrationFactorInput } from '../../shared/contract/calibration-factor';
import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { fieldProblem } from '../kernel/field-problem';
import { newId } from '../kernel/new-id';
import { Problem } from '../kernel/problem';
import { recomputeSince } from '../procedures/recompute-since';
import { addCalibrationFactor, listCalibrationFactors } from './calibration-factor.store';
import { findEquipment } from './equipment.store';

export async function listFactorsOfEquipment(
  db: Db,
  actor: Actor,
  equipmentId: string,
): Promise<CalibrationFactor[]> {
  if (!(await findEquipment(db, actor.hospitalId, equipmentId))) throw new Problem('not-found');
  return listCalibrationFactors(db, actor.hospitalId, equipmentId);
}

/**
 * Enters a factor and recomputes what it concerns: the machine's procedures from its day on. Estimates made with the
 * factor before stay readable as earlier revisions.
 */
export async function enterCalibrationFactor(
  db: Db,
  actor: Actor,
  input: CalibrationFactorInput,
  now: Date,
): Promise<CalibrationFactor> {
  const entered = await appendFactor(db, actor, input);
  const reason = `calibration factor ${entered.factor} from ${entered.validFrom}`;
  await recomputeSince(db, actor.hospitalId, entered.equipmentId, entered.validFrom, reason, now);
  return entered;
}

/** Appends a factor; earlier ones stay as they are, so that every corrected value can be retraced. */
const appendFactor = (db: Db, actor: Actor, input: CalibrationFactorInput): Promise<CalibrationFactor> =>
  db.transaction(async (tx) => {
    if (!(await findEquipment(tx, actor.hospitalId, input.equipmentId)))
      throw fieldProblem({ pointer: '/equipmentId', detail: 'There is no such machine.' });
    const id = newId();
    await addCalibrationFactor(tx, {
      ...input,
      id,
      hospitalId: actor.hospitalId,
      enteredById: actor.id,
    });
    const factors = await listCalibrationFactors(tx, actor.hospitalId, input.equipmentId);
    const entered = factors.find((factor) => factor.id === id);
    if (!entered) throw new Problem('not-found');
    await noteAudit(tx, {
      hospitalId: actor.hospitalId,
      actorId: actor.id,
      action: 'added',
      subject: 'calibration factor',
      subjectId: id,
      after: entered,
    });
    return entered;
  });
