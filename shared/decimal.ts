const decimalString = /^[+-]?(\d+\.?\d*|\.\d+)([eE][+-]?\d+)?$/;

/**
 * A decimal string (VR DS, PS3.5 6.2) as a number; null unless the whole text is one. Blanks around it are allowed,
 * "0,5", "12abc", "NaN" and "INF" are not. " +1.25E-3 " → 0.00125.
 */
export function parseDecimal(text: string): number | null {
  const trimmed = text.trim();
  if (!decimalString.test(trimmed)) return null;
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
  if (value === null) return null;
  const shift = powerOfTen(factor);
  const { digits, exponent } = splitDecimal(text);
  if (shift !== null) return Number(`${digits}e${exponent + shift}`);
  return Number.isSafeInteger(factor)
    ? Number(`${BigInt(digits) * BigInt(factor)}e${exponent}`)
    : value * factor;
}
