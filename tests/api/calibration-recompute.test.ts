import { afterAll, beforeAll, expect, test } from 'vitest';
import { makeHospital, makePerson, testPassword } from '../factories';
import { readSample } from '../samples';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';

let app: TestApp;
let physicist: Agent;

beforeAll(async () => {
  app = await startTestApp();
  const hospitalId = await makeHospital(app.dataSource);
  await makePerson(app.dataSource, hospitalId, { email: 'p@example.org', roles: ['physicist'] });
  physicist = await signIn(app.app, 'p@example.org', testPassword);
});
afterAll(() => app.close());

test('a factor corrects the procedures of its machine from its day on, and leaves the displayed value beside', async () => {
  const { body } = await physicist
    .post('/api/dose-reports')
    .attach('files', readSample('01-single-plane.dcm'), 'a.dcm');
  const id = body.results[0].procedureId;
  const before = (await physicist.get(`/api/procedures/${id}`)).body;
  const enter = (validFrom: string, factor: number) =>
    physicist
      .post('/api/calibration-factors')
      .send({
        equipmentId: before.planes[0].equipmentId,
        plane: 'single',
        quantity: 'reference-air-kerma',
        factor,
        uncertaintyPercent: 5,
        validFrom,
        source: 'ion chamber',
      })
      .expect(201);
  const day = before.startedAt.slice(0, 10);
  await enter('2099-01-01', 2);
  await app.runJobs();
  expect((await physicist.get(`/api/procedures/${id}`)).body).toMatchObject({ isCorrected: false });
  await enter(day, 1.12);
  const factorsPath = `/api/equipment/${before.planes[0].equipmentId}/calibration-factors`;
  expect((await physicist.get(factorsPath)).body.items).toContainEqual(
    expect.objectContaining({ validFrom: day, isBeingApplied: true }),
  );
  await app.runJobs();
  expect(
    (await physicist.get(factorsPath)).body.items.map(
      (factor: { isBeingApplied: boolean }) => factor.isBeingApplied,
    ),
  ).toEqual([false, false]);
  const after = (await physicist.get(`/api/procedures/${id}`)).body;
  expect(after.isCorrected).toBe(true);
  expect(after.planes[0].displayed.referenceAirKermaGy).toBe(before.referenceAirKermaGy);
  expect(after.referenceAirKermaGy).toBeCloseTo(before.referenceAirKermaGy * 1.12, 12);
});
