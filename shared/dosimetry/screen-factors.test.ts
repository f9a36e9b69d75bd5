import { describe, expect, it } from 'vitest';
import { bodyPoints } from './body-points';
import { isBehindScreen, screenFactorAt, type Screen } from './screen-factors';

const behind = (screen: Screen, statureM = 1.7) =>
  bodyPoints.filter((point) => isBehindScreen(screen, point, statureM));

describe('screens act on body points', () => {
  it('ceiling screen: eye and collar', () => expect(behind('ceilingScreen')).toEqual(['eye', 'collar']));
  it('glasses: the eye', () => expect(behind('glasses')).toEqual(['eye']));
  it('mobile screen: everything', () => expect(behind('mobileScreen')).toEqual(bodyPoints));
  it('table skirt: the leg, and the waist of a person whose waist is below the table top', () => {
    expect(behind('tableSkirt', 1.8)).toEqual(['lowerLeg']);
    expect(behind('tableSkirt', 1.6)).toEqual(['waist', 'lowerLeg']);
  });
  it('multiply, but never below 0.02', () => {
    expect(screenFactorAt(['ceilingScreen', 'glasses'], 'eye', 1.7)).toBeCloseTo(0.175, 12);
    expect(screenFactorAt(['ceilingScreen', 'glasses', 'mobileScreen'], 'eye', 1.7)).toBe(0.02);
    expect(screenFactorAt(['ceilingScreen'], 'chest', 1.7)).toBe(1);
  });
});
