import { closedFormEstimate } from './exposure-interval';
import {
  estimatedQuantities,
  type Estimated,
  type EstimatedQuantity,
  type InputSpread,
  type StaffExposureEstimate,
} from './exposure-types';

export type ExposureSum = Record<EstimatedQuantity, Estimated | null> & {
  estimateCount: number;
  /** How many estimates have no value of a quantity and are not in its sum. */
  missingCounts: Record<EstimatedQuantity, number>;
};

/** What can be summed: a stored estimate may have lost its spreads. */
export type SummableExposure = Record<EstimatedQuantity, Estimated | null> &
  Partial<Pick<StaffExposureEstimate, 'spreads'>>;

/**
 * One person's estimates over a period. Nominal values add. Every input is systematic and shared: it
 * stands at its low or high end in all procedures at once, and the inputs combine as in a single
 * estimate, so how a period is cut into procedures and events changes nothing. An estimate without
 * spreads brings its whole interval as one shared input.
 *
 * A quantity that no estimate has is null; `missingCounts` tells what a sum leaves out.
 *
 * Known value: two estimates of 10 (5–20) from the same input: 20 (10–40).
 */
export function sumExposures(list: readonly SummableExposure[]): ExposureSum {
  const sums = {} as Record<EstimatedQuantity, Estimated | null>;
  const missingCounts = {} as Record<EstimatedQuantity, number>;
  for (const quantity of estimatedQuantities) {
    const known = list.flatMap((estimate) => {
      const value = estimate[quantity];
      return value ? [{ value, spreads: estimate.spreads?.[quantity] ?? wholeInterval(value) }] : [];
    });
    missingCounts[quantity] = list.length - known.length;
    sums[quantity] = known.length === 0 ? null : sumQuantity(known);
  }
  return { ...sums, estimateCount: list.length, missingCounts };
}

function wholeInterval({ nominal, low, high }: Estimated): InputSpread[] {
  return nominal > 0 ? [{ input: 'interval', low: low / nominal, high: high / nominal }] : [];
}

function sumQuantity(known: { value: Estimated; spreads: InputSpread[] }[]): Estimated | null {
  const nominal = known.reduce((sum, { value }) => sum + value.nominal, 0);
  const changes = new Map<string, { low: number; high: number }>();
  for (const { value, spreads } of known) {
    for (const { input, low, high } of spreads) {
      const change = changes.get(input) ?? { low: 0, high: 0 };
      change.low += value.nominal * (low - 1);
      change.high += value.nominal * (high - 1);
      changes.set(input, change);
    }
  }
  const shared = [...changes].map(([input, { low, high }]) => ({
    input,
    low: nominal > 0 ? 1 + low / nominal : 1,
    high: nominal > 0 ? 1 + high / nominal : 1,
  }));
  return closedFormEstimate(nominal, shared);
}
