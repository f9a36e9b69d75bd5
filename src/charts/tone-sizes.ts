/** Diameters in px of the five tones of a point, least to most. */
export const toneSizes = [5, 6.5, 8, 10, 12.5] as const;
