import request from 'supertest';
import { afterAll, beforeAll, beforeEach, expect, test } from 'vitest';
import { makeHospital, makePerson, testPassword } from '../factories';
import { personInput } from '../person-input';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';

let app: TestApp;
let hospitalId: string;
let administrator: Agent;
let administratorId: string;
let number = 0;

beforeAll(async () => {
  app = await startTestApp();
});
afterAll(() => app.close());

beforeEach(async () => {
  number += 1;
  hospitalId = await makeHospital(app.dataSource);
  const email = `administrator-${number}@example.org`;
  administratorId = await makePerson(app.dataSource, hospitalId, {
    name: 'A-01',
    email,
    roles: ['administrator'],
  });
  administrator = await signIn(app.app, email, testPassword);
});

const personOf = async (id: string) => {
  const { body } = await administrator.get('/api/people').expect(200);
  return body.items.find((person: { id: string }) => person.id === id);
};
const auditOf = (subjectId: string): Promise<{ action: string; before: unknown; after: unknown }[]> =>
  app.dataSource.query(
    'select "action", "before", "after" from audit_entry where subject_id = $1 order by "at", id',
    [subjectId],
  );

test('staff without a sign-in are people too', async () => {
  const { body } = await administrator.post('/api/people').send(personInput()).expect(201);
  expect(body.invitationUrl).toBeNull();
  expect(body.person).toMatchObject({ name: 'N-09', email: null, roles: [], hasPassword: false, version: 1 });
  const choices = await administrator.get('/api/people/choices').expect(200);
  expect(choices.body.items.map((choice: { name: string }) => choice.name)).toEqual(['A-01', 'N-09']);
  expect(Object.keys(choices.body.items[0]).sort()).toEqual(['id', 'isActive', 'job', 'name']);
});

test('an invitation opens once, on the address by which the server was reached', async () => {
  const { body } = await administrator
    .post('/api/people')
    .set('Host', 'leeward.example:4600')
    .send(personInput({ email: `T-${number}@Example.org`, roles: ['technologist', 'technologist'] }))
    .expect(201);
  expect(body.invitationUrl).toMatch(/^http:\/\/leeward\.example:4600\/welcome\/[\w-]{43}$/);
  expect(body.person.roles).toEqual(['technologist']);
  const token = body.invitationUrl.split('/').pop();

  const link = await request(app.app).get(`/api/sign-in-links/${token}`).expect(200);
  expect(link.body).toEqual({ purpose: 'invitation', email: `t-${number}@example.org`, name: 'N-09' });
  const short = await request(app.app).post('/api/sign-in-links').send({ token, password: 'short' });
  expect([short.status, short.body.issues[0].pointer]).toEqual([422, '/password']);
  const first = await request(app.app).post('/api/sign-in-links').send({ token, password: testPassword });
  expect([first.status, first.body.user.roles]).toEqual([200, ['technologist']]);
  const second = await request(app.app)
    .post('/api/sign-in-links')
    .send({ token, password: 'someone else took it' });
  expect([second.status, second.body.code]).toEqual([410, 'link-spent']);
  await signIn(app.app, `t-${number}@example.org`, testPassword);
  expect((await personOf(body.person.id)).hasPassword).toBe(true);
  expect((await auditOf(body.person.id)).map((entry) => entry.action)).toEqual([
    'invited',
    'added',
    'password chosen',
  ]);
});

test('a new invitation ends the one before, and only its hash is kept', async () => {
  const email = `t-${number}@example.org`;
  const { body: added } = await administrator.post('/api/people').send(personInput({ email })).expect(201);
  const { body: again } = await administrator.post(`/api/people/${added.person.id}/invitation`).expect(201);
  expect(again.invitationUrl).not.toBe(added.invitationUrl);
  const old = added.invitationUrl.split('/').pop();
  await request(app.app).get(`/api/sign-in-links/${old}`).expect(410);
  const token = again.invitationUrl.split('/').pop();
  await request(app.app).get(`/api/sign-in-links/${token}`).expect(200);
  const kept = await app.dataSource.query(
    `select (select string_agg(link::text, ' ') from sign_in_link link) ||
            (select string_agg(entry::text, ' ') from audit_entry entry) as kept`,
  );
  expect(kept[0].kept).not.toContain(token);
});

test('a newly chosen password ends the sessions that the old one opened, and no others', async () => {
  const email = `forgot-${number}@example.org`;
  const id = await makePerson(app.dataSource, hospitalId, { email, roles: ['technologist'] });
  const before = await signIn(app.app, email, testPassword);
  const { body } = await administrator.post(`/api/people/${id}/invitation`).expect(201);
  const token = body.invitationUrl.split('/').pop();
  const after = request.agent(app.app);
  await after.post('/api/sign-in-links').send({ token, password: 'another long password' }).expect(200);
  await before.get('/api/rooms').expect(401);
  await after.get('/api/rooms').expect(200);
  await administrator.get('/api/people').expect(200);
});

test('a person without an e-mail, and one who left, cannot be invited', async () => {
  const { body: nurse } = await administrator.post('/api/people').send(personInput()).expect(201);
  const refused = await administrator.post(`/api/people/${nurse.person.id}/invitation`).expect(422);
  expect(refused.body.issues[0].pointer).toBe('/email');
  const email = `gone-${number}@example.org`;
  const { body: gone } = await administrator
    .post('/api/people')
    .send(personInput({ email, isActive: false }));
  expect(gone.invitationUrl).toBeNull();
  await administrator.post(`/api/people/${gone.person.id}/invitation`).expect(422);
});

test('the e-mail of somebody else is refused at its field, whatever its case, and nothing is kept', async () => {
  const email = `administrator-${number}@EXAMPLE.org`;
  const { body, status } = await administrator.post('/api/people').send(personInput({ email }));
  expect([status, body.code, body.issues[0].pointer]).toEqual([409, 'already-exists', '/email']);
  const { body: people } = await administrator.get('/api/people');
  expect(people.items).toHaveLength(1);
});

test('a role without an e-mail is refused at the e-mail', async () => {
  const { body } = await administrator
    .post('/api/people')
    .send(personInput({ roles: ['committee'] }))
    .expect(422);
  expect(body.issues[0].pointer).toBe('/email');
});

test('a changed address keeps the password; a removed one ends the sign-in', async () => {
  const id = await makePerson(app.dataSource, hospitalId, {
    email: `before-${number}@example.org`,
    roles: ['physicist'],
  });
  const agent = await signIn(app.app, `before-${number}@example.org`, testPassword);
  const moved = personInput({ email: `after-${number}@example.org`, roles: ['physicist'], version: 1 });
  const { body } = await administrator.put(`/api/people/${id}`).send(moved).expect(200);
  expect([body.invitationUrl, body.person.hasPassword]).toEqual([null, true]);
  await signIn(app.app, `after-${number}@example.org`, testPassword);
  await administrator
    .put(`/api/people/${id}`)
    .send(personInput({ version: 2 }))
    .expect(200);
  const session = await agent.get('/api/session').expect(200);
  expect(session.body.user).toBeNull();
});

test('somebody who leaves is signed out at once', async () => {
  const email = `leaver-${number}@example.org`;
  const id = await makePerson(app.dataSource, hospitalId, { email, roles: ['technologist'] });
  const agent = await signIn(app.app, email, testPassword);
  await agent.get('/api/rooms').expect(200);
  await administrator
    .put(`/api/people/${id}`)
    .send(personInput({ email, roles: ['technologist'], isActive: false, version: 1 }))
    .expect(200);
  await agent.get('/api/rooms').expect(401);
});

test('the later of two editors is shown what the earlier saved', async () => {
  const id = await makePerson(app.dataSource, hospitalId, { name: 'N-10' });
  await administrator
    .put(`/api/people/${id}`)
    .send(personInput({ name: 'N-11', version: 1 }))
    .expect(200);
  const late = await administrator.put(`/api/people/${id}`).send(personInput({ name: 'N-12', version: 1 }));
  expect([late.status, late.body.code]).toEqual([409, 'conflict']);
  expect(late.body.current).toMatchObject({ name: 'N-11', version: 2 });
  expect((await personOf(id)).name).toBe('N-11');
  const edits = await auditOf(id);
  expect(edits).toHaveLength(1);
  expect(edits[0]).toMatchObject({ action: 'edited', before: { name: 'N-10' }, after: { name: 'N-11' } });
});

test('nobody reaches the people of another hospital', async () => {
  const elsewhere = await makeHospital(app.dataSource);
  const strangerId = await makePerson(app.dataSource, elsewhere);
  await administrator
    .put(`/api/people/${strangerId}`)
    .send(personInput({ version: 1 }))
    .expect(404);
  await administrator.post(`/api/people/${strangerId}/invitation`).expect(404);
  const { body } = await administrator.get('/api/people').expect(200);
  expect(body.items.map((person: { id: string }) => person.id)).toEqual([administratorId]);
});

test.each([
  ['technologist', 200],
  ['physicist', 200],
  ['interventionalist', 403],
  ['committee', 403],
] as const)('a %s edits nobody; the choices of a form answer %i', async (role, choices) => {
  const email = `${role}-${number}@example.org`;
  const id = await makePerson(app.dataSource, hospitalId, { email, roles: [role] });
  const agent = await signIn(app.app, email, testPassword);
  await agent.get('/api/people').expect(403);
  await agent.post('/api/people').send(personInput()).expect(403);
  await agent
    .put(`/api/people/${id}`)
    .send(personInput({ email, roles: ['administrator'], version: 1 }))
    .expect(403);
  await agent.post(`/api/people/${id}/invitation`).expect(403);
  await agent.get('/api/people/choices').expect(choices);
});

test('signed out, the people are closed', async () => {
  await request(app.app).get('/api/people').expect(401);
  await request(app.app).get('/api/people/choices').expect(401);
});
