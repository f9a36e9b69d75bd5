import type { DoseReportContent } from '../../server/dicom-writer/dose-report-content';
import { caseContent, fluoroscopyEvent, sampleUid, smallCase } from './case-content';
import { readable } from './make-readable';
import { mobileCase } from './other-rooms';
import type { Sample } from './sample';

const DOSE_REPORT = '1.2.840.10008.5.1.4.1.1.88.67';

/** The study that samples 109 to 117 belong to. */
const STUDY = 109;

function ofStudy(sample: number, overrides: Partial<DoseReportContent> = {}): DoseReportContent {
  const base = smallCase(sample);
  return {
    ...base,
    studyInstanceUid: sampleUid(STUDY, 2),
    seriesInstanceUid: sampleUid(STUDY, 3),
    accessionNumber: 'MC2600109',
    studyId: 'S109',
    patient: { ...base.patient, id: 'MCR7109' },
    ...overrides,
  };
}

const events = (...indexes: number[]) => indexes.map((index) => fluoroscopyEvent(STUDY, index));

/** Reports that stand for one case together, or must not (PS3.16 CID 10000; the event's UID is what counts). */
export function severalReportSamples(): Sample[] {
  const cumulative = { kind: 'procedure-step-to-this-point', uid: sampleUid(STUDY, 6) } as const;
  return [
    readable(
      '109-cumulative-first',
      'First of a cumulative series: procedure step to this point, partial, one event.',
      ofStudy(109, { events: events(0), scope: cumulative, completionFlag: 'PARTIAL' }),
      { warningCodes: ['completion-partial'] },
    ),
    readable(
      '110-cumulative-second',
      'Second of that series: names the first as predecessor and holds its event again.',
      ofStudy(110, {
        events: events(0, 1),
        scope: cumulative,
        contentAt: '2026-03-04T10:40:00',
        predecessors: [{ sopClassUid: DOSE_REPORT, sopInstanceUid: sampleUid(109, 1) }],
      }),
    ),
    readable(
      '111-sent-again-under-new-identity',
      'The second report under another SOP Instance UID, same events.',
      ofStudy(111, { events: events(0, 1), scope: cumulative, contentAt: '2026-03-04T10:40:00' }),
    ),
    readable(
      '112-same-identity-other-content',
      'The second report’s SOP Instance UID with another value inside.',
      ofStudy(112, {
        sopInstanceUid: sampleUid(110, 1),
        events: [fluoroscopyEvent(STUDY, 0), fluoroscopyEvent(STUDY, 1, { kermaAreaProductGyCm2: 9.9 })],
        scope: cumulative,
        contentAt: '2026-03-04T10:40:00',
      }),
    ),
    readable(
      '113-one-event-first',
      'One report for each event: the third event.',
      ofStudy(113, {
        events: events(2),
        scope: { kind: 'irradiation-event', uid: sampleUid(STUDY, 4, 2) },
      }),
    ),
    readable(
      '114-one-event-second',
      'One report for each event: the fourth event.',
      ofStudy(114, {
        events: events(3),
        scope: { kind: 'irradiation-event', uid: sampleUid(STUDY, 4, 3) },
      }),
    ),
    readable(
      '115-second-system',
      'The same study in another room: a mobile C-arm.',
      {
        ...mobileCase(115),
        studyInstanceUid: sampleUid(STUDY, 2),
        accessionNumber: 'MC2600109',
        patient: { ...caseContent(115).patient, id: 'MCR7109' },
      },
      { warningCodes: ['value-missing'] },
    ),
    readable(
      '116-restarted-system',
      'The rest of the case after a restart: new study, same patient, room and order.',
      smallCase(116, {
        accessionNumber: 'MC2600109',
        patient: { ...caseContent(116).patient, id: 'MCR7109' },
        studyAt: '2026-03-04T10:50:00',
        contentAt: '2026-03-04T11:05:00',
        events: [fluoroscopyEvent(116, 0, { startedAt: '2026-03-04T10:52:00' })],
      }),
    ),
    readable(
      '117-other-patient',
      'The same Study Instance UID with another patient, who must never be merged.',
      ofStudy(117, {
        patient: {
          name: 'Cray^Bertil',
          id: 'MCR9901',
          birthDate: '1948-01-30',
          sex: 'M',
          heightM: 1.8,
          weightKg: 91,
        },
        events: [fluoroscopyEvent(117, 0)],
      }),
    ),
    readable(
      '118-series-scope',
      'Accumulated over a series.',
      smallCase(118, { scope: { kind: 'series', uid: sampleUid(118, 3) } }),
    ),
  ];
}
