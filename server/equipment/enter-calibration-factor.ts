import type { CalibrationFactor, CalibrationFactorInput } from '../../shared/contract/calibration-factor';
import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { fieldProblem } from '../kernel/field-problem';
import { addJob, listPendingKeys } from '../jobs/job.store';
import { newId } from '../kernel/new-id';
import { Problem } from '../kernel/problem';
import { addCalibrationFactor, listCalibrationFactors } from './calibration-factor.store';
import { findEquipment } from './equipment.store';

export async function listFactorsOfEquipment(
  db: Db,
  actor: Actor,
  equipmentId: string,
): Promise<CalibrationFactor[]> {
  if (!(await findEquipment(db, actor.hospitalId, equipmentId))) throw new Problem('not-found');
  const factors = await listCalibrationFactors(db, actor.hospitalId, equipmentId);
  const pending = await listPendingKeys(db, factors.map(keyOf));
  return factors.map((factor) => ({ ...factor, isBeingApplied: pending.has(keyOf(factor)) }));
}

/** Two factors entered one after the other may begin on different days: each has a job of its own. */
const keyOf = (factor: Pick<CalibrationFactor, 'equipmentId' | 'validFrom'>) =>
  `recompute-machine:${factor.equipmentId}:${factor.validFrom}`;

/**
 * Appends a factor; earlier ones stay as they are, so that every corrected value can be retraced. What it concerns,
 * the machine's procedures from its day on, is recomputed afterwards; estimates made before stay readable as earlier
 * revisions.
 */
export const enterCalibrationFactor = (
  db: Db,
  actor: Actor,
  input: CalibrationFactorInput,
): Promise<CalibrationFactor> =>
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
    await addJob(
      tx,
      'recompute-machine',
      {
        hospitalId: actor.hospitalId,
        equipmentId: entered.equipmentId,
        day: entered.validFrom,
        reason: `calibration factor ${entered.factor} from ${entered.validFrom}`,
      },
      keyOf(entered),
    );
    return { ...entered, isBeingApplied: true };
  });
