import {
  type Estimated,
  estimateStaffExposures,
  type ExposedPerson,
  type ExposureContext,
  type ExposureEvent,
  type StaffExposureEstimate,
  type TubePosition,
} from '../../shared/dosimetry/estimate-staff-exposure';
import type { Garment } from '../garments/garment.entity';
import type { EventFigures } from '../procedures/irradiation-event.store';
import type { Presence } from '../procedures/presence.entity';
import type { Procedure } from '../procedures/procedure.entity';
import { findSettledScale } from './settled-kerma';
import type { StaffEstimate } from './staff-estimate.entity';

/** The registers that an estimate needs beside the procedure's own rows. */
export interface EstimateRegisters {
  garments: ReadonlyMap<string, Garment>;
  staturesM: ReadonlyMap<string, number | null>;
  typicalKvps: ReadonlyMap<string, number | null>;
  /** Machine → where its tube is. */
  tubePositions: ReadonlyMap<string, TubePosition>;
}

/** What the caller decides about the rows: their keys, revision, moment and reason. */
export type EstimateRowOptions = {
  newId: () => string;
  revision: number;
  computedAt: Date;
  reason: string | null;
  draws?: number;
};

function toExposureEvent(
  event: EventFigures,
  procedure: Procedure,
  settledScale: number | null,
): ExposureEvent {
  const copper = event.filters.filter((filter) => filter.type === 'flat' && filter.material === 'Cu');
  const plane =
    procedure.planes.length === 1
      ? procedure.planes[0]
      : procedure.planes.find((totals) => totals.plane === event.plane);
  return {
    type: event.type,
    plane: event.plane,
    kvp: event.kvpMean,
    kermaAreaProductGyCm2:
      event.kermaAreaProductGyCm2 === null || settledScale === null
        ? event.kermaAreaProductGyCm2
        : event.kermaAreaProductGyCm2 * settledScale,
    copperMm:
      event.filters.length === 0
        ? null
        : copper.reduce((sum, filter) => sum + (filter.minThicknessMm ?? 0), 0),
    primaryAngleDeg: event.primaryAngleDeg,
    secondaryAngleDeg: event.secondaryAngleDeg,
    primaryEndAngleDeg: event.primaryEndAngleDeg,
    secondaryEndAngleDeg: event.secondaryEndAngleDeg,
    kapCalibrationFactor: settledScale === null ? (plane?.factors.kermaAreaProduct ?? null) : null,
  };
}

/** A procedure without events has its totals only: one event of unknown angle. */
const totalAsEvent = (procedure: Procedure, settledGyCm2: number | null): ExposureEvent => ({
  type: 'fluoroscopy',
  plane: null,
  kvp: procedure.kvpMean,
  kermaAreaProductGyCm2: settledGyCm2 ?? procedure.displayedKermaAreaProductGyCm2,
  copperMm: null,
  primaryAngleDeg: null,
  secondaryAngleDeg: null,
  primaryEndAngleDeg: null,
  secondaryEndAngleDeg: null,
  kapCalibrationFactor:
    settledGyCm2 === null ? (procedure.planes[0]?.factors.kermaAreaProduct ?? null) : null,
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

/** How well the garment's condition is known on a day: inspected in date, overdue, unknown, failed. */
export function gradeOf(garment: Garment | undefined, day: string): ExposedPerson['evidenceGrade'] {
  if (garment?.state === 'withdrawn') return 'D';
  if (!garment?.lastInspectedOn) return 'C';
  return garment.nextDueOn !== null && garment.nextDueOn < day ? 'B' : 'A';
}

/** Only for the type: a record without places is not estimated. */
const unknownPlace = { preset: null, xM: 0, yM: 0, isBehindBarrier: true } as const;

function toPerson(presence: Presence, procedure: Procedure, registers: EstimateRegisters): ExposedPerson {
  const garment = presence.garmentId === null ? undefined : registers.garments.get(presence.garmentId);
  const fluoroscopyPlace = presence.fluoroscopyPlace ?? unknownPlace;
  return {
    statureM: presence.personId === null ? null : (registers.staturesM.get(presence.personId) ?? null),
    fluoroscopyPlace,
    acquisitionPlace: presence.acquisitionPlace ?? fluoroscopyPlace,
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

/**
 * The estimates of a procedure with a complete record, one for each person of it; the interval in closed form, or from
 * draws where they are asked for.
 */
export function toEstimateRows(
  procedure: Procedure,
  events: readonly EventFigures[],
  presences: readonly Presence[],
  registers: EstimateRegisters,
  { newId, revision, computedAt, reason, draws = 0 }: EstimateRowOptions,
): StaffEstimate[] {
  const { procedureTypeId } = procedure;
  const context: ExposureContext = {
    tubePosition:
      (procedure.equipmentId && registers.tubePositions.get(procedure.equipmentId)) || 'under-table',
    patientPosition: {
      isFeetFirst: procedure.isFeetFirst ?? false,
      isProne: procedure.isProne ?? false,
      isAssumed: procedure.isFeetFirst === null || procedure.isProne === null,
    },
    accessSide: procedure.accessSide === 'head' ? null : procedure.accessSide,
    typicalKvp: procedureTypeId === null ? null : (registers.typicalKvps.get(procedureTypeId) ?? null),
  };
  const settledScale = findSettledScale(procedure, events);
  const beams =
    events.length > 0
      ? events.map((event) => toExposureEvent(event, procedure, settledScale))
      : [totalAsEvent(procedure, procedure.settledFigures?.kermaAreaProductGyCm2 ?? null)];
  const persons = presences.map((presence) => toPerson(presence, procedure, registers));
  return estimateStaffExposures(beams, persons, context, { draws }).map((estimate, index): StaffEstimate => {
    const presence = presences[index] as Presence;
    return {
      id: newId(),
      procedureId: procedure.id,
      presenceId: presence.id,
      personId: presence.personId,
      revision,
      duty: presence.duty,
      computedAt,
      reason,
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
