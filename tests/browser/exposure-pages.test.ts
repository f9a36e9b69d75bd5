import { afterAll, afterEach, beforeAll, expect, test } from 'vitest';
import { makeEstimate, makeProcedure } from '../estimate-factory';
import { makeGarment, makeHospital, makePerson, makeProcedureType } from '../factories';
import { findBarriers, findOverflow, startJourney, type Journey } from './journey';

const procedureCount = 30;

let journey: Journey;

/** Procedures of the last days by six operators, each with an estimate. */
async function addEstimates(hospitalId: string, operatorIds: string[]): Promise<void> {
  const { dataSource } = journey;
  const procedureTypeId = await makeProcedureType(dataSource, hospitalId, { name: 'Hepatic arteriography' });
  for (let index = 0; index < procedureCount; index += 1) {
    const startedAt = new Date(Date.now() - (index + 1) * 20 * 3_600_000);
    const operatorId = operatorIds[index % operatorIds.length] ?? '';
    const id = await makeProcedure(dataSource, hospitalId, {
      procedureTypeId,
      primaryOperatorId: operatorId,
      startedAt,
      fluoroscopyTimeS: 120 + index * 17,
      kvpMean: 68 + (index % 30),
    });
    await makeEstimate(dataSource, id, operatorId, 10 * (index + 1));
  }
}

beforeAll(async () => {
  journey = await startJourney();
  const { dataSource } = journey;
  const hospitalId = await makeHospital(dataSource);
  const add = (name: string, overrides: Parameters<typeof makePerson>[2]) =>
    makePerson(dataSource, hospitalId, { name, ...overrides });
  await add('P-01', { email: 'p@example.org', roles: ['physicist'], job: 'physicist' });
  await add('Q-01', { email: 'q@example.org', roles: ['committee'] });
  const operatorIds: string[] = [];
  for (let number = 1; number <= 6; number += 1)
    operatorIds.push(
      await add(`IR-${number}`, {
        email: `ir${number}@example.org`,
        roles: ['interventionalist'],
        job: 'interventional-radiologist',
      }),
    );
  await makeGarment(dataSource, hospitalId, { code: 'LG-001', ownerId: operatorIds[0] ?? null });
  await makeGarment(dataSource, hospitalId, { code: 'LG-002', nextDueOn: '2020-01-01' });
  await addEstimates(hospitalId, operatorIds);
});
afterEach(() => journey.closePages());
afterAll(() => journey.close());

test('the physicist sees the chart, its table, a person by month, and how the figure is made', async () => {
  const page = await journey.open('p@example.org');
  await page.getByRole('link', { name: 'Staff exposure' }).click();
  await page.getByText(`${procedureCount} procedures with an estimate`, { exact: false }).waitFor();
  // The chart library draws; what it drew is said in words.
  await page.locator('canvas').first().waitFor();
  expect(await page.getByText(`All ${procedureCount}`).count()).toBeGreaterThan(0);
  const table = page.getByRole('table', { name: /Procedures with the estimated/ });
  // Highest first: the last of 10, 20, … 300 µSv, with its interval ÷2…×3.
  expect(await table.getByRole('row').nth(1).textContent()).toMatch(/300µSv.*150–900µSv/);
  await page.getByLabel('Person').selectOption({ label: 'IR-3, Interventional radiologist' });
  await page.getByText('5 procedures with an estimate of IR-3', { exact: false }).waitFor();
  await page
    .getByRole('button', { name: /How|calculated/ })
    .first()
    .click();
  await page.getByRole('dialog').getByText('scatter-by-event', { exact: false }).first().waitFor();
});

test('the chart’s page has no barrier and fits, wide and narrow, in both themes', async () => {
  const page = await journey.open('p@example.org');
  for (const colorScheme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme });
    for (const width of [390, 1440]) {
      await page.setViewportSize({ width, height: 900 });
      await page.goto('/staff-exposure');
      await page.locator('canvas').first().waitFor();
      expect([colorScheme, width, await findOverflow(page)]).toEqual([colorScheme, width, 0]);
    }
    expect([colorScheme, await findBarriers(page)]).toEqual([colorScheme, []]);
  }
});

test('a committee member sees the figures without names and cases', async () => {
  const page = await journey.open('q@example.org');
  await page.getByRole('link', { name: 'Staff exposure' }).click();
  await page.getByText(`${procedureCount} procedures with an estimate`, { exact: false }).waitFor();
  const text = (await page.getByRole('main').textContent()) ?? '';
  expect(text).not.toMatch(/IR-\d|C-[0-9a-f]{8}/);
  expect(await page.getByLabel('Person').count()).toBe(0);
});

test('an interventionalist sees the own months and own procedures', async () => {
  const page = await journey.open('ir1@example.org');
  await page.getByRole('link', { name: 'My exposure' }).click();
  await page.getByRole('heading', { level: 1 }).waitFor();
  await page.waitForLoadState('networkidle');
  const text = (await page.getByRole('main').textContent()) ?? '';
  expect(text).toContain('Hepatic arteriography');
  expect(text).not.toMatch(/IR-[2-6]/);
  expect(await findBarriers(page)).toEqual([]);
});

test('the physicist finds the garment that is overdue', async () => {
  const page = await journey.open('p@example.org');
  await page.goto('/garments');
  await page.getByText('2 registered, 2 in service, 1 overdue for inspection').waitFor();
  await page.getByLabel('inspection').selectOption('overdue');
  await page.getByRole('rowheader', { name: 'LG-002' }).waitFor();
  expect(await page.getByRole('rowheader').count()).toBe(1);
  expect(await findBarriers(page)).toEqual([]);
});

test('no page complained, and none spoke to another host', () => {
  expect(journey.complaints).toEqual([]);
});
