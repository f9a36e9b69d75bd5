import type { MissingPart } from '../../shared/contract/record';
import type { DoseReport } from '../dose-reports/dose-report.entity';
import type { CalibrationFactor } from '../equipment/calibration-factor.entity';
import type { Level } from '../levels/level.entity';
import type { IrradiationEvent } from '../procedures/irradiation-event.entity';
import { patientKeyOf } from '../procedures/patient-identity.store';
import type { Procedure } from '../procedures/procedure.entity';
import { summariseProcedure } from '../procedures/summarise-procedure';
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
}

export const isRecordUnfinished = (procedure: DemoProcedure): boolean =>
  procedure.defect === 'record-incomplete';

/** What a person wrote into the record, or what is still missing of it. */
export function recordOf(procedure: DemoProcedure, ids: DemoIds) {
  const isUnfinished = isRecordUnfinished(procedure);
  const person = (code: string | null) => (code === null || isUnfinished ? null : idOf(ids.people, code));
  const { heightM, weightKg } = procedure.patient;
  return {
    recordState: isUnfinished ? ('incomplete' as const) : ('complete' as const),
    missing: isUnfinished ? (['operator', 'person'] satisfies MissingPart[] as MissingPart[]) : [],
    procedureTypeId: idOf(ids.types, procedure.type.key),
    primaryOperatorId: person(procedure.operatorCode),
    secondOperatorId: person(procedure.secondOperatorCode),
    traineeId: person(procedure.traineeCode),
    accessSide: isUnfinished ? null : procedure.type.accessSide,
    isFeetFirst: false,
    isProne: false,
    isEmergency: isUnfinished ? null : procedure.isOutOfHours,
    patientHeightM: heightM,
    patientWeightKg: weightKg,
    fromFile: [
      'procedureTypeId',
      ...(heightM === null ? [] : ['patientHeightM']),
      ...(weightKg === null ? [] : ['patientWeightKg']),
      'isFeetFirst',
      'isProne',
    ],
    completedAt: isUnfinished ? null : new Date(arrivalOf(procedure).getTime() + 25 * 60_000),
    recordRevision: isUnfinished ? 0 : firstRevision,
    estimateRevision: isUnfinished ? 0 : firstRevision,
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
    procedure: kind,
    reports: rows.reports.filter((report) => report.outcome === 'stored'),
    events: [...rows.events],
    equipmentLabels: context.equipmentLabels,
    factors: context.factors.filter((factor) => factor.equipmentId === equipmentId),
    levels: [...context.levels],
    studyStartedAt: procedure.startedAtLocal,
    receivedAt,
    timeZone: demoHospital.timeZone,
    now: receivedAt,
  });
  return {
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
    isGenerated: true,
    version: 1,
    createdAt: receivedAt,
  };
}
