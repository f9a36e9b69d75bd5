import type { DemoPlane } from './demo-types';
import type { Segment } from './irradiation-segments';
import type { Random } from './random';
import type { View } from './techniques.table-data';

export interface BeamAngles {
  primaryAngleDeg: number;
  secondaryAngleDeg: number;
  primaryEndAngleDeg: number | null;
  secondaryEndAngleDeg: number | null;
}

const roundToTenth = (value: number) => Math.round(value * 10) / 10;

const fixed = (primaryAngleDeg: number, secondaryAngleDeg: number): BeamAngles => ({
  primaryAngleDeg: roundToTenth(primaryAngleDeg),
  secondaryAngleDeg: roundToTenth(secondaryAngleDeg),
  primaryEndAngleDeg: null,
  secondaryEndAngleDeg: null,
});

/**
 * Angles of every plane of every segment, degrees, LAO and cranial positive (DICOM positioner
 * angles). A team keeps a working view for a while and changes it mostly for an acquisition; the
 * neuro room's lateral plane stays near −90°, its tube at the patient's left.
 */
export function chooseAngles(
  segments: readonly Segment[],
  views: readonly View[],
  random: Random,
): Map<DemoPlane, BeamAngles>[] {
  const weighted = views.map((view) => [view, view[2]] as const);
  let view = random.pickWeighted(weighted);
  return segments.map((segment) => {
    const changeShare = segment.type === 'fluoroscopy' ? 0.2 : 0.55;
    if (random.chance(changeShare)) view = random.pickWeighted(weighted);
    const [primaryDeg, secondaryDeg] = view;
    const angles = new Map<DemoPlane, BeamAngles>();
    for (const plane of segment.planes) {
      if (segment.type === 'rotational-acquisition')
        angles.set(plane, {
          primaryAngleDeg: -100,
          secondaryAngleDeg: 0,
          primaryEndAngleDeg: 100,
          secondaryEndAngleDeg: 0,
        });
      else if (plane === 'B') angles.set(plane, fixed(-90 + 3 * random.normal(), 2 * random.normal()));
      else angles.set(plane, fixed(primaryDeg + 2 * random.normal(), secondaryDeg + 2 * random.normal()));
    }
    return angles;
  });
}

/** 0 for a straight beam, about 1 for 50° of tilt: the path through the patient grows with it. */
export const steepness = ({ primaryAngleDeg, secondaryAngleDeg, primaryEndAngleDeg }: BeamAngles): number =>
  primaryEndAngleDeg === null
    ? Math.min(1.4, Math.hypot(primaryAngleDeg, 1.3 * secondaryAngleDeg) / 50)
    : 0.5;
