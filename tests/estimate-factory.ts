import type { DataSource } from 'typeorm';
import { newId } from '../server/kernel/new-id';
import { Presence } from '../server/procedures/presence.entity';
import { Procedure } from '../server/procedures/procedure.entity';
import { StaffEstimate } from '../server/staff-exposure/staff-estimate.entity';

/** A complete clinical procedure of 10 min, 82 kVp and 40 Gy·cm² without estimates. */
export async function makeProcedure(
  dataSource: DataSource,
  hospitalId: string,
  overrides: Partial<Procedure> = {},
): Promise<string> {
  const id = newId();
  const startedAt = overrides.startedAt ?? new Date('2026-11-10T17:00:00Z');
  const row: Partial<Procedure> = {
    id,
    hospitalId,
    caseNumber: `C-${id}`,
    studyInstanceUid: `1.2.3.${id}`,
    patientKey: id,
    startedAt,
    localStartedAt: '2026-11-10T10:00:00',
    localDate: startedAt.toISOString().slice(0, 10),
    timeBasis: 'event',
    fluoroscopyTimeS: 600,
    kvpMean: 82,
    kermaAreaProductGyCm2: 40,
    recordState: 'complete',
    recordRevision: 1,
    estimateRevision: 1,
    ...overrides,
  };
  await dataSource.manager.insert(Procedure, row as never);
  return id;
}

/** An estimate of ÷2…×3 around a collar value; the other quantities are fixed shares of it. */
export async function makeEstimate(
  dataSource: DataSource,
  procedureId: string,
  personId: string | null,
  collarUSv: number | null,
  overrides: Partial<StaffEstimate> = {},
): Promise<void> {
  const duty = overrides.duty ?? 'primary-operator';
  const revision = overrides.revision ?? 1;
  const presence: Partial<Presence> = {
    id: newId(),
    procedureId,
    revision,
    personId,
    duty,
    garmentAnswer: 'none',
  };
  await dataSource.manager.insert(Presence, presence as never);
  const share = (factor: number) => (collarUSv === null ? null : collarUSv * factor);
  const row: Partial<StaffEstimate> = {
    id: newId(),
    procedureId,
    presenceId: presence.id,
    personId,
    revision,
    duty,
    method: 'scatter-by-event',
    methodVersion: '1.0.0',
    scatterModel: 'williams-bir 1996',
    effectiveDoseFormula: 'ncrp122-two-badges',
    collarHp10USv: collarUSv,
    collarHp10LowUSv: share(0.5),
    collarHp10HighUSv: share(3),
    underGarmentHp10USv: share(0.1),
    underGarmentHp10LowUSv: share(0.02),
    underGarmentHp10HighUSv: share(0.4),
    inputs: {},
    ...overrides,
  };
  await dataSource.manager.insert(StaffEstimate, row as never);
}
