import type { EffectiveDoseFormulaId } from './effective-dose';
import type { PositionPreset } from './room-positions';
import type { ScatterModelId } from './scatter-air-kerma';

/** One irradiation event (or one total) as the estimate sees it. Absent is null. */
export type ExposureEvent = {
  type:
    | 'fluoroscopy'
    | 'stationary-acquisition'
    | 'stepping-acquisition'
    | 'rotational-acquisition'
    // Reports hold other types too; they count as acquisitions.
    | (string & {})
    | null;
  plane: 'single' | 'A' | 'B' | 'all' | null;
  kvp: number | null;
  kermaAreaProductGyCm2: number | null;
  copperMm: number | null;
  primaryAngleDeg: number | null;
  secondaryAngleDeg: number | null;
  primaryEndAngleDeg: number | null;
  secondaryEndAngleDeg: number | null;
  /** True over displayed; null = no factor for this equipment, plane and date. */
  kapCalibrationFactor: number | null;
};

/** Where someone stood, in room coordinates (see room-positions). */
export type Place = {
  preset: PositionPreset | null;
  xM: number;
  yM: number;
  isBehindBarrier: boolean;
  /** Says whether a preset was moved; left out: told from the coordinates. */
  isAdjusted?: boolean;
};

export type WornGarment = {
  answer: 'worn';
  frontLeadMm: number;
  backLeadMm: number | null;
  isMeasured: boolean;
  isLeadFree: boolean;
  defectAreaFraction: number;
};

/** A inspected in date, B overdue, C unknown, D failed. */
export type EvidenceGrade = 'A' | 'B' | 'C' | 'D';

export type ExposedPerson = {
  statureM: number | null;
  fluoroscopyPlace: Place;
  acquisitionPlace: Place;
  isTurnedAway: boolean;
  garment: WornGarment | { answer: 'none' } | { answer: 'unknown' };
  hasThyroidCollar: boolean | null;
  hasGlasses: boolean;
  hasCeilingScreen: boolean;
  hasTableSkirt: boolean;
  hasMobileScreen: boolean;
  isPresentDuringRotation: boolean;
  evidenceGrade: EvidenceGrade;
};

export type TubePosition = 'under-table' | 'over-table';
export type AccessSide = 'right' | 'left';

export type PatientPosition = {
  isFeetFirst: boolean;
  isProne: boolean;
  /** True where nobody recorded it and head first, supine was taken. */
  isAssumed?: boolean;
};

export type ExposureContext = {
  tubePosition: TubePosition;
  patientPosition: PatientPosition;
  /** The patient's side the operators stood on; null or left out = not recorded. */
  accessSide?: AccessSide | null;
  /** Median kVp of the procedure type, taken where an event has none. */
  typicalKvp: number | null;
  scatterModel?: ScatterModelId;
  effectiveDoseFormula?: EffectiveDoseFormulaId;
};

/** A deterministic value and its interval of about 95 %. */
export type Estimated = { nominal: number; low: number; high: number };

export const estimatedQuantities = [
  'collarAirKermaUGy',
  'eyeAirKermaUGy',
  'waistAirKermaUGy',
  'chestAirKermaUGy',
  'lowerLegAirKermaUGy',
  'collarHp10USv',
  'eyeHp3USv',
  'lowerLegHp007USv',
  'underGarmentHp10USv',
  'effectiveDoseUSv',
] as const;

/**
 * Air kerma: unshielded, free in air. Hp(10) at the collar, Hp(3) and Hp(0.07) of the leg: behind
 * the room's screens (and glasses), over the garment. Under the garment: behind everything.
 */
export type EstimatedQuantity = (typeof estimatedQuantities)[number];

export type Note = { code: string; detail: string };
export type Contribution = { input: string; share: number };

/** Factor on the nominal value when one input stands at its low and at its high end. */
export type InputSpread = { input: string; low: number; high: number };

export type StaffExposureEstimate = Record<EstimatedQuantity, Estimated | null> & {
  method: string;
  methodVersion: string;
  scatterModel: { id: ScatterModelId; version: string };
  effectiveDoseFormula: EffectiveDoseFormulaId | 'unprotected';
  byPart: Record<'fluoroscopy' | 'acquisition', Record<EstimatedQuantity, number | null>>;
  /** Shares of the interval of Hp(10) at the collar, largest first. */
  contributions: Contribution[];
  /** What each input does to each quantity; what month sums and rankings are made from. */
  spreads: Partial<Record<EstimatedQuantity, InputSpread[]>>;
  /** Why a value is null. */
  gaps: Note[];
  warnings: Note[];
};
