import { afterAll, beforeAll, expect, test } from 'vitest';
import type { Role } from '../../shared/permissions';
import { makeHospital, makePerson, testPassword } from '../factories';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';

/** 05:30 UTC on 2 December is still 1 December in America/Denver, where the hospital stands. */
const now = new Date('2026-12-02T05:30:00Z');

let app: TestApp;
let hospitalId: string;
let ownerId: string;
let technologist: Agent;

beforeAll(async () => {
  app = await startTestApp(() => now);
  hospitalId = await makeHospital(app.dataSource);
  ownerId = await makePerson(app.dataSource, hospitalId, { name: 'N-01', email: 'n@example.org' });
  technologist = await signInAs('t@example.org', ['technologist']);
});
afterAll(() => app.close());

async function signInAs(email: string, roles: Role[]): Promise<Agent> {
  await makePerson(app.dataSource, hospitalId, { name: email, email, roles });
  return signIn(app.app, email, testPassword);
}

const garment = (code: string, overrides: Record<string, unknown> = {}) => ({
  code,
  kind: 'vest-and-skirt',
  material: 'lead-composite',
  frontLeadMm: 0.35,
  backLeadMm: null,
  leadKvp: 100,
  isMeasured: false,
  ownerId: null,
  state: 'in-service',
  lastInspectedOn: '2025-12-01',
  nextDueOn: '2026-12-01',
  note: null,
  ...overrides,
});
const add = async (code: string, overrides: Record<string, unknown> = {}) =>
  (await technologist.post('/api/garments').send(garment(code, overrides)).expect(201)).body;

test('a garment is added with its owner, edited, and told apart by its code', async () => {
  const added = await add('VS-01', { ownerId, note: 'Blue trim' });
  expect(added).toMatchObject({ owner: { id: ownerId, name: 'N-01' }, backLeadMm: null, version: 1 });
  const twin = await technologist.post('/api/garments').send(garment('VS-01')).expect(409);
  expect(twin.body.issues[0].pointer).toBe('/code');
  const withdrawn = garment('VS-01', { ownerId, state: 'withdrawn', version: 1 });
  await technologist.put(`/api/garments/${added.id}`).send(withdrawn).expect(200);
  const late = await technologist.put(`/api/garments/${added.id}`).send(garment('VS-01', { version: 1 }));
  expect([late.status, late.body.current]).toMatchObject([
    409,
    { state: 'withdrawn', owner: { name: 'N-01' }, version: 2 },
  ]);
  const audit = await app.dataSource.query(
    `select "action", "after" from audit_entry where subject = 'garment' and subject_id = $1 order by "at"`,
    [added.id],
  );
  expect(audit).toMatchObject([{ action: 'added' }, { action: 'edited', after: { state: 'withdrawn' } }]);
});

test('overdue begins the day after the due day, by the clock of the hospital', async () => {
  expect((await add('VS-02', { nextDueOn: '2026-12-01' })).isOverdue).toBe(false);
  expect((await add('VS-03', { nextDueOn: '2026-11-30' })).isOverdue).toBe(true);
});

test('what is out of service, or has no due day, is not overdue', async () => {
  expect((await add('VS-04', { nextDueOn: '2026-11-30', state: 'lost' })).isOverdue).toBe(false);
  expect((await add('VS-05', { nextDueOn: null })).isOverdue).toBe(false);
});

test('an owner who is not on the staff, and a lead of 4 mm, are refused at their fields', async () => {
  const elsewhere = await makePerson(app.dataSource, await makeHospital(app.dataSource));
  const owner = await technologist
    .post('/api/garments')
    .send(garment('VS-06', { ownerId: elsewhere }))
    .expect(422);
  expect(owner.body.issues[0].pointer).toBe('/ownerId');
  const lead = await technologist
    .post('/api/garments')
    .send(garment('VS-06', { frontLeadMm: 4 }))
    .expect(422);
  expect(lead.body.issues[0].pointer).toBe('/frontLeadMm');
});

test('the committee sees the state of every garment and nobody’s name', async () => {
  await add('VS-07', { ownerId, note: 'Ask N-01 first' });
  const committee = await signInAs('c@example.org', ['committee']);
  const { body } = await committee.get('/api/garments').expect(200);
  const codes = body.items.map((item: { code: string }) => item.code);
  expect(codes).toContain('VS-07');
  expect(JSON.stringify(body)).not.toContain('N-01');
  expect(JSON.stringify(body)).not.toContain(ownerId);
});

test.each([[[]], [['interventionalist']]] as [Role[]][])(
  'a person with the roles %j sees the own garments only and edits none',
  async (roles) => {
    const email = `own-${roles.length}@example.org`;
    const id = await makePerson(app.dataSource, hospitalId, { name: email, email, roles });
    const agent = await signIn(app.app, email, testPassword);
    const mine = await add(`OWN-${roles.length}`, { ownerId: id });
    const { body } = await agent.get('/api/garments').expect(200);
    expect(body.items.map((item: { code: string }) => item.code)).toEqual([mine.code]);
    await agent
      .put(`/api/garments/${mine.id}`)
      .send(garment(mine.code, { version: 1 }))
      .expect(403);
    await agent.post('/api/garments').send(garment('VS-08')).expect(403);
  },
);

test('garments in service come before the others', async () => {
  const { body } = await technologist.get('/api/garments').expect(200);
  const isOut = body.items.map((item: { state: string }) => item.state !== 'in-service');
  expect(isOut).toEqual([...isOut].sort());
  expect(isOut).toContain(true);
});
