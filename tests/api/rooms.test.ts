import request from 'supertest';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { makeHospital, makePerson, testPassword } from '../factories';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';

let app: TestApp;
let administrator: Agent;
let technologist: Agent;

beforeAll(async () => {
  app = await startTestApp();
  const hospitalId = await makeHospital(app.dataSource);
  await makePerson(app.dataSource, hospitalId, { email: 'a@example.org', roles: ['administrator'] });
  await makePerson(app.dataSource, hospitalId, { email: 't@example.org', roles: ['technologist'] });
  administrator = await signIn(app.app, 'a@example.org', testPassword);
  technologist = await signIn(app.app, 't@example.org', testPassword);
});
afterAll(() => app.close());

const room = (overrides: Record<string, unknown> = {}) => ({
  code: 'R1',
  name: 'Suite 1',
  note: '  ',
  isActive: true,
  ...overrides,
});

test('a room is added, edited and told apart by its code', async () => {
  const { body: added } = await administrator.post('/api/rooms').send(room()).expect(201);
  expect(added).toMatchObject({ code: 'R1', note: null, version: 1 });
  const twin = await administrator.post('/api/rooms').send(room({ name: 'Other' }));
  expect([twin.status, twin.body.issues[0]]).toEqual([
    409,
    { pointer: '/code', detail: 'Another room has this code.' },
  ]);
  const edit = room({ name: 'Suite one', version: 1 });
  await administrator.put(`/api/rooms/${added.id}`).send(edit).expect(200);
  const late = await administrator
    .put(`/api/rooms/${added.id}`)
    .send(room({ name: 'Suite 1a', version: 1 }))
    .expect(409);
  expect(late.body).toMatchObject({ code: 'conflict', current: { name: 'Suite one', version: 2 } });
  await administrator
    .put(`/api/rooms/${added.id}`)
    .send(room({ name: 'Suite 1b' }))
    .expect(409);
});

test('all issues are told at once', async () => {
  const { body } = await administrator.post('/api/rooms').send({ code: ' ', isActive: true }).expect(422);
  expect(body.issues.map((issue: { pointer: string }) => issue.pointer)).toEqual(['/code', '/name']);
});

test('a technologist reads the rooms and changes none; signed out they are closed', async () => {
  const { body } = await technologist.get('/api/rooms').expect(200);
  await technologist
    .post('/api/rooms')
    .send(room({ code: 'R2' }))
    .expect(403);
  await technologist
    .put(`/api/rooms/${body.items[0].id}`)
    .send(room({ version: 2 }))
    .expect(403);
  await request(app.app).get('/api/rooms').expect(401);
});
