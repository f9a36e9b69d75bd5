import { describe, expect, it } from 'vitest';
import { dependsOnThyroidCollar, effectiveDose, type EffectiveDoseFormulaId } from './effective-dose';

// 0.1 under the garment and 3 at the collar, by hand from the published formulas.
describe('effective dose by named formula', () => {
  it.each<[EffectiveDoseFormulaId, number, number]>([
    ['ncrp122-two-badges', 0.125, 0.125],
    ['ncrp122-collar', 0.142857, 0.142857],
    ['webster-two-badges', 0.27, 0.27],
    ['webster-collar', 0.535714, 0.535714],
    ['webster-regulatory', 0.9, 0.9],
    ['niklason-simple', 0.16, 0.28],
    ['niklason-strict', 0.158, 0.274],
    ['von-boetticher', 0.237, 0.379],
    ['mcewan', 0.221, 0.221],
    ['swiss-ordinance', 0.25, 0.4],
    ['martin-magee', 0.3, 0.3],
  ])('%s: %f with, %f without thyroid collar', (formula, withCollar, without) => {
    expect(effectiveDose(formula, 0.1, 3, true)).toBeCloseTo(withCollar, 6);
    expect(effectiveDose(formula, 0.1, 3, false)).toBeCloseTo(without, 6);
    expect(effectiveDose(formula, 0.1, 3, null)).toBeCloseTo(without, 6);
    expect(dependsOnThyroidCollar(formula)).toBe(withCollar !== without);
  });
});
