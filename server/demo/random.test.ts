import { describe, expect, it } from 'vitest';
import { mean, standardDeviation } from 'simple-statistics';
import { createRandom } from './random';

describe('createRandom', () => {
  it('gives the same draws for the same key and others for another key', () => {
    const draws = (...key: (string | number)[]) => {
      const random = createRandom(...key);
      return Array.from({ length: 5 }, () => random.uniform());
    };
    expect(draws('events', 17)).toEqual(draws('events', 17));
    expect(draws('events', 17)).not.toEqual(draws('events', 18));
    expect(draws('events', 1, 7)).not.toEqual(draws('events', 17));
  });

  it('has normal deviates of mean 0 and standard deviation 1', () => {
    const random = createRandom('normal');
    const deviates = Array.from({ length: 20_000 }, () => random.normal());
    expect(mean(deviates)).toBeCloseTo(0, 1);
    expect(standardDeviation(deviates)).toBeCloseTo(1, 1);
  });

  it('is uniform over neighbouring keys too, not only within one stream', () => {
    const firstDraws = Array.from({ length: 10_000 }, (_, index) => createRandom('x', index).uniform());
    expect(mean(firstDraws)).toBeCloseTo(0.5, 1);
    expect(new Set(firstDraws).size).toBeGreaterThan(9_990);
  });

  it('draws weighted items in proportion', () => {
    const random = createRandom('weights');
    const heads = Array.from({ length: 10_000 }, () =>
      random.pickWeighted([
        ['a', 3],
        ['b', 1],
      ]),
    ).filter((item) => item === 'a').length;
    expect(heads / 10_000).toBeCloseTo(0.75, 1);
  });
});
