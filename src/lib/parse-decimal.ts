/**
 * Reads what a person types into a number field: a comma or a point as the decimal sign, spaces as
 * thousands. Empty is null; anything else is NaN, which the form's schema refuses with its own words.
 * "1 250,5" → 1250.5, "" → null, "12 kg" → NaN.
 */
export function parseDecimal(text: unknown): number | null {
  if (text === null || text === undefined) return null;
  const plain = String(text).replace(/[\s\u2009\u00a0\u202f]/g, '');
  if (plain === '') return null;
  return /^[-+\u2212]?(\d+([.,]\d*)?|[.,]\d+)$/.test(plain)
    ? Number(plain.replace(',', '.').replace('\u2212', '-'))
    : Number.NaN;
}
