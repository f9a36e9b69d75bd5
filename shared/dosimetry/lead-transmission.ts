import {
  archerLeadPrimary,
  archerLeadSecondary,
  type ArcherFit,
  type ArcherRow,
} from './archer-lead.table-data';
import { clamp } from './clamp';

export const minLeadKvp = 50;
export const maxLeadKvp = 150;

/** Thickest lead the fits are used for, mm (they are not to be used beyond the plotted range). */
export const maxLeadMm = 3;

/**
 * Broad-beam transmission B of x mm: B = [(1 + β/α)·e^{αγx} − β/α]^{−1/γ}, 0 to 1.
 *
 * Source: Archer et al. 1983; NCRP 147 eq. A.2. Known value: lead at 80 kVp (table A.1), 0.5 mm: 0.0137.
 */
export function archerTransmission({ alphaPerMm, betaPerMm, gamma }: ArcherFit, thicknessMm: number): number {
  const ratio = betaPerMm / alphaPerMm;
  return ((1 + ratio) * Math.exp(alphaPerMm * gamma * thicknessMm) - ratio) ** (-1 / gamma);
}

/**
 * The thickness in mm that lets the share B (0 to 1) through: x = ln[(B^{−γ} + β/α)/(1 + β/α)]/(αγ).
 *
 * Source: NCRP 147 eq. A.3. Known value: lead at 100 kVp (table A.1), B = 1.25e-3: 1.66 mm.
 */
export function archerThicknessMm({ alphaPerMm, betaPerMm, gamma }: ArcherFit, transmission: number): number {
  const ratio = betaPerMm / alphaPerMm;
  return Math.log((transmission ** -gamma + ratio) / (1 + ratio)) / (alphaPerMm * gamma);
}

/** ln B is taken as linear in kVp between the table's rows; outside 50–150 kVp the end row holds. */
function tableTransmission(rows: readonly ArcherRow[], kvp: number, thicknessMm: number): number {
  const upperIndex = rows.findIndex((row) => row.kvp >= kvp);
  const upper = rows[upperIndex] ?? rows[rows.length - 1];
  const lower = rows[upperIndex - 1];
  if (!upper) throw new RangeError('A transmission table needs at least one row.');
  const atUpper = archerTransmission(upper, thicknessMm);
  if (upperIndex < 1 || !lower || upper.kvp === kvp) return atUpper;
  const share = (kvp - lower.kvp) / (upper.kvp - lower.kvp);
  return archerTransmission(lower, thicknessMm) ** (1 - share) * atUpper ** share;
}

/** Transmission of the primary beam through lead (NCRP 147 table A.1). 80 kVp, 0.5 mm: 0.0137. */
export function primaryLeadTransmission(kvp: number, leadMm: number): number {
  return tableTransmission(archerLeadPrimary, kvp, leadMm);
}

/** Transmission of secondary radiation through lead (NCRP 147 table C.1). 100 kVp, 0.5 mm: 0.0472. */
export function secondaryLeadTransmission(kvp: number, leadMm: number): number {
  return tableTransmission(archerLeadSecondary, kvp, leadMm);
}

/**
 * The transmission used for scatter: the larger of the primary and the secondary fit, 0 to 1.
 * kVp is clamped to 50–150, lead to 0–3 mm; callers say so (`isOutsideLeadRange`).
 *
 * Known value: 80 kVp, 0.5 mm: 0.013703.
 */
export function leadTransmission(kvp: number, leadMm: number): number {
  const usedKvp = clamp(kvp, minLeadKvp, maxLeadKvp);
  const usedMm = clamp(leadMm, 0, maxLeadMm);
  return Math.min(
    1,
    Math.max(primaryLeadTransmission(usedKvp, usedMm), secondaryLeadTransmission(usedKvp, usedMm)),
  );
}

/** Whether `leadTransmission` had to clamp. (40, 0.5) → true. */
export function isOutsideLeadRange(kvp: number, leadMm: number): boolean {
  return kvp < minLeadKvp || kvp > maxLeadKvp || leadMm < 0 || leadMm > maxLeadMm;
}
