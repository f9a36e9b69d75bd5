import { clamp } from './clamp';

/**
 * Scattered air kerma 1 m from the patient per kerma-area product, Williams' fit:
 * S = (aθ⁴ + bθ³ + cθ² + dθ + e)·((kV − 85)·f + 1), in µGy/(Gy·cm²).
 *
 * θ in degrees from the beam's forward direction (180 = back towards the tube), 30 to 165;
 * kV peak, 50 to 125 (range of the fit: from memory). Values outside are computed as given:
 * callers clamp and say so.
 *
 * Source: J. R. Williams, Br J Radiol 69 (1996) 1032–1037, taken up by the British Institute of
 * Radiology's shielding report (Sutton et al., 2nd edition 2012, KAP method).
 *
 * Known value: 85 kV, 90°: 3.79. Its largest value at 85 kV is 9.99, at 161°.
 */
export function williamsScatterUGyPerGyCm2(thetaDeg: number, kvp: number): number {
  const angular =
    (((-1.042e-7 * thetaDeg + 3.265e-5) * thetaDeg - 2.751e-3) * thetaDeg + 8.371e-2) * thetaDeg + 1.578;
  return angular * ((kvp - 85) * 5.987e-3 + 1);
}

/**
 * Scatter fraction a₁ of NCRP 147 per cm² of field at 1 m, times 1e6:
 * a₁ = 0.016·(kV − 125) + 8.434 − 0.1105θ + 9.828e-4θ² − 1.741e-6θ³.
 * As KAP = kerma × field, a₁ is numerically µGy/(Gy·cm²).
 *
 * θ in degrees from the forward direction, 30 to 180; above about 50 kV. The curve is the mean plus
 * one standard deviation of the measurements of Trout and Kelley (1972).
 *
 * Source: Simpkin and Dixon, Health Phys 74 (1998) 350; NCRP 145 eq. F.12; NCRP 147 appendix C.1.
 *
 * Known value: 125 kV, 90°: 5.18.
 */
export function ncrpScatterUGyPerGyCm2(thetaDeg: number, kvp: number): number {
  return 1.6e-2 * (kvp - 125) + 8.434 + thetaDeg * (-1.105e-1 + thetaDeg * (9.828e-4 - 1.741e-6 * thetaDeg));
}

export const scatterModels = {
  'williams-bir': {
    version: '1996',
    name: 'Williams 1996, British Institute of Radiology',
    source: 'Br J Radiol 69:1032–1037',
    scatterUGyPerGyCm2: williamsScatterUGyPerGyCm2,
    minKvp: 50,
    maxKvp: 125,
  },
  'ncrp-scatter-fraction': {
    version: '2004',
    name: 'NCRP scatter fraction (mean plus one standard deviation)',
    source: 'NCRP 147 appendix C.1; Health Phys 74:350',
    scatterUGyPerGyCm2: ncrpScatterUGyPerGyCm2,
    minKvp: 50,
    maxKvp: 150,
  },
} as const;

export type ScatterModelId = keyof typeof scatterModels;
export const defaultScatterModel: ScatterModelId = 'williams-bir';

/** Angles both models are used at; nearer to the beam's axis neither was measured (our choice). */
export const minScatterAngleDeg = 30;
export const maxScatterAngleDeg = 165;

/**
 * Scattered air kerma per KAP at 1 m in µGy/(Gy·cm²) by a named model, angle and kVp clamped to the
 * model's range; `isClamped` says that this happened.
 *
 * Known value: 'williams-bir', 90°, 80 kV: 3.6805.
 */
export function scatterPerKap(model: ScatterModelId, thetaDeg: number, kvp: number) {
  const { scatterUGyPerGyCm2, minKvp, maxKvp } = scatterModels[model];
  const usedThetaDeg = clamp(thetaDeg, minScatterAngleDeg, maxScatterAngleDeg);
  const usedKvp = clamp(kvp, minKvp, maxKvp);
  return {
    scatterPerKapUGyPerGyCm2: scatterUGyPerGyCm2(usedThetaDeg, usedKvp),
    isClamped: usedThetaDeg !== thetaDeg || usedKvp !== kvp,
  };
}
