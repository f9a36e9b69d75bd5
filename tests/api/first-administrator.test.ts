import request from 'supertest';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { offerFirstAdministrator } from '../../server/session/offer-first-administrator';
import { testPassword } from '../factories';
import { startTestApp, type TestApp } from '../test-app';

let app: TestApp;
let lines: string[] = [];

beforeAll(async () => {
  app = await startTestApp();
});
afterAll(() => app.close());

const start = async () => {
  lines = [];
  await offerFirstAdministrator(app.dataSource.manager, 'http://127.0.0.1:4600', (line) => lines.push(line));
  return /\/welcome\/([\w-]+)$/.exec(lines[0] ?? '')?.[1] ?? '';
};

const first = (token: string) => ({
  token,
  password: testPassword,
  hospitalName: 'Test Hospital',
  timeZone: 'Europe/Vienna',
  name: 'A-01',
  email: 'a@example.org',
});

/** One story, from an empty database to a hospital with a room. */
test('from nothing, the printed link makes the hospital, its first administrator and a session', async () => {
  const forgotten = await start();
  const token = await start();
  await request(app.app).get(`/api/sign-in-links/${forgotten}`).expect(410);
  const link = await request(app.app).get(`/api/sign-in-links/${token}`).expect(200);
  expect(link.body).toEqual({ purpose: 'first-administrator', email: null, name: null });

  const incomplete = await request(app.app)
    .post('/api/sign-in-links')
    .send({ token, password: testPassword, timeZone: 'Nowhere/Land' });
  expect(incomplete.status).toBe(422);
  expect(incomplete.body.issues.map((issue: { pointer: string }) => issue.pointer)).toEqual([
    '/hospitalName',
    '/name',
    '/email',
    '/timeZone',
  ]);

  const agent = request.agent(app.app);
  const { body } = await agent.post('/api/sign-in-links').send(first(token)).expect(200);
  expect(body.user).toMatchObject({ name: 'A-01', roles: ['administrator'] });
  expect(body.hospital).toEqual({ name: 'Test Hospital', timeZone: 'Europe/Vienna', isDemo: false });
  await request(app.app).post('/api/sign-in-links').send(first(token)).expect(410);

  await agent.post('/api/rooms').send({ code: 'R1', name: 'Suite 1', note: '', isActive: true }).expect(201);
  const people = await agent.get('/api/people').expect(200);
  expect(people.body.items).toHaveLength(1);

  expect(await start()).toBe('');
  expect(lines).toEqual([]);
});
