import { afterAll, beforeAll, expect, test } from 'vitest';
import { makeGarment, makeHospital, makePerson, makeProcedureType } from '../factories';
import { findBarriers, findOverflow, startJourney, type Journey } from './journey';

let journey: Journey;

beforeAll(async () => {
  journey = await startJourney();
  const hospitalId = await makeHospital(journey.dataSource);
  const person = (email: string, overrides: Parameters<typeof makePerson>[2]) =>
    makePerson(journey.dataSource, hospitalId, { email, ...overrides });
  await person('t@example.org', { name: 'T-01', roles: ['technologist'], job: 'technologist' });
  const operator = await person('o@example.org', {
    name: 'IR-7',
    roles: ['interventionalist'],
    job: 'interventional-radiologist',
  });
  await person('p@example.org', { name: 'P-01', roles: ['physicist'], job: 'physicist' });
  await makeGarment(journey.dataSource, hospitalId, { code: 'MC-G-017', ownerId: operator });
  await makeProcedureType(journey.dataSource, hospitalId, { name: 'Hepatic arteriography' });
});
afterAll(() => journey.close());

test('a technologist drops a report, completes the record and sees the estimate', async () => {
  const page = await journey.open('t@example.org');
  await page.getByText('No procedure here').waitFor();
  await page.getByLabel('Choose files').setInputFiles(['samples/01-single-plane.dcm', 'samples/43-text.txt']);
  const outcomes = page.getByRole('list', { name: 'Files and their outcomes' });
  await outcomes.getByText('stored').waitFor();
  await outcomes.getByText('This is a text, not a DICOM file', { exact: false }).waitFor();
  const told = await page.getByRole('status').filter({ hasText: 'read' }).first().textContent();
  expect(told?.trim()).toBe('2 read: 1 stored, 1 refused.');
  expect(await findBarriers(page)).toEqual([]);

  await outcomes.getByRole('link', { name: 'Open the procedure' }).click();
  await page.getByRole('heading', { name: 'Hepatic arteriography' }).waitFor();
  await page.getByText('no estimate before it is complete').waitFor();
  await page.getByRole('link', { name: 'Complete the record' }).first().click();

  // Type and patient came from the file: only the operator is asked for, by keyboard.
  await page.getByRole('combobox', { name: 'Operator', exact: true }).focus();
  await page.keyboard.type('IR-7');
  await page.keyboard.press('Enter');
  await page.getByRole('button', { name: 'Remove IR-7' }).waitFor();
  expect(await page.getByRole('combobox', { name: 'Garment' }).inputValue()).toContain('MC-G-017');
  expect(await findBarriers(page)).toEqual([]);
  await page.getByRole('button', { name: 'Save the record' }).click();

  await page.getByRole('heading', { name: /Staff exposure, estimated/ }).waitFor();
  const row = page.getByRole('row').filter({ hasText: 'How calculated' });
  await row.first().waitFor();
  const text = (await row.first().textContent()) ?? '';
  // Five figures, each with its interval.
  expect(text.match(/\d+\s?µSv/g)?.length ?? 0).toBeGreaterThanOrEqual(3);
  expect(text.match(/\d[\d.]*–\d/g)?.length ?? 0).toBeGreaterThanOrEqual(4);
  expect(text).not.toContain('IR-7');
  await row.first().getByRole('button', { name: 'How calculated' }).click();
  await page.getByRole('dialog').getByText('scatter-by-event', { exact: false }).first().waitFor();
});

test('the interventionalist sees own procedures, and another’s address leads nowhere', async () => {
  const technologist = await journey.open('t@example.org');
  const other = await technologist.request.post('/api/dose-reports', {
    multipart: {
      files: {
        name: 'x.dcm',
        mimeType: 'application/dicom',
        buffer: (await import('../samples')).readSample('03-odd-units.dcm'),
      },
    },
  });
  const { results } = (await other.json()) as { results: { procedureId: string }[] };
  const page = await journey.open('o@example.org');
  await page.goto('/procedures?period=all');
  await page.getByText('1 procedure', { exact: false }).first().waitFor();
  expect(await page.getByRole('link', { name: /Hepatic arteriography/ }).count()).toBe(1);
  expect(await page.getByLabel('Choose files').count()).toBe(0);
  await page.goto(`/procedures/${results[0]?.procedureId}`);
  await page.getByRole('heading', { name: /nothing/i }).waitFor();
});

test('the procedure fits a phone in both themes', async () => {
  for (const colorScheme of ['light', 'dark'] as const) {
    const page = await journey.open('p@example.org', { viewport: { width: 390, height: 844 }, colorScheme });
    await page.goto('/procedures?period=all');
    await page
      .getByRole('link', { name: /Hepatic arteriography/ })
      .first()
      .click();
    await page.getByRole('heading', { name: 'Totals' }).waitFor();
    expect(await findOverflow(page)).toBe(0);
    expect(await findBarriers(page)).toEqual([]);
  }
});

test('no page complained, and none spoke to another host', () => {
  expect(journey.complaints).toEqual([]);
});
