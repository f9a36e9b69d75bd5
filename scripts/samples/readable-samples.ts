import type { DoseReportContent, WrittenEvent } from '../../server/dicom-writer/dose-report-content';
import { writeDoseReport } from '../../server/dicom-writer/write-dose-report';
import type { FileOptions } from '../../server/dicom-writer/write-file';
import type { WarningCode } from '../../shared/contract/outcome';
import { acquisitionEvent, caseContent, clock, fluoroscopyEvent, round, sampleUid } from './case-content';
import { expectedReport } from './expected-report';
import { mobileEvent, radiographyEvent } from './other-rooms';
import type { Sample } from './sample';

interface Further {
  options?: FileOptions;
  warningCodes?: WarningCode[];
  isValid?: boolean;
}

function readable(name: string, how: string, content: DoseReportContent, further: Further = {}): Sample {
  return {
    fileName: `${name}.dcm`,
    how,
    isValid: further.isValid ?? true,
    bytes: writeDoseReport(content, further.options),
    expected: { outcome: 'read', report: expectedReport(content), warningCodes: further.warningCodes ?? [] },
  };
}

/** A rotational run with end angles and a wedge beside the copper. */
function rotationalEvent(sample: number, index: number): WrittenEvent {
  return acquisitionEvent(sample, index, {
    type: 'rotational-acquisition',
    protocol: 'Rotation 200 deg',
    primaryAngleDeg: -100,
    primaryEndAngleDeg: 100,
    secondaryAngleDeg: 0,
    secondaryEndAngleDeg: 0,
    filters: [
      { type: 'flat', material: 'Cu', minThicknessMm: 0.2, maxThicknessMm: 0.2 },
      { type: 'wedge', material: 'Al', minThicknessMm: 0.5, maxThicknessMm: 3 },
    ],
  });
}

function biplane(sample: number): DoseReportContent {
  const lateral = { plane: 'B', primaryAngleDeg: 88.5, secondaryAngleDeg: 0 } as const;
  const base = caseContent(sample);
  const totals = base.planes.flatMap((one) => [
    { ...one, plane: 'A' as const },
    { ...one, plane: 'B' as const, kermaAreaProductGyCm2: 5.5, referenceAirKermaGy: 0.0312 },
  ]);
  const events = [0, 2, 4].flatMap((index) => [
    fluoroscopyEvent(sample, index, { plane: 'A' }),
    fluoroscopyEvent(sample, index + 1, { ...lateral, startedAt: clock(index * 40) }),
  ]);
  return { ...base, planes: totals, events: [...events, rotationalEventOfPlane(sample)] };
}

function rotationalEventOfPlane(sample: number): WrittenEvent {
  return { ...rotationalEvent(sample, 6), plane: 'A' };
}

function oddUnits(sample: number): DoseReportContent {
  const base = caseContent(sample);
  return {
    ...base,
    planes: [
      {
        plane: 'single',
        kermaAreaProductGyCm2: { text: '786.3', unit: 'cGy.cm2' },
        referenceAirKermaGy: { text: '45.77', unit: 'mGy' },
        fluoroscopyKermaAreaProductGyCm2: { text: '161.3', unit: 'uGy.m2' },
        fluoroscopyReferenceAirKermaGy: { text: '8270', unit: 'uGy' },
        fluoroscopyTimeS: { text: '.413', unit: 'min' },
        acquisitionKermaAreaProductGyCm2: { text: '62.5', unit: 'dGy.cm2' },
        acquisitionReferenceAirKermaGy: { text: '+3.75E+1', unit: 'mGy' },
        acquisitionTimeS: { text: '8000', unit: 'ms' },
        referencePointDefinition: 'isocenter-15-cm-toward-source',
      },
    ],
    events: [
      fluoroscopyEvent(sample, 0, {
        kermaAreaProductGyCm2: { text: '0.8e+3', unit: 'mGy.cm2' },
        referenceAirKermaGy: { text: '4.1', unit: 'mGy' },
        exposureTimeS: { text: '0.558', unit: 's' },
        sourceToDetectorMm: { text: '112', unit: 'cm' },
      }),
      acquisitionEvent(sample, 1, {
        kermaAreaProductGyCm2: { text: '6.25', unit: 'Gy.cm2' },
        irradiationDurationS: { text: '8000', unit: 'ms' },
      }),
    ],
  };
}

/** 300 events in one procedure, all different, made by arithmetic alone. */
function manyEvents(sample: number): DoseReportContent {
  const events = Array.from({ length: 300 }, (_, index) => {
    const isAcquisition = index % 12 === 11;
    const make = isAcquisition ? acquisitionEvent : fluoroscopyEvent;
    return make(sample, index, {
      kermaAreaProductGyCm2: round((isAcquisition ? 4 : 0.35) * (1 + 0.6 * Math.sin(index))),
      referenceAirKermaGy: round((isAcquisition ? 0.024 : 0.0021) * (1 + 0.6 * Math.sin(index))),
      primaryAngleDeg: round(35 * Math.sin(index / 17), 3),
      secondaryAngleDeg: round(20 * Math.cos(index / 11), 3),
      kvpValues: [70 + (index % 23), 70.5 + (index % 23)],
    });
  });
  const sum = (key: 'kermaAreaProductGyCm2' | 'referenceAirKermaGy') =>
    round(
      events.reduce((total, event) => total + Number(event[key]), 0),
      9,
    );
  const totals = {
    plane: 'single' as const,
    kermaAreaProductGyCm2: sum('kermaAreaProductGyCm2'),
    referenceAirKermaGy: sum('referenceAirKermaGy'),
    fluoroscopyTimeS: 3410,
    referencePointDefinition: 'isocenter-15-cm-toward-source',
  };
  return caseContent(sample, { planes: [totals], events });
}

const planTotalsOnly = {
  plane: 'single',
  kermaAreaProductGyCm2: 31.4,
  fluoroscopyTimeS: 612,
  frameCount: 18,
} as const;

/** Every sample that the reader reads. */
export function readableSamples(): Sample[] {
  return [
    readable(
      '01-single-plane',
      'Angiography room, one plane: fluoroscopy, acquisition, rotation with end angles and two filters.',
      {
        ...caseContent(1),
        events: [...caseContent(1).events, rotationalEvent(1, 3)],
        comment: 'Table moved by hand between runs.',
      },
    ),
    readable('02-biplane', 'Two planes: pairs of events with equal start, totals per plane.', biplane(2)),
    readable(
      '03-odd-units',
      'mGy, uGy, cGy.cm2, dGy.cm2, mGy.cm2, uGy.m2, min, ms, cm in place of the standard units; exponents, plus sign, leading point.',
      oddUnits(3),
    ),
    readable(
      '04-kvp-per-pulse',
      'One KVP, tube current and pulse width item for each pulse, lists of different length; another event has only the average tube current.',
      {
        ...caseContent(4),
        events: [
          fluoroscopyEvent(4, 0, {
            kvpValues: [68, 70.5, 73, 74, 74.5],
            tubeCurrentValuesMa: [40, 52, 61, 66],
            pulseWidthValuesMs: [5.8, 6, 6.4],
          }),
          fluoroscopyEvent(4, 1, { tubeCurrentValuesMa: [], averageTubeCurrentMa: 57.25 }),
          fluoroscopyEvent(4, 2, { tubeCurrentValuesMa: [], exposureValuesMas: [31.5] }),
        ],
      },
      { warningCodes: ['value-missing'] },
    ),
    readable('05-implicit-little-endian', 'Implicit VR little endian.', caseContent(5), {
      options: { transferSyntax: 'implicit-little-endian' },
    }),
    readable(
      '06-explicit-big-endian',
      'Explicit VR big endian, sequences of undefined length.',
      caseContent(6),
      {
        options: { transferSyntax: 'explicit-big-endian', hasUndefinedLengths: true },
      },
    ),
    readable('07-deflated', 'Deflated explicit VR little endian.', caseContent(7), {
      options: { transferSyntax: 'deflated' },
    }),
    readable(
      '08-bare-data-set',
      'Implicit VR little endian without preamble and file meta information.',
      caseContent(8),
      {
        options: { transferSyntax: 'implicit-little-endian', hasMetaHeader: false },
        warningCodes: ['no-meta-header'],
      },
    ),
    readable(
      '09-no-preamble',
      'File meta information first, the 128 bytes and DICM missing.',
      caseContent(9),
      { options: { hasPreamble: false } },
    ),
    readable(
      '10-mobile-c-arm',
      'Mobile C-arm: no angles, no table, no isocentre, no field size, no plane; reference point 30 cm in front of the image receptor; continuous fluoroscopy.',
      {
        ...caseContent(10),
        equipment: {
          ...caseContent(10).equipment,
          modelName: 'Tern M',
          serialNumber: 'QR-88012',
          stationName: 'MCRH-OR4',
          deviceUid: sampleUid(0, 9, 2),
        },
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
        events: [mobileEvent(10, 0), mobileEvent(10, 1)],
      },
      { warningCodes: ['value-missing'] },
    ),
    readable(
      '11-radiography',
      'Integrated radiography room (DX): exposures only, TID 10007 totals, column angulation.',
      {
        ...caseContent(11),
        equipment: {
          ...caseContent(11).equipment,
          modelName: 'Plover DX',
          serialNumber: 'QR-55120',
          stationName: 'MCRH-XR2',
          deviceUid: sampleUid(0, 9, 3),
        },
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
        events: [radiographyEvent(11, 0), radiographyEvent(11, 1)],
      },
      { warningCodes: ['value-missing'] },
    ),
    readable('12-utf8-names', 'Names beyond ASCII in UTF-8.', {
      ...caseContent(12),
      studyDescription: 'Artériographie hépatique',
      patient: { ...caseContent(12).patient, name: 'Żurawska-Öst^Zoë^^Dr' },
    }),
    readable(
      '13-iso2022-names',
      'A Japanese name in ISO 2022 IR 87 with its three component groups.',
      {
        ...caseContent(13),
        patient: { ...caseContent(13).patient, name: 'Hoshikawa^Tsuki=星川^月=ほしかわ^つき' },
      },
      { options: { characterSet: 'ISO 2022 IR 87' } },
    ),
    readable(
      '14-gb18030-names',
      'A Chinese name in GB18030, whose second bytes may look like delimiters.',
      {
        ...caseContent(14),
        patient: { ...caseContent(14).patient, name: 'Wu^Yunqi=烏^雲誠' },
      },
      { options: { characterSet: 'GB18030' } },
    ),
    readable(
      '15-korean-names',
      'A Korean name in ISO 2022 IR 149.',
      {
        ...caseContent(15),
        patient: { ...caseContent(15).patient, name: 'Haneul^Byeol=하늘^별' },
      },
      { options: { characterSet: 'ISO 2022 IR 149' } },
    ),
    readable(
      '16-unknown-unit',
      'The kerma-area product of one event in a unit that is no UCUM code, another one without a readable number.',
      {
        ...caseContent(16),
        events: [
          fluoroscopyEvent(16, 0, { kermaAreaProductGyCm2: { text: '8000', unit: 'Gym2' } }),
          fluoroscopyEvent(16, 1, { referenceAirKermaGy: { text: '0,0042', unit: 'Gy' } }),
        ],
      },
      { warningCodes: ['unit-unknown', 'number-unreadable'], isValid: false },
    ),
    readable(
      '17-snomed-rt',
      'An older report: SNOMED-RT codes throughout, stored as Enhanced SR.',
      {
        ...caseContent(17),
        terminology: 'SRT',
        sopClassUid: '1.2.840.10008.5.1.4.1.1.88.22',
      },
      { isValid: false },
    ),
    readable(
      '18-mpps-totals',
      'Totals derived from a performed procedure step, no events.',
      {
        ...caseContent(18),
        sourcesOfInformation: ['mpps'],
        planes: [planTotalsOnly],
        events: [],
      },
      { warningCodes: ['events-missing', 'value-missing'] },
    ),
    readable(
      '19-equipment-in-tree',
      'Maker, model and serial only at the irradiating device, times with an offset and fractions.',
      {
        ...caseContent(19),
        isEquipmentOnlyInTree: true,
        events: caseContent(19).events.map((event) => ({
          ...event,
          startedAt: `${event.startedAt}.250+01:00`,
        })),
      },
      { isValid: false },
    ),
    readable('20-quality-control', 'A phantom exposure: intent Quality Control.', {
      ...caseContent(20),
      intent: { value: '113680', scheme: 'DCM', meaning: 'Quality Control Intent' },
      patient: { ...caseContent(20).patient, name: 'Phantom^Water 20 cm', id: 'QC-20' },
    }),
    readable('21-300-events', '300 events, the size of a long case.', manyEvents(21), {
      warningCodes: ['value-missing'],
    }),
  ];
}
