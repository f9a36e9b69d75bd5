import { dcm } from '../../server/dicom-writer/content-items';
import { textElement } from '../../server/dicom-writer/data-element';
import type { DoseReportContent } from '../../server/dicom-writer/dose-report-content';
import { acquisitionEvent, caseContent, clock, fluoroscopyEvent, sampleUid, smallCase } from './case-content';
import { rotationalEvent } from './case-variants';
import { changeEveryItem, changeItems, conceptOf, withElement } from './edit-content';
import { fullCase } from './full-case';
import { readable } from './make-readable';
import { radiographyCase } from './other-rooms';
import type { Sample } from './sample';

/** A cassette room: frames counted, nothing measured (TID 10006). */
function cassetteCase(sample: number): DoseReportContent {
  return {
    ...radiographyCase(sample),
    acquisitionDeviceType: 'cassette',
    sourcesOfInformation: ['manual'],
    planes: [{ plane: 'single', detectorType: dcm('113950', 'Storage Detector'), frameCount: 2 }],
    events: [],
  };
}

/** A table with the tube below it: kerma 1 cm above the tabletop, continuous fluoroscopy and single pictures. */
function tableCase(sample: number): DoseReportContent {
  const geometry = {
    primaryAngleDeg: null,
    secondaryAngleDeg: null,
    sourceToIsocenterMm: null,
    columnAngulationDeg: 0,
    referencePointDefinition: 'tabletop-1-cm-above' as const,
  };
  const base = caseContent(sample);
  return {
    ...base,
    equipment: { ...base.equipment, modelName: 'Heron RF', serialNumber: 'QR-31177' },
    studyDescription: 'Upper gastrointestinal series',
    planes: base.planes.map((plane) => ({ ...plane, referencePointDefinition: 'tabletop-1-cm-above' })),
    events: [
      fluoroscopyEvent(sample, 0, {
        ...geometry,
        fluoroMode: 'continuous',
        pulseRatePerS: null,
        pulseCount: null,
      }),
      acquisitionEvent(sample, 1, { ...geometry, pulseCount: 1 }),
    ],
  };
}

/** Table travelling under the beam: steps of a run along the leg with its end positions. */
const steppingEvent = (sample: number, index: number) =>
  acquisitionEvent(sample, index, {
    type: 'stepping-acquisition',
    protocol: 'Run-off',
    tableLongitudinalMm: 214,
    tableLongitudinalEndMm: 1006.5,
    tableLateralEndMm: -8,
    tableHeightEndMm: 31,
  });

/** Kinds of machine and of case that leave out, fill in or word things otherwise. */
export function systemSamples(): Sample[] {
  const empty = {
    plane: 'B' as const,
    kermaAreaProductGyCm2: 0,
    referenceAirKermaGy: 0,
    fluoroscopyKermaAreaProductGyCm2: 0,
    fluoroscopyReferenceAirKermaGy: 0,
    fluoroscopyTimeS: 0,
    acquisitionKermaAreaProductGyCm2: 0,
    acquisitionReferenceAirKermaGy: 0,
    acquisitionTimeS: 0,
  };
  return [
    readable(
      '95-every-row',
      'Every row of the template: observers and participants, language, calibration, views, contrast, images, table and isocentre.',
      fullCase(95),
    ),
    readable(
      '96-stepping-and-rotation',
      'A run with table end positions and a rotation with end angles.',
      caseContent(96, { events: [steppingEvent(96, 0), rotationalEvent(96, 1)] }),
    ),
    readable(
      '97-all-planes-total',
      'Two planes in the events, one total for all planes.',
      caseContent(97, {
        planes: caseContent(97).planes.map((plane) => ({ ...plane, plane: 'all' })),
        events: [fluoroscopyEvent(97, 0, { plane: 'A' }), fluoroscopyEvent(97, 1, { plane: 'B' })],
      }),
      { isValid: false },
    ),
    readable(
      '98-unused-plane',
      'A room of two planes where one was not used: its totals are zero, not missing.',
      caseContent(98, {
        planes: [...caseContent(98).planes.map((plane) => ({ ...plane, plane: 'A' as const })), empty],
        events: [fluoroscopyEvent(98, 0, { plane: 'A' })],
      }),
    ),
    readable(
      '99-cassette',
      'Cassette-based radiography: detector type and frames, entered by hand.',
      cassetteCase(99),
      {
        warningCodes: ['events-missing', 'value-missing'],
      },
    ),
    readable(
      '100-table-fluoroscopy',
      'Fluoroscopy table: column angulation in place of angles, kerma 1 cm above the tabletop, continuous mode.',
      tableCase(100),
      { warningCodes: ['value-missing'] },
    ),
    readable(
      '101-reference-point-in-words',
      'Reference point as text, in totals and events.',
      smallCase(101, {
        planes: caseContent(101).planes.map((plane) => ({
          ...plane,
          referencePointDefinition: 'Skin entrance at 60 cm from focus',
        })),
        events: [fluoroscopyEvent(101, 0, { referencePointDefinition: 'Skin entrance at 60 cm from focus' })],
      }),
    ),
    readable(
      '102-step-conversion',
      'As a public converter makes it from a performed procedure step: fluoroscopy as P5-0600, Comprehensive SR, no device type.',
      smallCase(102, {
        terminology: 'SRT',
        sopClassUid: '1.2.840.10008.5.1.4.1.1.88.33',
        acquisitionDeviceType: null,
        sourcesOfInformation: ['mpps'],
        scope: { kind: 'performed-procedure-step', uid: sampleUid(102, 6) },
        events: [
          fluoroscopyEvent(102, 0, { type: { value: 'P5-0600', scheme: 'SRT', meaning: 'Fluoroscopy' } }),
        ],
      }),
      {
        isValid: false,
        expect: (report) => ({
          ...report,
          events: report.events.map((event) => ({ ...event, type: 'fluoroscopy' })),
        }),
      },
    ),
    readable(
      '103-events-out-of-order',
      'Events from last to first; an identifier comes twice in one plane.',
      caseContent(103, {
        events: [
          acquisitionEvent(103, 9),
          fluoroscopyEvent(103, 4),
          fluoroscopyEvent(103, 4, { kermaAreaProductGyCm2: 0.5 }),
          fluoroscopyEvent(103, 0),
        ],
      }),
      { warningCodes: ['event-duplicate'] },
    ),
    readable(
      '104-integrated-with-fluoroscopy',
      'A system that calls itself integrated radiography and did fluoroscopy.',
      smallCase(104, { acquisitionDeviceType: 'integrated' }),
    ),
    readable(
      '105-geometry-not-available',
      'A machine that says it cannot state geometry and detector data.',
      smallCase(105, {
        availability: { detector: 'no', mechanical: 'no' },
        events: [
          fluoroscopyEvent(105, 0, {
            primaryAngleDeg: null,
            secondaryAngleDeg: null,
            sourceToDetectorMm: null,
            sourceToIsocenterMm: null,
          }),
        ],
      }),
      { warningCodes: ['value-missing'] },
    ),
    readable(
      '106-plane-absent',
      'A single-plane system that names no plane anywhere and no kind of procedure.',
      smallCase(106),
      {
        isValid: false,
        warningCodes: ['value-missing', 'procedure-unknown'],
        change: (dataSet) =>
          changeItems(
            changeEveryItem(dataSet, (item) => (conceptOf(item) === '113764' ? null : item)),
            (items) => items.filter((item) => conceptOf(item) !== '121058'),
          ),
        expect: (report) => ({
          ...report,
          planes: report.planes.map((plane) => ({ ...plane, plane: null })),
          events: report.events.map((event) => ({ ...event, plane: null })),
        }),
      },
    ),
    readable(
      '107-simultaneous-planes',
      'One run of two planes: two events with one identifier and one start.',
      caseContent(107, {
        planes: (['A', 'B'] as const).flatMap((plane) =>
          caseContent(107).planes.map((one) => ({ ...one, plane })),
        ),
        events: (['A', 'B'] as const).map((plane) =>
          acquisitionEvent(107, 0, { plane, startedAt: clock(10), primaryAngleDeg: plane === 'A' ? 0 : 90 }),
        ),
      }),
    ),
    readable(
      '108-patient-of-zero-size',
      'Height and weight left at zero on the console: unknown, not zero.',
      smallCase(108),
      {
        warningCodes: ['value-missing'],
        change: (dataSet) =>
          [textElement(0x00101020, 'DS', '0'), textElement(0x00101030, 'DS', '0.0')].reduce(
            withElement,
            dataSet,
          ),
        expect: (report) => ({ ...report, patient: { ...report.patient, heightM: null, weightKg: null } }),
      },
    ),
  ];
}
