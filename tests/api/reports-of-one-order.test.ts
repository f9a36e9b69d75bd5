import { afterAll, beforeAll, expect, test } from 'vitest';
import type { ProcedureReport } from '../../shared/contract/procedure';
import { makeHospital, makePerson, testPassword } from '../factories';
import { createSender, cumulative, later, newStudy, withTotal } from '../report-series';
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

// Own acceptance check: A (40 events), B (A and 12 more), then C (30 others) under a study of its own, same order.
test('a restart that splits a case in two studies of one order gives one procedure with 82 events', async () => {
  const { procedureId } = await send(cumulative(310, 0, 0, 40));
  await send(cumulative(310, 1, 0, 52));
  const c = await send(later(newStudy(cumulative(310, 2, 52, 82), 311), 3));
  expect(c.procedureId).toBe(procedureId);
  const all = await open(procedureId);
  expect([all.eventCount, all.reports.map(({ origin }: ProcedureReport) => origin)]).toEqual([
    82,
    ['study', 'study', 'order'],
  ]);
  expect(all.kermaAreaProductGyCm2).toBeCloseTo(82, 9);
  expect(all.referenceAirKermaGy).toBeCloseTo(0.82, 9);
});

test('a case of one order goes on in another room: one procedure, both machines', async () => {
  const { procedureId } = await send(cumulative(312, 0, 0, 10));
  const other = later(newStudy(cumulative(312, 1, 10, 20), 313), 2);
  const second = await send({ ...other, equipment: { ...other.equipment, serialNumber: 'QR-99998' } });
  expect(second.procedureId).toBe(procedureId);
  expect((await open(procedureId)).planes).toHaveLength(2);
});

test('another study of the order the day after, of another patient, or without an order is another procedure', async () => {
  const { procedureId } = await send(cumulative(314, 0, 0, 10));
  const other = newStudy(cumulative(314, 1, 10, 20), 315);
  const next = await send(later(other, 14));
  const patient = { ...other.patient, id: 'MCR9998' };
  const foreign = await send({ ...newStudy(cumulative(314, 2, 20, 30), 316), patient });
  const orderless = await send({ ...newStudy(cumulative(314, 3, 30, 40), 317), accessionNumber: null });
  const nameless = { ...other.patient, id: '' };
  const unknown = await send({ ...newStudy(cumulative(314, 4, 40, 50), 318), patient: nameless });
  const alsoUnknown = await send({ ...newStudy(cumulative(314, 5, 50, 60), 319), patient: nameless });
  const ids = [
    procedureId,
    ...[next, foreign, orderless, unknown, alsoUnknown].map((sent) => sent.procedureId),
  ];
  expect(new Set(ids).size).toBe(6);
});

test('a phantom exposure under the order, or even the study, of a patient stays apart', async () => {
  const intent = { value: '113680', scheme: 'DCM', meaning: 'Quality Control Intent' };
  const { procedureId } = await send(cumulative(320, 0, 0, 10));
  const sameOrder = await send({ ...newStudy(cumulative(320, 1, 10, 12), 321), intent });
  const phantom = { intent, accessionNumber: null };
  const sameStudy = await send({ ...cumulative(320, 2, 12, 14), ...phantom });
  const again = await send({ ...cumulative(320, 3, 12, 15), ...phantom });
  expect(new Set([procedureId, sameOrder.procedureId, sameStudy.procedureId]).size).toBe(3);
  expect(again.procedureId).toBe(sameStudy.procedureId);
  expect((await open(procedureId)).eventCount).toBe(10);
});

test('twelve reports of one order, each a study of its own, arriving at once make one procedure', async () => {
  const sent = await Promise.all(
    Array.from({ length: 12 }, (_, index) =>
      send(newStudy(cumulative(330, index, index * 2, index * 2 + 2), 331 + index)),
    ),
  );
  expect(sent.map(({ outcome }) => outcome)).toEqual(Array(12).fill('stored'));
  expect(new Set(sent.map(({ procedureId }) => procedureId)).size).toBe(1);
  const procedure = await open(sent[0]?.procedureId as string);
  expect([procedure.eventCount, procedure.reports.length]).toEqual([24, 12]);
  expect(procedure.kermaAreaProductGyCm2).toBeCloseTo(24, 9);
});

test('totals of a second study of the order are not lost beside the exposures of the first', async () => {
  const { procedureId } = await send(cumulative(354, 0, 0, 10));
  const second = await send(newStudy(withTotal(cumulative(354, 1, 0, 0), 7), 355));
  expect(second.procedureId).toBe(procedureId);
  expect((await open(procedureId)).kermaAreaProductGyCm2).toBeCloseTo(17, 9);
  expect(await standingsOf(procedureId)).toEqual(['adds', 'adds']);
});
