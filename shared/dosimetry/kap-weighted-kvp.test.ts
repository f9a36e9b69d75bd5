import { describe, expect, it } from 'vitest';
import { kapWeightedKvp } from './kap-weighted-kvp';
import { meanKvp } from './mean-kvp';

describe('the kVp of a procedure', () => {
  it('weighs by KAP', () => {
    expect(kapWeightedKvp([{ kvp: 70, kermaAreaProductGyCm2: 10 }, { kvp: 90, kermaAreaProductGyCm2: 30 }])).toBe(85); // prettier-ignore
  });
  it('leaves events without kVp or KAP out', () => {
    expect(
      kapWeightedKvp([
        { kvp: 70, kermaAreaProductGyCm2: 10 },
        { kvp: null, kermaAreaProductGyCm2: 30 },
        { kvp: 90, kermaAreaProductGyCm2: null },
      ]),
    ).toBe(70);
  });
  it('is unknown without any weight', () => {
    expect(kapWeightedKvp([])).toBeNull();
    expect(kapWeightedKvp([{ kvp: 70, kermaAreaProductGyCm2: 0 }])).toBeNull();
  });
});

it('means the kVp values of an event plainly, none giving null', () => {
  expect(meanKvp([70, 80, 90, 80])).toBe(80);
  expect(meanKvp([])).toBeNull();
});
