import { afterAll, beforeAll, expect, test } from 'vitest';
import type { ProcedureReport } from '../../shared/contract/procedure';
import { makeHospital, makePerson, testPassword } from '../factories';
import { createSender, cumulative, later, withTotal } from '../report-series';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';

let app: TestApp;
let technologist: Agent;

beforeAll(async () => {
  app = await startTestApp();
  const hospitalId = await makeHospital(app.dataSource);
  await makePerson(app.dataSource, hospitalId, { email: 't@example.org', roles: ['technologist'] });
  technologist = await signIn(app.app, 't@example.org', testPassword);
});
afterAll(() => app.close());

const { send, open, standingsOf } = createSender(() => technologist);

// Own acceptance check: files A (40 events), B (A and 12 more), C (30 others of the same study).
test('a later report that holds the earlier events and a continuation give each event once', async () => {
  const a = cumulative(301, 0, 0, 40);
  const first = await send(a);
  expect((await open(first.procedureId)).eventCount).toBe(40);
  await send(cumulative(301, 1, 0, 52));
  const second = await open(first.procedureId);
  expect(second.eventCount).toBe(52);
  expect(second.kermaAreaProductGyCm2).toBeCloseTo(52, 9);
  expect(second.planes[0].basis).toBe('reported');
  const third = await send(cumulative(301, 2, 52, 82));
  expect(third.procedureId).toBe(first.procedureId);
  const all = await open(first.procedureId);
  expect(all.eventCount).toBe(82);
  expect(all.kermaAreaProductGyCm2).toBeCloseTo(82, 9);
  expect(all.referenceAirKermaGy).toBeCloseTo(0.82, 9);
  expect(all.fluoroscopyTimeS).toBeCloseTo(820, 9);
  expect(all.planes[0].basis).toBe('summed');
  const [listedA, listedB, listedC] = all.reports as ProcedureReport[];
  expect([listedA?.standing, listedB?.standing, listedC?.standing]).toEqual(['superseded', 'adds', 'adds']);
  expect(listedA?.byId).toBe(listedB?.id);
  await technologist.get(`/api/dose-reports/${listedA?.id}/original`).expect(200);
  const again = await send(a);
  expect(again.outcome).toBe('duplicate');
  expect((await open(first.procedureId)).kermaAreaProductGyCm2).toBeCloseTo(82, 9);
});

test('the order in which reports come does not matter', async () => {
  await send(cumulative(302, 1, 0, 20));
  const { procedureId } = await send(cumulative(302, 0, 0, 10));
  const procedure = await open(procedureId);
  expect([procedure.eventCount, procedure.kermaAreaProductGyCm2, procedure.planes[0].basis]).toEqual([
    20,
    20,
    'reported',
  ]);
});

test('a copy under a new SOP Instance UID counts its events once', async () => {
  const { procedureId } = await send(cumulative(303, 0, 0, 10));
  const copy = await send(cumulative(303, 1, 0, 10));
  expect([copy.outcome, copy.procedureId]).toEqual(['stored', procedureId]);
  expect((await open(procedureId)).kermaAreaProductGyCm2).toBeCloseTo(10, 9);
});

test('the same SOP Instance UID with other content is held for a person; nothing is overwritten', async () => {
  const { procedureId } = await send(cumulative(304, 0, 0, 10));
  const other = await send({
    ...cumulative(304, 0, 0, 11),
    sopInstanceUid: cumulative(304, 0, 0, 10).sopInstanceUid,
  });
  expect([other.outcome, other.procedureId, other.reason?.code]).toEqual([
    'held',
    null,
    'sop-instance-conflict',
  ]);
  expect((await open(procedureId)).eventCount).toBe(10);
});

test('the same study UID of another patient is another procedure', async () => {
  const mine = cumulative(305, 0, 0, 5);
  const { procedureId } = await send(mine);
  const yours = await send({ ...cumulative(305, 1, 5, 9), patient: { ...mine.patient, id: 'MCR9999' } });
  expect(yours.outcome).toBe('stored');
  expect(yours.procedureId).not.toBe(procedureId);
});

test('two machines of one study: kerma-area product adds up, air kerma is an upper bound', async () => {
  const { procedureId } = await send(cumulative(306, 0, 0, 10));
  const other = cumulative(306, 1, 10, 20);
  await send({ ...other, equipment: { ...other.equipment, serialNumber: 'QR-99999' } });
  const procedure = await open(procedureId);
  expect(procedure.planes).toHaveLength(2);
  expect(procedure.kermaAreaProductGyCm2).toBeCloseTo(20, 9);
  expect([
    procedure.isReferenceAirKermaUpperBound,
    procedure.planes.every((plane: { basis: string }) => plane.basis === 'reported'),
  ]).toEqual([true, true]);
});

test('a quality-control exposure stays outside the ledger', async () => {
  const { procedureId } = await send({
    ...cumulative(307, 0, 0, 3),
    intent: { value: '113680', scheme: 'DCM', meaning: 'Quality Control Intent' },
  });
  expect((await open(procedureId)).procedureClass).toBe('quality-control');
  const ids = async (query: string) =>
    (await technologist.get(`/api/procedures?period=all&${query}`).expect(200)).body.items.map(
      (item: { id: string }) => item.id,
    );
  expect(await ids('kind=fluoroscopy')).not.toContain(procedureId);
  expect(await ids('kind=quality-control')).toContain(procedureId);
});

test('the hospital’s zone decides the day: ten in the evening in Denver is not the next day', async () => {
  const content = cumulative(308, 0, 0, 1);
  const late = content.events.map((event) => ({ ...event, startedAt: '2026-03-04T22:30:00' }));
  const { procedureId } = await send({ ...content, events: late });
  const [row] = await app.dataSource.query(
    'select local_date::text as day, started_at from procedure where id = $1',
    [procedureId],
  );
  expect([row.day, row.started_at.toISOString()]).toEqual(['2026-03-04', '2026-03-05T05:30:00.000Z']);
});

test('one report for each exposure: they add up', async () => {
  const { procedureId } = await send(cumulative(350, 0, 0, 1));
  await send(cumulative(350, 1, 1, 2));
  await send(cumulative(350, 2, 2, 3));
  expect(await standingsOf(procedureId)).toEqual(['adds', 'adds', 'adds']);
  expect((await open(procedureId)).kermaAreaProductGyCm2).toBeCloseTo(3, 9);
});

test('where clocks disagree, the stated predecessor decides which of two equal reports counts', async () => {
  const first = withTotal(cumulative(351, 5, 0, 10), 10.1);
  const { procedureId } = await send(first);
  const sopClassUid = '1.2.840.10008.5.1.4.1.1.88.67';
  await send({
    ...withTotal(cumulative(351, 1, 0, 10), 10.4),
    predecessors: [{ sopClassUid, sopInstanceUid: first.sopInstanceUid }],
  });
  expect((await open(procedureId)).kermaAreaProductGyCm2).toBeCloseTo(10.4, 9);
  expect(await standingsOf(procedureId)).toEqual(['repeats', 'counts']);
});

test('a complete report counts before a partial one, whichever came first', async () => {
  const { procedureId } = await send(withTotal(cumulative(352, 1, 0, 10), 10.4));
  await send({ ...withTotal(cumulative(352, 5, 0, 10), 9.5), completionFlag: 'PARTIAL' });
  expect((await open(procedureId)).kermaAreaProductGyCm2).toBeCloseTo(10.4, 9);
  await send({ ...withTotal(cumulative(352, 6, 0, 12), 12.5), completionFlag: 'PARTIAL' });
  expect((await open(procedureId)).kermaAreaProductGyCm2).toBeCloseTo(12.5, 9);
});

const step = (uid: string) => ({ kind: 'performed-procedure-step' as const, uid });

test('totals without exposures: superseded by a full report of the machine, added for a step of their own', async () => {
  const totals = { ...withTotal(cumulative(353, 0, 0, 0), 7), scope: step('2.25.1') };
  const { procedureId } = await send(totals);
  await send({ ...withTotal(cumulative(353, 1, 0, 0), 8), scope: step('2.25.1') });
  expect((await open(procedureId)).kermaAreaProductGyCm2).toBeCloseTo(8, 9);
  await send({ ...withTotal(cumulative(353, 2, 0, 0), 5), scope: step('2.25.2') });
  expect((await open(procedureId)).kermaAreaProductGyCm2).toBeCloseTo(13, 9);
  await send(cumulative(353, 3, 0, 14));
  const full = await open(procedureId);
  expect(full.kermaAreaProductGyCm2).toBeCloseTo(14, 9);
  expect(await standingsOf(procedureId)).toEqual(['superseded', 'superseded', 'superseded', 'counts']);
});

test('a copy that lost the machine’s serial number on its way is no second machine', async () => {
  const content = cumulative(356, 0, 0, 10);
  const { procedureId } = await send(content);
  const equipment = { ...content.equipment, serialNumber: null, manufacturer: null };
  await send({ ...cumulative(356, 1, 0, 10), equipment });
  const procedure = await open(procedureId);
  expect([procedure.planes.length, procedure.eventCount]).toEqual([1, 10]);
  expect(procedure.kermaAreaProductGyCm2).toBeCloseTo(10, 9);
});

test('a copy whose clock was set right counts its exposures once', async () => {
  const { procedureId } = await send(cumulative(357, 0, 0, 10));
  await send(later(cumulative(357, 1, 0, 12), 1));
  const procedure = await open(procedureId);
  expect([procedure.eventCount, procedure.planes[0].summed.kermaAreaProductGyCm2]).toEqual([12, 12]);
});

// Own acceptance check: A 1.80 Gy, 130 Gy·cm², 21.0 min; B 1.20, 60, 13.5; "all planes" repeats their sum.
test('two planes: 3.00 Gy as an upper bound, 190 Gy·cm², 34.5 min; the maker’s own sum is not added', async () => {
  const plane = (name: 'A' | 'B' | 'all', gy: number, product: number, minutes: number) => ({
    plane: name,
    referenceAirKermaGy: gy,
    kermaAreaProductGyCm2: product,
    fluoroscopyTimeS: minutes * 60,
  });
  const { procedureId } = await send({
    ...cumulative(358, 0, 0, 0),
    planes: [plane('A', 1.8, 130, 21), plane('B', 1.2, 60, 13.5), plane('all', 3, 190, 34.5)],
  });
  const procedure = await open(procedureId);
  expect(procedure.planes.map((one: { plane: string }) => one.plane)).toEqual(['A', 'B']);
  expect([procedure.referenceAirKermaGy, procedure.isReferenceAirKermaUpperBound]).toEqual([3, true]);
  expect(procedure.kermaAreaProductGyCm2).toBeCloseTo(190, 9);
  expect(procedure.fluoroscopyTimeS).toBeCloseTo(34.5 * 60, 9);
});
