/** Fit of broad-beam transmission through lead: α and β in 1/mm, γ without unit. */
export type ArcherFit = { alphaPerMm: number; betaPerMm: number; gamma: number };
export type ArcherRow = ArcherFit & { kvp: number };

const rows = (values: [number, number, number, number][]): ArcherRow[] =>
  values.map(([kvp, alphaPerMm, betaPerMm, gamma]) => ({ kvp, alphaPerMm, betaPerMm, gamma }));

/** NCRP 147 table A.1 (Simpkin 1995): primary beam, tungsten anode, three-phase. */
export const archerLeadPrimary = rows([
  [50, 8.801, 27.28, 0.2957],
  [55, 7.839, 25.92, 0.3499],
  [60, 6.951, 24.89, 0.4198],
  [65, 6.13, 24.09, 0.5019],
  [70, 5.369, 23.49, 0.5881],
  [75, 4.666, 22.69, 0.6618],
  [80, 4.04, 21.69, 0.7187],
  [85, 3.504, 20.37, 0.755],
  [90, 3.067, 18.83, 0.7726],
  [95, 2.731, 17.07, 0.7714],
  [100, 2.5, 15.28, 0.7557],
  [105, 2.364, 13.41, 0.7239],
  [110, 2.296, 11.7, 0.6827],
  [115, 2.265, 10.21, 0.6363],
  [120, 2.246, 8.95, 0.5873],
  [125, 2.219, 7.923, 0.5386],
  [130, 2.17, 7.094, 0.4909],
  [135, 2.102, 6.45, 0.4469],
  [140, 2.009, 5.916, 0.4018],
  [145, 1.895, 5.498, 0.358],
  [150, 1.757, 5.177, 0.3156],
]);

/** NCRP 147 table C.1: secondary radiation (scatter at 90° and leakage). */
export const archerLeadSecondary = rows([
  [50, 8.801, 27.28, 0.2957],
  [70, 5.369, 23.49, 0.5883],
  [100, 2.507, 15.33, 0.9124],
  [125, 2.233, 7.888, 0.7295],
  [150, 1.791, 5.478, 0.5678],
]);

/**
 * NCRP 147 tables B.1 (primary) and C.1 (secondary): whole workloads instead of one kVp. The chest
 * bucky's fit is from memory; it gives the report's own example.
 */
export const archerLeadWorkloads = {
  primary: {
    chestBucky: { alphaPerMm: 2.264, betaPerMm: 13.08, gamma: 0.56 },
    fluoroscopyTube: { alphaPerMm: 2.347, betaPerMm: 12.67, gamma: 0.6149 },
    cardiacAngiography: { alphaPerMm: 2.389, betaPerMm: 14.26, gamma: 0.5948 },
    peripheralAngiography: { alphaPerMm: 2.728, betaPerMm: 18.52, gamma: 0.4614 },
  },
  secondary: {
    fluoroscopyTube: { alphaPerMm: 2.322, betaPerMm: 12.91, gamma: 0.7575 },
    cardiacAngiography: { alphaPerMm: 2.354, betaPerMm: 14.94, gamma: 0.7481 },
    peripheralAngiography: { alphaPerMm: 2.661, betaPerMm: 19.54, gamma: 0.5094 },
  },
} as const satisfies Record<string, Record<string, ArcherFit>>;
