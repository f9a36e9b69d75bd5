import type { IrradiationEvent } from '../procedures/irradiation-event.entity';
import type { Presence } from '../procedures/presence.entity';
import type { Procedure } from '../procedures/procedure.entity';
import { type EstimateRegisters, toEstimateRows as estimate } from '../staff-exposure/estimate-rows';
import type { StaffEstimate } from '../staff-exposure/staff-estimate.entity';
import { bulkId } from './bulk-ids';
import { firstRevision } from './presence-rows';

export type { EstimateRegisters };

/** The estimates of a generated procedure, made on the day its record was completed. */
export const toEstimateRows = (
  procedure: Procedure,
  events: readonly IrradiationEvent[],
  presences: readonly Presence[],
  registers: EstimateRegisters,
): StaffEstimate[] =>
  estimate(procedure, events, presences, registers, {
    newId: () => bulkId(procedure.startedAt),
    revision: firstRevision,
    computedAt: procedure.completedAt ?? procedure.createdAt,
    reason: null,
  });
