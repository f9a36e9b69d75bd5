import { createEvaluator, quantityIndex, type QuantityValues } from './evaluate-exposure';
import { estimateInputs } from './estimate-inputs';
import type { ExposureModel } from './exposure-model';
import {
  estimatedQuantities,
  type Contribution,
  type Estimated,
  type EstimatedQuantity,
  type InputSpread,
} from './exposure-types';
import { seededNormals } from './seeded-random';
import { combineSpreads, sortedQuantile, spreadVariance, z95 } from './spread';

/** Factors are kept to this many decimals: enough for any sum, short when stored. */
const factorDecimals = 1e6;
const round = (factor: number) => Math.round(factor * factorDecimals) / factorDecimals;

/**
 * What each input alone does to each quantity: its factor on the nominal value with the input at
 * the low and the high end of its 95 %, everything else nominal. Inputs without effect are left out.
 */
export function spreadsByInput(model: ExposureModel): {
  nominal: QuantityValues;
  spreads: Partial<Record<EstimatedQuantity, InputSpread[]>>;
} {
  const evaluate = createEvaluator(model);
  const values = () => new Float64Array(estimatedQuantities.length);
  const z = new Float64Array(estimateInputs.length);
  const [nominal, low, high] = [values(), values(), values()];
  evaluate(z, nominal);
  const spreads: Partial<Record<EstimatedQuantity, InputSpread[]>> = {};
  estimateInputs.forEach((input, index) => {
    z[index] = -z95;
    evaluate(z, low);
    z[index] = z95;
    evaluate(z, high);
    z[index] = 0;
    for (const quantity of estimatedQuantities) {
      const at = quantityIndex[quantity];
      const middle = nominal[at] ?? Number.NaN;
      if (!(middle > 0)) continue;
      const spread = {
        input,
        low: round((low[at] ?? middle) / middle),
        high: round((high[at] ?? middle) / middle),
      };
      if (spread.low !== 1 || spread.high !== 1) (spreads[quantity] ??= []).push(spread);
    }
  });
  return { nominal, spreads };
}

/** A nominal value with the closed-form interval of its inputs' spreads; NaN gives null. */
export function closedFormEstimate(nominal: number, spreads: readonly InputSpread[]): Estimated | null {
  if (Number.isNaN(nominal)) return null;
  const { low, high } = combineSpreads(spreads);
  return { nominal, low: nominal * low, high: nominal * high };
}

/**
 * The middle 95 % of `draws` seeded draws of all inputs, two-piece log-normal, each drawn once and
 * shared by all events. Null where the quantity is not estimable.
 */
export function drawIntervals(
  model: ExposureModel,
  draws: number,
  seed: number,
): Record<EstimatedQuantity, { low: number; high: number } | null> {
  const evaluate = createEvaluator(model);
  const normal = seededNormals(seed);
  const z = new Float64Array(estimateInputs.length);
  const values = new Float64Array(estimatedQuantities.length);
  const drawn = estimatedQuantities.map(() => new Float64Array(draws));
  for (let draw = 0; draw < draws; draw += 1) {
    for (let index = 0; index < z.length; index += 1) z[index] = normal();
    evaluate(z, values);
    for (let at = 0; at < values.length; at += 1)
      (drawn[at] as Float64Array)[draw] = values[at] ?? Number.NaN;
  }
  const intervals = estimatedQuantities.map((quantity, at) => {
    const column = (drawn[at] ?? new Float64Array(0)).sort();
    const isKnown = column.length > 0 && !Number.isNaN(column[0]);
    const interval = isKnown
      ? { low: sortedQuantile(column, 0.025), high: sortedQuantile(column, 0.975) }
      : null;
    return [quantity, interval] as const;
  });
  return Object.fromEntries(intervals) as Record<EstimatedQuantity, { low: number; high: number } | null>;
}

/**
 * Which inputs the width of the interval comes from: shares of the summed squared log widths,
 * largest first, together 1. ÷2…×2 beside ÷4…×4: 0.2 and 0.8.
 */
export function rankContributions(spreads: readonly InputSpread[]): Contribution[] {
  const total = spreads.reduce((sum, spread) => sum + spreadVariance(spread), 0);
  return spreads
    .map((spread) => ({ input: spread.input, share: total > 0 ? spreadVariance(spread) / total : 0 }))
    .sort((a, b) => b.share - a.share);
}
