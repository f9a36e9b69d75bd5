import { textElement } from '../../server/dicom-writer/data-element';
import { fluoroscopyEvent, smallCase } from './case-content';
import { withElement } from './edit-content';
import { readable, withEvents } from './make-readable';
import type { Sample } from './sample';

const startingAt = (sample: number, times: string[]) =>
  smallCase(sample, {
    events: times.map((startedAt, index) => fluoroscopyEvent(sample, index, { startedAt })),
  });

/** Date-times (VR DT) and the header's dates and times, local to the device unless they state an offset. */
export function timeSamples(): Sample[] {
  return [
    readable(
      '76-fractions',
      'Starts with one to six digits of a second.',
      startingAt(
        76,
        ['.1', '.12', '.123', '.1234', '.12345', '.123456'].map((part) => `2026-03-04T09:00:00${part}`),
      ),
    ),
    readable(
      '77-cut-times',
      'Starts cut after the minute, the hour and the date.',
      startingAt(77, ['2026-03-04T09:12', '2026-03-04T10', '2026-03-04T']),
      {
        warningCodes: ['date-time-imprecise'],
        expect: (report) => ({
          ...withEvents(
            report,
            { startedAt: '2026-03-04T09:12:00' },
            { startedAt: '2026-03-04T10:00:00' },
            { startedAt: '2026-03-04T00:00:00' },
          ),
          startedAt: '2026-03-04T00:00:00',
        }),
      },
    ),
    readable(
      '78-malformed-times',
      'Starts that are no date-times: month 13, hour 25, words, a year alone.',
      startingAt(78, [
        '2026-13-04T09:00:00',
        '2026-03-04T25:00:00',
        'at nine',
        '2026',
        '2026-03-04T09:30:00',
      ]),
      {
        warningCodes: ['date-time-unreadable'],
        isValid: false,
        expect: (report) => ({
          ...withEvents(report, ...Array.from({ length: 4 }, () => ({ startedAt: null }))),
          startedAt: '2026-03-04T09:30:00',
        }),
      },
    ),
    readable(
      '79-offset-in-header',
      'The offset from UTC stands in the header alone (0008,0201).',
      { ...startingAt(79, ['2026-03-04T09:00:00', '2026-03-04T09:05:00']), timezoneOffset: '-0330' },
      {
        expect: (report) => ({
          ...withEvents(
            report,
            { startedAt: '2026-03-04T09:00:00-03:30' },
            { startedAt: '2026-03-04T09:05:00-03:30' },
          ),
          startedAt: '2026-03-04T09:00:00-03:30',
        }),
      },
    ),
    readable(
      '80-midnight-and-clock-change',
      'A case over midnight in the night the clocks go back, each start with its own offset, not in order.',
      startingAt(80, ['2026-10-25T02:10:00+01:00', '2026-10-24T23:58:00+02:00', '2026-10-25T02:40:00+02:00']),
      { expect: (report) => ({ ...report, startedAt: '2026-10-24T23:58:00+02:00' }) },
    ),
    readable(
      '81-clock-reset',
      'A clock that fell back to the year 2000, and one far ahead.',
      startingAt(81, ['2000-01-01T00:03:12', '2031-01-01T08:00:00']),
    ),
    readable(
      '82-leap-second',
      'Second 60, and the widest offsets.',
      startingAt(82, ['2026-06-30T23:59:60+00:00', '2026-07-01T13:59:59+14:00']),
      {
        expect: (report) => ({
          ...withEvents(
            report,
            { startedAt: '2026-06-30T23:59:59+00:00' },
            { startedAt: '2026-07-01T13:59:59+14:00' },
          ),
          startedAt: '2026-06-30T23:59:59+00:00',
        }),
        isValid: false,
      },
    ),
    readable(
      '83-retired-date-forms',
      'Study date with dots and time with colons, birth date unreadable; no events, so the study dates the case.',
      smallCase(83, { events: [] }),
      {
        warningCodes: ['events-missing', 'date-time-unreadable'],
        isValid: false,
        change: (dataSet) =>
          [
            textElement(0x00080020, 'DA', '2026.03.04'),
            textElement(0x00080030, 'TM', '08:55:00'),
            textElement(0x00100030, 'DA', '19610799'),
          ].reduce(withElement, dataSet),
        expect: (report) => ({ ...report, patient: { ...report.patient, birthDate: null } }),
      },
    ),
  ];
}
