import { randomUUID } from 'node:crypto';
import { createServer, request as openRequest, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { writeNewReport } from '../../scripts/bench/written-report';
import { makeHospital, makePerson, testPassword } from '../factories';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';
import { writeZip } from '../zip-writer';

let app: TestApp;
let technologist: Agent;
let server: Server;
let cookie: string;

beforeAll(async () => {
  app = await startTestApp();
  const hospitalId = await makeHospital(app.dataSource);
  await makePerson(app.dataSource, hospitalId, { email: 't@example.org', roles: ['technologist'] });
  technologist = await signIn(app.app, 't@example.org', testPassword);
  server = createServer(app.app);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { headers } = await technologist
    .post('/api/session')
    .send({ email: 't@example.org', password: testPassword });
  cookie = String(headers['set-cookie']).split(';')[0] ?? '';
});
afterAll(async () => {
  await new Promise((resolve) => server.close(resolve));
  await app.close();
});

const report = (eventCount = 1) => Buffer.from(writeNewReport(eventCount));
const send = (bytes: Buffer, key: string) =>
  technologist.post('/api/dose-reports').set('Upload-Key', key).attach('files', bytes, 'case.dcm');
const rowsOf = (key: string): Promise<{ id: string; outcome: string }[]> =>
  app.dataSource.query('select id, outcome from dose_report where upload_key = $1', [key]);

/** Sends a form over a connection of its own and cuts it after so many bytes. */
function sendAndCut(bytes: Buffer, key: string, cutAfter: number): Promise<void> {
  const boundary = 'cut';
  const body = Buffer.concat([
    Buffer.from(`--${boundary}\r\nContent-Disposition: form-data; name="files"; filename="case.dcm"\r\n\r\n`),
    bytes,
    Buffer.from(`\r\n--${boundary}--\r\n`),
  ]);
  return new Promise((resolve) => {
    const sender = openRequest({
      port: (server.address() as AddressInfo).port,
      method: 'POST',
      path: '/api/dose-reports',
      headers: {
        cookie,
        'upload-key': key,
        'content-type': `multipart/form-data; boundary=${boundary}`,
        'content-length': body.length,
      },
    });
    sender.on('error', () => resolve());
    sender.on('close', () => resolve());
    sender.write(body.subarray(0, cutAfter), () => setTimeout(() => sender.destroy(), 30));
  });
}

test('a repeated key is told the first outcome and stores nothing', async () => {
  const [key, bytes] = [randomUUID(), report()];
  const first = await send(bytes, key).expect(200);
  const second = await send(bytes, key).expect(200);
  expect(second.body.results).toEqual(first.body.results);
  expect(first.body.results[0].outcome).toBe('stored');
  expect(await rowsOf(key)).toHaveLength(1);
});

test('a key repeated while the first sending is still being read waits for its outcome', async () => {
  const [key, bytes] = [randomUUID(), report(200)];
  const answers = await Promise.all(Array.from({ length: 5 }, () => send(bytes, key).expect(200)));
  expect(new Set(answers.map(({ body }) => body.results[0].doseReportId)).size).toBe(1);
  expect(answers.map(({ body }) => body.results[0].outcome)).toEqual(Array<string>(5).fill('stored'));
});

test('a connection cut in the middle of the body leaves nothing; the next try is stored once', async () => {
  const [key, bytes] = [randomUUID(), report(20)];
  await sendAndCut(bytes, key, Math.floor(bytes.length / 2));
  expect(await rowsOf(key)).toEqual([]);
  await send(bytes, key).expect(200);
  expect((await rowsOf(key)).map(({ outcome }) => outcome)).toEqual(['stored']);
});

test('a connection cut before the answer: the next try is told what became of the first', async () => {
  const [key, bytes] = [randomUUID(), report(20)];
  await sendAndCut(bytes, key, Infinity);
  const { body } = await send(bytes, key).expect(200);
  expect(body.results[0].outcome).toBe('stored');
  expect((await rowsOf(key)).map(({ id }) => id)).toEqual([body.results[0].doseReportId]);
  const [{ count }] = await app.dataSource.query(
    'select count(*)::int as count from irradiation_event where dose_report_id = $1',
    [body.results[0].doseReportId],
  );
  expect(count).toBe(20);
});

test('a key of another file is refused, and so is one that is no UUID', async () => {
  const key = randomUUID();
  await send(report(), key).expect(200);
  expect((await send(report(), key).expect(409)).body.detail).toContain('belongs to another file');
  expect((await send(report(), 'seven').expect(422)).body.issues[0].pointer).toBe('/Upload-Key');
});

test('the same bytes under a new key are already here, and are not kept twice', async () => {
  const bytes = report();
  const countFiles = async () =>
    (await app.dataSource.query('select count(*)::int as count from original_file'))[0].count;
  await send(bytes, randomUUID()).expect(200);
  const before = await countFiles();
  const { body } = await send(bytes, randomUUID()).expect(200);
  expect(body.results[0].outcome).toBe('duplicate');
  expect(await countFiles()).toBe(before);
});

test('an archive sent twice under one key is unpacked once', async () => {
  const key = randomUUID();
  const zip = writeZip([1, 2, 3].map((number) => ({ path: `${number}.dcm`, bytes: report() })));
  const answers = await Promise.all([send(zip, key), send(zip, key)]);
  const again = await send(zip, key).expect(200);
  expect(again.body.results.map(({ outcome }: { outcome: string }) => outcome)).toEqual([
    'stored',
    'stored',
    'stored',
  ]);
  const ids = new Set(answers.map(({ body }) => body.archives[0].id));
  expect([...ids]).toEqual([again.body.archives[0].id]);
  const rows = await app.dataSource.query('select id from dose_report where archive_id = $1', [...ids]);
  expect(rows).toHaveLength(3);
});
