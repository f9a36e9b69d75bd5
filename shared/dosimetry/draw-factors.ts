import { inputIndex, type EstimateInput } from './estimate-inputs';
import { z95, type Spread } from './spread';

/** One factor of an evaluation: an input and how far it moves this factor. */
export type FactorSlot = { input: EstimateInput; spread: Spread };

/**
 * The function that writes every slot's factor for inputs standing z standard deviations off (see
 * `factorAt`). Logarithms are taken once: an evaluation may run thousands of times.
 *
 * Known value: one slot { low: 0.25, high: 2.5 } at z = 1.96: 2.5.
 */
export function createFactors(
  slots: readonly FactorSlot[],
): (z: Float64Array, factors: Float64Array) => void {
  const inputs = Uint8Array.from(slots, ({ input }) => inputIndex[input]);
  const below = Float64Array.from(slots, ({ spread }) => -Math.log(spread.low) / z95);
  const above = Float64Array.from(slots, ({ spread }) => Math.log(spread.high) / z95);
  return (z, factors) => {
    for (let slot = 0; slot < inputs.length; slot += 1) {
      const at = z[inputs[slot] as number] as number;
      const exponent = at * ((at > 0 ? above[slot] : below[slot]) as number);
      factors[slot] = exponent === 0 ? 1 : Math.exp(exponent);
    }
  };
}
