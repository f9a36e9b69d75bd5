/**
 * Mass attenuation coefficients μ/ρ of lead, cm²/g, by photon energy in keV. An absorption edge has
 * two rows of the same energy: below it, then above it.
 *
 * Source: NIST, Tables of X-Ray Mass Attenuation Coefficients (Hubbell and Seltzer, NISTIR 5632).
 * The upper sides of the edges are from memory, confirmed against xraylib.
 */
export const leadMassAttenuation: readonly (readonly [energyKeV: number, cm2PerG: number])[] = [
  [10, 130.6],
  [13.0352, 67.01],
  [13.0352, 162.1],
  [15, 111.6],
  [15.2, 107.8],
  [15.2, 148.5],
  [15.53, 141.6],
  [15.8608, 134.4],
  [15.8608, 154.8],
  [20, 86.36],
  [30, 30.32],
  [40, 14.36],
  [50, 8.041],
  [60, 5.021],
  [80, 2.419],
  [88.0045, 1.91],
  [88.0045, 7.683],
  [100, 5.549],
  [150, 2.014],
];

/** Density of lead, g/cm³. */
export const leadDensityGPerCm3 = 11.35;
