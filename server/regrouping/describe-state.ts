import type { GroupedState } from '../../shared/contract/regrouping';
import type { Db } from '../db/db';
import { listReportsOf } from '../dose-reports/dose-report.store';
import { Problem } from '../kernel/problem';
import { findProcedure } from '../procedures/procedure.store';
import { checksumOf } from './grouped-events.store';

/** A procedure's events and totals at a moment: what "identical again" is checked against. */
export async function describeState(db: Db, hospitalId: string, id: string): Promise<GroupedState> {
  const procedure = await findProcedure(db, hospitalId, id);
  if (!procedure) throw new Problem('not-found');
  return {
    caseNumber: procedure.caseNumber,
    reportCount: (await listReportsOf(db, hospitalId, id)).length,
    eventCount: procedure.eventCount,
    checksum: await checksumOf(db, id),
    startedAt: procedure.localStartedAt,
    fluoroscopyTimeS: procedure.fluoroscopyTimeS,
    referenceAirKermaGy: procedure.referenceAirKermaGy,
    isReferenceAirKermaUpperBound: procedure.isReferenceAirKermaUpperBound,
    kermaAreaProductGyCm2: procedure.kermaAreaProductGyCm2,
    recordState: procedure.recordState,
    isWithdrawn: procedure.isWithdrawn,
  };
}
