/**
 * Reads what a person types into a number field: a comma or a point as the decimal sign, spaces as
 * thousands. Empty is null; anything else is NaN, which the form's schema refuses with its own words.
 * "1 250,5" → 1250.5, "" → null, "12 kg" → NaN.
 */
export declare function parseDecimal(text: unknown): number | null;
