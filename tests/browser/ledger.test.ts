import type { Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { makeProcedure } from '../estimate-factory';
import { makeHospital, makePerson, makeProcedureType } from '../factories';
import { findBarriers, findOverflow, startJourney, type Journey } from './journey';

const longName = 'Transjugular portosystemic shunt with variceal embolisation';
const manyProcedures = 10_000;

let journey: Journey;
let hospitalId: string;
let procedureId: string;
let page: Page;

beforeAll(async () => {
  journey = await startJourney();
  hospitalId = await makeHospital(journey.dataSource);
  await makePerson(journey.dataSource, hospitalId, { email: 't@example.org', roles: ['technologist'] });
  page = await journey.open('t@example.org');
});
afterAll(() => journey.close());

/** Copies of one procedure, an hour apart, each with its own figures. */
async function addCopies(count: number): Promise<void> {
  await journey.dataSource.query(
    `insert into procedure
     select (jsonb_populate_record(original, jsonb_build_object(
       'id', gen_random_uuid(),
       'case_number', 'C' || copy,
       'study_instance_uid', original.study_instance_uid || '.' || copy,
       'started_at', original.started_at - copy * interval '1 hour',
       'fluoroscopy_time_s', 60 + copy))).*
     from procedure original, generate_series(1, $2::int) copy where original.id = $1`,
    [procedureId, count],
  );
}

const firstRow = () => page.getByRole('rowheader').first();
const pressUntil = async (key: string, isReached: () => Promise<boolean>, most: number) => {
  for (let presses = 0; presses < most; presses += 1) {
    await page.keyboard.press(key);
    if (await isReached()) return;
  }
  throw new Error(`${most} times ${key} did not lead there.`);
};
const isOnRowLink = () => page.evaluate(() => document.activeElement?.closest('th[role=rowheader]') !== null);

test('without any row the page says what to do next', async () => {
  await page.goto('/procedures?period=all');
  await page.getByText('No procedure here').waitFor();
  await page.getByText('Drop a dose report on this page', { exact: false }).waitFor();
  await page
    .getByRole('status')
    .filter({ hasText: /^(0|No) procedures?\./ })
    .waitFor();
});

test('with one row of a long name it fits a wide and a narrow window in both themes', async () => {
  const procedureTypeId = await makeProcedureType(journey.dataSource, hospitalId, { name: longName });
  procedureId = await makeProcedure(journey.dataSource, hospitalId, {
    caseNumber: 'MC-26-0001',
    procedureTypeId,
  });
  for (const colorScheme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme });
    for (const width of [390, 1440]) {
      await page.setViewportSize({ width, height: 900 });
      await page.goto('/procedures?period=all');
      await firstRow().filter({ hasText: longName }).waitFor();
      expect([colorScheme, width, await findOverflow(page)]).toEqual([colorScheme, width, 0]);
    }
    expect([colorScheme, await findBarriers(page)]).toEqual([colorScheme, []]);
  }
});

test('with ten thousand rows: the first of them, more on demand, in any order', async () => {
  await addCopies(manyProcedures - 1);
  await page.goto('/procedures?period=all');
  await page.getByText('50 of 10000 shown').waitFor();
  expect(await findOverflow(page)).toBe(0);
  await page.getByRole('button', { name: 'Show more' }).click();
  await page.getByText('100 of 10000 shown').waitFor();
  expect(await page.getByRole('rowheader').count()).toBe(100);

  const byTime = page.getByRole('columnheader', { name: /FT/ });
  await byTime.getByRole('button').click();
  // The longest of the copies: 60 s + 9,999 s.
  await page.getByRole('row').nth(1).filter({ hasText: '167.7' }).waitFor();
  expect(await byTime.getAttribute('aria-sort')).toBe('descending');
  expect(new URL(page.url()).searchParams.get('sort')).toBe('fluoroscopy-time');
});

test('by keyboard alone: find a case, walk the rows, open one, come back to the same list', async () => {
  await page.goto('/procedures?period=all');
  await page.getByText('50 of 10000 shown').waitFor();
  const isOn = (name: string) => () =>
    page.evaluate(
      (wanted) => (document.activeElement as HTMLInputElement | null)?.labels?.[0]?.textContent === wanted,
      name,
    );
  await pressUntil('Tab', isOn('Find a case, patient or accession'), 30);
  await page.keyboard.type('C999');
  await page.keyboard.press('Enter');
  // C999 and C9990 to C9999.
  await page.getByText('11 of 11 shown').waitFor();
  await pressUntil('Tab', isOnRowLink, 30);
  await page.keyboard.press('ArrowDown');
  await page.keyboard.press('End');
  expect(await isOnRowLink()).toBe(true);
  expect(await page.locator(':focus').evaluate((link) => link.closest('tr')?.textContent)).toContain('C9999');
  await page.keyboard.press('Enter');
  await page.getByRole('heading', { level: 1, name: longName }).waitFor();
  await page.goBack();
  await page.getByText('11 of 11 shown').waitFor();
});

test('no page complained, and none spoke to another host', () => {
  expect(journey.complaints).toEqual([]);
});
