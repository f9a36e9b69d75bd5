import { defaultStatureM, maxStatureM, minStatureM } from './body-points';
import { effectiveDoseFormulas, dependsOnThyroidCollar, type EffectiveDoseFormulaId } from './effective-dose';
import {
  areAnglesMissing,
  assumedKvp,
  hasCalibration,
  hasKermaAreaProduct,
  isRotationEndMissing,
} from './event-beams';
import type { ExposedPerson, ExposureContext, ExposureEvent, Note } from './exposure-types';
import { heavyCopperMm } from './garment-transmission';
import { maxLeadMm } from './lead-transmission';
import { isUnchangedPreset } from './room-positions';
import { scatterModels, type ScatterModelId } from './scatter-air-kerma';

type Rule = [code: string, count: number, detail: (events: string) => string];

const say = (count: number) => (count === 1 ? '1 event' : `${count} events`);
const isAre = (count: number) => (count === 1 ? 'is' : 'are');

/** Warnings about the events: what was left out, assumed or clamped, with how many it concerns. */
export function eventWarnings(
  events: readonly ExposureEvent[],
  context: ExposureContext,
  scatterModel: ScatterModelId,
): Note[] {
  const used = events.filter(hasKermaAreaProduct);
  const missing = events.length - used.length;
  const { minKvp, maxKvp } = scatterModels[scatterModel];
  const count = (test: (event: ExposureEvent) => boolean) => used.filter(test).length;
  const rules: Rule[] = [
    [
      'kerma-area-product-missing',
      used.length > 0 ? missing : 0,
      (n) => `${n} without P KA ${isAre(missing)} not in the estimate`,
    ],
    ['event-type-unknown', count((e) => e.type === null), (n) => `${n} of unknown type: counted at the place during fluoroscopy`],
    ['angles-missing', count(areAnglesMissing), (n) => `${n} without C-arm angles: taken as upright (plane B: lateral, either side); the range is wider`],
    ['rotation-end-missing', count(isRotationEndMissing), (n) => `${n} rotational without an end angle: taken at the start angle`],
    ['kvp-missing', count((e) => e.kvp === null), (n) => `${n} without kVp: ${assumedKvp(context)} kV taken${context.typicalKvp === null ? '' : ' from the procedure type'}; the range is wider`],
    ['kvp-out-of-range', count((e) => e.kvp !== null && (e.kvp < minKvp || e.kvp > maxKvp)), (n) => `${n} outside ${minKvp}–${maxKvp} kV: the nearest end was taken for the scatter`],
    ['heavy-copper', count((e) => e.copperMm !== null && e.copperMm >= heavyCopperMm), (n) => `${n} behind ${heavyCopperMm} mm copper or more: garment transmission read 10 kV higher`],
    ['kap-not-calibrated', count((e) => !hasCalibration(e)), (n) => `${n} with the displayed P KA, which may differ by up to ±35 % from the true one`],
    ['calibration-factor-invalid', count((e) => e.kapCalibrationFactor !== null && !hasCalibration(e)), (n) => `${n} with a calibration factor that is not above 0: not applied`],
  ]; // prettier-ignore
  return rules.flatMap(([code, n, detail]) => (n > 0 ? [{ code, detail: detail(say(n)) }] : []));
}

/** Warnings about the person and the room. */
export function personWarnings(
  events: readonly ExposureEvent[],
  person: ExposedPerson,
  context: ExposureContext,
  formula: EffectiveDoseFormulaId | 'unprotected',
): Note[] {
  const notes: Note[] = [];
  const add = (isTrue: boolean, code: string, detail: string) => {
    if (isTrue) notes.push({ code, detail });
  };
  const { statureM, garment } = person;
  const places = [person.fluoroscopyPlace, person.acquisitionPlace];
  const rotational = events.filter(
    (e) => e.type === 'rotational-acquisition' && hasKermaAreaProduct(e),
  ).length;

  add(
    rotational > 0 && !person.isPresentDuringRotation && places.some((place) => !place.isBehindBarrier),
    'outside-during-rotation',
    `${rotational} rotational ${rotational === 1 ? 'run' : 'runs'} not counted: staff taken as outside the room`,
  );
  add(places.some((place) => place.isBehindBarrier), 'behind-barrier', 'Behind the barrier: counted as nothing'); // prettier-ignore
  add(statureM === null, 'stature-assumed', `Height of the person not known: ${defaultStatureM} m taken`);
  add(
    statureM !== null && (statureM < minStatureM || statureM > maxStatureM),
    'stature-clamped',
    `Height of the person kept to ${minStatureM}–${maxStatureM} m`,
  );
  add(places.some((place) => !place.isBehindBarrier && isUnchangedPreset(place)), 'preset-position', 'Usual place taken, not the actual one: the range is wider'); // prettier-ignore
  add(
    (context.accessSide ?? null) === null &&
      places.some((place) => !place.isBehindBarrier && isUnchangedPreset(place)),
    'access-side-not-recorded',
    'Access side not recorded: the other side would change the values by a factor 2 to 4',
  );
  add(context.patientPosition.isAssumed === true, 'patient-position-assumed', 'Patient position not recorded: head first, supine taken'); // prettier-ignore
  add(
    person.isTurnedAway,
    'turned-away',
    'Turned away: eye and collar values are those of a person facing the beam',
  );
  if (garment.answer === 'worn') {
    add(
      !garment.isMeasured,
      'lead-labelled',
      'Lead equivalence is the label, not measured: the upper end is wider',
    );
    add(garment.isLeadFree, 'lead-free', 'Lead-free material: 1.5 times the transmission of lead');
    add(Math.max(garment.frontLeadMm, garment.backLeadMm ?? 0) > maxLeadMm || garment.frontLeadMm < 0, 'lead-clamped', `Lead equivalence kept to 0–${maxLeadMm} mm`); // prettier-ignore
    add(garment.defectAreaFraction < 0 || garment.defectAreaFraction > 1, 'defect-clamped', 'Defect area kept to 0–100 % of the garment'); // prettier-ignore
    add(
      person.evidenceGrade === 'B',
      'condition-overdue',
      'Garment inspection overdue: condition not confirmed',
    );
    add(person.evidenceGrade === 'C', 'condition-unknown', 'Garment condition not confirmed');
  }
  if (formula !== 'unprotected') {
    const { caution } = effectiveDoseFormulas[formula];
    add(caution !== null, 'formula-caution', caution ?? '');
    add(person.hasThyroidCollar === null && dependsOnThyroidCollar(formula), 'thyroid-collar-unknown', 'Thyroid collar not recorded: taken as not worn'); // prettier-ignore
  }
  return notes;
}

/** Why nothing, or nothing behind a garment, can be said. */
export function exposureGaps(
  events: readonly ExposureEvent[],
  person: ExposedPerson,
  isUnprotectedBack: boolean,
): Note[] {
  if (events.length === 0) return [{ code: 'no-events', detail: 'No irradiation events are known' }];
  if (!events.some(hasKermaAreaProduct)) {
    return [{ code: 'no-kerma-area-product', detail: 'Not estimable: no P KA was reported' }];
  }
  const { garment } = person;
  if (garment.answer === 'unknown') {
    return [
      { code: 'garment-unknown', detail: 'Garment not recorded: nothing can be said of the body behind it' },
    ];
  }
  if (garment.answer === 'none') {
    return [{ code: 'no-garment', detail: 'No garment worn: there is no value under one' }];
  }
  if (isUnprotectedBack) {
    return [
      {
        code: 'back-unprotected',
        detail: 'Turned away in a garment without back panel: taken as unprotected',
      },
    ];
  }
  if (person.evidenceGrade === 'D') {
    return [
      { code: 'garment-failed', detail: 'The garment failed its inspection: nothing is estimated behind it' },
    ];
  }
  return [];
}
