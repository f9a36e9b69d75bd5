import { readdirSync, readFileSync } from 'node:fs';
import { gzipSync } from 'node:zlib';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { writeNewReport } from '../../scripts/bench/written-report';
import { purgeRefused } from '../../server/dose-reports/purge-refused';
import { reasonCodes, reasons, type ReasonCode } from '../../shared/contract/outcome';
import { makeHospital, makePerson, testPassword } from '../factories';
import { readSample } from '../samples';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';
import { writeZip } from '../zip-writer';

let app: TestApp;
let technologist: Agent;
let administrator: Agent;

beforeAll(async () => {
  app = await startTestApp();
  const hospitalId = await makeHospital(app.dataSource);
  await makePerson(app.dataSource, hospitalId, { email: 't@example.org', roles: ['technologist'] });
  await makePerson(app.dataSource, hospitalId, { email: 'a@example.org', roles: ['administrator'] });
  technologist = await signIn(app.app, 't@example.org', testPassword);
  administrator = await signIn(app.app, 'a@example.org', testPassword);
});
afterAll(() => app.close());

const send = async (bytes: Buffer, name: string) =>
  (await technologist.post('/api/dose-reports').attach('files', bytes, name).expect(200)).body.results[0];
const text = (content: string) => Buffer.from(content);

test.each([
  [
    'screen.dcm',
    Buffer.from('89504e470d0a1a0a0000000d', 'hex'),
    'This is a picture (PNG), not a DICOM file.',
  ],
  ['photo.jpg', Buffer.from('ffd8ffe000104a464946', 'hex'), 'This is a picture (JPEG), not a DICOM file.'],
  ['report.pdf', text('%PDF-1.7\n'), 'This is a PDF document, not a DICOM file.'],
  ['report.gz', gzipSync('x'), 'This is a packed file (gzip), not a DICOM file.'],
  ['page.htm', text('<!DOCTYPE html><html>'), 'This is a web page (HTML), not a DICOM file.'],
  ['list.csv', text('case;dose\n1;2\n'), 'This is a text, not a DICOM file.'],
  [
    'list.xls',
    Buffer.from('d0cf11e0a1b11ae1', 'hex'),
    'This is an older Excel or Word document, not a DICOM file.',
  ],
  ['noise', Buffer.from('00ff00ff01020304', 'hex'), 'This is not a DICOM file.'],
])('%s is refused by what it is, and the sentence says what to do', async (name, bytes, sentence) => {
  const { outcome, reason } = await send(bytes, name);
  expect(outcome).toBe('refused');
  expect(reason.code).toBe('not-dicom');
  expect(reason.detail.startsWith(sentence)).toBe(true);
  expect(reason.detail).toMatch(/(Send|Export|Unpack) /);
});

/** A DICOM file of one SOP class with hardly anything in it (PS3.10 7.1). */
function writeBareDicom(sopClassUid: string): Buffer {
  const element = (group: number, item: number, vr: string, value: string) => {
    const padded = value.length % 2 === 0 ? value : `${value}\0`;
    const head = Buffer.alloc(8);
    head.writeUInt16LE(group, 0);
    head.writeUInt16LE(item, 2);
    head.write(vr, 4, 'latin1');
    head.writeUInt16LE(padded.length, 6);
    return Buffer.concat([head, Buffer.from(padded, 'latin1')]);
  };
  const meta = [element(2, 2, 'UI', sopClassUid), element(2, 0x10, 'UI', '1.2.840.10008.1.2.1')];
  const length = Buffer.from('\x02\0\0\0UL\x04\0\0\0\0\0', 'latin1');
  length.writeUInt32LE(Buffer.concat(meta).length, 8);
  const disc = element(4, 0x1130, 'CS', 'CASES ');
  return Buffer.concat([Buffer.alloc(128), Buffer.from('DICM'), length, ...meta, disc]);
}

test('the table of contents of a disc is told as that', async () => {
  const { outcome, reason } = await send(writeBareDicom('1.2.840.10008.1.3.10'), 'DICOMDIR');
  expect(outcome).toBe('refused');
  expect(reason.detail).toContain('the table of contents of a DICOM disc (DICOMDIR)');
});

const unread = readdirSync('samples')
  .filter((name) => name.endsWith('.expected.json'))
  .map((name) => JSON.parse(readFileSync(`samples/${name}`, 'utf8')))
  .filter(({ outcome }) => outcome === 'refused');

test.each(unread)(
  '$fileName comes to its outcome through the API: $reasonCode',
  async ({ fileName, reasonCode }) => {
    const result = await send(readSample(fileName), fileName);
    const { outcome, sentence } = reasons[reasonCode as ReasonCode];
    expect(result).toMatchObject({ outcome, procedureId: null, reason: { code: reasonCode } });
    // A file that is not DICOM is named by what it is instead.
    if (reasonCode !== 'not-dicom') expect(result.reason.detail.startsWith(sentence)).toBe(true);
  },
);

test('every reason but those of archives and of a strained server has a sample here', () => {
  const elsewhere = /^archive-|^limit-(items|time|memory)$|^reader-failure$|^sop-instance-/;
  const missing = reasonCodes.filter(
    (code) => !elsewhere.test(code) && !unread.some(({ reasonCode }) => reasonCode === code),
  );
  expect(missing).toEqual([]);
});

test('a study of radiography alone is stored, and classed as such', async () => {
  const { outcome, procedureId } = await send(readSample('11-radiography.dcm'), 'wards.dcm');
  expect(outcome).toBe('stored');
  const { body } = await technologist.get(`/api/procedures/${procedureId}`).expect(200);
  expect(body.deviceClass).toBe('radiography');
  // Outside fluoroscopy figures: no level is judged, nobody is asked to look at it.
  expect(body.attention).toBeNull();
});

test('the bytes of a refused file are kept for a time that the list tells, those of others for good', async () => {
  await send(text('to be told'), 'told.txt');
  await send(Buffer.from(writeNewReport(1)), 'good.dcm');
  const { body } = await technologist.get('/api/dose-reports').expect(200);
  expect(body.refusedKeepDays).toBe(180);
  const told = body.items.find((item: { fileName: string }) => item.fileName === 'told.txt');
  const days = (Date.parse(told.keptUntil) - Date.parse(told.receivedAt)) / 86_400_000;
  expect(days).toBeCloseTo(180, 1);
  // No reader of DICOM will ever make a report of a text.
  expect(told).toMatchObject({ hasOriginal: true, canReadAgain: false });
  const good = body.items.find((item: { fileName: string }) => item.fileName === 'good.dcm');
  expect(good.keptUntil).toBeNull();
});

test('after that time the bytes are deleted, the row stays, and nothing else is touched', async () => {
  const refused = await send(text('soon gone'), 'gone.txt');
  const held = await send(readSample('47-enhanced-report.dcm'), 'held.dcm');
  const good = Buffer.from(writeNewReport(1));
  const zip = writeZip([
    { path: 'in.dcm', bytes: good },
    { path: 'locked.dcm', bytes: good, flags: 1 },
  ]);
  const stored = await send(zip, 'mixed.zip');
  const inDays = (days: number) => new Date(Date.now() + days * 86_400_000);
  const db = app.dataSource.manager;
  expect((await purgeRefused(db, inDays(179), 180)).files).toBe(0);
  expect((await purgeRefused(db, inDays(2000), 0)).files).toBe(0);
  const { files, bytes } = await purgeRefused(db, inDays(181), 180);
  expect(files).toBeGreaterThanOrEqual(2);
  expect(bytes).toBeGreaterThan(0);

  const gone = await technologist.get(`/api/dose-reports/${refused.doseReportId}/original`).expect(404);
  expect(gone.body.detail).toContain('were deleted');
  await technologist.get(`/api/dose-reports/${stored.doseReportId}/original`).expect(200);
  expect(held.outcome).toBe('held');
  await technologist.get(`/api/dose-reports/${held.doseReportId}/original`).expect(200);
  const { body } = await technologist.get('/api/dose-reports?outcome=refused&limit=200').expect(200);
  expect(body.items.every((item: { purgedAt: string | null }) => item.purgedAt !== null)).toBe(true);
  expect(body.items.some((item: { hasOriginal: boolean }) => item.hasOriginal)).toBe(false);
  const [{ lines }] = await app.dataSource.query(
    `select count(*)::int as lines from audit_entry where "action" = 'refused bytes deleted'`,
  );
  expect(lines).toBe(1);
  expect((await purgeRefused(db, inDays(181), 180)).files).toBe(0);
});

test('the list finds files by part of a name, with true counts; who sees no names cannot search them', async () => {
  await send(text('a'), '100%_Meyer.txt');
  await send(text('b'), '1000 other.txt');
  const query = `text=${encodeURIComponent('0%_mey')}`;
  const { body } = await technologist.get(`/api/dose-reports?${query}`).expect(200);
  expect(body.items.map((item: { fileName: string }) => item.fileName)).toEqual(['100%_Meyer.txt']);
  expect(body.counts).toEqual({ refused: 1 });
  const all = await administrator.get('/api/dose-reports').expect(200);
  const masked = await administrator.get(`/api/dose-reports?${query}`).expect(200);
  expect(masked.body.counts).toEqual(all.body.counts);
  expect(JSON.stringify(masked.body)).not.toContain('Meyer');
});
