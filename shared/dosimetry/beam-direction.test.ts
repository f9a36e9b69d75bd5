import { describe, expect, it } from 'vitest';
import { beamDirection, reverseDirection, rotationPath, turnBetweenPatientAndRoom } from './beam-direction';
import { scatterAngleDeg } from './scatter-geometry';

function expectVector(actual: readonly number[], expected: readonly number[]) {
  expected.forEach((value, axis) => expect(actual[axis]).toBeCloseTo(value, 6));
}

describe('the direction of the beam', () => {
  it('goes up through a supine patient at 0/0', () => expectVector(beamDirection(0, 0), [0, 0, 1]));
  it('leans to the patient’s left in left anterior oblique', () =>
    expectVector(beamDirection(30, 0), [0.5, 0, Math.sqrt(0.75)]));
  it('leans to the head in cranial angulation', () =>
    expectVector(beamDirection(0, 30), [0, 0.5, Math.sqrt(0.75)]));
  it('is turned round by a tube over the table', () =>
    expectVector(reverseDirection(beamDirection(0, 0)), [0, 0, -1]));
});

describe('patient and room axes', () => {
  const supine = { isFeetFirst: false, isProne: false };
  it.each([
    ['head first, supine', supine, [1, 2, 3]],
    ['feet first, supine', { isFeetFirst: true, isProne: false }, [-1, -2, 3]],
    ['head first, prone', { isFeetFirst: false, isProne: true }, [-1, 2, -3]],
    ['feet first, prone', { isFeetFirst: true, isProne: true }, [1, -2, -3]],
  ])('%s', (_, position, expected) => {
    const turned = turnBetweenPatientAndRoom([1, 2, 3], position);
    expectVector(turned, expected);
    expectVector(turnBetweenPatientAndRoom(turned, position), [1, 2, 3]);
  });
});

describe('a rotational run', () => {
  it('goes through the middle when taken in one step', () => {
    const [only, ...rest] = rotationPath({ primaryAngleDeg: 0, secondaryAngleDeg: 0 }, { primaryAngleDeg: 90, secondaryAngleDeg: 0 }, 90); // prettier-ignore
    expectVector(only ?? [], beamDirection(45, 0));
    expect(rest).toHaveLength(0);
  });

  it('is fine enough: a quarter of the step changes the mean scatter angle by less than 0.1°', () => {
    const [start, end] = [
      { primaryAngleDeg: -100, secondaryAngleDeg: 0 },
      { primaryAngleDeg: 100, secondaryAngleDeg: 0 },
    ];
    const mean = (stepDeg: number) => {
      const path = rotationPath(start, end, stepDeg);
      return path.reduce((sum, u) => sum + scatterAngleDeg(u, [-0.6, -0.5, 0.35]), 0) / path.length;
    };
    expect(Math.abs(mean(5) - mean(200 / 72))).toBeLessThan(0.1);
    expect(Math.abs(mean(5) - mean(50))).toBeGreaterThan(0.1);
  });
});
