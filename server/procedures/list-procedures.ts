import type { ProcedureFilter, ProcedurePage, ProcedureRow } from '../../shared/contract/procedure-row';
import { can, scopeOf } from '../../shared/permissions';
import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { readCursor, writeCursor } from '../kernel/cursor';
import { findPatients } from './patient-identity.store';
import { countProcedures, listProcedures, type ListScope } from './procedure-list.store';

const day = 86_400_000;
const periodDays = { '7d': 7, '30d': 30, '90d': 90, '12m': 365, all: null } as const;

function scopeFor(actor: Actor, filter: ProcedureFilter, now: Date): ListScope {
  const days = periodDays[filter.period];
  return {
    hospitalId: actor.hospitalId,
    ownerId: scopeOf(actor, 'procedure.list') === 'all' ? null : actor.id,
    canFindPatients: can(actor, 'procedure.read-patient'),
    since: days === null ? null : new Date(now.getTime() - days * day),
  };
}

/** One page of the ledger. Patients are named to those who may see them; each page that names any leaves one audit line. */
export async function listLedger(
  db: Db,
  actor: Actor,
  filter: ProcedureFilter,
  now: Date,
): Promise<ProcedurePage> {
  const rows = await listProcedures(db, filter, scopeFor(actor, filter, now), readCursor(filter.cursor));
  const shown = rows.slice(0, filter.limit);
  const patients = can(actor, 'procedure.read-patient')
    ? await findPatients(
        db,
        actor.hospitalId,
        shown.flatMap((row) => row.patientIdentityId ?? []),
      )
    : null;
  if (patients && patients.size > 0)
    await noteAudit(db, {
      hospitalId: actor.hospitalId,
      actorId: actor.id,
      action: 'patients shown in the ledger',
      subject: 'procedures',
      after: { procedureIds: shown.map((row) => row.id) },
    });
  const items = shown.map(({ patientIdentityId, sortKey: _, ...row }): ProcedureRow => {
    const patient = patientIdentityId === null ? undefined : patients?.get(patientIdentityId);
    return patient ? { ...row, patient } : row;
  });
  const last = rows.length > filter.limit ? shown.at(-1) : undefined;
  return { items, nextCursor: last ? writeCursor({ value: last.sortKey, id: last.id }) : null };
}

export const countLedger = (db: Db, actor: Actor, filter: ProcedureFilter, now: Date) =>
  countProcedures(db, filter, scopeFor(actor, filter, now));
