import type { TypedQuantity, TypedQuantityName } from './contract/manual-entry';
import { readTypedQuantity } from './read-typed-quantity';

/**
 * Above these totals of all planes a figure is typed twice, since a slip there starts a patient's follow-up or hides
 * the need of one: K a,r 3 Gy, where notification during a procedure usually begins (SIR 2009, from memory), P KA
 * 300 Gy·cm² (likewise).
 */
export const secondEntryAbove: Partial<Record<TypedQuantityName, number>> = {
  'reference-air-kerma': 3,
  'kerma-area-product': 300,
};

/** Compared after rounding, so that 3 Gy is not above 3 Gy by a last binary digit. */
const rounded = (value: number) => Math.round(value * 1e6) / 1e6;

/** Which of the figures must be typed a second time; exactly at the threshold is not above it. */
export function findSecondEntries(quantities: readonly TypedQuantity[]): TypedQuantity[] {
  const totals = new Map<TypedQuantityName, number>();
  for (const figure of quantities) {
    const { value = 0 } = readTypedQuantity(figure);
    totals.set(figure.quantity, (totals.get(figure.quantity) ?? 0) + value);
  }
  return quantities.filter(({ quantity }) => {
    const threshold = secondEntryAbove[quantity];
    return threshold !== undefined && rounded(totals.get(quantity) ?? 0) > threshold;
  });
}

/** The same amount, whichever unit it was typed in: 3.5 Gy is 3500 mGy. */
export function isSameAmount(
  one: Pick<TypedQuantity, 'quantity' | 'text' | 'unit'>,
  other: Pick<TypedQuantity, 'quantity' | 'text' | 'unit'>,
): boolean {
  const [first, second] = [readTypedQuantity(one).value, readTypedQuantity(other).value];
  return first !== undefined && first === second;
}
