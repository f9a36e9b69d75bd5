import { afterAll, beforeAll, expect, test } from 'vitest';
import type { TypedQuantity } from '../../shared/contract/manual-entry';
import { makeHospital, makePerson, makeProcedureType, testPassword } from '../factories';
import { readSample } from '../samples';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';
import { kap, kerma, pointers, typedEntry } from '../typed-entry';

let app: TestApp;
let technologist: Agent;
let physicist: Agent;
let administrator: Agent;
let typeId: string;
let machineId: string;
const clock = { now: new Date('2026-11-30T20:00:00Z') };

const newMachine = {
  label: 'Old mobile',
  manufacturer: 'Quayside Radiological',
  modelName: 'QM 2',
  serialNumber: 'QM-1',
  stationName: null,
  roomId: null,
  tubePosition: 'under-table',
  inServiceFrom: null,
  inServiceTo: null,
};

beforeAll(async () => {
  app = await startTestApp(() => clock.now);
  const hospitalId = await makeHospital(app.dataSource);
  const person = (email: string, role: 'technologist' | 'physicist' | 'administrator') =>
    makePerson(app.dataSource, hospitalId, { name: email, email, roles: [role] });
  await person('t@example.org', 'technologist');
  await person('p@example.org', 'physicist');
  typeId = await makeProcedureType(app.dataSource, hospitalId, { name: 'Nephrostomy' });
  await person('a@example.org', 'administrator');
  administrator = await signIn(app.app, 'a@example.org', testPassword);
  technologist = await signIn(app.app, 't@example.org', testPassword);
  physicist = await signIn(app.app, 'p@example.org', testPassword);
  const { body } = await physicist.post('/api/equipment').send(newMachine).expect(201);
  machineId = body.id;
});
afterAll(() => app.close());

const entry = (quantities: TypedQuantity[], overrides: object = {}) =>
  typedEntry(quantities, { equipmentId: machineId, ...overrides });
const send = (body: object, agent = technologist) => agent.post('/api/manual-entries').send(body);
const open = async (id: string) => (await technologist.get(`/api/procedures/${id}`).expect(200)).body;
const enter = async (quantities: TypedQuantity[], overrides: object = {}) =>
  (await send(entry(quantities, overrides)).expect(201)).body as { id: string; procedureId: string };

// Source: the SI prefixes, 1 m² = 10,000 cm² and 1 min = 60 s.
test.each<[string, string, number]>([
  ['1250', 'uGy.m2', 12.5],
  ['1', 'Gy.m2', 10_000],
  ['1', 'uGy.m2', 0.01],
  ['1', 'cGy.cm2', 0.01],
  ['1', 'dGy.cm2', 0.1],
  ['0.00430', 'Gy.m2', 43],
  ['43,0', 'Gy.cm2', 43],
])('%s %s typed is %d Gy·cm² stored, and the typed text stays', async (text, unit, stored) => {
  const confirmation = stored > 300 ? [kap(text, unit)] : [];
  const { procedureId } = await enter([kap(text, unit)], { confirmation });
  const procedure = await open(procedureId);
  expect(procedure).toMatchObject({ kermaAreaProductGyCm2: stored, isManual: true, eventCount: 0 });
  expect(procedure).toMatchObject({ referenceAirKermaGy: null, fluoroscopyTimeS: null, kvpMean: null });
  const { body } = await technologist.get(`/api/procedures/${procedureId}/manual-entries`).expect(200);
  expect(body.items).toMatchObject([{ quantities: [kap(text, unit)], isCurrent: true }]);
});

test.each([
  ['390', 's', 390],
  ['6.5', 'min', 390],
  ['0.57', 'min', 34.2],
  ['12:30', 'min:s', 750],
])('a fluoroscopy time of %s %s is %d s', async (text, unit, seconds) => {
  const { procedureId } = await enter([{ ...kap(text, unit), quantity: 'fluoroscopy-time' }]);
  expect((await open(procedureId)).fluoroscopyTimeS).toBe(seconds);
});

test.each<[TypedQuantity, string]>([
  [kap('12.5', 'R.cm2'), '/quantities/0/unit'],
  [kap('12.5', ''), '/quantities/0/unit'],
  [kap('12.5', 'Gy'), '/quantities/0/unit'],
  [kap('1,250', 'uGy.m2'), '/quantities/0/text'],
  [kap('-3'), '/quantities/0/text'],
  [kap('12.5 about'), '/quantities/0/text'],
  [{ ...kap('12:30', 'min'), quantity: 'fluoroscopy-time' }, '/quantities/0/unit'],
  [{ ...kap('3.5', '1'), quantity: 'frame-count' }, '/quantities/0/text'],
])('%j is refused at its field, and nothing is stored', async (figure, pointer) => {
  const { body } = await send(entry([figure])).expect(422);
  expect(pointers(body)).toEqual([pointer]);
});

test('without a figure or a place there is no entry, and nothing is still to come', async () => {
  expect(pointers((await send(entry([])).expect(422)).body)).toEqual(['/quantities']);
  const nowhere = await send(entry([kap('1')], { equipmentId: null })).expect(422);
  expect(pointers(nowhere.body)).toEqual(['/equipmentId']);
  // 13:00 in Denver is 20:00 UTC, the moment of the request.
  const late = { localStartedAt: '2026-11-30T13:01' };
  expect(pointers((await send(entry([kap('1')], late)).expect(422)).body)).toEqual(['/localStartedAt']);
  await enter([kap('1')], { localStartedAt: '2026-11-30T13:00' });
});

test('K a,r above 3 Gy is stored only when it was typed twice alike', async () => {
  await enter([kerma('2.999')]);
  await enter([kerma('3.000')]);
  const single = await send(entry([kerma('3.001')])).expect(422);
  expect(pointers(single.body)).toEqual(['/quantities/0/text']);
  const slip = await send(entry([kerma('3.001')], { confirmation: [kerma('3.01')] })).expect(422);
  expect(pointers(slip.body)).toEqual(['/confirmation/0/text']);
  const { procedureId } = await enter([kerma('3.001')], { confirmation: [kerma('3001', 'mGy')] });
  expect(await open(procedureId)).toMatchObject({
    referenceAirKermaGy: 3.001,
    attention: { level: 'notify' },
  });
});

test('two planes count together for the second entry, and are stored apart', async () => {
  const planes = [kerma('2', 'Gy', 'A'), kerma('1500', 'mGy', 'B')];
  const once = await send(entry(planes)).expect(422);
  expect(pointers(once.body)).toEqual(['/quantities/0/text', '/quantities/1/text']);
  const { procedureId } = await enter(planes, { confirmation: planes });
  const procedure = await open(procedureId);
  expect(procedure).toMatchObject({ referenceAirKermaGy: 3.5, isReferenceAirKermaUpperBound: true });
  expect(procedure.planes.map((plane: { plane: string }) => plane.plane)).toEqual(['A', 'B']);
  const mixed = await send(entry([kap('1'), kap('1', 'Gy.cm2', 'A')])).expect(422);
  expect(pointers(mixed.body)).toEqual(['/quantities/1/plane']);
});

test('a double click makes one entry; another content under the same key is told', async () => {
  const body = entry([kap('7')]);
  const answers = await Promise.all([send(body), send(body), send(body)]);
  expect(new Set(answers.map((answer) => answer.body.procedureId)).size).toBe(1);
  expect(answers.map(({ status }) => status)).toEqual([201, 201, 201]);
  await send({ ...body, quantities: [kap('8')] }).expect(409);
});

test('the ledger shows what was entered by hand, with its machine’s room, type and patient', async () => {
  const { procedureId } = await enter([kap('12.5')], {
    procedureTypeId: typeId,
    patient: { id: 'HAND-1', name: 'Typed, Name', accessionNumber: 'A-77' },
  });
  const { body } = await technologist.get('/api/procedures?period=all&find=HAND-1').expect(200);
  expect(body.items).toMatchObject([
    {
      id: procedureId,
      isManual: true,
      hasOriginal: false,
      strip: null,
      kvpMean: null,
      startedAt: '2026-11-30T09:15:00',
    },
  ]);
  expect(body.items[0].patient).toMatchObject({ id: 'HAND-1', name: 'Typed, Name', accessionNumber: 'A-77' });
  expect(body.items[0].procedureType.name).toBe('Nephrostomy');
  const [audit] = await app.dataSource.query(
    `select "after"::text from audit_entry where "action" = 'figures entered by hand' and subject_id = $1`,
    [procedureId],
  );
  expect(audit.after).toContain('12.5');
  expect(audit.after).not.toContain('HAND-1');
});

test('a correction takes the place of an entry, with a reason; the earlier one stays readable', async () => {
  const { id, procedureId } = await enter([kap('125')]);
  const { version } = (await open(procedureId)).record;
  const {
    key: _,
    procedureId: __,
    roomId: ___,
    procedureTypeId: ____,
    patient: _____,
    ...fields
  } = entry([kap('12.5')]);
  const correct = (body: object) =>
    physicist.post(`/api/manual-entries/${id}/corrections`).send({ ...fields, version, ...body });
  expect(pointers((await correct({}).expect(422)).body)).toEqual(['/reason']);
  const { body: corrected } = await correct({ reason: 'point missed' }).expect(201);
  expect((await open(procedureId)).kermaAreaProductGyCm2).toBe(12.5);
  const { body } = await technologist.get(`/api/procedures/${procedureId}/manual-entries`).expect(200);
  expect(body.items).toMatchObject([
    { id: corrected.id, replacesId: id, reason: 'point missed', isCurrent: true, enteredBy: 'p@example.org' },
    { id, isCurrent: false, quantities: [kap('125')], enteredBy: 't@example.org' },
  ]);
  await correct({ reason: 'once more' }).expect(409);
});

test('a procedure whose report tells no figure takes those of the screen, for its own machine', async () => {
  const { body } = await technologist
    .post('/api/dose-reports')
    .attach('files', readSample('99-cassette.dcm'), 'c.dcm')
    .expect(200);
  const { procedureId } = body.results[0];
  await enter([kap('2.5')], { procedureId });
  expect(await open(procedureId)).toMatchObject({ kermaAreaProductGyCm2: 2.5, isManual: false });
  const again = await send(entry([kap('2.6')], { procedureId })).expect(422);
  expect(pointers(again.body)).toEqual(['/procedureId']);
});

test('technologists choose among machines by name and room', async () => {
  const { body } = await technologist.get('/api/equipment/choices').expect(200);
  expect(body.items).toContainEqual({ id: machineId, label: 'Old mobile', room: null, isBiplane: false });
});

test('figures of a report are not typed over', async () => {
  const { body } = await technologist
    .post('/api/dose-reports')
    .attach('files', readSample('01-single-plane.dcm'), 'a.dcm')
    .expect(200);
  const { procedureId } = body.results[0];
  const answer = await send(entry([kap('1')], { procedureId })).expect(422);
  expect(pointers(answer.body)).toEqual(['/procedureId']);
});

test('a machine that no list knows is entered by its room', async () => {
  const { body: room } = await administrator
    .post('/api/rooms')
    .send({ code: 'OR3', name: 'Theatre 3', note: null, isActive: true })
    .expect(201);
  const { procedureId } = await enter([kap('5')], { equipmentId: null, roomId: room.id });
  expect((await open(procedureId)).room).toEqual({ id: room.id, name: 'OR3' });
});

test('what is stored of the same machine and hour is told before it is typed again', async () => {
  const at = '2026-03-02T09:00';
  const { procedureId } = await enter([kap('5')], {
    localStartedAt: '2026-03-02T09:50',
    procedureTypeId: typeId,
  });
  await enter([kap('5')], { localStartedAt: '2026-03-02T10:10' });
  const near = async (equipment: string) =>
    (await technologist.get(`/api/manual-entries/neighbours?equipment=${equipment}&at=${at}`).expect(200))
      .body.items;
  expect(await near(machineId)).toMatchObject([{ id: procedureId, name: 'Nephrostomy', isManual: true }]);
  expect(await near(procedureId)).toEqual([]);
});
