import { describe, expect, it } from 'vitest';
import type { Garment } from '../../../shared/contract/garment';
import { offerGarments } from './garment-choices';
import { readPlaceChoice } from './place-choices';
import { mirrorPresences, newPresence, seatOperator, seatPerson, wearOwn } from './presence-values';

const garment = (id: string, ownerId: string | null, over: Partial<Garment> = {}): Garment => ({
  id,
  code: id,
  kind: 'one-piece',
  material: 'lead',
  frontLeadMm: 0.5,
  backLeadMm: 0.25,
  leadKvp: 100,
  isMeasured: false,
  owner: ownerId === null ? null : { id: ownerId, name: `Owner ${ownerId}` },
  state: 'in-service',
  lastInspectedOn: null,
  nextDueOn: null,
  isOverdue: false,
  note: null,
  version: 1,
  ...over,
});

const register = [
  garment('overdue', 'ana', { isOverdue: true }),
  garment('good', 'ana'),
  garment('gone', 'ana', { state: 'withdrawn' }),
  garment('collar', 'ana', { kind: 'thyroid-collar' }),
  garment('shared', null),
  garment('foreign', 'ben'),
];

describe('the operator’s row', () => {
  it('is added on top, at the operator’s place, in the own garment that is in date', () => {
    const scrub = newPresence('scrub', 'right');
    const rows = seatOperator([scrub], 'primary-operator', 'ana', register, 'right');
    expect(rows).toHaveLength(2);
    expect(rows[0]).toMatchObject({
      personId: 'ana',
      duty: 'primary-operator',
      garmentAnswer: 'worn',
      garmentId: 'good',
      hasThyroidCollar: true,
      fluoroscopyPlace: { preset: 'operator', xM: -0.6, yM: -0.45 },
    });
    expect(rows[1]).toBe(scrub);
  });
  it('takes the name of another operator, and that person’s garment with it', () => {
    const rows = seatOperator([], 'primary-operator', 'ana', register, 'right');
    const again = seatOperator(rows, 'primary-operator', 'ben', register, 'right');
    expect(again).toHaveLength(1);
    expect(again[0]).toMatchObject({ personId: 'ben', garmentId: 'foreign', hasThyroidCollar: null });
  });
  it('moves somebody who is listed already instead of listing them twice', () => {
    const second = wearOwn(newPresence('second-operator', 'right'), 'ana', register);
    const rows = seatOperator([second], 'primary-operator', 'ana', register, 'right');
    expect(rows).toHaveLength(1);
    expect(rows[0]).toMatchObject({ duty: 'primary-operator', fluoroscopyPlace: { preset: 'operator' } });
  });
});

it('keeps a garment answer that was given, and a place that was moved by hand', () => {
  const moved = { preset: null, xM: 1, yM: 1, isBehindBarrier: false } as const;
  const row = {
    ...newPresence('other', null),
    garmentAnswer: 'none' as const,
    fluoroscopyPlace: { ...moved },
  };
  const seated = seatPerson(row, { id: 'ana', name: 'Ana', job: 'nurse', isActive: true }, register, null);
  expect(seated).toMatchObject({
    duty: 'scrub',
    garmentAnswer: 'none',
    garmentId: null,
    fluoroscopyPlace: moved,
  });
});

it('mirrors unmoved presets with the access side, and nothing else', () => {
  const moved = { preset: null, xM: -0.6, yM: -0.45, isBehindBarrier: false } as const;
  const rows = mirrorPresences(
    [newPresence('primary-operator', 'right'), { ...newPresence('other', 'right'), fluoroscopyPlace: moved }],
    'left',
  );
  expect(rows.map((row) => row.fluoroscopyPlace?.xM)).toEqual([0.6, -0.6]);
});

it('offers own garments first, then the answers, and never what is out of service', () => {
  expect(offerGarments(register, 'ana', null).map(({ value }) => value)).toEqual([
    'good',
    'overdue',
    'none',
    'unknown',
    'shared',
    'foreign',
  ]);
  expect(offerGarments(register, 'ana', null)[1]?.detail).toContain('inspection overdue');
  // A record of last year still says what was worn then.
  expect(offerGarments(register, 'ana', 'gone').map(({ value }) => value)).toContain('gone');
});

it('sets a preset’s coordinates free without moving the person', () => {
  const place = readPlaceChoice('scrub', null, 'left');
  expect(place).toMatchObject({ preset: 'scrub', xM: 0.7, yM: -1.35 });
  expect(readPlaceChoice('moved', place, 'left')).toMatchObject({ preset: null, xM: 0.7, yM: -1.35 });
  expect(readPlaceChoice('', place, 'left')).toBeNull();
});
