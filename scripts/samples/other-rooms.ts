import type { DoseReportContent, WrittenEvent } from '../../server/dicom-writer/dose-report-content';
import { caseContent, clock, sampleUid } from './case-content';

/** What a mobile C-arm writes: no geometry, no field, kerma 30 cm in front of the receptor. */
function mobileEvent(sample: number, index: number): WrittenEvent {
  return {
    irradiationEventUid: sampleUid(sample, 4, index),
    type: 'fluoroscopy',
    startedAt: clock(index * 300),
    kermaAreaProductGyCm2: 0.76,
    referenceAirKermaGy: 0.00305,
    referencePointDefinition: 'image-input-surface-30-cm-in-front',
    fluoroMode: 'continuous',
    irradiationDurationS: 48,
    kvpValues: [66 + index],
    averageTubeCurrentMa: 2.4,
    exposureTimeS: 48,
  };
}

/** One exposure of a radiography room with column and bucky. */
function radiographyEvent(sample: number, index: number): WrittenEvent {
  return {
    irradiationEventUid: sampleUid(sample, 4, index),
    plane: 'single',
    type: 'stationary-acquisition',
    startedAt: clock(index * 60),
    protocol: index === 0 ? 'Chest PA' : 'Chest lateral',
    anatomy: { value: '51185008', scheme: 'SCT', meaning: 'Chest' },
    targetRegion: { value: '51185008', scheme: 'SCT', meaning: 'Chest' },
    kermaAreaProductGyCm2: index === 0 ? 0.062 : 0.12,
    referenceAirKermaGy: index === 0 ? 0.00008 : 0.00015,
    referencePointDefinition: 'detector-plane',
    exposureIndex: 412,
    targetExposureIndex: 400,
    deviationIndex: 0.13,
    kvpValues: [125],
    tubeCurrentValuesMa: [320],
    exposureTimeS: 0.0051,
    pulseCount: 1,
    filters: [{ type: 'none' }],
    fieldHeightMm: 420,
    fieldWidthMm: 350,
    fieldAreaCm2: 1470,
    columnAngulationDeg: 0,
    sourceToDetectorMm: 1800,
  };
}

/** A case in theatre with a mobile C-arm. */
export function mobileCase(sample: number): DoseReportContent {
  const base = caseContent(sample);
  const room = {
    modelName: 'Tern M',
    serialNumber: 'QR-88012',
    stationName: 'MCRH-OR4',
    deviceUid: sampleUid(0, 9, 2),
  };
  return {
    ...base,
    equipment: { ...base.equipment, ...room },
    studyDescription: 'Fluoroscopy in theatre',
    planes: [
      {
        plane: 'single',
        kermaAreaProductGyCm2: 1.52,
        referenceAirKermaGy: 0.0061,
        fluoroscopyKermaAreaProductGyCm2: 1.52,
        fluoroscopyReferenceAirKermaGy: 0.0061,
        fluoroscopyTimeS: 96,
        acquisitionKermaAreaProductGyCm2: 0,
        acquisitionReferenceAirKermaGy: 0,
        acquisitionTimeS: 0,
        referencePointDefinition: 'image-input-surface-30-cm-in-front',
      },
    ],
    events: [mobileEvent(sample, 0), mobileEvent(sample, 1)],
  };
}

/** Two exposures in a radiography room. */
export function radiographyCase(sample: number): DoseReportContent {
  const base = caseContent(sample);
  const room = {
    modelName: 'Plover DX',
    serialNumber: 'QR-55120',
    stationName: 'MCRH-XR2',
    deviceUid: sampleUid(0, 9, 3),
  };
  return {
    ...base,
    equipment: { ...base.equipment, ...room },
    studyDescription: 'Chest two views',
    acquisitionDeviceType: 'integrated',
    planes: [
      {
        plane: 'single',
        kermaAreaProductGyCm2: 0.182,
        referenceAirKermaGy: 0.00023,
        frameCount: 2,
        referencePointDefinition: 'detector-plane',
      },
    ],
    events: [radiographyEvent(sample, 0), radiographyEvent(sample, 1)],
  };
}
