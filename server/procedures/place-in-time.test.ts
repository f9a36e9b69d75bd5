import fc from 'fast-check';
import { expect, test } from 'vitest';
import { createInstantReader, toInstant } from './place-in-time';

const zones = ['America/Denver', 'Europe/Vienna', 'Asia/Kathmandu', 'Australia/Lord_Howe', 'UTC'];

test('read one by one or many together, a time is the same instant, through every change of the clock', () => {
  const anyTime = fc.date({ min: new Date('2020-01-01'), max: new Date('2027-12-31'), noInvalidDate: true });
  fc.assert(
    fc.property(
      fc.constantFrom(...zones),
      fc.array(anyTime, { minLength: 1, maxLength: 20 }),
      (zone, times) => {
        const readInstant = createInstantReader(zone);
        for (const time of times) {
          const local = time.toISOString().slice(0, -1);
          expect(readInstant(local)).toEqual(toInstant(local, zone));
        }
      },
    ),
  );
});

test('also in every minute of the nights in which clocks are changed', () => {
  const nights = ['2026-03-08', '2026-11-01', '2026-03-29', '2026-10-25', '2026-04-05', '2026-10-04'];
  for (const zone of zones) {
    const readInstant = createInstantReader(zone);
    for (const night of nights)
      for (let minute = 0; minute < 5 * 60; minute += 1) {
        const clock = [Math.floor(minute / 60), minute % 60].map((part) => String(part).padStart(2, '0'));
        const local = `${night}T${clock.join(':')}:30.25`;
        expect(readInstant(local), `${zone} ${local}`).toEqual(toInstant(local, zone));
      }
  }
});

test('an offset in the text goes before the hospital’s zone', () => {
  expect(createInstantReader('America/Denver')('2026-03-04T10:00:00+01:00')?.toISOString()).toBe(
    '2026-03-04T09:00:00.000Z',
  );
});

test('a time that does not exist gives no instant', () => {
  expect(createInstantReader('UTC')('2026-02-30T10:00:00')).toBeNull();
  expect(createInstantReader('UTC')('2026-02-03T10:00:75')).toBeNull();
  expect(createInstantReader('UTC')('2026-02-03T10:60:00')).toBeNull();
  expect(createInstantReader('UTC')('2026-02-03T24:05:00')).toBeNull();
});
