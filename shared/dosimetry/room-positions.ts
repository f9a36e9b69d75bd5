import type { AccessSide, Place } from './exposure-types';

/**
 * Usual standing places as (x, y) in metres from the isocentre, room axes: +x to the left and +y to
 * the head of a patient lying head first and supine. Own choices for a right femoral access, to be
 * edited by each department. The control room is behind the barrier: nothing in sums.
 */
export const positionPresets = {
  operator: { xM: -0.6, yM: -0.45, isBehindBarrier: false },
  'second-operator': { xM: -0.65, yM: -1.0, isBehindBarrier: false },
  scrub: { xM: -0.7, yM: -1.35, isBehindBarrier: false },
  anaesthesia: { xM: 0.6, yM: 1.4, isBehindBarrier: false },
  circulating: { xM: 1.5, yM: -2.0, isBehindBarrier: false },
  technologist: { xM: 1.5, yM: -3.2, isBehindBarrier: false },
  'jugular-access': { xM: -0.35, yM: 0.6, isBehindBarrier: false },
  'left-chest': { xM: 0.35, yM: 0.25, isBehindBarrier: false },
  'control-room': { xM: 2.5, yM: -4.5, isBehindBarrier: true },
} as const;

export type PositionPreset = keyof typeof positionPresets;

/**
 * The place of a preset. With access from the patient's left everybody at the table stands
 * mirrored: x changes sign.
 *
 * Known value: operator, right: (−0.60, −0.45).
 */
export function placeFromPreset(preset: PositionPreset, accessSide: AccessSide = 'right'): Place {
  const { xM, yM, isBehindBarrier } = positionPresets[preset];
  return { preset, xM: accessSide === 'left' ? -xM : xM, yM, isBehindBarrier };
}

/** Whether a place still stands where its preset (or its mirror image) put it, within 1 cm. */
export function isUnchangedPreset(place: Place): boolean {
  if (place.preset === null) return false;
  if (place.isAdjusted !== undefined) return !place.isAdjusted;
  const { xM, yM } = positionPresets[place.preset];
  return Math.abs(Math.abs(place.xM) - Math.abs(xM)) < 0.01 && Math.abs(place.yM - yM) < 0.01;
}
