import { meanKvp } from '../../shared/dosimetry/mean-kvp';
import type { IrradiationEvent } from '../procedures/irradiation-event.entity';
import { bulkId } from './bulk-ids';
import type { DemoIrradiationEvent, DemoProcedure } from './demo-types';
import { localTimeAfter } from './local-time';

export const eventKeyOf = (event: { irradiationEventUid: string; plane?: string | null }): string =>
  `${event.irradiationEventUid}|${event.plane ?? ''}`;

/** A generated event as a row of the table. No file was read, so nothing was reported to the letter. */
export function toEventRow(
  event: DemoIrradiationEvent,
  procedure: DemoProcedure,
  ids: { procedureId: string; doseReportId: string | null },
): IrradiationEvent {
  const { offsetS, filters, ...measured } = event;
  const startMs = procedure.startedAt.getTime() + 1000 * (offsetS + procedure.deviceClockAheadS);
  return {
    id: bulkId(procedure.startedAt),
    startedAt: new Date(Math.round(startMs)),
    ...ids,
    eventKey: eventKeyOf(event),
    localStartedAt: localTimeAfter(procedure, offsetS),
    ...measured,
    kvpMean: meanKvp(event.kvpValues),
    sourceToReferencePointMm: event.sourceToIsocenterMm - 150,
    filters,
    reported: {},
    details: {},
  };
}
