/** `merge`: a whole procedure into another. `split`: reports into a new one. `move`: reports into a known one. */
export const regroupingKinds = ['merge', 'split', 'move'] as const;
export type RegroupingKind = (typeof regroupingKinds)[number];
