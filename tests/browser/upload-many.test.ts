import { resolve } from 'node:path';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { writeNewReport } from '../../scripts/bench/written-report';
import { makeHospital, makePerson } from '../factories';
import { startJourney, type Journey } from './journey';

let journey: Journey;
let page: Page;

beforeAll(async () => {
  journey = await startJourney();
  const hospitalId = await makeHospital(journey.dataSource);
  await makePerson(journey.dataSource, hospitalId, { email: 't@example.org', roles: ['technologist'] });
  page = await journey.open('t@example.org');
  await page.goto('/procedures?period=all');
  await page.getByText('No procedure here').waitFor();
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

  await page.getByLabel('Only what was not stored').check();
  expect(await outcomes().getByRole('listitem').count()).toBe(1);
  expect(await outcomes().textContent()).toContain('This is not a DICOM file.');

  // One from the file dropped before.
  await page.getByRole('status').filter({ hasText: '28 procedures.' }).waitFor();
  expect(await page.getByRole('rowheader').count()).toBe(28);
});

test('every file received is listed with its reason, the refused ones too', async () => {
  await page.getByRole('link', { name: 'Dose reports' }).click();
  await page.getByRole('heading', { level: 1 }).waitFor();
  await page.getByText('This is not a DICOM file.', { exact: false }).first().waitFor();
  await page.getByText('list.txt').first().waitFor();
});

test('no page complained, and none spoke to another host', () => {
  expect(journey.complaints).toEqual([]);
});
