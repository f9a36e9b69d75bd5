import type { ConceptName } from './concepts.table-data';
import type { QuantityKind } from '../../shared/unit-factors';

/** Field of the contract, the concept it is read from, and the kind of quantity that fixes its units. */
type QuantityFields = Record<string, readonly [ConceptName, QuantityKind]>;

/** Quantities that stand once in an irradiation event (TID 10003, 10003A–C). */
export const eventQuantities = {
  kermaAreaProductGyCm2: ['kermaAreaProduct', 'kermaAreaProduct'],
  referenceAirKermaGy: ['referenceAirKerma', 'airKerma'],
  averageTubeCurrentMa: ['averageTubeCurrent', 'tubeCurrent'],
  pulseCount: ['pulseCount', 'count'],
  pulseRatePerS: ['pulseRate', 'rate'],
  exposureTimeS: ['exposureTime', 'time'],
  irradiationDurationS: ['irradiationDuration', 'time'],
  focalSpotSizeMm: ['focalSpotSize', 'length'],
  halfValueLayerMm: ['halfValueLayer', 'length'],
  patientEquivalentThicknessMm: ['patientEquivalentThickness', 'length'],
  entranceExposureGy: ['entranceExposure', 'airKerma'],
  compressionThicknessMm: ['compressionThickness', 'length'],
  exposureIndex: ['exposureIndex', 'count'],
  targetExposureIndex: ['targetExposureIndex', 'count'],
  deviationIndex: ['deviationIndex', 'count'],
  fieldAreaCm2: ['fieldArea', 'area'],
  fieldHeightMm: ['fieldHeight', 'length'],
  fieldWidthMm: ['fieldWidth', 'length'],
  primaryAngleDeg: ['primaryAngle', 'angle'],
  secondaryAngleDeg: ['secondaryAngle', 'angle'],
  primaryEndAngleDeg: ['primaryEndAngle', 'angle'],
  secondaryEndAngleDeg: ['secondaryEndAngle', 'angle'],
  columnAngulationDeg: ['columnAngulation', 'angle'],
  tableHeadTiltDeg: ['tableHeadTilt', 'angle'],
  tableHorizontalRotationDeg: ['tableHorizontalRotation', 'angle'],
  tableCradleTiltDeg: ['tableCradleTilt', 'angle'],
  sourceToIsocenterMm: ['sourceToIsocenter', 'length'],
  sourceToReferencePointMm: ['sourceToReferencePoint', 'length'],
  sourceToDetectorMm: ['sourceToDetector', 'length'],
  sourceToTableMm: ['sourceToTable', 'length'],
  tableLongitudinalMm: ['tableLongitudinal', 'length'],
  tableLateralMm: ['tableLateral', 'length'],
  tableHeightMm: ['tableHeight', 'length'],
  tableLongitudinalEndMm: ['tableLongitudinalEnd', 'length'],
  tableLateralEndMm: ['tableLateralEnd', 'length'],
  tableHeightEndMm: ['tableHeightEnd', 'length'],
  tableXToIsocenterMm: ['tableXToIsocenter', 'length'],
  tableYToIsocenterMm: ['tableYToIsocenter', 'length'],
  tableZToIsocenterMm: ['tableZToIsocenter', 'length'],
  tableXToIsocenterEndMm: ['tableXToIsocenterEnd', 'length'],
  tableYToIsocenterEndMm: ['tableYToIsocenterEnd', 'length'],
  tableZToIsocenterEndMm: ['tableZToIsocenterEnd', 'length'],
  isocenterPrimaryAngleDeg: ['isocenterPrimaryAngle', 'angle'],
  isocenterSecondaryAngleDeg: ['isocenterSecondaryAngle', 'angle'],
  isocenterDetectorRotationDeg: ['isocenterDetectorRotation', 'angle'],
  isocenterPrimaryEndAngleDeg: ['isocenterPrimaryEndAngle', 'angle'],
  isocenterSecondaryEndAngleDeg: ['isocenterSecondaryEndAngle', 'angle'],
  isocenterDetectorRotationEndDeg: ['isocenterDetectorRotationEnd', 'angle'],
} as const satisfies QuantityFields;

/** Quantities that may repeat, one value for each pulse. */
export const eventQuantityLists = {
  kvpValues: ['kvp', 'tubeVoltage'],
  tubeCurrentValuesMa: ['tubeCurrent', 'tubeCurrent'],
  pulseWidthValuesMs: ['pulseWidth', 'pulseWidth'],
  exposureValuesMas: ['exposure', 'tubeCharge'],
} as const satisfies QuantityFields;

/** Totals of a plane (TID 10004, 10006, 10007). */
export const planeQuantities = {
  kermaAreaProductGyCm2: ['kermaAreaProductTotal', 'kermaAreaProduct'],
  referenceAirKermaGy: ['referenceAirKermaTotal', 'airKerma'],
  fluoroscopyTimeS: ['fluoroscopyTimeTotal', 'time'],
  fluoroscopyKermaAreaProductGyCm2: ['fluoroscopyKermaAreaProductTotal', 'kermaAreaProduct'],
  fluoroscopyReferenceAirKermaGy: ['fluoroscopyReferenceAirKermaTotal', 'airKerma'],
  acquisitionKermaAreaProductGyCm2: ['acquisitionKermaAreaProductTotal', 'kermaAreaProduct'],
  acquisitionReferenceAirKermaGy: ['acquisitionReferenceAirKermaTotal', 'airKerma'],
  acquisitionTimeS: ['acquisitionTimeTotal', 'time'],
  sourceToReferencePointMm: ['sourceToReferencePoint', 'length'],
  frameCount: ['frameCountTotal', 'count'],
} as const satisfies QuantityFields;
