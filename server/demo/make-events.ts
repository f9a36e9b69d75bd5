import type { DemoEquipment, DemoIrradiationEvent, DemoProcedureType } from './demo-types';
import { draftEvents, listFilters, settleKvp } from './draft-events';
import { layOutSegments } from './irradiation-segments';
import type { PlacedBooking } from './place-in-rooms';
import { createRandom, type Random } from './random';
import { shareOutKerma } from './share-out-kerma';
import { pulseRateReviewMonth } from './staff.table-data';
import { type ImagingPlan, imagingPlans } from './techniques.table-data';
import { chooseTubeLoad } from './tube-output';

/** The reference point lies 15 cm from the isocentre towards the focus (IEC 60601-2-43). */
const referencePointOffsetMm = 150;
/** Lateral plane's share of K a,r, about that of a published neuro series (0.09 of 0.35 Gy). */
const lateralKermaShare = 0.25;

/** 40 cm × 40 cm. */
const detectorAreaCm2 = 1600;

const clamp = (value: number, low: number, high: number) => Math.min(high, Math.max(low, value));
const roundTo = (value: number, decimals: number): number => Number(value.toFixed(decimals));

interface Subject {
  type: DemoProcedureType;
  equipment: DemoEquipment;
  placed: PlacedBooking;
  studyInstanceUid: string;
}

function chooseSetting({ type, equipment, placed: { booking } }: Subject, plan: ImagingPlan, random: Random) {
  const usual = random.pickWeighted(plan.family.fluoroscopyPulsesPerS);
  const isBeforeReview = booking.operatorCode === 'IC-2' && booking.month < pulseRateReviewMonth;
  return {
    fluoroscopyPulsesPerS: isBeforeReview ? 15 : usual,
    sizeLoad: type.bodyRegion === 'head' ? 0 : (booking.bodyMassIndex - 27.5) / 10,
    // The old machine of the second room had no thick filters.
    maxCopperMm: equipment.key === 'IR2-1' ? 0.3 : 0.9,
  };
}

/**
 * Irradiation events of one procedure, in order of time, adding up to its totals. In the biplane
 * room a press of both pedals is one irradiation event UID with a row for each plane.
 */
export function makeEvents(subject: Subject): DemoIrradiationEvent[] {
  const { type, equipment, placed, studyInstanceUid } = subject;
  const { booking, totals } = placed;
  const plan = imagingPlans[type.key];
  if (!plan) throw new Error(`No imaging plan for ${type.key}.`);
  const random = createRandom('events', type.key, booking.index);
  const segments = layOutSegments(
    plan,
    {
      fluoroscopyTimeS: totals.fluoroscopyTimeS,
      relativeKerma: (1000 * totals.referenceAirKermaGy) / type.referenceAirKermaMGy.median,
      isBiplane: equipment.isBiplane,
      spanS: 60 * placed.spanMin,
    },
    random,
  );
  const drafts = draftEvents(segments, plan.family, chooseSetting(subject, plan, random), random);
  const shares = shareOutKerma(drafts, totals, {
    acquisition: clamp(plan.acquisitionKermaShare * Math.exp(0.15 * random.normal()), 0.02, 0.92),
    lateral: lateralKermaShare * Math.exp(0.12 * random.normal()),
  });
  const sizeKvp = type.bodyRegion === 'head' ? 0 : 0.6 * (booking.bodyMassIndex - 27.5);
  const kvps = settleKvp(
    drafts,
    shares.map((share) => share.kermaAreaProductGyCm2),
    type.typicalKvp + sizeKvp + 3 * random.normal(),
  );
  const sourceToDetectorMm = Math.round(random.between(...plan.family.sourceToDetectorMm));
  const referenceDistanceMm = equipment.sourceToIsocenterMm - referencePointOffsetMm;
  const table = {
    longitudinalMm: random.between(-1400, -700),
    lateralMm: random.between(-60, 60),
    heightMm: random.between(...plan.family.tableHeightMm),
  };
  return drafts.map((draft, index): DemoIrradiationEvent => {
    const share = shares[index] as (typeof shares)[number];
    const kvp = kvps[index] ?? type.typicalKvp;
    const pulseCount = Math.max(1, Math.round(draft.segment.durationS * draft.pulseRatePerS));
    const widths = draft.isAcquisition
      ? plan.family.acquisitionPulseWidthMs
      : plan.family.fluoroscopyPulseWidthMs;
    const isRotational = draft.angles.primaryEndAngleDeg !== null;
    const load = chooseTubeLoad(
      {
        referenceAirKermaGy: share.referenceAirKermaGy,
        pulseCount,
        kvp,
        copperMm: draft.copperMm,
        referenceDistanceMm,
      },
      isRotational ? 7 : random.between(...widths),
    );
    const areaAtReferenceCm2 = share.kermaAreaProductGyCm2 / share.referenceAirKermaGy;
    const drawnMm = sourceToDetectorMm + Math.round(15 * random.normal());
    // A wide field fits onto the detector only when it is drawn near.
    const nearMm = Math.floor(referenceDistanceMm * Math.sqrt(detectorAreaCm2 / areaAtReferenceCm2));
    const detectorMm = Math.min(drawnMm, nearMm);
    table.longitudinalMm += 8 * random.normal();
    // Automatic exposure control lets the voltage wander within a long press.
    const isWandering = !draft.isAcquisition && draft.segment.durationS > 20 && random.chance(0.3);
    return {
      irradiationEventUid: `${studyInstanceUid}.${draft.irradiationNumber}`,
      plane: draft.plane,
      type: draft.segment.type,
      offsetS: draft.segment.offsetS,
      protocol: isRotational
        ? 'Rotational 3D'
        : random.pick(
            draft.isAcquisition ? plan.family.acquisitionProtocols : plan.family.fluoroscopyProtocols,
          ),
      kvpValues: (isWandering ? [kvp - 1.2, kvp, kvp + 1.2] : [kvp]).map((value) => roundTo(value, 1)),
      ...load,
      pulseCount,
      pulseRatePerS: draft.pulseRatePerS,
      exposureTimeS: roundTo((pulseCount * load.pulseWidthMs) / 1000, 4),
      irradiationDurationS: draft.segment.durationS,
      ...share,
      ...draft.angles,
      sourceToDetectorMm: detectorMm,
      sourceToIsocenterMm: equipment.sourceToIsocenterMm,
      fieldAreaCm2: roundTo(
        Math.min(detectorAreaCm2, areaAtReferenceCm2 * (detectorMm / referenceDistanceMm) ** 2),
        1,
      ),
      filters: listFilters(draft.copperMm, random),
      tableLongitudinalMm: Math.round(table.longitudinalMm),
      tableLateralMm: Math.round(table.lateralMm + 5 * random.normal()),
      tableHeightMm: Math.round(table.heightMm),
    };
  });
}
