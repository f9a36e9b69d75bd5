import { afterAll, beforeAll, expect, test } from 'vitest';
import type { Role } from '../../shared/permissions';
import { makeGarment, makeHospital, makePerson } from '../factories';
import { offerFirstAdministrator } from '../../server/session/offer-first-administrator';
import { findBarriers, findOverflow, startJourney, type Journey } from './journey';

let journey: Journey;
let welcomeUrl = '';
const examined = new Set<string>();

beforeAll(async () => {
  journey = await startJourney();
  await offerFirstAdministrator(journey.dataSource.manager, journey.url, (line) => {
    welcomeUrl = /http\S+/.exec(line)?.[0] ?? '';
  });
});
afterAll(() => journey.close());

test('with nobody there yet, the one-time link makes the first administrator', async () => {
  const page = await journey.open();
  await page.goto(welcomeUrl);
  await page.getByLabel('Hospital or department').fill('Test Hospital');
  await page.getByLabel('Time zone').fill('Europe/Vienna');
  await page.getByLabel('Your name').fill('AD-01');
  await page.getByLabel('Your e-mail').fill('first@example.org');
  await page.getByLabel(/^Password/).fill('a long enough password');
  await page.keyboard.press('Enter');
  await page.getByRole('button', { name: 'AD-01' }).waitFor();
  await page.goto('/admin/rooms');
  await page.getByRole('link', { name: /Add a room/ }).click();
  await page.getByLabel('Code').fill('IR9');
  await page.getByLabel('Name').fill('Interventional room 9');
  await page.getByRole('button', { name: /^(Save|Add)/ }).click();
  await page.getByText('Interventional room 9').first().waitFor();
});

const places: Record<Role, string[]> = {
  technologist: ['Procedures', 'Dose reports', 'My exposure', 'Garments', 'Methods'],
  physicist: [
    'Procedures',
    'Dose reports',
    'Staff exposure',
    'My exposure',
    'Garments',
    'Methods',
    'Administration',
  ],
  interventionalist: ['Procedures', 'My exposure', 'Garments', 'Methods'],
  committee: ['Staff exposure', 'My exposure', 'Garments', 'Methods'],
  administrator: ['Dose reports', 'My exposure', 'Garments', 'Methods', 'Administration'],
};

test.each(Object.entries(places))(
  '%s is offered own places only, and each opens without a barrier',
  async (role, names) => {
    const { dataSource } = journey;
    const [hospital] = await dataSource.query('select id from hospital limit 1');
    const hospitalId: string = hospital?.id ?? (await makeHospital(dataSource));
    const personId = await makePerson(dataSource, hospitalId, {
      email: `${role}@example.org`,
      roles: [role as Role],
    });
    await makeGarment(dataSource, hospitalId, { ownerId: personId });
    const page = await journey.open(`${role}@example.org`);
    const navigation = page.getByRole('navigation').first();
    await navigation.getByRole('link').first().waitFor();
    expect(
      (await navigation.getByRole('link').allTextContents()).filter((name) => name !== 'Leeward'),
    ).toEqual(names);
    for (const name of names) {
      await navigation.getByRole('link', { name, exact: true }).click();
      await page.getByRole('heading', { level: 1 }).first().waitFor();
      await page.waitForLoadState('networkidle');
      // The same place looks alike to all: it is examined once.
      if (!examined.has(name)) expect([name, await findBarriers(page)]).toEqual([name, []]);
      examined.add(name);
      expect([name, await findOverflow(page)]).toEqual([name, 0]);
    }
  },
);

test('a place that a role does not open is refused by its address too', async () => {
  const page = await journey.open('committee@example.org');
  await page.goto('/procedures');
  await page.getByText('Your role does not open this').first().waitFor();
});

test('no page complained, and none spoke to another host', () => {
  expect(journey.complaints).toEqual([]);
});
