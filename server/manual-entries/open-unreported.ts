import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { fieldProblem } from '../kernel/field-problem';
import { lockProcedure, updateProcedure } from '../procedures/procedure.store';
import type { Procedure } from '../procedures/procedure.entity';
import { hasTypedReport } from './manual-entry.store';

const hasFigures = ({ planes, eventCount }: Procedure) =>
  eventCount > 0 || planes.some(({ displayed }) => Object.values(displayed).some((value) => value !== null));

/** A procedure that waits for its figures; one that has some is not typed over. */
export async function openUnreported(
  tx: Db,
  actor: Actor,
  id: string,
  machine: { equipmentId: string | null; roomId: string | null },
): Promise<Procedure> {
  const refuse = (detail: string) => fieldProblem({ pointer: '/procedureId', detail });
  const procedure = await lockProcedure(tx, actor.hospitalId, id);
  if (!procedure) throw refuse('This procedure does not exist.');
  if (procedure.isWithdrawn) throw refuse('This procedure is withdrawn. Restore it first.');
  if (await hasTypedReport(tx, actor.hospitalId, id))
    throw refuse('Figures were entered by hand already. Correct those.');
  if (hasFigures(procedure))
    throw refuse(
      'This procedure has figures from a report. Enter the rest as a procedure of its own; the physicist joins the two.',
    );
  const place = {
    equipmentId: procedure.equipmentId ?? machine.equipmentId,
    roomId: procedure.roomId ?? machine.roomId,
  };
  await updateProcedure(tx, actor.hospitalId, id, place);
  return { ...procedure, ...place };
}
