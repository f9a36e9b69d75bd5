import type { PatientPosition } from './exposure-types';

/** x to the patient's left, y to the head, z to the front; in metres or a unit vector. */
export type Vector = readonly [number, number, number];

/**
 * Unit vector from the source to the detector in the patient's axes, of the positioner's primary
 * angle a (left anterior oblique positive) and secondary angle b (cranial positive), in degrees:
 * u = (sin a·cos b, sin b, cos a·cos b).
 *
 * Source: angle conventions of DICOM PS3.3 C.8.7.5 (positioner primary and secondary angle).
 *
 * Known value: 0/0 (posterior-anterior, tube under a supine patient): (0, 0, 1); 30/0: (0.5, 0, 0.866).
 */
export function beamDirection(primaryAngleDeg: number, secondaryAngleDeg: number): Vector {
  const a = (primaryAngleDeg * Math.PI) / 180;
  const b = (secondaryAngleDeg * Math.PI) / 180;
  return [Math.sin(a) * Math.cos(b), Math.sin(b), Math.cos(a) * Math.cos(b)];
}

/**
 * A patient-axes vector in room axes. Room axes are those of a patient lying head first and supine.
 * Feet first turns the patient about the vertical (x and y change sign), prone about the long axis
 * (x and z change sign). The mapping is its own inverse.
 *
 * Known value: feet first, supine: the patient's left (1, 0, 0) is the room's (−1, 0, 0).
 */
export function turnBetweenPatientAndRoom([x, y, z]: Vector, position: PatientPosition): Vector {
  const xSign = position.isFeetFirst !== position.isProne ? -1 : 1;
  return [xSign * x, position.isFeetFirst ? -y : y, position.isProne ? -z : z];
}

/** The direction with the tube over the table: reversed. */
export function reverseDirection([x, y, z]: Vector): Vector {
  return [-x, -y, -z];
}

/**
 * Directions along a rotational run, evenly spaced in angle: midpoints of steps of at most
 * `stepDeg`, so that their plain mean is the integral over the path at constant rotation and
 * output. Angles in degrees; the run goes straight from start to end without passing ±180.
 *
 * Known value: 0 → 90 in one step: the direction at 45.
 */
export function rotationPath(
  start: { primaryAngleDeg: number; secondaryAngleDeg: number },
  end: { primaryAngleDeg: number; secondaryAngleDeg: number },
  stepDeg = 5,
): Vector[] {
  const primarySpan = end.primaryAngleDeg - start.primaryAngleDeg;
  const secondarySpan = end.secondaryAngleDeg - start.secondaryAngleDeg;
  const span = Math.max(Math.abs(primarySpan), Math.abs(secondarySpan));
  const count = Math.max(1, Math.min(72, Math.ceil(span / stepDeg)));
  return Array.from({ length: count }, (_, step) => {
    const share = (step + 0.5) / count;
    return beamDirection(
      start.primaryAngleDeg + share * primarySpan,
      start.secondaryAngleDeg + share * secondarySpan,
    );
  });
}
