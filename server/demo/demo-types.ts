import type { GarmentKind } from '../../shared/contract/garment';
import type { Job } from '../../shared/contract/person';
import type { Duty, PositionPreset } from '../../shared/contract/record';

/** Codes of the invented hospital's rooms. */
export type DemoRoomCode = 'NR1' | 'IR1' | 'IR2' | 'CL1';

export interface DemoProcedureType {
  key: string;
  name: string;
  room: DemoRoomCode;
  bodyRegion: 'head' | 'chest' | 'abdomen' | 'pelvis' | 'extremity';
  accessSide: 'right' | 'left' | 'head';
  operatorPosition: PositionPreset;
  proceduresPerYear: number;
  fluoroscopyTimeMin: DemoQuartiles;
  referenceAirKermaMGy: DemoQuartiles;
  kermaAreaProductGyCm2: DemoQuartiles;
  /** KAP-weighted mean tube voltage of a typical procedure. */
  typicalKvp: number;
}

/** Median and third quartile of a type's distribution. */
export interface DemoQuartiles {
  median: number;
  p75: number;
}

export interface DemoEquipment {
  key: string;
  room: DemoRoomCode;
  manufacturer: string;
  modelName: string;
  serialNumber: string;
  stationName: string;
  isBiplane: boolean;
  sourceToIsocenterMm: number;
  /** First and last month of use, 1 to 24; null: since before, or to this day. */
  fromMonth: number | null;
  toMonth: number | null;
}

export interface DemoCalibrationFactor {
  equipmentKey: string;
  plane: DemoPlane;
  quantity: 'reference-air-kerma' | 'kerma-area-product';
  /** True value ÷ displayed value. */
  factor: number;
  fromMonth: number;
  note: string;
}

export interface DemoStaffMember {
  /** A role code; the demo has no invented names. */
  code: string;
  job: Job;
  statureM: number;
  isMonitored: boolean;
}

export interface DemoGarment {
  code: string;
  kind: GarmentKind;
  material: 'lead' | 'lead-composite' | 'lead-free';
  frontLeadMm: number;
  backLeadMm: number | null;
  leadKvp: number;
  isMeasured: boolean;
  /** Null: belongs to the room or the pool. */
  ownerCode: string | null;
  state: 'in-service' | 'withdrawn' | 'discarded' | 'lost';
  /** Days before the anchor. */
  lastInspectedDaysAgo: number;
  /** Days after the anchor; negative is overdue. Null once it left service. */
  nextDueInDays: number | null;
  note: string | null;
}

export type DemoPlane = 'single' | 'A' | 'B';

export interface DemoFilter {
  type: 'flat' | 'wedge' | 'none';
  material: 'Cu' | 'Al' | null;
  minThicknessMm: number | null;
  maxThicknessMm: number | null;
}

export interface DemoIrradiationEvent {
  irradiationEventUid: string;
  plane: DemoPlane;
  type: 'fluoroscopy' | 'stationary-acquisition' | 'stepping-acquisition' | 'rotational-acquisition';
  /** Seconds after the procedure's first event. */
  offsetS: number;
  protocol: string;
  kvpValues: number[];
  tubeCurrentMa: number;
  pulseWidthMs: number;
  pulseCount: number;
  pulseRatePerS: number;
  exposureTimeS: number;
  irradiationDurationS: number;
  kermaAreaProductGyCm2: number;
  referenceAirKermaGy: number;
  primaryAngleDeg: number;
  secondaryAngleDeg: number;
  primaryEndAngleDeg: number | null;
  secondaryEndAngleDeg: number | null;
  sourceToDetectorMm: number;
  sourceToIsocenterMm: number;
  /** At the detector. */
  fieldAreaCm2: number;
  filters: DemoFilter[];
  tableLongitudinalMm: number;
  tableLateralMm: number;
  tableHeightMm: number;
}

export interface DemoPlaneTotals {
  plane: DemoPlane;
  kermaAreaProductGyCm2: number;
  referenceAirKermaGy: number;
  fluoroscopyTimeS: number;
  /** The split is null in a manual entry: the machine's screen shows totals only. */
  fluoroscopyKermaAreaProductGyCm2: number | null;
  fluoroscopyReferenceAirKermaGy: number | null;
  acquisitionKermaAreaProductGyCm2: number | null;
  acquisitionReferenceAirKermaGy: number | null;
  acquisitionTimeS: number | null;
}

export interface DemoPatient {
  id: string;
  name: string;
  birthDate: string;
  sex: 'F' | 'M';
  heightM: number | null;
  weightKg: number | null;
}

export interface DemoPresence {
  staffCode: string;
  duty: Duty;
  fluoroscopyPreset: PositionPreset;
  acquisitionPreset: PositionPreset;
  garmentCode: string | null;
  garmentAnswer: 'worn' | 'none' | 'unknown';
  hasThyroidCollar: boolean;
  hasGlasses: boolean;
  hasCeilingScreen: boolean;
  hasTableSkirt: boolean;
  hasMobileScreen: boolean;
}

/** What was planted on purpose; at most one in a procedure. */
export type DemoDefect =
  | 'missing-weight'
  | 'clock-offset'
  | 'manual-entry'
  | 'kap-unit-slip'
  | 'duplicate-report'
  | 'superseded-report'
  | 'kerma-not-reset'
  | 'split-study'
  | 'merged-patient'
  | 'combined-procedure'
  | 'no-report'
  | 'wrong-operator-corrected'
  | 'record-incomplete';

/** A procedure's place in the calendar and its people, before anything is irradiated. */
export interface DemoBooking {
  typeKey: string;
  /** 0-based within the type, in time order. */
  index: number;
  /** 1 to 24. */
  month: number;
  /** Hospital-local calendar day. */
  day: string;
  isOutOfHours: boolean;
  operatorCode: string;
  secondOperatorCode: string | null;
  traineeCode: string | null;
  patientNumber: number;
  bodyMassIndex: number;
}

/** Targets that the irradiation events of a procedure add up to. */
export interface DemoTotals {
  fluoroscopyTimeS: number;
  referenceAirKermaGy: number;
  kermaAreaProductGyCm2: number;
}

export interface DemoProcedure {
  /** 1 to 7,356 in order of start. */
  number: number;
  type: DemoProcedureType;
  room: DemoRoomCode;
  equipment: DemoEquipment;
  month: number;
  startedAt: Date;
  /** The hospital's own wall time, ISO 8601 without offset. */
  startedAtLocal: string;
  utcOffsetMin: number;
  /** What the machine's clock is ahead of the true time. */
  deviceClockAheadS: number;
  isOutOfHours: boolean;
  studyInstanceUid: string;
  accessionNumber: string;
  studyDescription: string;
  operatorCode: string;
  secondOperatorCode: string | null;
  traineeCode: string | null;
  patient: DemoPatient;
  planes: DemoPlaneTotals[];
  events: DemoIrradiationEvent[];
  staff: DemoPresence[];
  defect: DemoDefect | null;
}
