/**
 * Mean field area at the reference point, cm²: kerma-area product (Gy·cm²) over reference air kerma (Gy). Null where one
 * is missing or nothing was irradiated. 12.5 Gy·cm² at 0.125 Gy is 100 cm².
 */
export const meanFieldAreaCm2 = (
  kermaAreaProductGyCm2: number | null,
  referenceAirKermaGy: number | null,
): number | null =>
  kermaAreaProductGyCm2 === null || referenceAirKermaGy === null || referenceAirKermaGy === 0
    ? null
    : kermaAreaProductGyCm2 / referenceAirKermaGy;

/** Fields of real machines at the reference point; outside, one of the two figures likely has another unit. From practice. */
export const plausibleFieldAreaCm2 = { low: 4, high: 600 } as const;

/** Reference air kerma over fluoroscopy time beyond which one of them is likely wrong, mGy/min. From practice. */
export const plausibleKermaRateMgyPerMin = 600;
