import { systemClock } from '../kernel/clock';
import type { Db } from '../db/db';
import { newId } from '../kernel/new-id';
import { listEventFigures } from '../procedures/irradiation-event.store';
import { listPresences } from '../procedures/presence.store';
import { updateProcedure } from '../procedures/procedure.store';
import type { Procedure } from '../procedures/procedure.entity';
import { toEstimateRows } from './estimate-rows';
import { readRegisters } from './registers.store';
import { appendEstimates } from './staff-estimate.store';

/** Estimates anew what reached each person of a complete record; appended, so that earlier figures stay readable. */
export async function refreshEstimates(db: Db, procedure: Procedure, reason: string | null): Promise<void> {
  const revision = procedure.estimateRevision + 1;
  const presences = await listPresences(db, procedure.id, procedure.recordRevision);
  const events = await listEventFigures(db, procedure.id);
  const registers = await readRegisters(db, procedure.hospitalId);
  const options = { newId, revision, computedAt: systemClock(), reason };
  await appendEstimates(db, toEstimateRows(procedure, events, presences, registers, options));
  await updateProcedure(db, procedure.hospitalId, procedure.id, { estimateRevision: revision });
}

/** A record that is no longer complete has no estimate: the next revision is empty. */
export async function dropEstimates(db: Db, procedure: Procedure): Promise<void> {
  await updateProcedure(db, procedure.hospitalId, procedure.id, {
    estimateRevision: procedure.estimateRevision + 1,
  });
}
