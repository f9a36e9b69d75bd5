import type { DoseReportContent, WrittenEvent } from '../../server/dicom-writer/dose-report-content';

/** Samples' own arc under the UUID-derived root (PS3.5 annex B.2); the numbers mean sample, kind and index. */
export function sampleUid(sampleNumber: number, kind: number, index = 0): string {
  return `2.25.70311400${String(sampleNumber).padStart(3, '0')}${String(kind).padStart(2, '0')}${String(index).padStart(5, '0')}`;
}

/** Rounded to so few digits that the decimal string in the file stands for exactly this number. */
export function round(value: number, digits = 6): number {
  return Number(value.toPrecision(digits));
}

/** "09:00:00" plus seconds on the day of the sample case. */
export function clock(secondsAfterNine: number): string {
  const total = 9 * 3600 + secondsAfterNine;
  const part = (value: number) => String(Math.floor(value)).padStart(2, '0');
  return `2026-03-04T${part(total / 3600)}:${part((total / 60) % 60)}:${part(total % 60)}`;
}

/** A complete fluoroscopy event of an angiography system; everything may be overridden. */
export function fluoroscopyEvent(
  sample: number,
  index: number,
  overrides: Partial<WrittenEvent> = {},
): WrittenEvent {
  return {
    irradiationEventUid: sampleUid(sample, 4, index),
    plane: 'single',
    type: 'fluoroscopy',
    startedAt: clock(index * 40),
    protocol: 'Fluoro low',
    patientTableRelationship: 'headfirst',
    patientOrientationModifier: 'supine',
    kermaAreaProductGyCm2: round(0.8 + index * 0.013),
    referenceAirKermaGy: round(0.0041 + index * 0.00007),
    referencePointDefinition: 'isocenter-15-cm-toward-source',
    fluoroMode: 'pulsed',
    pulseRatePerS: 7.5,
    pulseCount: 90 + index,
    pulseWidthValuesMs: [6.2],
    irradiationDurationS: 12.4,
    kvpValues: [72 + (index % 9)],
    tubeCurrentValuesMa: [58.5],
    exposureTimeS: 0.558,
    focalSpotSizeMm: 0.6,
    filters: [{ type: 'flat', material: 'Cu', minThicknessMm: 0.3, maxThicknessMm: 0.3 }],
    fieldAreaCm2: 412.5,
    primaryAngleDeg: -12.5 + (index % 5) * 9,
    secondaryAngleDeg: 4.5,
    sourceToIsocenterMm: 785,
    sourceToReferencePointMm: 635,
    sourceToDetectorMm: 1120,
    sourceToTableMm: 720,
    tableLongitudinalMm: 214,
    tableLateralMm: -8,
    tableHeightMm: 31,
    tableHeadTiltDeg: 0,
    tableHorizontalRotationDeg: 0,
    tableCradleTiltDeg: 0,
    ...overrides,
  };
}

/** A stationary acquisition (a run of single pictures). */
export function acquisitionEvent(
  sample: number,
  index: number,
  overrides: Partial<WrittenEvent> = {},
): WrittenEvent {
  return fluoroscopyEvent(sample, index, {
    type: 'stationary-acquisition',
    protocol: 'Angio 3 per s',
    fluoroMode: null,
    pulseRatePerS: 3,
    pulseCount: 24,
    pulseWidthValuesMs: [64],
    irradiationDurationS: 8,
    kvpValues: [81],
    tubeCurrentValuesMa: [412],
    exposureTimeS: 1.536,
    kermaAreaProductGyCm2: 6.25,
    referenceAirKermaGy: 0.0375,
    filters: [{ type: 'flat', material: 'Cu', minThicknessMm: 0.1, maxThicknessMm: 0.1 }],
    ...overrides,
  });
}

/** A case with two fluoroscopy events and one acquisition in a single-plane room; the base of most samples. */
export function caseContent(sample: number, overrides: Partial<DoseReportContent> = {}): DoseReportContent {
  return {
    sopInstanceUid: sampleUid(sample, 1),
    studyInstanceUid: sampleUid(sample, 2),
    seriesInstanceUid: sampleUid(sample, 3),
    studyAt: '2026-03-04T08:55:00',
    contentAt: '2026-03-04T10:20:00',
    accessionNumber: `MC26${String(sample).padStart(5, '0')}`,
    studyId: `S${sample}`,
    studyDescription: 'Hepatic arteriography',
    patient: {
      name: 'Fernhill^Ada',
      id: `MCR${String(7000 + sample)}`,
      birthDate: '1961-07-09',
      sex: 'F',
      heightM: 1.68,
      weightKg: 74.5,
    },
    equipment: {
      manufacturer: 'Quillon Roentgen',
      modelName: 'Aster F2',
      serialNumber: 'QR-20417',
      stationName: 'MCRH-IR1',
      institutionName: 'Marrow Creek Regional Hospital',
      softwareVersion: '4.2.0',
      deviceUid: sampleUid(0, 9, 1),
    },
    acquisitionDeviceType: 'fluoroscopy-guided',
    planes: [
      {
        plane: 'single',
        kermaAreaProductGyCm2: 7.863,
        referenceAirKermaGy: 0.04577,
        fluoroscopyKermaAreaProductGyCm2: 1.613,
        fluoroscopyReferenceAirKermaGy: 0.00827,
        fluoroscopyTimeS: 24.8,
        acquisitionKermaAreaProductGyCm2: 6.25,
        acquisitionReferenceAirKermaGy: 0.0375,
        acquisitionTimeS: 8,
        sourceToReferencePointMm: 635,
        frameCount: 24,
        referencePointDefinition: 'isocenter-15-cm-toward-source',
      },
    ],
    events: [fluoroscopyEvent(sample, 0), fluoroscopyEvent(sample, 1), acquisitionEvent(sample, 2)],
    persons: [
      {
        name: 'Larkmoor^Ines',
        role: { value: '113851', scheme: 'DCM', meaning: 'Irradiation Administering' },
        id: 'IC-2',
        organization: 'Marrow Creek Regional Hospital',
      },
    ],
    ...overrides,
  };
}

/** One fluoroscopy event and totals without its acquisition: small, and complete enough for no warning. */
export function smallCase(sample: number, overrides: Partial<DoseReportContent> = {}): DoseReportContent {
  return caseContent(sample, { events: [fluoroscopyEvent(sample, 0)], persons: [], ...overrides });
}
