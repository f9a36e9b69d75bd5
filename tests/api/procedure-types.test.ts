import { afterAll, beforeAll, expect, test } from 'vitest';
import { makeHospital, makePerson, testPassword } from '../factories';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';

let app: TestApp;
let hospitalId: string;
let physicist: Agent;

beforeAll(async () => {
  app = await startTestApp();
  hospitalId = await makeHospital(app.dataSource);
  await makePerson(app.dataSource, hospitalId, { email: 'p@example.org', roles: ['physicist'] });
  physicist = await signIn(app.app, 'p@example.org', testPassword);
});
afterAll(() => app.close());

const type = (overrides: Record<string, unknown> = {}) => ({
  key: 'CA',
  name: 'Coronary angiography',
  bodyRegion: 'chest',
  typicalKvp: 76,
  recognisedBy: ['coronary', 'angio'],
  isActive: true,
  ...overrides,
});

test('a procedure type is added, edited and told apart by its code', async () => {
  const { body: added } = await physicist.post('/api/procedure-types').send(type()).expect(201);
  expect(added).toMatchObject({ key: 'CA', recognisedBy: ['coronary', 'angio'], version: 1 });
  const twin = await physicist
    .post('/api/procedure-types')
    .send(type({ name: 'Another' }))
    .expect(409);
  expect(twin.body.issues[0].pointer).toBe('/key');
  await physicist
    .put(`/api/procedure-types/${added.id}`)
    .send(type({ typicalKvp: null, isActive: false, version: 1 }))
    .expect(200);
  const late = await physicist.put(`/api/procedure-types/${added.id}`).send(type({ version: 1 }));
  expect([late.status, late.body.current]).toMatchObject([409, { typicalKvp: null, isActive: false }]);
  const [{ count }] = await app.dataSource.query(
    'select count(*)::int as count from audit_entry where subject_id = $1',
    [added.id],
  );
  expect(count).toBe(2);
});

test('the same code may be used in another hospital', async () => {
  const elsewhere = await makeHospital(app.dataSource);
  await makePerson(app.dataSource, elsewhere, { email: 'p2@example.org', roles: ['physicist'] });
  const stranger = await signIn(app.app, 'p2@example.org', testPassword);
  await physicist
    .post('/api/procedure-types')
    .send(type({ key: 'EVAR' }))
    .expect(201);
  await stranger
    .post('/api/procedure-types')
    .send(type({ key: 'EVAR' }))
    .expect(201);
  const { body } = await stranger.get('/api/procedure-types').expect(200);
  expect(body.items).toHaveLength(1);
});

test.each([
  ['technologist', 200, 403],
  ['interventionalist', 200, 403],
  ['committee', 200, 403],
  ['administrator', 200, 201],
] as const)('a %s: reading answers %i, adding %i', async (role, reading, adding) => {
  const email = `${role}@example.org`;
  await makePerson(app.dataSource, hospitalId, { email, roles: [role] });
  const agent = await signIn(app.app, email, testPassword);
  await agent.get('/api/procedure-types').expect(reading);
  await agent
    .post('/api/procedure-types')
    .send(type({ key: role }))
    .expect(adding);
});

test('a monitored person without a role sees no procedure types', async () => {
  await makePerson(app.dataSource, hospitalId, { email: 'm@example.org' });
  const agent = await signIn(app.app, 'm@example.org', testPassword);
  await agent.get('/api/procedure-types').expect(403);
});
