import { afterAll, beforeAll, expect, test } from 'vitest';
import { findOrAddEquipment } from '../../server/equipment/equipment-identity.store';
import { newId } from '../../server/kernel/new-id';
import { Procedure } from '../../server/procedures/procedure.entity';
import { Room } from '../../server/rooms/room.entity';
import { makeHospital, makePerson, testPassword } from '../factories';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';

let app: TestApp;
let hospitalId: string;
let roomId: string;
let otherRoomId: string;
let administrator: Agent;
let physicist: Agent;

beforeAll(async () => {
  app = await startTestApp();
  hospitalId = await makeHospital(app.dataSource);
  roomId = await makeRoom('R1');
  otherRoomId = await makeRoom('R2');
  await makePerson(app.dataSource, hospitalId, { email: 'a@example.org', roles: ['administrator'] });
  await makePerson(app.dataSource, hospitalId, {
    name: 'P-01',
    email: 'p@example.org',
    roles: ['physicist'],
  });
  administrator = await signIn(app.app, 'a@example.org', testPassword);
  physicist = await signIn(app.app, 'p@example.org', testPassword);
});
afterAll(() => app.close());

async function makeRoom(code: string, hospital = hospitalId): Promise<string> {
  const id = newId();
  await app.dataSource.manager.insert(Room, { id, hospitalId: hospital, code, name: code });
  return id;
}

async function makeProcedure(equipmentId: string, inRoomId: string | null = null): Promise<string> {
  const id = newId();
  await app.dataSource.manager.insert(Procedure, {
    id,
    hospitalId,
    caseNumber: id,
    studyInstanceUid: `2.25.${id.length}`,
    patientKey: id,
    equipmentId,
    roomId: inRoomId,
    startedAt: new Date('2026-11-30T12:00:00Z'),
    localStartedAt: '2026-11-30T05:00:00',
    localDate: '2026-11-30',
    timeBasis: 'event',
  });
  return id;
}
const roomOf = async (procedureId: string) =>
  (await app.dataSource.manager.findOneByOrFail(Procedure, { id: procedureId })).roomId;

const identity = (serialNumber: string) => ({
  manufacturer: 'Pellworth Imaging',
  modelName: 'Twinarc B2',
  serialNumber,
  stationName: null,
});
const entry = (overrides: Record<string, unknown> = {}) => ({
  label: 'Suite 1 C-arm',
  roomId: null,
  tubePosition: 'under-table',
  inServiceFrom: null,
  inServiceTo: null,
  ...overrides,
});

test('a machine entered by hand is the one that its report finds', async () => {
  const { body } = await administrator
    .post('/api/equipment')
    .send({ ...entry({ roomId, inServiceFrom: '2026-01-01' }), ...identity('PW-1') })
    .expect(201);
  expect(body).toMatchObject({ reportCount: 0, roomId, inServiceFrom: '2026-01-01', version: 1 });
  const found = await findOrAddEquipment(app.dataSource.manager, hospitalId, identity(' pw-1 '));
  expect(found.id).toBe(body.id);
  const twin = await administrator
    .post('/api/equipment')
    .send({ ...entry(), ...identity('PW-1') })
    .expect(409);
  expect(twin.body.issues[0].pointer).toBe('/serialNumber');
});

test('a machine without a room comes first; given one, its homeless procedures follow, the others stay', async () => {
  const { id } = await findOrAddEquipment(app.dataSource.manager, hospitalId, identity('PW-2'));
  const stranger = await findOrAddEquipment(app.dataSource.manager, hospitalId, identity('PW-3'));
  const [homeless, housed, foreign] = [
    await makeProcedure(id),
    await makeProcedure(id, otherRoomId),
    await makeProcedure(stranger.id),
  ];
  const { body } = await physicist.get('/api/equipment').expect(200);
  const isHoused = body.items.map((machine: { roomId: string | null }) => machine.roomId !== null);
  expect(isHoused).toEqual([...isHoused].sort());
  await administrator
    .put(`/api/equipment/${id}`)
    .send(entry({ roomId, version: 1 }))
    .expect(200);
  expect([await roomOf(homeless), await roomOf(housed), await roomOf(foreign)]).toEqual([
    roomId,
    otherRoomId,
    null,
  ]);
});

test('a room of another hospital is refused at its field and nothing moves', async () => {
  const { id } = await findOrAddEquipment(app.dataSource.manager, hospitalId, identity('PW-4'));
  const elsewhere = await makeRoom('R1', await makeHospital(app.dataSource));
  const { body } = await administrator
    .put(`/api/equipment/${id}`)
    .send(entry({ roomId: elsewhere, version: 1 }))
    .expect(422);
  expect(body.issues[0].pointer).toBe('/roomId');
});

test('the later of two editors is shown what the earlier saved', async () => {
  const { id } = await findOrAddEquipment(app.dataSource.manager, hospitalId, identity('PW-5'));
  await administrator
    .put(`/api/equipment/${id}`)
    .send(entry({ label: 'First', version: 1 }))
    .expect(200);
  const late = await physicist.put(`/api/equipment/${id}`).send(entry({ label: 'Second', version: 1 }));
  expect([late.status, late.body.current.label]).toEqual([409, 'First']);
});

const factor = (equipmentId: string, overrides: Record<string, unknown> = {}) => ({
  equipmentId,
  plane: 'A',
  quantity: 'reference-air-kerma',
  factor: 0.93,
  uncertaintyPercent: 6,
  validFrom: '2026-06-01',
  source: 'Chamber comparison, sheet 12',
  ...overrides,
});

test('calibration factors are appended, the newest stands first, each with who entered it', async () => {
  const { id } = await findOrAddEquipment(app.dataSource.manager, hospitalId, identity('PW-6'));
  await physicist.post('/api/calibration-factors').send(factor(id)).expect(201);
  const { body: early } = await physicist
    .post('/api/calibration-factors')
    .send(factor(id, { validFrom: '2025-01-01', factor: 1.7, uncertaintyPercent: null }))
    .expect(201);
  expect(early).toMatchObject({ factor: 1.7, uncertaintyPercent: null, enteredBy: 'P-01' });
  await physicist
    .post('/api/calibration-factors')
    .send(factor(id, { factor: 0.95 }))
    .expect(201);
  const { body } = await administrator.get(`/api/equipment/${id}/calibration-factors`).expect(200);
  expect(
    body.items.map((item: { validFrom: string; factor: number }) => [item.validFrom, item.factor]),
  ).toEqual([
    ['2026-06-01', 0.95],
    ['2026-06-01', 0.93],
    ['2025-01-01', 1.7],
  ]);
  const audit = await app.dataSource.query(
    `select "action", "after" from audit_entry where subject = 'calibration factor' and subject_id = $1`,
    [early.id],
  );
  expect(audit).toMatchObject([{ action: 'added', after: { factor: 1.7 } }]);
});

test('a factor for an unknown machine, or one that no display could have, is refused', async () => {
  const unknown = await physicist.post('/api/calibration-factors').send(factor(newId())).expect(422);
  expect(unknown.body.issues[0].pointer).toBe('/equipmentId');
  const { id } = await findOrAddEquipment(app.dataSource.manager, hospitalId, identity('PW-7'));
  const absurd = await physicist
    .post('/api/calibration-factors')
    .send(factor(id, { factor: 0, source: '' }))
    .expect(422);
  expect(absurd.body.issues.map((issue: { pointer: string }) => issue.pointer)).toEqual([
    '/factor',
    '/source',
  ]);
  await physicist.get(`/api/equipment/${newId()}/calibration-factors`).expect(404);
});

test.each(['technologist', 'interventionalist', 'committee'] as const)(
  'machines and factors are closed to a %s',
  async (role) => {
    const email = `${role}@example.org`;
    await makePerson(app.dataSource, hospitalId, { email, roles: [role] });
    const agent = await signIn(app.app, email, testPassword);
    const { id } = await findOrAddEquipment(app.dataSource.manager, hospitalId, identity('PW-8'));
    await agent.get('/api/equipment').expect(403);
    await agent
      .post('/api/equipment')
      .send({ ...entry(), ...identity('PW-9') })
      .expect(403);
    await agent
      .put(`/api/equipment/${id}`)
      .send(entry({ version: 1 }))
      .expect(403);
    await agent.get(`/api/equipment/${id}/calibration-factors`).expect(403);
    await agent.post('/api/calibration-factors').send(factor(id)).expect(403);
  },
);
