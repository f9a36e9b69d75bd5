import { afterAll, beforeAll, expect, test } from 'vitest';
import { writeDoseReport } from '../../server/dicom-writer/write-dose-report';
import { totalsOf } from '../check-story';
import { makeHospital, makePerson, makeProcedureType } from '../factories';
import { findBarriers, findOverflow, startJourney, type Journey } from './journey';

let journey: Journey;

beforeAll(async () => {
  journey = await startJourney();
  const hospitalId = await makeHospital(journey.dataSource);
  await makePerson(journey.dataSource, hospitalId, {
    email: 'p@example.org',
    name: 'P-01',
    roles: ['physicist'],
  });
  await makeProcedureType(journey.dataSource, hospitalId, { name: 'Hepatic arteriography' });
});
afterAll(() => journey.close());

test('a physicist finds what is in doubt, types the true total, and takes it back', async () => {
  const page = await journey.open('p@example.org');
  await page.getByLabel('Choose files').setInputFiles({
    name: 'slipped.dcm',
    mimeType: 'application/dicom',
    buffer: Buffer.from(writeDoseReport(totalsOf(2, 4300))),
  });
  await page.getByRole('list', { name: 'Files and their outcomes' }).getByText('stored').waitFor();
  await page.goto('/procedures?period=all&attention=in-doubt');
  const row = page.getByRole('row').filter({ hasText: 'Hepatic arteriography' });
  await row.getByText('value in doubt').first().waitFor();
  await row.getByRole('link').first().click();

  await page.getByText('outside every statistic until a physicist decides', { exact: false }).waitFor();
  await page.getByRole('button', { name: 'Decide' }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByRole('button', { name: 'Keep this decision' }).click();
  await dialog.getByText('Choose a decision.').waitFor();
  await dialog.getByText('Say why in a few words.').waitFor();
  await dialog.getByLabel('Other totals count').check();
  await dialog.getByRole('textbox').nth(1).fill('43,0');
  await dialog.getByLabel('Reason').fill('the screen shows 43.0');
  expect(await findBarriers(page)).toEqual([]);
  await dialog.getByRole('button', { name: 'Keep this decision' }).click();

  await page.getByText('Totals corrected: P KA 43.0 Gy·cm².').waitFor();
  await page.getByText('typed by the physicist;', { exact: false }).waitFor();
  expect(await page.getByText('value in doubt').count()).toBe(0);
  expect(await findBarriers(page)).toEqual([]);

  await page.getByRole('button', { name: 'Take back' }).click();
  await dialog.getByLabel('Reason').fill('the photograph is of another case');
  await dialog.getByRole('button', { name: 'Take back' }).click();
  await page.getByText('value in doubt', { exact: false }).first().waitFor();
  await page.getByText('One earlier decision').click();
  await page.getByText('the screen shows 43.0', { exact: false }).first().waitFor();
  expect(journey.complaints).toEqual([]);
});

test('the rules are read on a phone and set with a reason', async () => {
  const page = await journey.open('p@example.org', { viewport: { width: 390, height: 844 } });
  await page.goto('/admin/data-checks');
  await page.getByRole('link', { name: 'Usual kVp' }).click();
  await page.getByRole('heading', { name: 'Usual kVp' }).waitFor();
  await page.getByLabel('Passes up to').fill('130');
  await page.getByRole('button', { name: 'Set the rule' }).click();
  await page.getByText('Say why in a few words.').waitFor();
  await page.getByLabel('Reason').fill('the new tube goes to 130');
  await page.getByRole('button', { name: 'Set the rule' }).click();
  await page.getByText('as delivered: 40 to 125 kV').waitFor();
  await page.getByText('the new tube goes to 130').last().waitFor();
  expect(await findOverflow(page)).toBeLessThanOrEqual(0);
  expect(await findBarriers(page)).toEqual([]);
});
