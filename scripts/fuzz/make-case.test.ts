import { inflateRawSync } from 'node:zlib';
import { describe, expect, it } from 'vitest';
import { makeCase, maxBytes } from './make-case';
import { mutationFamilies } from './mutations';
import { loadSamples } from './samples';

const samples = loadSamples();
const numbers = Array.from({ length: 1500 }, (_, index) => index);

describe('makeCase', () => {
  it('gives the same file for the same number and seed, another one for another', () => {
    for (const number of [0, 7, 199_999])
      expect(makeCase(samples, 5, number)).toEqual(makeCase(samples, 5, number));
    const files = new Set(numbers.map((number) => makeCase(samples, 5, number).bytes.toString('latin1')));
    expect(files.size).toBeGreaterThan(numbers.length * 0.85);
    expect(makeCase(samples, 6, 3).bytes.equals(makeCase(samples, 5, 3).bytes)).toBe(false);
  });

  it('keeps to the bound, spoils in every way, and leaves the samples as they are', () => {
    const before = samples.map(({ bytes }) => Buffer.from(bytes));
    const descriptions = numbers.map((number) => {
      const { bytes, description } = makeCase(samples, 11, number);
      expect(bytes.length).toBeLessThanOrEqual(maxBytes);
      return description;
    });
    for (const name of mutationFamilies.flatMap((family) => Object.keys(family)))
      expect(
        descriptions.some((description) => description.includes(name)),
        name,
      ).toBe(true);
    expect(samples.every(({ bytes }, index) => before[index]?.equals(bytes))).toBe(true);
  });

  it('spoils what is inside a deflated file, so that it still unpacks', () => {
    const deflated = samples.filter(({ name }) => name === '07-deflated.dcm');
    expect(deflated).toHaveLength(1);
    const cases = numbers.slice(0, 60).map((number) => makeCase(deflated, 3, number));
    const inside = cases.filter(({ description }) => description.includes('inflated'));
    expect(inside.length).toBeGreaterThan(20);
    const start = deflated[0]?.dataSetStart ?? 0;
    for (const { bytes } of inside) expect(() => inflateRawSync(bytes.subarray(start))).not.toThrow();
  });
});
