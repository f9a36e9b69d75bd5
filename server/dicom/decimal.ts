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
