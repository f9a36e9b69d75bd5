import request from 'supertest';
import { afterAll, beforeAll, expect, test } from 'vitest';
import type { ExposurePoints } from '../../shared/contract/staff-exposure';
import type { Role } from '../../shared/permissions';
import { makeEstimate, makeProcedure } from '../estimate-factory';
import { makeHospital, makePerson, testPassword } from '../factories';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';

/** 05:30 UTC on 1 December is still 30 November in America/Denver, where the hospital stands. */
const now = new Date('2026-12-01T05:30:00Z');

let app: TestApp;
let hospitalId: string;
let physicist: Agent;
let interventionalist: Agent;
let committee: Agent;
let ownId: string;
let otherId: string;
let ownCase: string;
let assistedCase: string;

async function addPerson(name: string, roles: Role[] = []): Promise<string> {
  const email = `${name.toLowerCase()}@example.org`;
  return makePerson(app.dataSource, hospitalId, { name, email, roles });
}
const as = (name: string) => signIn(app.app, `${name.toLowerCase()}@example.org`, testPassword);

beforeAll(async () => {
  app = await startTestApp(() => now);
  const { dataSource } = app;
  hospitalId = await makeHospital(dataSource);
  ownId = await addPerson('IC-91', ['interventionalist']);
  otherId = await addPerson('IC-92', ['interventionalist']);
  await addPerson('P-91', ['physicist']);
  await addPerson('Q-91', ['committee']);
  [physicist, interventionalist, committee] = await Promise.all([as('P-91'), as('IC-91'), as('Q-91')]);

  ownCase = await makeProcedure(dataSource, hospitalId, { primaryOperatorId: ownId });
  await makeEstimate(dataSource, ownCase, ownId, 40, { revision: 1 });
  assistedCase = await makeProcedure(dataSource, hospitalId, {
    primaryOperatorId: otherId,
    secondOperatorId: ownId,
    startedAt: new Date('2026-10-20T17:00:00Z'),
  });
  await makeEstimate(dataSource, assistedCase, otherId, 100);
  await makeEstimate(dataSource, assistedCase, ownId, 10, { duty: 'second-operator' });
});
afterAll(() => app.close());

const points = async (agent: Agent, query: Record<string, string> = {}): Promise<ExposurePoints> =>
  (await agent.get('/api/staff-exposure/procedures').query(query).expect(200)).body;
const cases = async (agent: Agent, query: Record<string, string> = {}) =>
  (await points(agent, query)).items.map((point) => point.procedureId);
const nominals = async (agent: Agent, query: Record<string, string> = {}) =>
  (await points(agent, query)).items.map((point) => point.estimate.nominal);

test('the physicist sees the operators of all procedures, highest first, with the interval and the method', async () => {
  const body = await points(physicist);
  expect(body.items.map((point) => point.procedureId)).toEqual([assistedCase, ownCase]);
  expect(body.items[1]).toMatchObject({
    fluoroscopyTimeS: 600,
    kvpMean: 82,
    kermaAreaProductGyCm2: 40,
    estimate: { nominal: 40, low: 20, high: 120 },
  });
  expect(body).toMatchObject({ method: 'scatter-by-event', methodVersion: '1.0.0', isWithheld: false });
  expect(await nominals(physicist, { duty: 'second-operator' })).toEqual([10]);
  expect(await nominals(physicist, { person: ownId })).toEqual([40]);
  expect(await nominals(physicist, { duty: 'any' })).toEqual([100, 40]);
  expect(await nominals(physicist, { duty: 'any', person: ownId })).toEqual([40, 10]);
  expect(await nominals(physicist, { quantity: 'underGarmentHp10USv' })).toEqual([10, 4]);
  expect(await nominals(physicist, { period: '30d' })).toEqual([40]);
});

test('a correction replaces the estimate, and what was withdrawn, quarantined or a test is left out', async () => {
  const { dataSource } = app;
  const id = await makeProcedure(dataSource, hospitalId, { estimateRevision: 2, localDate: '2026-02-03' });
  const asSpecial = { duty: 'other' as const };
  await makeEstimate(dataSource, id, otherId, 7, { ...asSpecial, revision: 1 });
  await makeEstimate(dataSource, id, otherId, 5, { ...asSpecial, revision: 2 });
  for (const defect of [
    { isWithdrawn: true },
    { isQuarantined: true },
    { procedureClass: 'phantom' as const },
    { deviceClass: 'radiography' as const },
  ])
    await makeEstimate(
      dataSource,
      await makeProcedure(dataSource, hospitalId, defect),
      otherId,
      999,
      asSpecial,
    );
  expect(await nominals(physicist, { duty: 'other' })).toEqual([5]);
});

test('missing is missing: without a value there is no point, and an incomplete record is counted', async () => {
  const { dataSource } = app;
  const id = await makeProcedure(dataSource, hospitalId);
  await makeEstimate(dataSource, id, otherId, null, { duty: 'scrub' });
  await makeProcedure(dataSource, hospitalId, { recordState: 'incomplete', primaryOperatorId: ownId });
  const body = await points(physicist, { duty: 'scrub' });
  expect(body).toMatchObject({ items: [], withoutEstimate: 1, incompleteRecords: 1 });
  expect(await points(interventionalist)).toMatchObject({ withoutEstimate: 0, incompleteRecords: 1 });
  const other = await as('IC-92');
  expect(await points(other)).toMatchObject({ incompleteRecords: 0 });
});

test('an interventionalist gets the own figures only, asked or not', async () => {
  expect(await cases(interventionalist)).toEqual([ownCase]);
  expect(await nominals(interventionalist, { duty: 'second-operator' })).toEqual([10]);
  expect(await cases(interventionalist, { person: ownId })).toEqual([ownCase]);
  for (const path of ['procedures', 'months'])
    await interventionalist.get(`/api/staff-exposure/${path}`).query({ person: otherId }).expect(403);
  const { body } = await interventionalist.get('/api/staff-exposure/people').expect(200);
  expect(body.items).toEqual([{ id: ownId, name: 'IC-91', job: 'nurse', procedures: 2 }]);
});

test('a monitored person reads the own figures without a link to the procedure', async () => {
  const nurseId = await addPerson('N-91');
  await makeEstimate(app.dataSource, ownCase, nurseId, 3, { duty: 'circulating' });
  const nurse = await as('N-91');
  expect(await points(nurse, { duty: 'circulating' })).toMatchObject({
    items: [{ procedureId: null, estimate: { nominal: 3 } }],
  });
  const technologistId = await addPerson('T-91', ['technologist']);
  await makeEstimate(app.dataSource, ownCase, technologistId, 2, { duty: 'technologist' });
  expect(await cases(await as('T-91'), { duty: 'technologist' })).toEqual([ownCase]);
});

test('months are summed in the hospital’s calendar, low and high with them, and gaps stay empty', async () => {
  const { body } = await interventionalist.get('/api/staff-exposure/months').query({ period: '90d' });
  expect(body.person).toEqual({ id: ownId, name: 'IC-91' });
  // Ninety days before 30 November is 1 September; it is not December yet where the hospital stands.
  expect(body.items.map((item: { month: string }) => item.month)).toEqual(['2026-09', '2026-10', '2026-11']);
  expect(body.items[0]).toMatchObject({ procedures: 0, collarHp10USv: null });
  expect(body.items[2]).toMatchObject({
    procedures: 1,
    withoutEstimate: 0,
    collarHp10USv: { nominal: 40, low: 20, high: 120 },
    eyeHp3USv: null,
  });
  const second = await makeProcedure(app.dataSource, hospitalId, { localDate: '2026-11-30' });
  await makeEstimate(app.dataSource, second, ownId, 60, { duty: 'trainee' });
  const again = await physicist.get('/api/staff-exposure/months').query({ person: ownId, period: '90d' });
  expect(again.body.items[2]).toMatchObject({
    procedures: 2,
    collarHp10USv: { nominal: 100, low: 50, high: 300 },
  });
});

test('the committee gets no names, no cases and no moments, and nothing that only a few people stand behind', async () => {
  expect(await points(committee)).toMatchObject({ items: [], isWithheld: true });
  const { body: few } = await committee.get('/api/staff-exposure/months').query({ period: '90d' });
  expect(few).toMatchObject({ person: null, isWithheld: true });
  expect(few.items[2]).toMatchObject({ collarHp10USv: null });

  for (const name of ['IC-93', 'IC-94', 'IC-95']) {
    const id = await addPerson(name);
    const procedureId = await makeProcedure(app.dataSource, hospitalId, { primaryOperatorId: id });
    await makeEstimate(app.dataSource, procedureId, id, 20);
  }
  const { items, isWithheld } = await points(committee);
  expect([items.length, isWithheld]).toEqual([5, false]);
  for (const point of items)
    expect(point).toMatchObject({ procedureId: null, caseNumber: null, startedAt: null });
  const answers = [
    await points(committee),
    (await committee.get('/api/staff-exposure/months').expect(200)).body,
    (await committee.get('/api/staff-exposure/people').expect(200)).body,
  ];
  expect(JSON.stringify(answers)).not.toMatch(/IC-9|N-91|T-91|"C-/);
  expect(answers[2]).toEqual({ items: [] });
  await committee.get('/api/staff-exposure/procedures').query({ person: otherId }).expect(403);
  await committee.get('/api/staff-exposure/months').query({ person: otherId }).expect(403);
});

test('a person of another hospital is not there, and signed out all is closed', async () => {
  const elsewhere = await makePerson(app.dataSource, await makeHospital(app.dataSource));
  await physicist.get('/api/staff-exposure/months').query({ person: elsewhere }).expect(404);
  for (const path of ['procedures', 'months', 'people'])
    await request(app.app).get(`/api/staff-exposure/${path}`).expect(401);
  await physicist.get('/api/staff-exposure/procedures').query({ duty: 'visitor' }).expect(422);
});
