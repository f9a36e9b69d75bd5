import {
  type Estimated,
  estimateStaffExposures,
  type ExposedPerson,
  type ExposureContext,
  type ExposureEvent,
  type StaffExposureEstimate,
} from '../../shared/dosimetry/estimate-staff-exposure';
import type { Garment } from '../garments/garment.entity';
import type { IrradiationEvent } from '../procedures/irradiation-event.entity';
import type { Presence } from '../procedures/presence.entity';
import type { Procedure } from '../procedures/procedure.entity';
import type { StaffEstimate } from '../staff-exposure/staff-estimate.entity';
import { bulkId } from './bulk-ids';
import { toDosimetryPlace } from './presence-rows';

/** The registers that an estimate needs beside the procedure's own rows. */
export interface EstimateRegisters {
  garments: ReadonlyMap<string, Garment>;
  staturesM: ReadonlyMap<string, number | null>;
  typicalKvps: ReadonlyMap<string, number | null>;
}

function toExposureEvent(event: IrradiationEvent, procedure: Procedure): ExposureEvent {
  const copper = event.filters.filter((filter) => filter.type === 'flat' && filter.material === 'Cu');
  const plane = procedure.planes.find((totals) => totals.plane === event.plane);
  return {
    type: event.type,
    plane: event.plane,
    kvp: event.kvpMean,
    kermaAreaProductGyCm2: event.kermaAreaProductGyCm2,
    copperMm: copper.reduce((sum, filter) => sum + (filter.minThicknessMm ?? 0), 0),
    primaryAngleDeg: event.primaryAngleDeg,
    secondaryAngleDeg: event.secondaryAngleDeg,
    primaryEndAngleDeg: event.primaryEndAngleDeg,
    secondaryEndAngleDeg: event.secondaryEndAngleDeg,
    kapCalibrationFactor: plane?.factors.kermaAreaProduct ?? null,
  };
}

/** A procedure without events has its totals only: one event of unknown angle. */
const totalAsEvent = (procedure: Procedure): ExposureEvent => ({
  type: 'fluoroscopy',
  plane: null,
  kvp: procedure.kvpMean,
  kermaAreaProductGyCm2: procedure.displayedKermaAreaProductGyCm2,
  copperMm: null,
  primaryAngleDeg: null,
  secondaryAngleDeg: null,
  primaryEndAngleDeg: null,
  secondaryEndAngleDeg: null,
  kapCalibrationFactor: procedure.planes[0]?.factors.kermaAreaProduct ?? null,
});

function toGarment(presence: Presence, garment: Garment | undefined): ExposedPerson['garment'] {
  if (presence.garmentAnswer === 'none') return { answer: 'none' };
  if (presence.garmentAnswer !== 'worn' || !garment || garment.frontLeadMm === null)
    return { answer: 'unknown' };
  return {
    answer: 'worn',
    frontLeadMm: garment.frontLeadMm,
    backLeadMm: garment.backLeadMm,
    isMeasured: garment.isMeasured,
    isLeadFree: garment.material === 'lead-free',
    defectAreaFraction: 0,
  };
}

function gradeOf(garment: Garment | undefined, day: string): ExposedPerson['evidenceGrade'] {
  if (!garment?.lastInspectedOn) return 'C';
  return garment.nextDueOn !== null && garment.nextDueOn < day ? 'B' : 'A';
}

function toPerson(presence: Presence, procedure: Procedure, registers: EstimateRegisters): ExposedPerson {
  const garment = presence.garmentId === null ? undefined : registers.garments.get(presence.garmentId);
  const fluoroscopyPlace = toDosimetryPlace(presence.fluoroscopyPlace);
  return {
    statureM: presence.personId === null ? null : (registers.staturesM.get(presence.personId) ?? null),
    fluoroscopyPlace,
    acquisitionPlace: presence.acquisitionPlace
      ? toDosimetryPlace(presence.acquisitionPlace)
      : fluoroscopyPlace,
    isTurnedAway: presence.isTurnedAway,
    garment: toGarment(presence, garment),
    hasThyroidCollar: presence.hasThyroidCollar,
    hasGlasses: presence.hasGlasses,
    hasCeilingScreen: presence.hasCeilingScreen,
    hasTableSkirt: presence.hasTableSkirt,
    hasMobileScreen: presence.hasMobileScreen,
    isPresentDuringRotation: presence.isPresentDuringRotation,
    evidenceGrade: gradeOf(garment, procedure.localDate),
  };
}

const spread = <N extends string>(name: (end: '' | 'Low' | 'High') => N, value: Estimated | null) =>
  ({
    [name('')]: value?.nominal ?? null,
    [name('Low')]: value?.low ?? null,
    [name('High')]: value?.high ?? null,
  }) as Record<N, number | null>;

function figuresOf(estimate: StaffExposureEstimate) {
  return {
    ...spread((end) => `collarAirKerma${end}UGy` as const, estimate.collarAirKermaUGy),
    ...spread((end) => `eyeAirKerma${end}UGy` as const, estimate.eyeAirKermaUGy),
    ...spread((end) => `waistAirKerma${end}UGy` as const, estimate.waistAirKermaUGy),
    ...spread((end) => `collarHp10${end}USv` as const, estimate.collarHp10USv),
    ...spread((end) => `eyeHp3${end}USv` as const, estimate.eyeHp3USv),
    ...spread((end) => `underGarmentHp10${end}USv` as const, estimate.underGarmentHp10USv),
    ...spread((end) => `effectiveDose${end}USv` as const, estimate.effectiveDoseUSv),
  };
}

function fluoroscopyShareOf({ byPart }: StaffExposureEstimate): number | null {
  const fluoroscopy = byPart.fluoroscopy.collarHp10USv;
  const acquisition = byPart.acquisition.collarHp10USv;
  const sum = (fluoroscopy ?? 0) + (acquisition ?? 0);
  return fluoroscopy === null || sum === 0 ? null : fluoroscopy / sum;
}

/** The estimates of a generated procedure, closed-form intervals, one for each person of its record. */
export function toEstimateRows(
  procedure: Procedure,
  events: readonly IrradiationEvent[],
  presences: readonly Presence[],
  registers: EstimateRegisters,
): StaffEstimate[] {
  const { procedureTypeId } = procedure;
  const context: ExposureContext = {
    tubePosition: 'under-table',
    patientPosition: { isFeetFirst: procedure.isFeetFirst ?? false, isProne: procedure.isProne ?? false },
    accessSide: procedure.accessSide === 'head' ? null : procedure.accessSide,
    typicalKvp: procedureTypeId === null ? null : (registers.typicalKvps.get(procedureTypeId) ?? null),
  };
  const beams =
    events.length > 0 ? events.map((event) => toExposureEvent(event, procedure)) : [totalAsEvent(procedure)];
  const persons = presences.map((presence) => toPerson(presence, procedure, registers));
  return estimateStaffExposures(beams, persons, context).map((estimate, index): StaffEstimate => {
    const presence = presences[index] as Presence;
    return {
      id: bulkId(procedure.startedAt),
      procedureId: procedure.id,
      presenceId: presence.id,
      personId: presence.personId,
      revision: presence.revision,
      duty: presence.duty,
      computedAt: procedure.completedAt ?? procedure.createdAt,
      reason: null,
      method: estimate.method,
      methodVersion: estimate.methodVersion,
      scatterModel: `${estimate.scatterModel.id} ${estimate.scatterModel.version}`,
      effectiveDoseFormula: estimate.effectiveDoseFormula,
      ...figuresOf(estimate),
      fluoroscopyShare: fluoroscopyShareOf(estimate),
      inputs: { person: persons[index], context },
      contributions: estimate.contributions,
      gaps: estimate.gaps,
      warnings: estimate.warnings,
    };
  });
}
