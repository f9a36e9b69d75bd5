import type { MissingPart } from '../../shared/contract/procedure-row';
import { plainChecking } from '../data-checks/check-data';
import type { DoseReport } from '../dose-reports/dose-report.entity';
import type { CalibrationFactor } from '../equipment/calibration-factor.entity';
import type { Level } from '../levels/level.entity';
import type { IrradiationEvent } from '../procedures/irradiation-event.entity';
import { patientKeyOf } from '../procedures/patient-identity.store';
import type { Procedure } from '../procedures/procedure.entity';
import { summariseProcedure } from '../procedures/summarise-procedure';
import type { CheckMemory } from './check-memory';
import type { DemoProcedure } from './demo-types';
import { demoHospital } from './hospital';
import type { EstimateRegisters } from './estimate-rows';
import { firstRevision } from './presence-rows';
import { arrivalOf } from './report-rows';
import { type DemoIds, idOf } from './seed-hospital';

/** What all procedures are summarised with. */
export interface DemoContext {
  ids: DemoIds;
  factors: readonly CalibrationFactor[];
  levels: readonly Level[];
  equipmentLabels: Map<string, string>;
  registers: EstimateRegisters;
  checkMemory: CheckMemory;
}

export const isRecordUnfinished = (procedure: DemoProcedure): boolean =>
  procedure.defect === 'record-incomplete';

/** What a report of the machine already answers. */
const answersOfFile = ({ type, patient }: DemoProcedure, ids: DemoIds) => ({
  procedureTypeId: idOf(ids.types, type.key),
  isFeetFirst: false,
  isProne: false,
  patientHeightM: patient.heightM,
  patientWeightKg: patient.weightKg,
});

/** The whole record but for its people: what the file says and what a person added. */
export function describeAnswers(procedure: DemoProcedure, ids: DemoIds) {
  const person = (code: string | null) => (code === null ? null : idOf(ids.people, code));
  return {
    ...answersOfFile(procedure, ids),
    primaryOperatorId: person(procedure.operatorCode),
    secondOperatorId: person(procedure.secondOperatorCode),
    traineeId: person(procedure.traineeCode),
    accessSide: procedure.type.accessSide,
    isEmergency: procedure.isOutOfHours,
  };
}

const minutesToComplete = 25;

/** When somebody completed a generated procedure's record. */
export const completionOf = (procedure: DemoProcedure): Date =>
  new Date(arrivalOf(procedure).getTime() + 60_000 * minutesToComplete);

function recordOf(procedure: DemoProcedure, ids: DemoIds) {
  const fromFile = Object.entries(answersOfFile(procedure, ids)).flatMap(([field, value]) =>
    value === null ? [] : [field],
  );
  if (!isRecordUnfinished(procedure))
    return {
      ...describeAnswers(procedure, ids),
      fromFile,
      recordState: 'complete' as const,
      missing: [],
      completedAt: completionOf(procedure),
      recordRevision: firstRevision,
      estimateRevision: firstRevision,
    };
  const missing: MissingPart[] = ['operator', 'person'];
  return {
    ...answersOfFile(procedure, ids),
    fromFile,
    primaryOperatorId: null,
    secondOperatorId: null,
    traineeId: null,
    accessSide: null,
    isEmergency: null,
    recordState: 'incomplete' as const,
    missing,
    completedAt: null,
    recordRevision: 0,
    estimateRevision: 0,
  };
}

/** A generated procedure as the intake would have left it: totals, strip, checks and attention. */
export function toProcedureRow(
  procedure: DemoProcedure,
  parts: { id: string; caseNumber: string; patientIdentityId: string },
  rows: { reports: readonly DoseReport[]; events: readonly IrradiationEvent[] },
  context: DemoContext,
): Procedure {
  const { ids } = context;
  const equipmentId = idOf(ids.equipment, procedure.equipment.key);
  const receivedAt = arrivalOf(procedure);
  const kind = { fieldsOverlap: null, procedureClass: 'clinical', deviceClass: 'fluoroscopy' } as const;
  const summary = summariseProcedure({
    procedure: {
      ...kind,
      patientHeightM: procedure.patient.heightM,
      patientWeightKg: procedure.patient.weightKg,
    },
    reports: rows.reports.filter((report) => report.outcome === 'stored'),
    events: [...rows.events],
    equipmentLabels: context.equipmentLabels,
    factors: context.factors.filter((factor) => factor.equipmentId === equipmentId),
    levels: [...context.levels],
    studyStartedAt: procedure.startedAtLocal,
    receivedAt,
    timeZone: demoHospital.timeZone,
    now: receivedAt,
    checking: {
      ...plainChecking,
      context: context.checkMemory.contextOf(idOf(ids.types, procedure.type.key), equipmentId),
    },
  });
  const row: Procedure = {
    ...parts,
    hospitalId: ids.hospitalId,
    studyInstanceUid: procedure.studyInstanceUid,
    patientKey: patientKeyOf(ids.hospitalId, procedure.patient.id),
    roomId: idOf(ids.rooms, procedure.room),
    equipmentId,
    studyDescription: procedure.studyDescription,
    ...kind,
    ...summary,
    ...recordOf(procedure, ids),
    isWithdrawn: false,
    mergedIntoId: null,
    isManual: procedure.defect === 'manual-entry',
    accessionKey: null,
    isGenerated: true,
    version: 1,
    createdAt: receivedAt,
  };
  context.checkMemory.add(row);
  return row;
}
