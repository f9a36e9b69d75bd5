import { describe, expect, it } from 'vitest';
import { formatUtcOffset, joinDateAndTime, parseDate, parseDateTime } from './date-time';

describe('a date-time', () => {
  it.each([
    ['20260304090506', '2026-03-04T09:05:06'],
    ['20260304090506.5', '2026-03-04T09:05:06.5'],
    ['20260304090506.123456+0130', '2026-03-04T09:05:06.123456+01:30'],
    ['202603040905', '2026-03-04T09:05:00'],
    ['20260304', '2026-03-04T00:00:00'],
    ['20240229120000', '2024-02-29T12:00:00'],
    ['20261025023000', '2026-10-25T02:30:00'],
    ['20260304235960', '2026-03-04T23:59:59'],
  ])('%s is %s on the clock of the device', (value, text) => {
    expect(parseDateTime(value, null)?.text).toBe(text);
  });

  it.each([
    '',
    '2026',
    '202602',
    '20260230090000',
    '20261304',
    '20260304250000',
    '2026-03-04',
    '20260304090506.',
    'now',
  ])('%j is unreadable', (value) => {
    expect(parseDateTime(value, null)).toBeNull();
  });

  it('takes the offset of the data set only where it has none of its own', () => {
    expect(parseDateTime('20260304090506', '-05:00')).toMatchObject({ utcOffset: '-05:00' });
    expect(parseDateTime('20260304090506-0400', '-05:00')).toMatchObject({ utcOffset: '-04:00' });
    expect(parseDateTime('20260304090506', null)).toMatchObject({ utcOffset: null });
  });

  it('says when seconds were cut off', () => {
    expect(parseDateTime('202603040905', null)?.isImprecise).toBe(true);
    expect(parseDateTime('20260304090500', null)?.isImprecise).toBe(false);
  });
});

describe('dates and times apart', () => {
  it('are joined, also in their retired forms and with an unreadable time', () => {
    expect(joinDateAndTime('20260304', '090506.25', null)?.text).toBe('2026-03-04T09:05:06.25');
    expect(joinDateAndTime('2026.03.04', '09:05:06', null)?.text).toBe('2026-03-04T09:05:06');
    expect(joinDateAndTime('20260304', 'noon', null)?.text).toBe('2026-03-04T00:00:00');
    expect(joinDateAndTime(null, '090506', null)).toBeNull();
  });

  it('give ISO birth dates', () => {
    expect(parseDate('19610709')).toBe('1961-07-09');
    expect(parseDate('1961')).toBeNull();
  });

  it('know the offsets that exist', () => {
    expect(formatUtcOffset('+0000')).toBe('+00:00');
    expect(formatUtcOffset('-0000')).toBe('+00:00');
    expect(formatUtcOffset('+1545')).toBeNull();
    expect(formatUtcOffset('0100')).toBeNull();
  });
});
