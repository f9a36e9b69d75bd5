/** Limits between the five shades of kVp, in kV, the same on every strip. */
export const kvpShadeLimits = [65, 75, 85, 95] as const;
