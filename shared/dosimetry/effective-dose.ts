type Weights = { underGarment: number; collar: number };

const both = (weights: Weights) => ({ withThyroidCollar: weights, withoutThyroidCollar: weights });

/**
 * Published formulas for the effective dose from two dosemeters: Hp(10) under the garment at the
 * waist (Hu) and over it at the collar (Ho). Each is linear: E = u·Hu + c·Ho.
 * Webster's give the older effective dose equivalent.
 */
export const effectiveDoseFormulas = {
  'ncrp122-two-badges': {
    name: '0.5 Hw + 0.025 Hn (NCRP 122)',
    source: 'Rosenstein and Webster, Health Phys 67 (1994) 88; NCRP 122 (from memory)',
    caution: 'The formula may be 30 % low.',
    ...both({ underGarment: 0.5, collar: 0.025 }),
  },
  'ncrp122-collar': {
    name: 'Hn / 21 (NCRP 122)',
    source: 'Rosenstein and Webster, Health Phys 67 (1994) 88; NCRP 122 (from memory)',
    caution: null,
    ...both({ underGarment: 0, collar: 1 / 21 }),
  },
  'webster-two-badges': {
    name: '1.5 Hw + 0.04 Hn (Webster 1989, effective dose equivalent)',
    source: 'Webster 1989, quoted in NCRP 122',
    caution: null,
    ...both({ underGarment: 1.5, collar: 0.04 }),
  },
  'webster-collar': {
    name: 'Hn / 5.6 (Webster 1989, effective dose equivalent)',
    source: 'Webster 1989, quoted in NCRP 122',
    caution: null,
    ...both({ underGarment: 0, collar: 1 / 5.6 }),
  },
  'webster-regulatory': {
    name: '0.3 Hn (Webster, single collar badge)',
    source: 'Regulatory variant of Webster’s single-badge formula',
    caution: null,
    ...both({ underGarment: 0, collar: 0.3 }),
  },
  'niklason-simple': {
    name: 'Hu + 0.02 Ho with, 0.06 Ho without thyroid collar (Niklason 1994)',
    source: 'Niklason et al., Health Phys 67 (1994) 611, shortened form',
    caution: null,
    withThyroidCollar: { underGarment: 1, collar: 0.02 },
    withoutThyroidCollar: { underGarment: 1, collar: 0.06 },
  },
  'niklason-strict': {
    name: 'Hu + 0.02 (Ho − Hu) with, 0.06 (Ho − Hu) without thyroid collar (Niklason 1994)',
    source: 'Niklason et al., Health Phys 67 (1994) 611',
    caution: null,
    withThyroidCollar: { underGarment: 0.98, collar: 0.02 },
    withoutThyroidCollar: { underGarment: 0.94, collar: 0.06 },
  },
  'von-boetticher': {
    name: '0.84 Hu + 0.051 Ho with, 0.79 Hu + 0.100 Ho without thyroid collar (von Boetticher 2010)',
    source: 'von Boetticher et al. 2010 (from memory)',
    caution: null,
    withThyroidCollar: { underGarment: 0.84, collar: 0.051 },
    withoutThyroidCollar: { underGarment: 0.79, collar: 0.1 },
  },
  mcewan: {
    name: '0.71 Hu + 0.05 Ho (McEwan 2000)',
    source: 'McEwan 2000 (from memory)',
    caution: null,
    ...both({ underGarment: 0.71, collar: 0.05 }),
  },
  'swiss-ordinance': {
    name: 'Hu + 0.05 Ho with, 0.1 Ho without thyroid collar (Swiss ordinance)',
    source: 'Swiss dosimetry ordinance (from memory)',
    caution: null,
    withThyroidCollar: { underGarment: 1, collar: 0.05 },
    withoutThyroidCollar: { underGarment: 1, collar: 0.1 },
  },
  'martin-magee': {
    name: 'Ho / 10 (Martin and Magee 2013)',
    source: 'Martin and Magee 2013',
    caution: null,
    ...both({ underGarment: 0, collar: 0.1 }),
  },
} as const;

export type EffectiveDoseFormulaId = keyof typeof effectiveDoseFormulas;
export const defaultEffectiveDoseFormula: EffectiveDoseFormulaId = 'ncrp122-two-badges';

/** The two weights of a formula; an unknown thyroid collar counts as none, which gives more. */
export function effectiveDoseWeights(
  formula: EffectiveDoseFormulaId,
  hasThyroidCollar: boolean | null,
): Weights {
  const { withThyroidCollar, withoutThyroidCollar } = effectiveDoseFormulas[formula];
  return hasThyroidCollar === true ? withThyroidCollar : withoutThyroidCollar;
}

/** Whether the answer depends on a thyroid collar. 'niklason-simple' → true. */
export function dependsOnThyroidCollar(formula: EffectiveDoseFormulaId): boolean {
  const { withThyroidCollar, withoutThyroidCollar } = effectiveDoseFormulas[formula];
  return withThyroidCollar.collar !== withoutThyroidCollar.collar;
}

/**
 * Effective dose from Hp(10) under the garment and at the collar, in their unit (µSv or mSv).
 *
 * Known value: 'niklason-simple', with thyroid collar, 0.10 and 3.0 mSv: 0.16 mSv.
 */
export function effectiveDose(
  formula: EffectiveDoseFormulaId,
  underGarmentHp10: number,
  collarHp10: number,
  hasThyroidCollar: boolean | null,
): number {
  const weights = effectiveDoseWeights(formula, hasThyroidCollar);
  return weights.underGarment * underGarmentHp10 + weights.collar * collarHp10;
}
