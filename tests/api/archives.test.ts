import { gzipSync } from 'node:zlib';
import type { Response } from 'supertest';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { writeNewReport } from '../../scripts/bench/written-report';
import type { ReceivedFile, ReceivedFiles } from '../../shared/contract/received-files';
import { makeHospital, makePerson, testPassword } from '../factories';
import { readSample } from '../samples';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';
import { writeZip, type ZipEntry } from '../zip-writer';

let app: TestApp;
let technologist: Agent;

beforeAll(async () => {
  app = await startTestApp();
  const hospitalId = await makeHospital(app.dataSource);
  await makePerson(app.dataSource, hospitalId, { email: 't@example.org', roles: ['technologist'] });
  technologist = await signIn(app.app, 't@example.org', testPassword);
});
afterAll(() => app.close());

const report = () => Buffer.from(writeNewReport(1));
const attach = (zip: Buffer, name = 'old cases.zip') =>
  technologist.post('/api/dose-reports').attach('files', zip, name);
const send = async (entries: ZipEntry[]): Promise<ReceivedFiles> =>
  (await attach(writeZip(entries)).expect(200)).body;
const codesOf = ({ results }: ReceivedFiles) => results.map(({ outcome, reason }) => reason?.code ?? outcome);

/** Reads a download as bytes. */
const collect = (response: Response, done: (error: Error | null, body: Buffer) => void) => {
  const chunks: Buffer[] = [];
  response.on('data', (chunk: Buffer) => chunks.push(chunk));
  response.on('end', () => done(null, Buffer.concat(chunks)));
};

test('each entry of an archive has its outcome, in its order, named by its path', async () => {
  const same = report();
  const { results, archives } = await send([
    { path: 'room 1/', bytes: Buffer.alloc(0) },
    { path: 'room 1/ä.dcm', bytes: same },
    { path: 'room 1/.DS_Store', bytes: Buffer.from('Bud1') },
    { path: 'DICOMDIR', bytes: Buffer.from('table') },
    { path: 'room 2/again.dcm', bytes: same, isStored: true },
    { path: 'room 2/empty', bytes: Buffer.alloc(0) },
    { path: 'list.txt', bytes: Buffer.from('Three cases.') },
  ]);
  expect(results.map(({ fileName, archiveName, outcome }) => [fileName, archiveName, outcome])).toEqual([
    ['room 1/ä.dcm', 'old cases.zip', 'stored'],
    ['room 2/again.dcm', 'old cases.zip', 'duplicate'],
    ['list.txt', 'old cases.zip', 'refused'],
  ]);
  expect(archives[0]).toMatchObject({ state: 'unpacked', entryCount: 3, settledCount: 3 });
  expect(archives[0]?.skipped.map(({ path, reason }) => `${path}: ${reason.split(';')[0]}`)).toEqual([
    'room 1/: a folder',
    'room 1/.DS_Store: view settings of a folder (macOS)',
    'DICOMDIR: the table of contents of a DICOM disc',
    'room 2/empty: empty',
  ]);
});

test('a bad entry is that entry’s outcome: the others are read', async () => {
  const good = report();
  const answer = await send([
    { path: '../outside.dcm', bytes: good },
    { path: '/etc/absolute.dcm', bytes: good },
    { path: 'C:/drive.dcm', bytes: good },
    { path: 'back\\slash.dcm', bytes: good },
    { path: 'link.dcm', bytes: Buffer.from('/etc/passwd'), mode: 0o120777 },
    { path: 'locked.dcm', bytes: good, flags: 1 },
    { path: 'bzip.dcm', bytes: good, method: 12 },
    { path: 'flipped.dcm', bytes: good, statedCrc: 1 },
    { path: 'short.dcm', bytes: good, statedByteCount: good.length + 1 },
    { path: 'inner.zip', bytes: writeZip([{ path: 'a.dcm', bytes: good }]) },
    { path: 'inner.gz', bytes: gzipSync(good) },
    { path: 'zeros.dcm', bytes: Buffer.alloc(300_000) },
    { path: 'good.dcm', bytes: good },
    { path: 'good.dcm', bytes: good },
  ]);
  expect(codesOf(answer)).toEqual([
    ...Array<string>(4).fill('archive-entry-path'),
    'archive-entry-link',
    'archive-entry-encrypted',
    'archive-entry-method',
    'archive-entry-broken',
    'archive-entry-broken',
    'archive-nested',
    'archive-nested',
    'archive-ratio',
    'stored',
    'archive-entry-repeated',
  ]);
});

test('what could not be unpacked is handed out with its archive, what was unpacked by itself', async () => {
  const zip = writeZip([
    { path: 'locked.dcm', bytes: report(), flags: 1 },
    { path: 'inner.zip', bytes: writeZip([{ path: 'x', bytes: Buffer.from('x') }]) },
  ]);
  const { results } = (await attach(zip).expect(200)).body as ReceivedFiles;
  const download = async ({ doseReportId }: ReceivedFile) =>
    (await technologist.get(`/api/dose-reports/${doseReportId}/original`).buffer(true).parse(collect)).body;
  expect(Buffer.compare(await download(results[0] as ReceivedFile), zip)).toBe(0);
  expect((await download(results[1] as ReceivedFile)).length).toBeLessThan(zip.length);
});

test.each([
  [
    'archive-overlap',
    [
      { path: 'a', bytes: Buffer.from('abc') },
      { path: 'b', bytes: Buffer.from('abc'), sharesDataOf: 0 },
    ],
  ],
  [
    'archive-too-many-entries',
    Array.from({ length: 2001 }, (_, index) => ({ path: `${index}`, bytes: Buffer.from('x') })),
  ],
  [
    'archive-unpacked-size',
    Array.from({ length: 4 }, (_, index) => ({
      path: `${index}`,
      bytes: Buffer.from('x'),
      statedByteCount: 60 * 1_048_576,
    })),
  ],
  ['archive-ratio', [{ path: 'a', bytes: Buffer.from('x'), statedByteCount: 60 * 1_048_576 }]],
  ['archive-empty', [{ path: 'folder/', bytes: Buffer.alloc(0) }]],
  [
    'not-dicom',
    [
      { path: '[Content_Types].xml', bytes: Buffer.from('<Types/>') },
      { path: 'xl/workbook.xml', bytes: Buffer.from('<w/>') },
    ],
  ],
])('an archive is refused as a whole and kept: %s', async (code, entries) => {
  const zip = writeZip(entries);
  const { results, archives } = (await attach(zip).expect(200)).body as ReceivedFiles;
  expect(results).toMatchObject([{ fileName: 'old cases.zip', outcome: 'refused', reason: { code } }]);
  expect(archives[0]?.state).toBe('refused');
  const { body } = await technologist
    .get(`/api/dose-reports/${results[0]?.doseReportId}/original`)
    .buffer(true)
    .parse(collect);
  expect(Buffer.compare(body, zip)).toBe(0);
});

test('an archive cut off in the middle is refused as a whole', async () => {
  const zip = writeZip([{ path: 'a.dcm', bytes: report() }]);
  const answer = (await attach(zip.subarray(0, zip.length - 30)).expect(200)).body as ReceivedFiles;
  expect(codesOf(answer)).toEqual(['archive-unreadable']);
});

test('an archive is known by its content: a wrong name changes nothing', async () => {
  const zip = writeZip([{ path: 'a.dcm', bytes: report() }]);
  expect(codesOf((await attach(zip, 'export.dcm').expect(200)).body)).toEqual(['stored']);
  const notZip = (await attach(readSample('43-text.txt'), 'text.zip').expect(200)).body;
  expect(codesOf(notZip)).toEqual(['not-dicom']);
});

test('the limit on what an archive unpacks to is counted, not believed', async () => {
  const { readContents } = await import('../../server/dose-reports/archive-contents');
  const { unpackEntry } = await import('../../server/dose-reports/unpack-entry');
  const { archiveLimits } = await import('../../server/dose-reports/archive-limits');
  const { openNamelessFile } = await import('../../server/kernel/nameless-file');
  const zip = writeZip([
    { path: 'a', bytes: Buffer.from('abc'.repeat(2000)), isStored: true, statedByteCount: 10 },
  ]);
  const handle = await openNamelessFile();
  await handle.appendFile(zip);
  const limits = { ...archiveLimits, unpackedBytes: 5000 };
  const { zip: opened, files } = await readContents(handle.fd, zip.length, limits);
  const [file] = files;
  if (!file) throw new Error('no entry');
  await expect(unpackEntry(opened, file, { byteCount: 0 }, zip.length, limits)).rejects.toMatchObject({
    code: 'archive-unpacked-size',
  });
  await handle.close();
});

test('1,000 files with 25 duplicates and 10 corrupt: 965 new, 25 already here, 10 refused, each listed', async () => {
  const fresh = Array.from({ length: 965 }, report);
  const files = [
    ...fresh,
    ...fresh.slice(0, 25),
    ...fresh.slice(25, 35).map((bytes) => bytes.subarray(0, bytes.length - 400)),
  ];
  const zip = writeZip(files.map((bytes, index) => ({ path: `export/${index}.dcm`, bytes })));
  const { body, status } = await technologist
    .post('/api/dose-reports')
    .set('Prefer', 'respond-async')
    .attach('files', zip, 'thousand.zip');
  expect(status).toBe(202);
  const { id } = (body as ReceivedFiles).archives[0] ?? {};
  const results: ReceivedFile[] = [];
  for (let state = 'received'; state === 'received';) {
    await new Promise((resolve) => setTimeout(resolve, 200));
    const { body: progress } = await technologist.get(
      `/api/dose-reports/archives/${id}?after=${results.length}`,
    );
    results.push(...progress.results);
    state = progress.archive.state;
  }
  expect(results.map(({ fileName }) => fileName)).toEqual(files.map((_, index) => `export/${index}.dcm`));
  const counted = (outcome: string) => results.filter((result) => result.outcome === outcome).length;
  expect([counted('stored'), counted('duplicate'), counted('refused')]).toEqual([965, 25, 10]);
  const { body: list } = await technologist.get(`/api/dose-reports?archive=${id}&outcome=refused`);
  expect(list.counts).toEqual({ stored: 965, duplicate: 25, refused: 10 });
  expect(list.items).toHaveLength(10);
  expect(list.archiveName).toBe('thousand.zip');
}, 60_000);

test('an archive half unpacked by a crash is finished at the next start, each entry once', async () => {
  const { keepArchive } = await import('../../server/dose-reports/archive.store');
  const { settleReceived } = await import('../../server/dose-reports/settle-received');
  const { openNamelessFile } = await import('../../server/kernel/nameless-file');
  const db = app.dataSource.manager;
  const [{ id: hospitalId }] = await app.dataSource.query('select id from hospital');
  const zip = writeZip(Array.from({ length: 6 }, (_, index) => ({ path: `${index}.dcm`, bytes: report() })));
  const handle = await openNamelessFile();
  await handle.appendFile(zip);
  const fields = {
    hospitalId,
    fileName: 'cut.zip',
    uploadKey: null,
    sha256: 'x',
    byteCount: zip.length,
    receivedById: null,
  };
  const id = await keepArchive(db, fields, handle);
  await handle.close();
  await settleReceived(db);
  // As if the process had ended before the fourth entry.
  await app.dataSource.query(`update received_archive set state = 'received' where id = $1`, [id]);
  await app.dataSource.query(
    `delete from irradiation_event where dose_report_id in (select id from dose_report where archive_id = $1 and file_name >= '3.dcm')`,
    [id],
  );
  await app.dataSource.query(`delete from dose_report where archive_id = $1 and file_name >= '3.dcm'`, [id]);
  await Promise.all([settleReceived(db), settleReceived(db)]);
  const rows = await app.dataSource.query(
    'select file_name, outcome from dose_report where archive_id = $1 order by file_name',
    [id],
  );
  expect(rows).toEqual(
    Array.from({ length: 6 }, (_, index) => ({ file_name: `${index}.dcm`, outcome: 'stored' })),
  );
  const [{ state }] = await app.dataSource.query('select state from received_archive where id = $1', [id]);
  expect(state).toBe('unpacked');
});
