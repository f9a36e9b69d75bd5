import type { TypedQuantity } from './contract/manual-entry';
import { scaleDecimal } from './decimal';
import { kindOfTyped, minutesAndSeconds, typedUnits } from './typed-units';
import { unitFactor } from './unit-factors';

/** Which part of a typed figure cannot be taken, and why. */
export type TypedFault = { part: 'text' | 'unit'; detail: string };
export type ReadTyped = { value: number; fault?: undefined } | { value?: undefined; fault: TypedFault };

const fault = (part: TypedFault['part'], detail: string): ReadTyped => ({ fault: { part, detail } });

const clock = /^(\d{1,4}):([0-5]\d)$/;
/** "1,250" is a thousand and more on one machine, one and a quarter on another: nobody guesses. */
const ambiguousComma = /^\d{1,3}(,\d{3})+$/;
const plainNumber = /^(\d+\.?\d*|\.\d+)$/;
/** Blanks that people and machines put between thousands. */
const blanks = /[\s\u00a0\u2009\u202f]/g;

/**
 * A figure as typed from a machine's screen, in the canonical unit of its kind (Gy, Gy·cm², s, frames): a decimal sign
 * as point or comma, thousands with blanks. The point is moved in the text, so that no binary residue comes in:
 * "1250" µGy·m² is 12.5 Gy·cm², "0.00430" Gy·m² is 43, "12:30" min:s is 750 s.
 */
export function readTypedQuantity({ quantity, text, unit }: Omit<TypedQuantity, 'plane'>): ReadTyped {
  const bare = text.replace(blanks, '');
  const isOffered = typedUnits[quantity].some((one) => one.unit === unit);
  if (!isOffered) return fault('unit', 'Choose the unit that the machine shows beside the number.');
  if (unit === minutesAndSeconds) return readClock(bare);
  if (clock.test(bare)) return fault('unit', 'A time with a colon is in min:s.');
  if (ambiguousComma.test(bare))
    return fault('text', `${bare} can be read in two ways. Write thousands without a comma.`);
  const plain = bare.replace(',', '.');
  if (!plainNumber.test(plain)) return fault('text', 'Type the number alone, such as 1250 or 12.5.');
  const factor = unitFactor(kindOfTyped[quantity], unit);
  const value = factor === null ? null : scaleDecimal(plain, factor);
  if (value === null || !Number.isFinite(value)) return fault('text', 'Type the number alone, such as 12.5.');
  if (quantity === 'frame-count' && !Number.isSafeInteger(value))
    return fault('text', 'Frames are counted in whole numbers.');
  return { value };
}

function readClock(text: string): ReadTyped {
  const parts = clock.exec(text);
  return parts
    ? { value: Number(parts[1]) * 60 + Number(parts[2]) }
    : fault('text', 'Type minutes and seconds with a colon, such as 12:30.');
}
