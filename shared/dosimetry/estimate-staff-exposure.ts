import { accumulateAirKerma } from './accumulate-air-kerma';
import { defaultStatureM, maxStatureM, minStatureM } from './body-points';
import { clamp } from './clamp';
import { defaultEffectiveDoseFormula, effectiveDoseWeights } from './effective-dose';
import { estimateInputs } from './estimate-inputs';
import { createEvaluator, quantityIndex } from './evaluate-exposure';
import { hasKermaAreaProduct, prepareEventBeams, type EventBeams } from './event-beams';
import { closedFormEstimate, drawIntervals, rankContributions, spreadsByInput } from './exposure-interval';
import type { ExposureModel } from './exposure-model';
import { eventWarnings, exposureGaps, personWarnings } from './exposure-notes';
import {
  estimatedQuantities,
  type Estimated,
  type EstimatedQuantity,
  type ExposedPerson,
  type ExposureContext,
  type ExposureEvent,
  type Note,
  type StaffExposureEstimate,
} from './exposure-types';
import { personSpreads } from './person-spreads';
import { defaultScatterModel, scatterModels } from './scatter-air-kerma';
import { createGarmentColumns, protectionOf } from './worn-protection';

export type * from './exposure-types';
export { sumExposures } from './sum-exposures';

export const estimateMethod = 'scatter-by-event';
export const estimateMethodVersion = '1.0.0';

export type EstimateOptions = { draws?: number; seed?: number };

/**
 * What scattered radiation one person received from the irradiation events of a procedure: per
 * event K = S(θ, kVp)·KAP/d² at the body points, summed, then shields and dose quantities. Values in
 * µGy and µSv with an interval of about 95 %: closed form, or from `draws` seeded draws.
 *
 * Unknown stays null, with the reason in `gaps`; everything assumed or clamped is in `warnings`.
 *
 * Known value: 50 Gy·cm² at 80 kV, point at 90° and 1 m: 184.03 µGy unshielded.
 */
export function estimateStaffExposure(
  events: readonly ExposureEvent[],
  person: ExposedPerson,
  context: ExposureContext,
  options: EstimateOptions = {},
): StaffExposureEstimate {
  return estimateStaffExposures(events, [person], context, options)[0] as StaffExposureEstimate;
}

/** The same for several persons at the same procedure; the events are laid out once. */
export function estimateStaffExposures(
  events: readonly ExposureEvent[],
  persons: readonly ExposedPerson[],
  context: ExposureContext,
  options: EstimateOptions = {},
): StaffExposureEstimate[] {
  const beams = prepareEventBeams(events, context);
  const warnings = eventWarnings(events, context, context.scatterModel ?? defaultScatterModel);
  const columns = createGarmentColumns(beams);
  return persons.map((person) => estimateOne({ events, beams, columns, warnings }, person, context, options));
}

type SharedByPersons = {
  events: readonly ExposureEvent[];
  beams: EventBeams;
  columns: ReturnType<typeof createGarmentColumns>;
  warnings: readonly Note[];
};

function estimateOne(
  { events, beams, columns, warnings }: SharedByPersons,
  person: ExposedPerson,
  context: ExposureContext,
  { draws = 0, seed = 1 }: EstimateOptions,
): StaffExposureEstimate {
  const scatterModel = context.scatterModel ?? defaultScatterModel;
  const formula = context.effectiveDoseFormula ?? defaultEffectiveDoseFormula;
  const { protection, leadMm, isUnprotectedBack } = protectionOf(person);
  const statureM = clamp(person.statureM ?? defaultStatureM, minStatureM, maxStatureM);
  const accumulated = accumulateAirKerma({
    beams,
    fluoroscopyPlace: person.fluoroscopyPlace,
    acquisitionPlace: person.acquisitionPlace,
    statureM,
    isPresentDuringRotation: person.isPresentDuringRotation,
    scatterModel,
    transmission: leadMm === null ? null : columns(leadMm, person.garment),
  });
  const model: ExposureModel = {
    sums: accumulated.sums,
    statureM,
    screens: [
      ...(person.hasCeilingScreen ? (['ceilingScreen'] as const) : []),
      ...(person.hasTableSkirt ? (['tableSkirt'] as const) : []),
      ...(person.hasMobileScreen ? (['mobileScreen'] as const) : []),
      ...(person.hasGlasses ? (['glasses'] as const) : []),
    ],
    protection,
    defectAreaFraction: person.garment.answer === 'worn' ? person.garment.defectAreaFraction : 0,
    effectiveDoseWeights: effectiveDoseWeights(formula, person.hasThyroidCollar),
    ...personSpreads(person, context, scatterModel, leadMm),
  };

  const isKnown = events.some(hasKermaAreaProduct);
  const { nominal, spreads } = spreadsByInput(model);
  const intervals = isKnown && draws > 0 ? drawIntervals(model, draws, seed) : null;
  const quantities = Object.fromEntries(
    estimatedQuantities.map((quantity) => {
      const value = isKnown ? (nominal[quantityIndex[quantity]] ?? Number.NaN) : Number.NaN;
      const closed = closedFormEstimate(value, spreads[quantity] ?? []);
      return [quantity, closed && { ...closed, ...intervals?.[quantity] }];
    }),
  ) as Record<EstimatedQuantity, Estimated | null>;
  const usedFormula = protection === 'unprotected' ? 'unprotected' : formula;

  return {
    method: estimateMethod,
    methodVersion: estimateMethodVersion,
    scatterModel: { id: scatterModel, version: scatterModels[scatterModel].version },
    effectiveDoseFormula: usedFormula,
    ...quantities,
    byPart: { fluoroscopy: nominalOf(model, isKnown, 0), acquisition: nominalOf(model, isKnown, 1) },
    contributions: rankContributions(spreads.collarHp10USv ?? []),
    spreads,
    gaps: exposureGaps(events, person, isUnprotectedBack),
    warnings: [
      ...warnings,
      ...personWarnings(events, person, context, usedFormula),
      ...clampWarnings(accumulated),
    ],
  };
}

function nominalOf(
  model: ExposureModel,
  isKnown: boolean,
  part: 0 | 1,
): Record<EstimatedQuantity, number | null> {
  const values = new Float64Array(estimatedQuantities.length);
  createEvaluator(model, part)(new Float64Array(estimateInputs.length), values);
  return Object.fromEntries(
    estimatedQuantities.map((quantity) => {
      const value = values[quantityIndex[quantity]] ?? Number.NaN;
      return [quantity, isKnown && !Number.isNaN(value) ? value : null];
    }),
  ) as Record<EstimatedQuantity, number | null>;
}

function clampWarnings(counts: { clampedDistanceEvents: number; clampedAngleEvents: number }): Note[] {
  const notes: Note[] = [];
  if (counts.clampedDistanceEvents > 0) {
    notes.push({ code: 'distance-clamped', detail: 'A body point nearer than 0.4 m was taken at 0.4 m' });
  }
  if (counts.clampedAngleEvents > 0) {
    const events = counts.clampedAngleEvents === 1 ? '1 event' : `${counts.clampedAngleEvents} events`;
    notes.push({
      code: 'scatter-angle-clamped',
      detail: `${events} with a scatter angle outside 30–165°: the nearest end was taken`,
    });
  }
  return notes;
}
