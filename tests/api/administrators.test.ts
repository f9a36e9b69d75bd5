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
const asAdministrator = (overrides: Record<string, unknown> = {}) =>
  personInput({
    name: 'A-01',
    email: `administrator-${number}@example.org`,
    roles: ['administrator'],
    version: 1,
    ...overrides,
  });

test.each([
  ['the role', { roles: ['physicist'] }, '/roles'],
  ['the sign-in', { email: null, roles: [] }, '/email'],
  ['the place on the staff', { isActive: false }, '/isActive'],
])('the last administrator cannot lose %s', async (_what, change, pointer) => {
  const { body } = await administrator
    .put(`/api/people/${administratorId}`)
    .send(asAdministrator(change))
    .expect(422);
  expect(body.issues[0]).toMatchObject({ pointer, detail: expect.stringContaining('last administrator') });
  expect((await personOf(administratorId)).roles).toEqual(['administrator']);
});

test('nobody takes the administrator role from themselves, another administrator may', async () => {
  const other = { email: `other-${number}@example.org`, roles: ['administrator' as const] };
  const otherId = await makePerson(app.dataSource, hospitalId, other);
  const own = await administrator
    .put(`/api/people/${administratorId}`)
    .send(asAdministrator({ roles: [] }))
    .expect(422);
  expect(own.body.issues[0].detail).toContain('themselves');
  await administrator
    .put(`/api/people/${otherId}`)
    .send(personInput({ ...other, roles: [], version: 1 }))
    .expect(200);
});

test('an administrator who never chose a password does not count as the other one', async () => {
  const email = `invited-${number}@example.org`;
  await administrator
    .post('/api/people')
    .send(personInput({ email, roles: ['administrator'] }))
    .expect(201);
  const { body } = await administrator
    .put(`/api/people/${administratorId}`)
    .send(asAdministrator({ roles: [] }))
    .expect(422);
  expect(body.issues[0].detail).toContain('last administrator');
});

/** Holds every person's row until `count` requests wait for one, so that they meet for certain. */
async function letMeet(count: number, send: () => Promise<unknown>): Promise<unknown> {
  const holder = app.dataSource.createQueryRunner();
  await holder.startTransaction();
  await holder.query('select id from person where hospital_id = $1 for update', [hospitalId]);
  const sent = send();
  const countWaiting = async () => {
    const [row] = await app.dataSource.query(
      `select count(*)::int as waiting from pg_stat_activity
        where datname = current_database() and wait_event_type = 'Lock'`,
    );
    return row.waiting as number;
  };
  while ((await countWaiting()) < count) await new Promise((resolve) => setTimeout(resolve, 20));
  await holder.commitTransaction();
  await holder.release();
  return sent;
}

test('two administrators who remove each other at the same moment leave one', async () => {
  const email = `second-${number}@example.org`;
  const secondId = await makePerson(app.dataSource, hospitalId, { email, roles: ['administrator'] });
  const second = await signIn(app.app, email, testPassword);
  await letMeet(2, () =>
    Promise.all([
      administrator.put(`/api/people/${secondId}`).send(personInput({ email, roles: [], version: 1 })),
      second.put(`/api/people/${administratorId}`).send(asAdministrator({ roles: [] })),
    ]),
  );
  const [{ count }] = await app.dataSource.query(
    `select count(*)::int as count from account join person on person.id = person_id
      where hospital_id = $1 and 'administrator' = any(roles)`,
    [hospitalId],
  );
  expect(count).toBe(1);
});
