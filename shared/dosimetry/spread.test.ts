import { describe, expect, it } from 'vitest';
import { createFactors } from './draw-factors';
import { estimateInputs } from './estimate-inputs';
import { seededNormals } from './seeded-random';
import { combineSpreads, factorAt, sortedQuantile, z95 } from './spread';

const skewed = { low: 0.25, high: 2.5 };

describe('a two-sided spread', () => {
  it('reaches its ends at 1.96 standard deviations', () => {
    expect(factorAt(skewed, z95)).toBeCloseTo(2.5, 12);
    expect(factorAt(skewed, -z95)).toBeCloseTo(0.25, 12);
    expect(factorAt(skewed, 0)).toBe(1);
  });
  it('is 1.58 and 0.5 half-way', () => {
    expect(factorAt(skewed, z95 / 2)).toBeCloseTo(Math.sqrt(2.5), 12);
    expect(factorAt(skewed, -z95 / 2)).toBeCloseTo(0.5, 12);
  });
  it('combines either side in quadrature of the logarithms', () => {
    const { low, high } = combineSpreads([skewed, { low: 1, high: 2 }]);
    expect(low).toBeCloseTo(0.25, 12);
    expect(Math.log(high)).toBeCloseTo(Math.hypot(Math.log(2.5), Math.log(2)), 12);
  });
  it('is the same from the columns of draws', () => {
    const factors = new Float64Array(2);
    const fill = createFactors([{ input: 'position', spread: skewed }, { input: 'glasses', spread: { low: 1, high: 1 } }]); // prettier-ignore
    for (const z of [-3, -z95, -0.4, 0, 0.7, z95]) {
      const all = new Float64Array(estimateInputs.length).fill(z);
      fill(all, factors);
      expect(factors[0]).toBeCloseTo(factorAt(skewed, z), 12);
      expect(factors[1]).toBe(1);
    }
  });
});

describe('seeded normal numbers', () => {
  const take = (seed: number, count: number) => {
    const next = seededNormals(seed);
    return Array.from({ length: count }, () => next());
  };
  it('repeat with the seed and differ without', () => {
    expect(take(7, 20)).toEqual(take(7, 20));
    expect(take(7, 20)).not.toEqual(take(8, 20));
  });
  it('have mean 0, deviation 1 and 5 % beyond 1.96', () => {
    const values = take(1, 40_000);
    const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
    const variance = values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / values.length;
    expect(Math.abs(mean)).toBeLessThan(0.02);
    expect(Math.abs(variance - 1)).toBeLessThan(0.03);
    const beyond = values.filter((value) => Math.abs(value) > z95).length / values.length;
    expect(Math.abs(beyond - 0.05)).toBeLessThan(0.005);
  });
});

it('interpolates a quantile between sorted draws', () => {
  expect(sortedQuantile(Float64Array.of(0, 1, 2, 3, 4), 0.5)).toBe(2);
  expect(sortedQuantile(Float64Array.of(0, 10), 0.25)).toBe(2.5);
  expect(sortedQuantile(Float64Array.of(5), 0.975)).toBe(5);
});
