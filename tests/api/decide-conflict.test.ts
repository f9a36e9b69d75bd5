import { afterAll, beforeAll, expect, test } from 'vitest';
import type { ReportConflict } from '../../shared/contract/decide-report';
import type { DoseReport } from '../../shared/contract/dose-report';
import { makeHospital, makePerson, testPassword } from '../factories';
import { createRegrouper } from '../regrouper';
import { cumulative, newStudy } from '../report-series';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';

let app: TestApp;
let hospitalId: string;
let physicist: Agent;
let technologist: Agent;

beforeAll(async () => {
  app = await startTestApp();
  hospitalId = await makeHospital(app.dataSource);
  await makePerson(app.dataSource, hospitalId, { email: 'p@example.org', roles: ['physicist'] });
  await makePerson(app.dataSource, hospitalId, { email: 't@example.org', roles: ['technologist'] });
  physicist = await signIn(app.app, 'p@example.org', testPassword);
  technologist = await signIn(app.app, 't@example.org', testPassword);
});
afterAll(() => app.close());

const { send, stateOf, openOne, standingsOf } = createRegrouper(
  () => physicist,
  () => app,
  () => hospitalId,
);
/** The one identity of a sample's reports. */
const identity = (sample: number) => ({ sopInstanceUid: cumulative(sample, 0, 0, 1).sopInstanceUid });
const compare = async (id: string): Promise<ReportConflict> =>
  (await physicist.get(`/api/dose-reports/${id}/conflict`).expect(200)).body;
const decide = async (id: string, decision: 'keep' | 'replace') => {
  const { stored } = await compare(id);
  return physicist
    .post(`/api/dose-reports/${id}/decide`)
    .send({ decision, storedId: stored?.doseReportId ?? null, reason: 'the console was restarted' });
};
const codeOf = async (id: string) => {
  const { body } = await physicist.get('/api/dose-reports?limit=200').expect(200);
  const found = body.items.find((item: DoseReport) => item.id === id);
  return [found.outcome, found.reasonCode];
};

async function sendConflict(sample: number) {
  const stored = await send(cumulative(sample, 0, 0, 10));
  const held = await send({ ...cumulative(sample, 1, 4, 16), ...identity(sample) });
  expect(held.outcome).toBe('held');
  return { stored: stored.doseReportId, held: held.doseReportId, procedureId: stored.procedureId };
}

test('both stand side by side: exposures, times, totals', async () => {
  const { stored, held } = await sendConflict(700);
  const { changedEventCount, ...shown } = await compare(held);
  expect(shown.stored).toMatchObject({ doseReportId: stored, eventCount: 10, ownEventCount: 4 });
  expect(shown.held).toMatchObject({ doseReportId: held, eventCount: 12, ownEventCount: 6, procedure: null });
  expect([shown.isSamePatient, shown.isSameStudy, changedEventCount]).toEqual([true, true, 0]);
  expect(shown.held.planes[0]?.kermaAreaProductGyCm2).toBe(12);
  expect(shown.held.firstEventAt).toBe('2026-03-04T09:02:40');
});

test('the stored one is kept: nothing changes, and a copy of the declined one is declined too', async () => {
  const { held, procedureId } = await sendConflict(702);
  const before = await stateOf(procedureId);
  expect((await decide(held, 'keep')).status).toBe(200);
  expect(await stateOf(procedureId)).toEqual(before);
  expect(await codeOf(held)).toEqual(['held', 'sop-instance-declined']);
  const copy = await send({ ...cumulative(702, 1, 4, 16), ...identity(702) });
  expect([copy.outcome, copy.reason?.code]).toEqual(['held', 'sop-instance-declined']);
});

test('the new one takes the place, and the old one can be put back: identical totals and exposures', async () => {
  const { stored, held, procedureId } = await sendConflict(704);
  // Another report holds two of the exposures: they stay whatever is decided.
  await send(cumulative(704, 2, 0, 2));
  const before = await stateOf(procedureId);
  const { body } = await decide(held, 'replace');
  expect(body).toEqual({ doseReportId: held, procedureId });
  expect(await codeOf(stored)).toEqual(['held', 'sop-instance-replaced']);
  expect(await stateOf(procedureId)).toMatchObject({ eventCount: 14, reportCount: 2 });
  expect(await standingsOf(procedureId)).toEqual(['adds', 'adds']);
  await physicist.get(`/api/dose-reports/${stored}/original`).expect(200);
  expect((await decide(stored, 'replace')).status).toBe(200);
  expect(await stateOf(procedureId)).toEqual(before);
  const actions = (await openOne(procedureId)).history.map(({ action }) => action);
  expect(actions.filter((action) => action.startsWith('report put in the place'))).toHaveLength(2);
});

test('put in place, a report of another study or patient goes to its own procedure', async () => {
  const { stored, procedureId } = await sendConflict(706);
  const mine = cumulative(706, 3, 20, 32);
  const patient = { ...mine.patient, id: 'MCR9995' };
  const foreign = await send({ ...newStudy(mine, 707), ...identity(706), patient });
  const { isSamePatient, isSameStudy } = await compare(foreign.doseReportId);
  expect([isSamePatient, isSameStudy]).toEqual([false, false]);
  const { body } = await decide(foreign.doseReportId, 'replace');
  expect(body.procedureId).not.toBe(procedureId);
  expect(await stateOf(procedureId)).toMatchObject({ eventCount: 0, isWithdrawn: true });
  expect((await openOne(procedureId)).mergedInto).toBe(null);
  await decide(stored, 'replace');
  expect(await stateOf(procedureId)).toMatchObject({ eventCount: 10, isWithdrawn: false });
  expect(await stateOf(body.procedureId)).toMatchObject({ eventCount: 0, isWithdrawn: true });
});

test('who compared with a report that does not count any more decides nothing; others may not decide', async () => {
  const { stored, held, procedureId } = await sendConflict(708);
  await decide(held, 'replace');
  const late = await physicist
    .post(`/api/dose-reports/${stored}/decide`)
    .send({ decision: 'replace', storedId: stored, reason: 'too late' });
  expect([late.status, late.body.code]).toEqual([409, 'conflict']);
  await technologist.get(`/api/dose-reports/${held}/conflict`).expect(403);
  expect(await stateOf(procedureId)).toMatchObject({ eventCount: 12 });
});
