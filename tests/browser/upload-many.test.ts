import { mkdir, mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, beforeEach, expect, test } from 'vitest';
import { writeNewReport } from '../../scripts/bench/written-report';
import { makeHospital, makePerson } from '../factories';
import { writeZip } from '../zip-writer';
import { startJourney, type Journey } from './journey';

let journey: Journey;
let page: Page;

beforeAll(async () => {
  journey = await startJourney();
  const hospitalId = await makeHospital(journey.dataSource);
  await makePerson(journey.dataSource, hospitalId, { email: 't@example.org', roles: ['technologist'] });
  page = await journey.open('t@example.org');
  // Hundreds of files on a machine that has other things to do.
  page.setDefaultTimeout(100_000);
});
// Each test begins with an empty list.
beforeEach(async () => {
  await page.goto('/procedures?period=all');
  await page.getByRole('button', { name: 'Choose a folder' }).waitFor();
});
afterAll(() => journey.close());

const outcomes = () => page.getByRole('list', { name: 'Files and their outcomes' });

/** Drags files of this machine over the page and lets go, as the browser itself hands them over. */
async function dropFiles(paths: string[]): Promise<void> {
  const client = await page.context().newCDPSession(page);
  const data = { items: [], files: paths.map((path) => resolve(path)), dragOperationsMask: 1 };
  for (const type of ['dragEnter', 'dragOver', 'drop'] as const)
    await client.send('Input.dispatchDragEvent', { type, x: 500, y: 450, data });
  await client.detach();
}

test('files dropped anywhere on the page are read, and a refused one says why', async () => {
  await dropFiles(['samples/02-biplane.dcm', 'samples/42-secondary-capture.dcm']);
  await outcomes().getByText('stored', { exact: true }).waitFor();
  await outcomes().getByText('refused', { exact: true }).waitFor();
  const refused = outcomes().getByRole('listitem').filter({ hasText: '42-secondary-capture.dcm' });
  expect(await refused.textContent()).toContain('picture');
  await page.getByRole('status').filter({ hasText: '1 procedure.' }).waitFor();
  await page.getByRole('button', { name: 'Clear this list' }).click();
});

test('30 files at once: each has its outcome, and twice the same file is one procedure', async () => {
  const asFile = (name: string, buffer: Buffer) => ({ name, mimeType: '', buffer });
  const reports = Array.from({ length: 27 }, (_, index) =>
    asFile(`new-${index}.dcm`, Buffer.from(writeNewReport(5))),
  );
  const again = reports.slice(0, 2).map(({ buffer }, index) => asFile(`again-${index}.dcm`, buffer));
  const text = asFile('list.txt', Buffer.from('Cases of this week: three.'));
  await page.getByLabel('Choose files').setInputFiles([...reports, ...again, text]);
  await page
    .getByRole('status')
    .filter({ hasText: '30 read: 27 stored, 2 already here, 1 refused.' })
    .waitFor();
  expect(await outcomes().getByRole('listitem').count()).toBe(30);
  expect(await outcomes().getByRole('link', { name: 'Open the procedure' }).count()).toBe(29);

  await page.getByLabel('Only what needs attention').check();
  expect(await outcomes().getByRole('listitem').count()).toBe(1);
  expect(await outcomes().textContent()).toContain('This is a text, not a DICOM file.');

  // One from the file dropped before.
  await page.getByRole('status').filter({ hasText: '28 procedures.' }).waitFor();
  expect(await page.getByRole('rowheader').count()).toBe(28);
});

test('a folder with folders in it, dropped on the page: every file in it is read, system files are left out', async () => {
  const folder = await mkdtemp(join(tmpdir(), 'cases-'));
  await mkdir(join(folder, 'room 1', 'monday'), { recursive: true });
  // More than the hundred that a browser hands over at a time.
  for (let index = 0; index < 105; index++)
    await writeFile(join(folder, 'room 1', `note-${index}.txt`), `Note ${index}`);
  await writeFile(join(folder, 'room 1', 'monday', 'deep.dcm'), writeNewReport(2));
  await writeFile(join(folder, 'DICOMDIR'), 'table of contents');
  await dropFiles([folder]);
  await page.getByRole('status').filter({ hasText: '106 read: 1 stored, 105 refused.' }).waitFor();
  await page.getByRole('status').filter({ hasText: '1 system file of a folder was left out.' }).waitFor();
  await outcomes()
    .getByTitle(/room 1\/monday\/deep\.dcm$/)
    .waitFor();
  await rm(folder, { recursive: true });
});

test('a zip archive is unpacked, each entry with its outcome, and the list can be saved', async () => {
  const bytes = Buffer.from(writeNewReport(2));
  const zip = writeZip([
    { path: 'old/', bytes: Buffer.alloc(0) },
    ...Array.from({ length: 12 }, (_, index) => ({
      path: `old/${index}.dcm`,
      bytes: Buffer.from(writeNewReport(1)),
    })),
    { path: 'old/one.dcm', bytes },
    { path: 'old/one again.dcm', bytes },
    { path: 'old/=sum.png', bytes: Buffer.from('89504e470d0a1a0a', 'hex') },
  ]);
  await page.getByLabel('Choose files').setInputFiles([{ name: 'old.zip', mimeType: '', buffer: zip }]);
  await page
    .getByRole('status')
    .filter({ hasText: '15 read: 13 stored, 1 already here, 1 refused.' })
    .waitFor();
  await outcomes().getByText('15 files in it').waitFor();
  await outcomes().getByText('1 entry left out').waitFor();
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Save this list' }).click(),
  ]);
  const list = await readFile(await download.path(), 'utf8');
  expect(list.split('\r\n')).toHaveLength(1 + 15 + 1 + 1);
  expect(list).toContain('old/one again.dcm,old.zip,already here,,,');
  expect(list).toMatch(/old\/=sum\.png,old\.zip,refused,not-dicom,"This is a picture \(PNG\)/);
  await page.getByRole('button', { name: 'Clear this list' }).click();
});

test('with the connection lost in the middle, what waits goes on by itself and is stored once', async () => {
  const countRows = async () =>
    (await journey.dataSource.query('select count(*)::int as count from dose_report'))[0].count as number;
  const before = await countRows();
  await page.context().setOffline(true);
  const reports = Array.from({ length: 8 }, (_, index) => ({
    name: `offline-${index}.dcm`,
    mimeType: '',
    buffer: Buffer.from(writeNewReport(3)),
  }));
  await page.getByLabel('Choose files').setInputFiles(reports);
  await page.getByText('The server does not answer. What waits goes on by itself').waitFor();
  expect(await countRows()).toBe(before);
  await page.context().setOffline(false);
  await page.getByRole('status').filter({ hasText: '8 read: 8 stored.' }).waitFor();
  expect(await countRows()).toBe(before + 8);
  expect(await page.getByText('The server does not answer.').count()).toBe(0);
});

test('the same files chosen again after a reload are already here', async () => {
  await page.reload();
  const again = Buffer.from(writeNewReport(3));
  const asFile = (name: string) => ({ name, mimeType: '', buffer: again });
  await page.getByLabel('Choose files').setInputFiles([asFile('first.dcm')]);
  await page.getByRole('status').filter({ hasText: '1 read: 1 stored.' }).waitFor();
  await page.reload();
  await page.getByLabel('Choose files').setInputFiles([asFile('first.dcm')]);
  await page.getByRole('status').filter({ hasText: '1 read: 1 already here.' }).waitFor();
});

test('every file received is listed with its reason, the refused ones too', async () => {
  await page.getByRole('link', { name: 'Dose reports' }).click();
  await page.getByRole('heading', { level: 1 }).waitFor();
  await page.getByText('This is a text, not a DICOM file.', { exact: false }).first().waitFor();
  await page.getByLabel('File or archive name contains').fill('list.t');
  await page.getByRole('button', { name: 'Find' }).click();
  await page.getByText('list.txt').first().waitFor();
  await page.getByText('1 refused.').waitFor();
  expect(await page.getByRole('rowheader').count()).toBe(1);
});

test('no page complained, and none spoke to another host', () => {
  const provoked = (text: string) => text.includes('ERR_INTERNET_DISCONNECTED');
  expect(journey.complaints.filter((text) => !provoked(text))).toEqual([]);
});
