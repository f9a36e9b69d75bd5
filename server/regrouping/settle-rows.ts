import type { Db } from '../db/db';
import { listReportsOf } from '../dose-reports/dose-report.store';
import { findEquipment } from '../equipment/factors-in-use.store';
import type { Hospital } from '../hospital/hospital.entity';
import { findProcedure, updateProcedure } from '../procedures/procedure.store';
import type { Procedure } from '../procedures/procedure.entity';
import { recomputeProcedure } from '../procedures/recompute-procedure';
import { dropEstimates, refreshEstimates } from '../staff-exposure/refresh-estimates';

/** What a procedure's row says of where and when, as far as its reports decide it. */
export type Placement = Pick<Procedure, 'equipmentId' | 'roomId' | 'deviceClass' | 'timeBasis'>;

export const placementOf = ({ equipmentId, roomId, deviceClass, timeBasis }: Procedure): Placement => ({
  equipmentId,
  roomId,
  deviceClass,
  timeBasis,
});

/** Machine and room of the reports that are left, where the procedure's own went; one with fluoroscopy is fluoroscopy. */
async function placeRow(tx: Db, procedure: Procedure): Promise<Partial<Placement>> {
  const reports = await listReportsOf(tx, procedure.hospitalId, procedure.id);
  const changes: Partial<Placement> = {};
  const first = reports[0]?.equipmentId;
  if (first && !reports.some(({ equipmentId }) => equipmentId === procedure.equipmentId)) {
    changes.equipmentId = first;
    changes.roomId = (await findEquipment(tx, procedure.hospitalId, first))?.roomId ?? null;
  }
  const classes = reports.map(({ context }) => context?.deviceClass);
  if (classes.includes('fluoroscopy')) changes.deviceClass = 'fluoroscopy';
  else if (classes.length > 0 && classes.every((one) => one === 'radiography'))
    changes.deviceClass = 'radiography';
  return changes;
}

/**
 * Brings a procedure's row up to date with its reports. Left without any, it is withdrawn, keeps its time, and tells
 * where they went; with reports again, it counts again.
 */
export async function settleRow(
  tx: Db,
  hospital: Hospital,
  { id, heirId, placement }: { id: string; heirId: string | null; placement: Placement | null },
  now: Date,
): Promise<void> {
  const before = await findProcedure(tx, hospital.id, id);
  if (!before) return;
  const reports = await listReportsOf(tx, hospital.id, id);
  const isEmptied = reports.length === 0;
  const isRevived = !isEmptied && before.mergedIntoId !== null;
  await updateProcedure(tx, hospital.id, id, {
    ...(isEmptied
      ? { isWithdrawn: true, mergedIntoId: heirId, timeBasis: 'study' as const }
      : await placeRow(tx, before)),
    ...(isRevived && { isWithdrawn: false, mergedIntoId: null }),
    ...placement,
  });
  const placed = (await findProcedure(tx, hospital.id, id)) as Procedure;
  await recomputeProcedure(tx, hospital, placed, null, now);
  const settled = (await findProcedure(tx, hospital.id, id)) as Procedure;
  if (settled.recordState !== 'complete') return;
  if (isEmptied) await dropEstimates(tx, settled);
  else await refreshEstimates(tx, settled, 'its dose reports were grouped anew');
}
