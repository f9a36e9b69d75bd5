import type {
  Maybe,
  Quantity,
  WrittenCalibration,
  WrittenCode,
  WrittenImage,
  WrittenPerson,
  WrittenPersonObserver,
} from './written-parts';

/**
 * What the writer puts into an X-Ray Radiation Dose SR (PS3.16 TID 10001). Names and units follow the report
 * contract: Gy, Gy·cm², s, mm, mA, mA·s, deg, kV. Everything optional may be left out or null: it is then not
 * written.
 */

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

export interface WrittenEvent {
  irradiationEventUid: string;
  plane?: Maybe<WrittenPlane>;
  type: WrittenEventType | WrittenCode;
  /** ISO 8601 local time, with an offset only if the file is to carry one. */
  startedAt: string;
  protocol?: Maybe<string>;
  label?: Maybe<string>;
  labelType?: Maybe<WrittenCode>;
  comment?: Maybe<string>;
  anatomy?: Maybe<WrittenCode>;
  laterality?: Maybe<WrittenCode>;
  targetRegion?: Maybe<WrittenCode>;
  imageView?: Maybe<WrittenCode>;
  imageViewModifiers?: WrittenCode[];
  projectionName?: Maybe<WrittenCode>;
  contrastAgents?: (WrittenCode | string)[];
  acquiredImages?: WrittenImage[];
  halfValueLayerMm?: Maybe<Quantity>;
  entranceExposureGy?: Maybe<Quantity>;
  compressionThicknessMm?: Maybe<Quantity>;
  anodeMaterial?: Maybe<WrittenCode>;
  grids?: WrittenCode[];
  mechanicalConfiguration?: Maybe<WrittenCode>;
  persons?: WrittenPerson[];
  patientTableRelationship?: Maybe<'headfirst' | 'feet-first'>;
  patientOrientationModifier?: Maybe<'supine' | 'prone'>;
  kermaAreaProductGyCm2?: Maybe<Quantity>;
  referenceAirKermaGy?: Maybe<Quantity>;
  referencePointDefinition?: Maybe<WrittenReferencePoint | string>;
  patientEquivalentThicknessMm?: Maybe<Quantity>;
  fluoroMode?: Maybe<'continuous' | 'pulsed' | WrittenCode>;
  pulseRatePerS?: Maybe<Quantity>;
  pulseCount?: Maybe<Quantity>;
  pulseCountDerivation?: Maybe<WrittenCode>;
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
  tableXToIsocenterMm?: Maybe<Quantity>;
  tableYToIsocenterMm?: Maybe<Quantity>;
  tableZToIsocenterMm?: Maybe<Quantity>;
  tableXToIsocenterEndMm?: Maybe<Quantity>;
  tableYToIsocenterEndMm?: Maybe<Quantity>;
  tableZToIsocenterEndMm?: Maybe<Quantity>;
  isocenterPrimaryAngleDeg?: Maybe<Quantity>;
  isocenterSecondaryAngleDeg?: Maybe<Quantity>;
  isocenterDetectorRotationDeg?: Maybe<Quantity>;
  isocenterPrimaryEndAngleDeg?: Maybe<Quantity>;
  isocenterSecondaryEndAngleDeg?: Maybe<Quantity>;
  isocenterDetectorRotationEndDeg?: Maybe<Quantity>;
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
  detectorType?: Maybe<WrittenCode>;
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
    /** As VR AS: "064Y". */
    age?: Maybe<string>;
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
    departmentName?: Maybe<string>;
    /** Where the device stood, and its roles as observer (CID 7445). */
    location?: Maybe<string>;
    roles?: WrittenCode[];
  };
  /** True leaves maker, model, serial out of the header: only the tree names them. */
  isEquipmentOnlyInTree?: boolean;
  /** Default: Combined Diagnostic and Therapeutic Procedure. */
  intent?: WrittenCode;
  acquisitionDeviceType?: Maybe<'fluoroscopy-guided' | 'integrated' | 'cassette'>;
  scope?: {
    kind:
      'study' | 'series' | 'performed-procedure-step' | 'procedure-step-to-this-point' | 'irradiation-event';
    uid: string;
  };
  /** Default: Automated Data Collection. */
  sourcesOfInformation?: ('automated' | 'mpps' | 'manual' | 'dosimeter' | 'calculated')[];
  /** SNOMED-CT codes (default), or the older SNOMED-RT ones. */
  terminology?: 'SCT' | 'SRT';
  planes: WrittenPlaneTotals[];
  events: WrittenEvent[];
  persons?: WrittenPerson[];
  personObservers?: WrittenPersonObserver[];
  comment?: Maybe<string>;
  language?: Maybe<WrittenCode>;
  country?: Maybe<WrittenCode>;
  doseImages?: WrittenImage[];
  /** What the machine could state (TID 10001, CID 230); default yes. */
  availability?: { detector?: 'yes' | 'no'; source?: 'yes' | 'no'; mechanical?: 'yes' | 'no' };
  procedureCodes?: WrittenCode[];
  requests?: {
    accessionNumber: string;
    requestedProcedureId: string;
    requestedProcedureDescription: string;
  }[];
  /** SOP Class and Instance UIDs of reports this one replaces, all of the same study and series. */
  predecessors?: { sopClassUid: string; sopInstanceUid: string }[];
}
