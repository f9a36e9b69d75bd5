import { z } from 'zod';

import {
  codeSchema,
  deviceParticipantSchema,
  furtherItemSchema,
  imageReferenceSchema,
  measured,
  optionalText as text,
  personParticipantSchema,
  planeSchema,
  preciseValues,
  qualifiers,
  referencePointSchema,
  reported,
} from './report-parts';

const measuredList = z.array(z.number());

export const eventTypes = [
  'fluoroscopy',
  'stationary-acquisition',
  'stepping-acquisition',
  'rotational-acquisition',
] as const;
export type EventType = (typeof eventTypes)[number];

export const filterTypes = ['flat', 'wedge', 'strip', 'butterfly', 'none'] as const;

export const printedFilterSchema = z.object({
  type: z.enum(filterTypes).nullable(),
  /** Chemical symbol of the element. */
  material: text,
  minThicknessMm: measured,
  maxThicknessMm: measured,
});

export const reportFilterSchema = printedFilterSchema.extend({
  typeCode: codeSchema.nullable(),
  materialCode: codeSchema.nullable(),
});
export type ReportFilter = z.infer<typeof reportFilterSchema>;

/** TID 4007: a contrast agent by code, by name, or both. */
export const contrastAgentSchema = z.object({ code: codeSchema.nullable(), text });
export type ContrastAgent = z.infer<typeof contrastAgentSchema>;

export const printedEventSchema = z.object({
  irradiationEventUid: text,
  plane: planeSchema.nullable(),
  type: z.enum(eventTypes).nullable(),
  startedAt: text,
  protocol: text,
  kvpValues: measuredList,
  kvpMean: measured,
  tubeCurrentMa: measured,
  pulseWidthMs: measured,
  pulseCount: measured,
  pulseRatePerS: measured,
  exposureTimeS: measured,
  irradiationDurationS: measured,
  kermaAreaProductGyCm2: measured,
  referenceAirKermaGy: measured,
  primaryAngleDeg: measured,
  secondaryAngleDeg: measured,
  primaryEndAngleDeg: measured,
  secondaryEndAngleDeg: measured,
  sourceToDetectorMm: measured,
  sourceToIsocenterMm: measured,
  /** At the detector. */
  fieldAreaCm2: measured,
  filters: z.array(printedFilterSchema),
});

/** One irradiation event of one plane (TID 10003 with A, B, C). */
export const reportEventSchema = printedEventSchema.extend({
  filters: z.array(reportFilterSchema),
  planeCode: codeSchema.nullable(),
  typeCode: codeSchema.nullable(),
  /** "+01:00" where the file gives one. */
  utcOffset: text,
  label: text,
  /** What the label is: series, acquisition or instance number (CID 10022). */
  labelType: codeSchema.nullable(),
  comment: text,
  anatomy: codeSchema.nullable(),
  laterality: codeSchema.nullable(),
  targetRegion: codeSchema.nullable(),
  imageView: codeSchema.nullable(),
  imageViewModifiers: z.array(codeSchema),
  projectionName: codeSchema.nullable(),
  patientTableRelationship: codeSchema.nullable(),
  patientOrientation: codeSchema.nullable(),
  patientOrientationModifier: codeSchema.nullable(),
  fluoroMode: z.enum(['continuous', 'pulsed']).nullable(),
  fluoroModeCode: codeSchema.nullable(),
  /** How the number of pulses was found: measured, calculated, estimated. */
  pulseCountDerivation: codeSchema.nullable(),
  contrastAgents: z.array(contrastAgentSchema),
  acquiredImages: z.array(imageReferenceSchema),
  referencePointDefinition: referencePointSchema.nullable(),
  tubeCurrentValuesMa: measuredList,
  averageTubeCurrentMa: measured,
  pulseWidthValuesMs: measuredList,
  exposureValuesMas: measuredList,
  focalSpotSizeMm: measured,
  anodeMaterial: codeSchema.nullable(),
  grids: z.array(codeSchema),
  fieldHeightMm: measured,
  fieldWidthMm: measured,
  halfValueLayerMm: measured,
  patientEquivalentThicknessMm: measured,
  entranceExposureGy: measured,
  compressionThicknessMm: measured,
  exposureIndex: measured,
  targetExposureIndex: measured,
  deviationIndex: measured,
  columnAngulationDeg: measured,
  mechanicalConfiguration: codeSchema.nullable(),
  tableHeadTiltDeg: measured,
  tableHorizontalRotationDeg: measured,
  tableCradleTiltDeg: measured,
  sourceToReferencePointMm: measured,
  sourceToTableMm: measured,
  tableLongitudinalMm: measured,
  tableLateralMm: measured,
  tableHeightMm: measured,
  tableLongitudinalEndMm: measured,
  tableLateralEndMm: measured,
  tableHeightEndMm: measured,
  /** Table in the isocentre's coordinates (CID 10008 since 2019). */
  tableXToIsocenterMm: measured,
  tableYToIsocenterMm: measured,
  tableZToIsocenterMm: measured,
  tableXToIsocenterEndMm: measured,
  tableYToIsocenterEndMm: measured,
  tableZToIsocenterEndMm: measured,
  isocenterPrimaryAngleDeg: measured,
  isocenterSecondaryAngleDeg: measured,
  isocenterDetectorRotationDeg: measured,
  isocenterPrimaryEndAngleDeg: measured,
  isocenterSecondaryEndAngleDeg: measured,
  isocenterDetectorRotationEndDeg: measured,
  persons: z.array(personParticipantSchema),
  devices: z.array(deviceParticipantSchema),
  reported,
  qualifiers,
  preciseValues,
  furtherItems: z.array(furtherItemSchema),
});
export type ReportEvent = z.infer<typeof reportEventSchema>;
