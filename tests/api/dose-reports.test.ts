import { readFileSync } from 'node:fs';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { readSample, sampleNames } from '../samples';
import { makeHospital, makePerson, testPassword } from '../factories';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';

let app: TestApp;
let technologist: Agent;
let physicist: Agent;

beforeAll(async () => {
  app = await startTestApp();
  const hospitalId = await makeHospital(app.dataSource);
  await makePerson(app.dataSource, hospitalId, { email: 't@example.org', roles: ['technologist'] });
  await makePerson(app.dataSource, hospitalId, { email: 'p@example.org', roles: ['physicist'] });
  technologist = await signIn(app.app, 't@example.org', testPassword);
  physicist = await signIn(app.app, 'p@example.org', testPassword);
});
afterAll(() => app.close());

const send = (agent: Agent, ...names: string[]) =>
  names.reduce(
    (request, name) => request.attach('files', readSample(name), name),
    agent.post('/api/dose-reports'),
  );
const count = async (table: string) =>
  Number((await app.dataSource.query(`select count(*) from ${table}`))[0].count);

test('a dose report becomes a procedure with every event of the file', async () => {
  const { body } = await send(technologist, '01-single-plane.dcm').expect(200);
  expect(body.results).toMatchObject([{ fileName: '01-single-plane.dcm', outcome: 'stored', reason: null }]);
  const expected = JSON.parse(readFileSync('samples/01-single-plane.expected.json', 'utf8')).report;
  const { body: events } = await technologist
    .get(`/api/procedures/${body.results[0].procedureId}/irradiation-events`)
    .expect(200);
  expect(events.items.map((event: { kvpValues: number[] }) => event.kvpValues)).toEqual(
    expected.events.map((event: { kvpValues: number[] }) => event.kvpValues),
  );
});

test('the same file again changes nothing and says so', async () => {
  const first = await send(technologist, '02-biplane.dcm').expect(200);
  const before = [await count('procedure'), await count('irradiation_event')];
  const second = await send(technologist, '02-biplane.dcm').expect(200);
  expect(second.body.results[0]).toMatchObject({
    outcome: 'duplicate',
    procedureId: first.body.results[0].procedureId,
  });
  expect([await count('procedure'), await count('irradiation_event')]).toEqual(before);
});

test('the same file sent ten times at once is stored once', async () => {
  const answers = await Promise.all(
    Array.from({ length: 10 }, () => send(technologist, '10-mobile-c-arm.dcm')),
  );
  const outcomes = answers.map((answer) => answer.body.results[0].outcome).toSorted();
  expect(outcomes).toEqual([...Array<string>(9).fill('duplicate'), 'stored']);
});

test('several files of one request are answered in their order, and every byte is kept', async () => {
  const names = sampleNames().slice(0, 8);
  const { body } = await send(technologist, ...names).expect(200);
  expect(body.results.map((result: { fileName: string }) => result.fileName)).toEqual(names);
  for (const [index, result] of body.results.entries()) {
    const original = await physicist
      .get(`/api/dose-reports/${result.doseReportId}/original`)
      .buffer(true)
      .parse((response, done) => {
        const chunks: Buffer[] = [];
        response.on('data', (chunk: Buffer) => chunks.push(chunk));
        response.on('end', () => done(null, Buffer.concat(chunks)));
      });
    expect(Buffer.compare(original.body, readSample(names[index] ?? ''))).toBe(0);
  }
});

test('a file that is no dose report is refused in plain words, kept and listed', async () => {
  const { body } = await technologist
    .post('/api/dose-reports')
    .attach('files', Buffer.from('not a dose report'), 'Ärztin.txt')
    .expect(200);
  expect(body.results[0]).toMatchObject({ fileName: 'Ärztin.txt', outcome: 'refused', procedureId: null });
  expect(body.results[0].reason.code).toBe('not-dicom');
  const { body: list } = await technologist.get('/api/dose-reports?outcome=refused').expect(200);
  expect(list.items.map((item: { fileName: string }) => item.fileName)).toContain('Ärztin.txt');
});

test('an upload without a file is told so, and nothing is stored', async () => {
  const before = await count('dose_report');
  const { body } = await technologist.post('/api/dose-reports').field('note', 'x').expect(422);
  expect(body.issues[0].pointer).toBe('/files');
  expect(await count('dose_report')).toBe(before);
});

test('a report left "received" by a crash is taken up at the next start', async () => {
  const { settleReceived } = await import('../../server/dose-reports/settle-received');
  const { keepArrival } = await import('../../server/dose-reports/dose-report.store');
  const [{ id: hospitalId }] = await app.dataSource.query('select id from hospital');
  const id = await keepArrival(app.dataSource.manager, {
    hospitalId,
    receivedById: null,
    fileName: 'crashed.dcm',
    channel: 'page',
    bytes: readSample('06-explicit-big-endian.dcm'),
    sha256: '',
  });
  await settleReceived(app.dataSource.manager);
  const [row] = await app.dataSource.query('select outcome, procedure_id from dose_report where id = $1', [
    id,
  ]);
  expect(['stored', 'duplicate']).toContain(row.outcome);
  expect(row.procedure_id).not.toBeNull();
});

test('a failure while storing holds that file, keeps it, and it can be read again', async () => {
  await app.dataSource.query('alter table irradiation_event rename to irradiation_event_away');
  const { body } = await send(technologist, '17-snomed-rt.dcm', '43-text.txt').expect(200);
  await app.dataSource.query('alter table irradiation_event_away rename to irradiation_event');
  expect(body.results.map((result: { outcome: string }) => result.outcome)).toEqual(['held', 'refused']);
  expect(body.results[0].reason.code).toBe('reader-failure');
  const again = await technologist
    .post(`/api/dose-reports/${body.results[0].doseReportId}/read-again`)
    .expect(200);
  expect(again.body).toMatchObject({ outcome: 'stored', reason: null });
  const { body: list } = await technologist.get('/api/dose-reports?outcome=stored').expect(200);
  const stored = list.items.find((item: { id: string }) => item.id === body.results[0].doseReportId);
  expect(stored.reasonCode).toBeNull();
});
