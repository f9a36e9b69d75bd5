import type { DemoFilter, DemoPlane } from './demo-types';
import { type BeamAngles, chooseAngles, steepness } from './beam-angles';
import type { Segment } from './irradiation-segments';
import type { Random } from './random';
import type { ImagingFamily } from './techniques.table-data';

const clamp = (value: number, low: number, high: number) => Math.min(high, Math.max(low, value));

/** One row of the report before kerma is shared out. */
export interface EventDraft {
  segment: Segment;
  plane: DemoPlane;
  angles: BeamAngles;
  irradiationNumber: number;
  isAcquisition: boolean;
  pulseRatePerS: number;
  copperMm: number;
  kvpDeviation: number;
  kermaWeight: number;
  relativeFieldArea: number;
}

/** Thin patients and straight beams take more copper than large patients and steep beams. */
function chooseCopper(levelsMm: readonly number[], load: number, random: Random): number {
  const position = clamp(
    Math.round((levelsMm.length - 1) * (0.4 + 0.35 * load + 0.15 * random.normal())),
    0,
    levelsMm.length - 1,
  );
  return levelsMm[position] ?? 0;
}

/** Angles, copper, pulse rate and field of every row; weights by which kerma is shared out later. */
export function draftEvents(
  segments: readonly Segment[],
  family: ImagingFamily,
  setting: { fluoroscopyPulsesPerS: number; sizeLoad: number; maxCopperMm: number },
  random: Random,
): EventDraft[] {
  const angles = chooseAngles(segments, family.views, random);
  return segments.flatMap((segment, index) => {
    const isAcquisition = segment.type !== 'fluoroscopy';
    const isRotational = segment.type === 'rotational-acquisition';
    const pulseRatePerS = isRotational
      ? 30
      : isAcquisition
        ? family.acquisitionFramesPerS
        : setting.fluoroscopyPulsesPerS;
    const zoom = random.pickWeighted([
      [1.25, 3],
      [1, 4],
      [0.7, 2],
    ]);
    return segment.planes.map((plane): EventDraft => {
      const beam = angles[index]?.get(plane) as BeamAngles;
      const tilt = plane === 'B' ? 0.3 : steepness(beam);
      const levels = isAcquisition ? family.acquisitionCopperMm : family.fluoroscopyCopperMm;
      return {
        segment,
        plane,
        angles: beam,
        irradiationNumber: index + 1,
        isAcquisition,
        pulseRatePerS,
        copperMm: Math.min(setting.maxCopperMm, chooseCopper(levels, setting.sizeLoad + tilt - 0.4, random)),
        kvpDeviation:
          4 * tilt + family.kvpSpread * random.normal() + (isAcquisition ? family.acquisitionKvpOffset : 0),
        kermaWeight:
          segment.durationS * pulseRatePerS ** 0.6 * Math.exp(0.8 * (tilt - 0.5) + 0.3 * random.normal()),
        relativeFieldArea: zoom * Math.exp(0.12 * random.normal()),
      };
    });
  });
}

/** Tube voltages whose KAP-weighted mean is the procedure's own. */
export function settleKvp(
  drafts: readonly EventDraft[],
  kermaAreaProducts: readonly number[],
  meanKvp: number,
): number[] {
  const weightSum = kermaAreaProducts.reduce((a, b) => a + b, 0);
  const meanDeviation =
    drafts.reduce((sum, draft, i) => sum + draft.kvpDeviation * (kermaAreaProducts[i] ?? 0), 0) / weightSum;
  return drafts.map((draft) => clamp(meanKvp + draft.kvpDeviation - meanDeviation, 50, 125));
}

const noFilter: DemoFilter = { type: 'none', material: null, minThicknessMm: null, maxThicknessMm: null };

/** The flat filter, if any, and now and then a wedge that softens the lung's edge. */
export function listFilters(copperMm: number, random: Random): DemoFilter[] {
  const filters: DemoFilter[] = [];
  if (copperMm > 0)
    filters.push({ type: 'flat', material: 'Cu', minThicknessMm: copperMm, maxThicknessMm: copperMm });
  if (random.chance(0.2))
    filters.push({ type: 'wedge', material: 'Al', minThicknessMm: 0, maxThicknessMm: 1.5 });
  // A machine says that nothing was in the beam; silence would mean that it does not know.
  return filters.length > 0 ? filters : [noFilter];
}
