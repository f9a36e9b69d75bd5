import type { AuditEntry } from '../audit/audit-entry.entity';
import type { Procedure } from '../procedures/procedure.entity';
import { bulkId } from './bulk-ids';
import type { DemoProcedure } from './demo-types';
import { createRandom } from './random';
import { type DemoIds, idOf } from './seed-hospital';
import { operatorShares } from './staff.table-data';

const dayMs = 86_400_000;

/** Somebody else of the same specialty: the operator whom the record named at first. */
export function confusedWith(procedure: DemoProcedure): string | null {
  const colleagues = Object.values(operatorShares)
    .find((shares) => shares.some(([code]) => code === procedure.operatorCode))
    ?.map(([code]) => code)
    .filter((code) => !procedure.staff.some(({ staffCode }) => staffCode === code));
  if (!colleagues || colleagues.length === 0) return null;
  return createRandom('wrong operator', procedure.studyInstanceUid).pick(colleagues);
}

/** The trail of a record whose operator was wrong at first and put right by the physicist the day after. */
export function toAuditRows(procedure: DemoProcedure, row: Procedure, ids: DemoIds): AuditEntry[] {
  if (procedure.defect !== 'wrong-operator-corrected' || !row.completedAt) return [];
  const wrongCode = confusedWith(procedure);
  if (wrongCode === null) return [];
  const at = new Date(row.completedAt.getTime() + dayMs);
  return [
    {
      id: bulkId(at),
      hospitalId: ids.hospitalId,
      at,
      actorId: idOf(ids.people, 'P-01'),
      action: 'record corrected',
      subject: 'procedure',
      subjectId: row.id,
      before: { primaryOperatorId: idOf(ids.people, wrongCode) },
      after: { primaryOperatorId: row.primaryOperatorId },
      reason: `The operator was ${procedure.operatorCode}, not ${wrongCode}`,
    },
  ];
}
