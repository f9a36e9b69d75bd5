import type { WrittenEvent, WrittenPlaneTotals } from './dose-report-content';
import type { Quantity } from './written-parts';

/** Where a quantity goes: concept, unit the standard fixes, and how much of the field's unit is one such unit. */
export interface QuantityPlace<Field> {
  field: Field;
  code: string;
  meaning: string;
  unit: string;
  perWrittenUnit: number;
}

type QuantityField<Holder> = {
  [Key in keyof Holder]-?: NonNullable<Holder[Key]> extends Quantity | Quantity[] ? Key : never;
}[keyof Holder];

function place<Field>(
  field: Field,
  code: string,
  meaning: string,
  unit: string,
  perWrittenUnit = 1,
): QuantityPlace<Field> {
  return { field, code, meaning, unit, perWrittenUnit };
}

/** TID 10003: the values that stand at the event itself. */
export const eventQuantities: QuantityPlace<QuantityField<WrittenEvent>>[] = [
  place('kermaAreaProductGyCm2', '122130', 'Dose Area Product', 'Gy.m2', 10_000),
  place('halfValueLayerMm', '111634', 'Half Value Layer', 'mm'),
  place('patientEquivalentThicknessMm', '111638', 'Patient Equivalent Thickness', 'mm'),
  place('entranceExposureGy', '111636', 'Entrance Exposure at RP', 'mGy', 0.001),
];

/** TID 10003A. */
export const detectorQuantities: QuantityPlace<QuantityField<WrittenEvent>>[] = [
  place('exposureIndex', '113845', 'Exposure Index', '1'),
  place('targetExposureIndex', '113846', 'Target Exposure Index', '1'),
  place('deviationIndex', '113847', 'Deviation Index', '1'),
];

/** TID 10003B rows 6 and 7, before the derivation of the number of pulses. */
export const pulseRate: QuantityPlace<QuantityField<WrittenEvent>>[] = [
  place('pulseRatePerS', '113791', 'Pulse Rate', '{pulse}/s'),
];

/** TID 10003B, in the order of the template. */
export const sourceQuantities: QuantityPlace<QuantityField<WrittenEvent>>[] = [
  place('pulseWidthValuesMs', '113793', 'Pulse Width', 'ms'),
  place('irradiationDurationS', '113742', 'Irradiation Duration', 's'),
  place('kvpValues', '113733', 'KVP', 'kV'),
  place('tubeCurrentValuesMa', '113734', 'X-Ray Tube Current', 'mA'),
  place('averageTubeCurrentMa', '113767', 'Average X-Ray Tube Current', 'mA'),
  place('exposureTimeS', '113824', 'Exposure Time', 'ms', 0.001),
  place('exposureValuesMas', '113736', 'Exposure', 'uA.s', 0.001),
  place('focalSpotSizeMm', '113766', 'Focal Spot Size', 'mm'),
];

export const fieldQuantities: QuantityPlace<QuantityField<WrittenEvent>>[] = [
  place('fieldAreaCm2', '113790', 'Collimated Field Area', 'm2', 10_000),
  place('fieldHeightMm', '113788', 'Collimated Field Height', 'mm'),
  place('fieldWidthMm', '113789', 'Collimated Field Width', 'mm'),
];

/** TID 10003C with CID 10008. */
export const mechanicalQuantities: QuantityPlace<QuantityField<WrittenEvent>>[] = [
  place('primaryAngleDeg', '112011', 'Positioner Primary Angle', 'deg'),
  place('secondaryAngleDeg', '112012', 'Positioner Secondary Angle', 'deg'),
  place('primaryEndAngleDeg', '113739', 'Positioner Primary End Angle', 'deg'),
  place('secondaryEndAngleDeg', '113740', 'Positioner Secondary End Angle', 'deg'),
  place('columnAngulationDeg', '113770', 'Column Angulation', 'deg'),
  place('tableHeadTiltDeg', '113754', 'Table Head Tilt Angle', 'deg'),
  place('tableHorizontalRotationDeg', '113755', 'Table Horizontal Rotation Angle', 'deg'),
  place('tableCradleTiltDeg', '113756', 'Table Cradle Tilt Angle', 'deg'),
  place('compressionThicknessMm', '111633', 'Compression Thickness', 'mm'),
  place('sourceToIsocenterMm', '113748', 'Distance Source to Isocenter', 'mm'),
  place('sourceToReferencePointMm', '113737', 'Distance Source to Reference Point', 'mm'),
  place('sourceToDetectorMm', '113750', 'Distance Source to Detector', 'mm'),
  place('tableLongitudinalMm', '113751', 'Table Longitudinal Position', 'mm'),
  place('tableLateralMm', '113752', 'Table Lateral Position', 'mm'),
  place('tableHeightMm', '113753', 'Table Height Position', 'mm'),
  place('sourceToTableMm', '113792', 'Distance Source to Table Plane', 'mm'),
  place('tableLongitudinalEndMm', '113759', 'Table Longitudinal End Position', 'mm'),
  place('tableLateralEndMm', '113760', 'Table Lateral End Position', 'mm'),
  place('tableHeightEndMm', '113761', 'Table Height End Position', 'mm'),
  place('tableXToIsocenterMm', '128766', 'Table X Position to Isocenter', 'mm'),
  place('tableYToIsocenterMm', '128767', 'Table Y Position to Isocenter', 'mm'),
  place('tableZToIsocenterMm', '128768', 'Table Z Position to Isocenter', 'mm'),
  place('tableXToIsocenterEndMm', '128769', 'Table X End Position to Isocenter', 'mm'),
  place('tableYToIsocenterEndMm', '128770', 'Table Y End Position to Isocenter', 'mm'),
  place('tableZToIsocenterEndMm', '128771', 'Table Z End Position to Isocenter', 'mm'),
  place('isocenterPrimaryAngleDeg', '128757', 'Positioner Isocenter Primary Angle', 'deg'),
  place('isocenterSecondaryAngleDeg', '128758', 'Positioner Isocenter Secondary Angle', 'deg'),
  place('isocenterDetectorRotationDeg', '128759', 'Positioner Isocenter Detector Rotation Angle', 'deg'),
  place('isocenterPrimaryEndAngleDeg', '128760', 'Positioner Isocenter Primary End Angle', 'deg'),
  place('isocenterSecondaryEndAngleDeg', '128761', 'Positioner Isocenter Secondary End Angle', 'deg'),
  place(
    'isocenterDetectorRotationEndDeg',
    '128762',
    'Positioner Isocenter Detector Rotation End Angle',
    'deg',
  ),
];

/** TID 10004 and 10007: the totals of a plane. */
export const totalQuantities: QuantityPlace<QuantityField<WrittenPlaneTotals>>[] = [
  place('kermaAreaProductGyCm2', '113722', 'Dose Area Product Total', 'Gy.m2', 10_000),
  place('referenceAirKermaGy', '113725', 'Dose (RP) Total', 'Gy'),
  place('fluoroscopyKermaAreaProductGyCm2', '113726', 'Fluoro Dose Area Product Total', 'Gy.m2', 10_000),
  place('fluoroscopyReferenceAirKermaGy', '113728', 'Fluoro Dose (RP) Total', 'Gy'),
  place('fluoroscopyTimeS', '113730', 'Total Fluoro Time', 's'),
  place('acquisitionKermaAreaProductGyCm2', '113727', 'Acquisition Dose Area Product Total', 'Gy.m2', 10_000),
  place('acquisitionReferenceAirKermaGy', '113729', 'Acquisition Dose (RP) Total', 'Gy'),
  place('acquisitionTimeS', '113855', 'Total Acquisition Time', 's'),
  place('sourceToReferencePointMm', '113737', 'Distance Source to Reference Point', 'mm'),
  place('frameCount', '113731', 'Total Number of Radiographic Frames', '1'),
];
