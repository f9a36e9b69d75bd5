import type { ErrorClassSum } from './accumulate-air-kerma';
import type { EstimateInput } from './estimate-inputs';
import type { Screen } from './screen-factors';
import type { Spread } from './spread';

/** How the trunk is protected, which decides the under-garment value and the effective dose. */
export type Protection = 'garment' | 'unprotected' | 'not-estimable';

/** Everything about one person's exposure that is left once the events are summed. */
export type ExposureModel = {
  /** Unshielded air kerma apart by body point and error class. */
  sums: readonly ErrorClassSum[];
  statureM: number;
  screens: readonly Screen[];
  protection: Protection;
  defectAreaFraction: number;
  effectiveDoseWeights: { underGarment: number; collar: number };
  /** Inputs with one spread for everything they touch; left out = exact. */
  spreads: Partial<Record<EstimateInput, Spread>>;
  /** The position's spread, fluoroscopy and acquisition. */
  positionSpreads: readonly [Spread, Spread];
  /** What an unknown kVp does to the garment's transmission. */
  kvpTransmissionSpread: Spread;
};
