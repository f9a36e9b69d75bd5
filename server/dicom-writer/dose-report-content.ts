/**
 * What the writer puts into an X-Ray Radiation Dose SR (PS3.16 TID 10001). Names and units follow the report
 * contract: Gy, Gy·cm², s, mm, mA, mA·s, deg, kV. Everything optional may be left out or null: it is then not
 * written.
 */

/** A number in the unit of the field's name, or the exact decimal string and UCUM code to write. */
export type Quantity = number | { text: string; unit: string };
type Maybe<T> = T | null;

/** Code value, coding scheme designator, code meaning. */
export interface WrittenCode {
  value: string;
  scheme: string;
  meaning: string;
}

export type WrittenPlane = 'single' | 'A' | 'B' | 'all';
export type WrittenEventType =
  'fluoroscopy' | 'stationary-acquisition' | 'stepping-acquisition' | 'rotational-acquisition';
export type WrittenReferencePoint =
  | 'isocenter-15-cm-toward-source'
  | 'image-input-surface-30-cm-in-front'
  | 'tabletop-1-cm-above'
  | 'detector-plane';

export interface WrittenFilter {
  type: 'flat' | 'wedge' | 'strip' | 'butterfly' | 'none';
  material?: Maybe<'Cu' | 'Al' | 'Mo' | 'Rh' | 'Ag' | 'Sn' | 'Pb' | 'Ta' | 'Nb' | 'Eu'>;
  minThicknessMm?: Maybe<Quantity>;
  maxThicknessMm?: Maybe<Quantity>;
}

export interface WrittenPerson {
  /** As a DICOM person name: family^given^middle^prefix^suffix. */
  name: string;
  /** Role in procedure (CID 7453 and others), for example 113851 Irradiation Administering. */
  role: WrittenCode;
  id?: Maybe<string>;
  organization?: Maybe<string>;
}

export interface WrittenCalibration {
  /** ISO 8601 local time. */
  calibratedAt: string;
  factor: Quantity;
  uncertaintyPercent: Quantity;
  responsibleParty: string;
}

export interface WrittenEvent {
  irradiationEventUid: string;
  plane?: Maybe<WrittenPlane>;
  type: WrittenEventType | WrittenCode;
  /** ISO 8601 local time, with an offset only if the file is to carry one. */
  startedAt: string;
  protocol?: Maybe<string>;
  label?: Maybe<string>;
  comment?: Maybe<string>;
  anatomy?: Maybe<WrittenCode>;
  laterality?: Maybe<WrittenCode>;
  targetRegion?: Maybe<WrittenCode>;
  patientTableRelationship?: Maybe<'headfirst' | 'feet-first'>;
  patientOrientationModifier?: Maybe<'supine' | 'prone'>;
  kermaAreaProductGyCm2?: Maybe<Quantity>;
  referenceAirKermaGy?: Maybe<Quantity>;
  referencePointDefinition?: Maybe<WrittenReferencePoint | string>;
  patientEquivalentThicknessMm?: Maybe<Quantity>;
  fluoroMode?: Maybe<'continuous' | 'pulsed'>;
  pulseRatePerS?: Maybe<Quantity>;
  pulseCount?: Maybe<Quantity>;
  pulseWidthValuesMs?: Quantity[];
  irradiationDurationS?: Maybe<Quantity>;
  kvpValues?: Quantity[];
  tubeCurrentValuesMa?: Quantity[];
  averageTubeCurrentMa?: Maybe<Quantity>;
  /** Beam-on time; the file carries it in ms. */
  exposureTimeS?: Maybe<Quantity>;
  /** Tube charge; the file carries it in uA.s. */
  exposureValuesMas?: Quantity[];
  focalSpotSizeMm?: Maybe<Quantity>;
  filters?: WrittenFilter[];
  /** At the detector; the file carries it in m2. */
  fieldAreaCm2?: Maybe<Quantity>;
  fieldHeightMm?: Maybe<Quantity>;
  fieldWidthMm?: Maybe<Quantity>;
  exposureIndex?: Maybe<Quantity>;
  targetExposureIndex?: Maybe<Quantity>;
  deviationIndex?: Maybe<Quantity>;
  primaryAngleDeg?: Maybe<Quantity>;
  secondaryAngleDeg?: Maybe<Quantity>;
  primaryEndAngleDeg?: Maybe<Quantity>;
  secondaryEndAngleDeg?: Maybe<Quantity>;
  columnAngulationDeg?: Maybe<Quantity>;
  tableHeadTiltDeg?: Maybe<Quantity>;
  tableHorizontalRotationDeg?: Maybe<Quantity>;
  tableCradleTiltDeg?: Maybe<Quantity>;
  sourceToIsocenterMm?: Maybe<Quantity>;
  sourceToReferencePointMm?: Maybe<Quantity>;
  sourceToDetectorMm?: Maybe<Quantity>;
  sourceToTableMm?: Maybe<Quantity>;
  tableLongitudinalMm?: Maybe<Quantity>;
  tableLateralMm?: Maybe<Quantity>;
  tableHeightMm?: Maybe<Quantity>;
  tableLongitudinalEndMm?: Maybe<Quantity>;
  tableLateralEndMm?: Maybe<Quantity>;
  tableHeightEndMm?: Maybe<Quantity>;
}

/** The accumulated values of one plane (TID 10002 with 10004 or 10007). */
export interface WrittenPlaneTotals {
  plane: Maybe<WrittenPlane>;
  kermaAreaProductGyCm2?: Maybe<Quantity>;
  referenceAirKermaGy?: Maybe<Quantity>;
  fluoroscopyKermaAreaProductGyCm2?: Maybe<Quantity>;
  fluoroscopyReferenceAirKermaGy?: Maybe<Quantity>;
  fluoroscopyTimeS?: Maybe<Quantity>;
  acquisitionKermaAreaProductGyCm2?: Maybe<Quantity>;
  acquisitionReferenceAirKermaGy?: Maybe<Quantity>;
  acquisitionTimeS?: Maybe<Quantity>;
  sourceToReferencePointMm?: Maybe<Quantity>;
  frameCount?: Maybe<Quantity>;
  referencePointDefinition?: Maybe<WrittenReferencePoint | string>;
  calibrations?: WrittenCalibration[];
}

export interface DoseReportContent {
  sopInstanceUid: string;
  studyInstanceUid: string;
  seriesInstanceUid: string;
  /** Default X-Ray Radiation Dose SR Storage. */
  sopClassUid?: string;
  seriesNumber?: number;
  instanceNumber?: number;
  /** ISO 8601 local times without offset. */
  studyAt: string;
  contentAt: string;
  /** Timezone Offset From UTC (0008,0201), for example "+0100". */
  timezoneOffset?: Maybe<string>;
  accessionNumber?: Maybe<string>;
  studyId?: Maybe<string>;
  studyDescription?: Maybe<string>;
  completionFlag?: 'COMPLETE' | 'PARTIAL';
  patient: {
    name: string;
    id: string;
    /** ISO date. */
    birthDate?: Maybe<string>;
    sex?: Maybe<'M' | 'F' | 'O'>;
    heightM?: Maybe<number>;
    weightKg?: Maybe<number>;
  };
  equipment: {
    manufacturer?: Maybe<string>;
    modelName?: Maybe<string>;
    serialNumber?: Maybe<string>;
    stationName?: Maybe<string>;
    institutionName?: Maybe<string>;
    softwareVersion?: Maybe<string>;
    /** UID of the irradiating device as observer. */
    deviceUid: string;
  };
  /** True leaves maker, model, serial out of the header: only the tree names them. */
  isEquipmentOnlyInTree?: boolean;
  /** Default: Combined Diagnostic and Therapeutic Procedure. */
  intent?: WrittenCode;
  acquisitionDeviceType?: Maybe<'fluoroscopy-guided' | 'integrated' | 'cassette'>;
  scope?: {
    kind: 'study' | 'series' | 'performed-procedure-step' | 'procedure-step-to-this-point';
    uid: string;
  };
  /** Default: Automated Data Collection. */
  sourcesOfInformation?: ('automated' | 'mpps' | 'manual' | 'dosimeter' | 'calculated')[];
  /** SNOMED-CT codes (default), or the older SNOMED-RT ones. */
  terminology?: 'SCT' | 'SRT';
  planes: WrittenPlaneTotals[];
  events: WrittenEvent[];
  persons?: WrittenPerson[];
  comment?: Maybe<string>;
  /** SOP Class and Instance UIDs of reports this one replaces, all of the same study and series. */
  predecessors?: { sopClassUid: string; sopInstanceUid: string }[];
}
