import type { IrradiationEvent } from '../../shared/contract/irradiation-event';
import { airKermaRate } from '../../shared/dosimetry/air-kerma-rate';
import type { Db } from '../db/db';
import { listEvents } from './irradiation-event.store';
import type { Procedure } from './procedure.entity';

/** The events of a procedure in time, each with its offset from the start and its mean rate. */
export async function listIrradiationEvents(db: Db, procedure: Procedure): Promise<IrradiationEvent[]> {
  const events = await listEvents(db, procedure.id);
  return events.map((event) => {
    const { startedAt, localStartedAt, procedureId: _, doseReportId: __, eventKey: ___, ...fields } = event;
    const rate = airKermaRate(event);
    return {
      ...fields,
      startedAt: localStartedAt,
      offsetS: (startedAt.getTime() - procedure.startedAt.getTime()) / 1000,
      airKermaRateGyPerS: rate && rate.basis !== 'kerma-area-product' ? rate.perS : null,
      airKermaRateBasis: rate?.basis ?? null,
    };
  });
}
