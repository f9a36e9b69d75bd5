/** Standard deviations to the edge of the middle 95 % of a normal distribution. */
export const z95 = 1.959963984540054;

/**
 * How far an input may lie from its nominal value: factors at the ends of about 95 %, low ≤ 1 ≤ high.
 * The logarithm is two-piece normal around 0, so the nominal value is the median and either side has
 * its own width.
 */
export type Spread = { low: number; high: number };

export const noSpread: Spread = { low: 1, high: 1 };

/**
 * The factor at z standard deviations: high^(z/1.96) above the nominal value, low^(−z/1.96) below.
 *
 * Known value: { low: 0.25, high: 2.5 } at z = 1.96: 2.5; at 0: 1; at −1.96: 0.25.
 */
export function factorAt({ low, high }: Spread, z: number): number {
  if (z === 0) return 1;
  return Math.pow(z > 0 ? high : low, Math.abs(z) / z95);
}

/**
 * Independent spreads combined in closed form: the logarithms of either side add in quadrature.
 *
 * Known value: ÷2…×2 twice: ÷2.67…×2.67.
 */
export function combineSpreads(spreads: readonly Spread[]): Spread {
  let below = 0;
  let above = 0;
  for (const { low, high } of spreads) {
    below += Math.log(low) ** 2;
    above += Math.log(high) ** 2;
  }
  return { low: Math.exp(-Math.sqrt(below)), high: Math.exp(Math.sqrt(above)) };
}

/** What one spread adds to a combination: the squares of both log widths. */
export function spreadVariance({ low, high }: Spread): number {
  return Math.log(low) ** 2 + Math.log(high) ** 2;
}

/**
 * The value below which a share of sorted draws lies, between neighbours linearly.
 *
 * Known value: [0, 1, 2, 3, 4] at 0.5: 2.
 */
export function sortedQuantile(sorted: Float64Array, share: number): number {
  const position = share * (sorted.length - 1);
  const below = Math.floor(position);
  const lower = sorted[below] ?? Number.NaN;
  const upper = sorted[Math.min(below + 1, sorted.length - 1)] ?? lower;
  return lower + (position - below) * (upper - lower);
}
