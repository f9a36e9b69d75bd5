import request from 'supertest';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { makeHospital, makePerson, testPassword } from '../factories';
import { signIn, startTestApp, type TestApp } from '../test-app';

let app: TestApp;

beforeAll(async () => {
  app = await startTestApp();
  const hospitalId = await makeHospital(app.dataSource);
  await makePerson(app.dataSource, hospitalId, {
    name: 'T-01',
    email: 't@example.org',
    roles: ['technologist'],
  });
});
afterAll(() => app.close());

test('signed out is an answer, not an error', async () => {
  const { body } = await request(app.app).get('/api/session').expect(200);
  expect(body.user).toBeNull();
});

test('a right password signs in, and the session is kept in the database', async () => {
  const agent = await signIn(app.app, 'T@Example.org', testPassword);
  const { body } = await agent.get('/api/session').expect(200);
  expect(body.user).toMatchObject({ name: 'T-01', roles: ['technologist'] });
  const [{ count }] = await app.dataSource.query('select count(*)::int as count from session');
  expect(count).toBe(1);
});

test('signing in gives a new session id: one known before is worth nothing', async () => {
  const agent = request.agent(app.app);
  const first = await agent.post('/api/session').send({ email: 't@example.org', password: testPassword });
  const second = await agent.post('/api/session').send({ email: 't@example.org', password: testPassword });
  const idOf = (response: request.Response) =>
    /leeward\.session=([^;]+)/.exec(String(response.headers['set-cookie']))?.[1];
  expect(idOf(first)).toBeTruthy();
  expect(idOf(second)).not.toBe(idOf(first));
});

test('the cookie is out of reach of scripts and of other sites', async () => {
  const { headers } = await request(app.app)
    .post('/api/session')
    .send({ email: 't@example.org', password: testPassword });
  expect(String(headers['set-cookie'])).toMatch(/HttpOnly/);
  expect(String(headers['set-cookie'])).toMatch(/SameSite=Lax/);
});

test('a wrong password and an unknown e-mail get the same answer', async () => {
  const wrong = await request(app.app).post('/api/session').send({ email: 't@example.org', password: 'no' });
  const unknown = await request(app.app)
    .post('/api/session')
    .send({ email: 'x@example.org', password: 'no' });
  expect(wrong.status).toBe(401);
  expect([unknown.status, unknown.body.code, unknown.body.detail]).toEqual([
    401,
    wrong.body.code,
    wrong.body.detail,
  ]);
});

test('the eleventh wrong try waits, even with the right password', async () => {
  const tries = Array.from({ length: 10 }, () => ({ email: 'throttled@example.org', password: 'no' }));
  for (const body of tries) await request(app.app).post('/api/session').send(body).expect(401);
  const { body } = await request(app.app).post('/api/session').send(tries[0]).expect(429);
  expect(body.detail).toMatch(/Wait \d+ min/);
});

test('one address that tries a hundred accounts waits for all of them', async () => {
  const { body: before } = await request(app.app)
    .post('/api/session')
    .send({ email: 'spread@example.org', password: 'no' });
  expect(before.code).toBe('wrong-credentials');
  await app.dataSource.query(`update rate_limit set points = 100 where key like 'sign-in-address:%'`);
  const { status } = await request(app.app)
    .post('/api/session')
    .send({ email: 't@example.org', password: testPassword });
  expect(status).toBe(429);
  await app.dataSource.query('delete from rate_limit');
});

test('a request from another site may not change anything; a program without browser headers may', async () => {
  const credentials = { email: 't@example.org', password: testPassword };
  const crossSite = await request(app.app)
    .post('/api/session')
    .set('Sec-Fetch-Site', 'cross-site')
    .send(credentials);
  expect([crossSite.status, crossSite.body.code]).toEqual([403, 'cross-site']);
  const origin = await request(app.app)
    .post('/api/session')
    .set('Origin', 'https://elsewhere.example')
    .send(credentials);
  expect(origin.status).toBe(403);
  await request(app.app).post('/api/session').send(credentials).expect(200);
});

test('every issue of the input is told at once', async () => {
  const { body, status, type } = await request(app.app).post('/api/session').send({ email: 'x' });
  expect([status, type]).toEqual([422, 'application/problem+json']);
  expect(body.issues.map((issue: { pointer: string }) => issue.pointer)).toEqual(['/email', '/password']);
});

test('signing out ends the session on the server', async () => {
  const agent = await signIn(app.app, 't@example.org', testPassword);
  await agent.delete('/api/session').expect(204);
  const { body } = await agent.get('/api/session').expect(200);
  expect(body.user).toBeNull();
});

test('no page may be framed, and scripts come from this server only', async () => {
  const { headers } = await request(app.app).get('/api/health').expect(200);
  expect(headers['content-security-policy']).toContain("script-src 'self';");
  expect(headers['content-security-policy']).toContain("frame-ancestors 'none'");
  expect(headers['content-security-policy']).not.toContain('unsafe');
});
