import { afterAll, beforeAll, expect, test } from 'vitest';
import { makeJpeg } from '../../server/attachments/example-pictures';
import { makeHospital, makePerson, makeProcedureType, makeRoom } from '../factories';
import { findBarriers, findOverflow, startJourney, type Journey } from './journey';

let journey: Journey;
const phone = { viewport: { width: 390, height: 844 }, hasTouch: true };

beforeAll(async () => {
  journey = await startJourney();
  const hospitalId = await makeHospital(journey.dataSource);
  const person = (name: string) =>
    makePerson(journey.dataSource, hospitalId, {
      email: `${name}@example.org`,
      name,
      roles: ['technologist'],
      job: 'technologist',
    });
  await person('t1');
  await person('t2');
  await makeRoom(journey.dataSource, hospitalId, { code: 'OR3', name: 'Theatre 3' });
  await makeProcedureType(journey.dataSource, hospitalId, { name: 'Nephrostomy' });
});
afterAll(() => journey.close());

test('a technologist types the dose screen on a phone, hands over half-way, and the figures are stored as typed', async () => {
  const page = await journey.open('t1@example.org', phone);
  await page.getByRole('link', { name: 'No report? Enter by hand' }).click();
  await page.getByLabel('Machine').selectOption({ label: 'A machine that is not in this list' });
  await page.getByLabel('Room').selectOption({ label: 'OR3, Theatre 3' });
  await page.getByLabel('Start of the procedure').fill('2026-01-15T09:15');
  await page.getByLabel('Air kerma–area product').first().fill('1250');
  await page.getByLabel('Unit of air kerma–area product').selectOption('µGy·m²');
  await page.getByText('1250\u202fµGy·m² is 12.5\u202fGy·cm²').waitFor();
  await page.getByLabel('Choose a picture').setInputFiles({
    name: 'screen.jpg',
    mimeType: 'image/jpeg',
    buffer: makeJpeg(),
  });
  await page.getByText('Kept: screen.jpg').waitFor();
  expect(await findOverflow(page)).toBe(0);
  expect(await findBarriers(page)).toEqual([]);

  // Another person takes the same tab over; what was typed is still there.
  await page.request.delete('/api/session');
  await page.request.post('/api/session', {
    data: { email: 't2@example.org', password: 'a long enough password' },
  });
  await page.goto('/procedures/enter');
  await page.getByText('Your entries from before are back').waitFor();
  await page.getByText('Kept: screen.jpg').waitFor();

  // 3.2 Gy are typed twice; a slip is shown, the first typing is not.
  await page.getByLabel('Reference air kerma').first().fill('3.2');
  await page.getByLabel('Unit of reference air kerma').selectOption('Gy');
  await page.getByRole('button', { name: 'Store the entry' }).click();
  const again = page.getByLabel('Reference air kerma').first();
  expect(await again.inputValue()).toBe('');
  await again.fill('3.2');
  await page.getByLabel('Unit of reference air kerma').selectOption('mGy');
  await again.press('Enter');
  await page.getByText('First 3.2\u202fGy, now 3.2\u202fmGy', { exact: false }).waitFor();
  await page.getByLabel('Unit of reference air kerma').selectOption('Gy');
  await page.getByRole('button', { name: 'Compare and store' }).click();

  await page.getByText('Entered by hand: no report came.').waitFor();
  await page.getByText('1250\u202fµGy·m²').first().waitFor();
  await page.getByRole('button', { name: 'Show the picture of the dose screen' }).waitFor();
  expect(await findOverflow(page)).toBe(0);
  expect(await findBarriers(page)).toEqual([]);
  await page.goto('/procedures?period=12m');
  await page.getByText('1 procedure, 1 of them entered by hand.').waitFor();
  await page.getByRole('row').getByText('entered by hand').first().waitFor();
  // The draft went with the stored entry.
  await page.goto('/procedures/enter');
  expect(await page.getByLabel('Air kerma–area product').first().inputValue()).toBe('');
});

test('what was typed is corrected with a reason, and the earlier figure stays readable', async () => {
  const page = await journey.open('t1@example.org');
  await page.goto('/procedures?period=12m');
  await page.getByRole('row').filter({ hasText: 'entered by hand' }).getByRole('link').first().click();
  await page.getByRole('link', { name: 'Correct what was typed' }).click();
  expect(await page.getByLabel('Air kerma–area product').first().inputValue()).toBe('1250');
  await page.getByLabel('Air kerma–area product').first().fill('1350');
  await page.getByLabel('Reference air kerma').first().fill('');
  await page.getByLabel('Why the entry is corrected').fill('digit misread');
  await page.getByRole('button', { name: 'Store the correction' }).click();
  await page.getByText('Corrected, because: “digit misread”').waitFor();
  await page.getByText('1350\u202fµGy·m²').first().waitFor();
  await page.getByText('1 earlier entry').click();
  await page.getByText('1250\u202fµGy·m²').first().waitFor();
});

test('no page complained, and none spoke to another host', () => {
  expect(journey.complaints).toEqual([]);
});
