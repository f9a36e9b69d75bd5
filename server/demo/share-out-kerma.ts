import type { DemoPlane } from './demo-types';

export interface KermaClaim {
  plane: DemoPlane;
  isAcquisition: boolean;
  /** Any positive number: K a,r is shared out in proportion. */
  kermaWeight: number;
  /** Relative field area at the reference point. */
  relativeFieldArea: number;
}

export interface KermaShare {
  referenceAirKermaGy: number;
  kermaAreaProductGyCm2: number;
}

const sum = (values: readonly number[]) => values.reduce((a, b) => a + b, 0);

/** Files carry about six significant digits. */
const roundFigure = (value: number): number => Number(value.toPrecision(6));

/** Splits a whole over groups by share; a group without members leaves its share to the others. */
function splitByShare<T>(
  members: readonly T[],
  groups: readonly (readonly [(member: T) => boolean, number])[],
) {
  const present = groups.filter(([belongs]) => members.some(belongs));
  const shareSum = sum(present.map(([, share]) => share));
  return present.map(([belongs, share]) => ({ belongs, share: share / shareSum }));
}

/**
 * Shares out a procedure's K a,r and P KA over its irradiation events: first over planes, then over
 * fluoroscopy and acquisition, then by weight. What comes out adds up to the totals but for rounding.
 */
export function shareOutKerma(
  claims: readonly KermaClaim[],
  totals: { referenceAirKermaGy: number; kermaAreaProductGyCm2: number },
  shares: { acquisition: number; lateral: number },
): KermaShare[] {
  const kermaGy = claims.map(() => 0);
  const planes = splitByShare(claims, [
    [(claim) => claim.plane !== 'B', 1 - shares.lateral],
    [(claim) => claim.plane === 'B', shares.lateral],
  ]);
  for (const plane of planes) {
    const inPlane = claims.filter(plane.belongs);
    const parts = splitByShare(inPlane, [
      [(claim) => claim.isAcquisition, shares.acquisition],
      [(claim) => !claim.isAcquisition, 1 - shares.acquisition],
    ]);
    for (const part of parts) {
      const isMember = (claim: KermaClaim) => plane.belongs(claim) && part.belongs(claim);
      const weightSum = sum(claims.filter(isMember).map((claim) => claim.kermaWeight));
      const partGy = totals.referenceAirKermaGy * plane.share * part.share;
      claims.forEach((claim, index) => {
        if (isMember(claim)) kermaGy[index] = (partGy * claim.kermaWeight) / weightSum;
      });
    }
  }
  const products = claims.map((claim, index) => (kermaGy[index] ?? 0) * claim.relativeFieldArea);
  const scale = totals.kermaAreaProductGyCm2 / sum(products);
  return claims.map((_, index) => ({
    referenceAirKermaGy: roundFigure(kermaGy[index] ?? 0),
    kermaAreaProductGyCm2: roundFigure((products[index] ?? 0) * scale),
  }));
}
