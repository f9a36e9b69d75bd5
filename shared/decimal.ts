const decimalString = /^[+-]?(?:\d+(?:\.\d*)?|\.\d+)(?:[eE][+-]?\d+)?$/;

/** The standard allows 16 characters, devices write up to about 25; longer is damage or an attack on the reader. */
const MOST_CHARACTERS = 100;

/**
 * A decimal string (VR DS, PS3.5 6.2) as a number; null unless the whole text is one. Blanks around it are allowed,
 * "0,5", "12abc", "NaN" and "INF" are not. " +1.25E-3 " → 0.00125.
 */
export function parseDecimal(text: string): number | null {
  const trimmed = text.trim();
  if (trimmed.length > MOST_CHARACTERS || !decimalString.test(trimmed)) return null;
  const value = Number(trimmed);
  return Number.isFinite(value) ? value : null;
}

/** The exponent of a factor that is a power of ten; null for others such as 60. */
function powerOfTen(factor: number): number | null {
  const exponent = Math.round(Math.log10(factor));
  return Number(`1e${exponent}`) === factor ? exponent : null;
}

/** The digits of a decimal string without their point, and the power of ten that belongs to them: "-0.57" is -57e-2. */
function splitDecimal(text: string): { digits: string; exponent: number } {
  const [mantissa = '', exponent = '0'] = text.trim().toLowerCase().split('e');
  const [whole = '', fraction = ''] = mantissa.replace('+', '').split('.');
  return { digits: `${whole}${fraction}`, exponent: Number(exponent) - fraction.length };
}

/**
 * A decimal string times a factor. A power of ten shifts the point in the text, and a whole factor multiplies the
 * digits, so that nothing is lost to binary fractions: "0.00015" × 10,000 is 1.5 and not 1.4999999999999998, and
 * "0.57" × 60 is 34.2.
 */
export function scaleDecimal(text: string, factor: number): number | null {
  const value = parseDecimal(text);
  // Most numbers stand in the canonical unit; a zero may have any exponent.
  if (value === null || factor === 1 || value === 0) return value;
  const scaled = multiplyDecimal(text, value, factor);
  return Number.isFinite(scaled) ? scaled : null;
}

function multiplyDecimal(text: string, value: number, factor: number): number {
  const shift = powerOfTen(factor);
  const { digits, exponent } = splitDecimal(text);
  if (shift !== null) return Number(`${digits}e${exponent + shift}`);
  return Number.isSafeInteger(factor)
    ? Number(`${BigInt(digits) * BigInt(factor)}e${exponent}`)
    : value * factor;
}
