import { describe, expect, it } from 'vitest';
import { bodyPointZM } from './body-points';
import { isUnchangedPreset, placeFromPreset } from './room-positions';

describe('a preset place', () => {
  it('stands right of the patient for right access, mirrored for left', () => {
    expect(placeFromPreset('operator')).toEqual({
      preset: 'operator',
      xM: -0.6,
      yM: -0.45,
      isBehindBarrier: false,
    });
    expect(placeFromPreset('operator', 'left').xM).toBe(0.6);
  });
  it('is behind the barrier in the control room only', () => {
    expect(placeFromPreset('control-room').isBehindBarrier).toBe(true);
    expect(placeFromPreset('technologist').isBehindBarrier).toBe(false);
  });
  it('counts as unchanged where it or its mirror image stands', () => {
    expect(isUnchangedPreset(placeFromPreset('scrub'))).toBe(true);
    expect(isUnchangedPreset(placeFromPreset('scrub', 'left'))).toBe(true);
    expect(isUnchangedPreset({ ...placeFromPreset('scrub'), yM: -1.2 })).toBe(false);
    expect(isUnchangedPreset({ ...placeFromPreset('scrub'), preset: null })).toBe(false);
  });
  it('believes what was recorded about an adjustment', () => {
    expect(isUnchangedPreset({ ...placeFromPreset('scrub'), isAdjusted: true })).toBe(false);
    expect(isUnchangedPreset({ ...placeFromPreset('scrub'), yM: -1.2, isAdjusted: false })).toBe(true);
  });
});

it('puts the eye of a person of 1.70 m 0.52 m above the isocentre and the leg 0.61 m below', () => {
  expect(bodyPointZM('eye', 1.7)).toBeCloseTo(0.5195, 4);
  expect(bodyPointZM('lowerLeg', 1.7)).toBeCloseTo(-0.611, 4);
});
