import { afterAll, beforeAll, expect, test } from 'vitest';
import { placeFromPreset } from '../../shared/dosimetry/room-positions';
import { makeGarment, makeHospital, makePerson, makeProcedureType, testPassword } from '../factories';
import { readSample } from '../samples';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';

let app: TestApp;
let technologist: Agent;
let physicist: Agent;
let operator: Agent;
let nurse: Agent;
let procedureId: string;
let ids: Record<'operator' | 'nurse' | 'garment' | 'withdrawn' | 'type', string>;

beforeAll(async () => {
  app = await startTestApp();
  const { dataSource } = app;
  const hospitalId = await makeHospital(dataSource);
  const person = (email: string, overrides: Parameters<typeof makePerson>[2]) =>
    makePerson(dataSource, hospitalId, { email, ...overrides });
  await person('t@example.org', { roles: ['technologist'], job: 'technologist' });
  await person('p@example.org', { roles: ['physicist'], job: 'physicist' });
  ids = {
    operator: await person('o@example.org', {
      name: 'IR-7',
      roles: ['interventionalist'],
      job: 'interventional-radiologist',
    }),
    nurse: await person('n@example.org', { name: 'N-07', job: 'nurse' }),
    garment: await makeGarment(dataSource, hospitalId, { code: 'G-1' }),
    withdrawn: await makeGarment(dataSource, hospitalId, { code: 'G-2', state: 'withdrawn' }),
    type: await makeProcedureType(dataSource, hospitalId, { name: 'Hepatic arteriography' }),
  };
  technologist = await signIn(app.app, 't@example.org', testPassword);
  physicist = await signIn(app.app, 'p@example.org', testPassword);
  operator = await signIn(app.app, 'o@example.org', testPassword);
  nurse = await signIn(app.app, 'n@example.org', testPassword);
  const { body } = await technologist
    .post('/api/dose-reports')
    .attach('files', readSample('01-single-plane.dcm'), '01-single-plane.dcm');
  procedureId = body.results[0].procedureId;
});
afterAll(() => app.close());

const presence = (
  personId: string,
  preset: 'operator' | 'circulating',
  garmentId: string | null = ids.garment,
) => ({
  personId,
  visitorName: null,
  duty: preset === 'operator' ? 'primary-operator' : 'circulating',
  fluoroscopyPlace: placeFromPreset(preset),
  acquisitionPlace: placeFromPreset(preset),
  garmentAnswer: garmentId ? 'worn' : 'none',
  garmentId,
  hasThyroidCollar: true,
});

const read = async () => (await technologist.get(`/api/procedures/${procedureId}`).expect(200)).body;
const save = async (changes: object, agent = technologist) => {
  const { record } = await read();
  const { state: _, missing: __, fromFile: ___, people: ____, ...answers } = record;
  return agent.put(`/api/procedures/${procedureId}/record`).send({ ...answers, ...changes });
};
const exposures = async (agent: Agent) =>
  (await agent.get(`/api/procedures/${procedureId}/staff-exposures`)).body;

test('what the file says is prefilled and marked as such', async () => {
  const { record } = await read();
  expect(record.procedureTypeId).toBe(ids.type);
  expect(record.fromFile).toContain('procedureTypeId');
  expect(record.state).toBe('incomplete');
});

test('an incomplete record has no estimate and says what is missing', async () => {
  const { items, notEstimable } = await exposures(physicist);
  expect(items).toEqual([]);
  expect(notEstimable.detail).toMatch(/operator/);
});

test('a completed record gives every person an estimate that lies in its own interval', async () => {
  const answer = await save({
    primaryOperatorId: ids.operator,
    presences: [presence(ids.operator, 'operator'), presence(ids.nurse, 'circulating')],
  });
  expect(answer.status).toBe(200);
  expect(answer.body.recordState).toBe('complete');
  const { items } = await exposures(physicist);
  expect(items.map((item: { person: { name: string } }) => item.person.name)).toEqual(['IR-7', 'N-07']);
  for (const item of items)
    for (const name of ['collarHp10USv', 'underGarmentHp10USv', 'effectiveDoseUSv']) {
      const { nominal, low, high } = item[name];
      expect(low).toBeGreaterThan(0);
      expect(low).toBeLessThanOrEqual(nominal);
      expect(nominal).toBeLessThanOrEqual(high);
    }
  expect(items[0].collarHp10USv.nominal).toBeGreaterThan(items[1].collarHp10USv.nominal);
  expect(items[0]).toMatchObject({ method: 'scatter-by-event', intervalMethod: 'draws' });
});

test('opened twice, the figures are the same', async () => {
  expect((await exposures(physicist)).items).toEqual((await exposures(physicist)).items);
});

test('technologists see job titles, the operator sees own name, a nurse only the own row', async () => {
  const byJob = (await exposures(technologist)).items;
  expect(byJob.map((item: object) => 'person' in item)).toEqual([false, false]);
  expect(JSON.stringify(byJob)).not.toMatch(/IR-7|N-07|G-1/);
  const own = (await exposures(operator)).items;
  expect(own.map((item: { person?: { name: string } }) => item.person?.name)).toEqual(['IR-7', undefined]);
  expect((await exposures(nurse)).items).toHaveLength(1);
});

test('a complete record is corrected with a reason only; the earlier estimate stays', async () => {
  const changes = { presences: [presence(ids.operator, 'operator', null)] };
  const refused = await save(changes);
  expect([refused.status, refused.body.issues[0].pointer]).toEqual([422, '/reason']);
  const [{ n: before }] = await app.dataSource.query('select count(*)::int as n from staff_estimate');
  const corrected = await save({ ...changes, reason: 'the apron hung on its hook' });
  expect(corrected.status).toBe(200);
  const [{ n: after }] = await app.dataSource.query('select count(*)::int as n from staff_estimate');
  expect(after).toBe(before + 1);
  const { items } = await exposures(physicist);
  expect(items).toHaveLength(1);
  expect(items[0].underGarmentHp10USv).toBeNull();
  expect(items[0].effectiveDoseUSv.nominal).toBeGreaterThan(0);
});

test('two who save the same version: the second is shown what the first saved', async () => {
  const { record } = await read();
  const { state: _, missing: __, fromFile: ___, people: ____, ...answers } = record;
  const path = `/api/procedures/${procedureId}/record`;
  await technologist
    .put(path)
    .send({ ...answers, isEmergency: true, reason: 'it was an emergency' })
    .expect(200);
  const { body } = await physicist
    .put(path)
    .send({ ...answers, isEmergency: false, reason: 'it was not' })
    .expect(409);
  expect(body.code).toBe('conflict');
  expect(body.current.isEmergency).toBe(true);
});

test('a withdrawn garment cannot be chosen, and every issue is told at once', async () => {
  const answer = await save({
    reason: 'try',
    presences: [presence(ids.operator, 'operator', ids.withdrawn), presence(ids.withdrawn, 'circulating')],
  });
  expect(answer.status).toBe(422);
  expect(answer.body.issues.map((issue: { pointer: string }) => issue.pointer)).toEqual([
    '/presences/0/garmentId',
    '/presences/1/personId',
  ]);
});

test('an interventionalist finds own procedures only, by list and by address', async () => {
  const { body } = await technologist
    .post('/api/dose-reports')
    .attach('files', readSample('03-odd-units.dcm'), '03-odd-units.dcm');
  const other = body.results[0].procedureId;
  const list = await operator.get('/api/procedures?period=all').expect(200);
  expect(list.body.items.map((item: { id: string }) => item.id)).toEqual([procedureId]);
  for (const path of ['', '/patient', '/irradiation-events', '/staff-exposures'])
    await operator.get(`/api/procedures/${other}${path}`).expect(404);
  await nurse.get('/api/procedures').expect(403);
});

test('each look at the patient leaves an audit line, and nobody can change the trail', async () => {
  const lines = () =>
    app.dataSource.query(`select count(*)::int as n from audit_entry where action = 'patient shown'`);
  const [{ n: before }] = await lines();
  await physicist.get(`/api/procedures/${procedureId}/patient`).expect(200);
  const [{ n: after }] = await lines();
  expect(after).toBe(before + 1);
  await expect(app.dataSource.query(`update audit_entry set action = 'nothing'`)).rejects.toThrow(
    /never changed/,
  );
  await expect(app.dataSource.query('delete from audit_entry')).rejects.toThrow(/never changed/);
});

test('a withdrawn procedure leaves the list with its reason and can be restored', async () => {
  const { record } = await read();
  const path = `/api/procedures/${procedureId}`;
  const withdrawn = await technologist
    .patch(path)
    .send({ isWithdrawn: true, reason: 'wrong patient', version: record.version });
  expect(withdrawn.status).toBe(200);
  const list = await technologist.get('/api/procedures?period=all').expect(200);
  expect(list.body.items.map((item: { id: string }) => item.id)).not.toContain(procedureId);
  expect(withdrawn.body.history[0]).toMatchObject({ action: 'procedure withdrawn', reason: 'wrong patient' });
  const version = withdrawn.body.record.version;
  await technologist.patch(path).send({ isWithdrawn: false, reason: 'it was right', version }).expect(200);
  await technologist
    .patch(path)
    .send({ procedureClass: 'phantom', reason: 'phantom', version: version + 2 })
    .expect(403);
});
