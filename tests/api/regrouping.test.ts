import { afterAll, beforeAll, expect, test } from 'vitest';
import type { ProcedureReport } from '../../shared/contract/procedure';
import type { DoseReportContent } from '../../server/dicom-writer/dose-report-content';
import { makeHospital, makePerson, testPassword } from '../factories';
import { createRegrouper, orderless } from '../regrouper';
import { cumulative, later, newStudy } from '../report-series';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';

let app: TestApp;
let hospitalId: string;
let physicist: Agent;
let technologist: Agent;

beforeAll(async () => {
  app = await startTestApp();
  hospitalId = await makeHospital(app.dataSource);
  await makePerson(app.dataSource, hospitalId, {
    name: 'Rowan Thistle',
    email: 'p@example.org',
    roles: ['physicist'],
  });
  await makePerson(app.dataSource, hospitalId, { email: 't@example.org', roles: ['technologist'] });
  physicist = await signIn(app.app, 'p@example.org', testPassword);
  technologist = await signIn(app.app, 't@example.org', testPassword);
});
afterAll(() => app.close());

const {
  send,
  standingsOf,
  openOne,
  versionOf,
  statesOf,
  stateOf,
  post,
  between,
  merge,
  move,
  split,
  listOf,
  takeBack,
  preview,
  reportIds,
  sendTwoStudies,
} = createRegrouper(
  () => physicist,
  () => app,
  () => hospitalId,
);
test('merged, two studies are one procedure with the sum of unique events; taken back, both are as before', async () => {
  const [first, second] = await sendTwoStudies(400);
  const before = await statesOf(first, second);
  expect((await merge(second, first)).status).toBe(200);
  const merged = await openOne(first);
  expect([merged.eventCount, merged.reports.length]).toEqual([25, 2]);
  expect(merged.kermaAreaProductGyCm2).toBeCloseTo(25, 9);
  const emptied = await openOne(second);
  expect([emptied.isWithdrawn, emptied.mergedInto?.id, emptied.eventCount]).toEqual([true, first, 0]);
  expect(emptied.startedAt).toBe(before[1]?.startedAt);
  const [line] = await listOf(first);
  expect((await takeBack(line?.id as string, first)).status).toBe(200);
  expect(await statesOf(first, second)).toEqual(before);
  expect((await openOne(second)).mergedInto).toBe(null);
});

test('split and merged again, a procedure has identical totals and events', async () => {
  const { procedureId } = await send(cumulative(410, 0, 0, 40));
  await send(cumulative(410, 1, 0, 52));
  await send(cumulative(410, 2, 52, 82));
  const before = await stateOf(procedureId);
  const ids = await reportIds(procedureId);
  const { body: cut, status } = await split(procedureId, ids.slice(1));
  expect(status).toBe(200);
  const [left, cutOff] = await statesOf(procedureId, cut.procedureId);
  // The 40 exposures that both sides report are on both sides.
  expect([left?.eventCount, cutOff?.eventCount, cutOff?.recordState]).toEqual([40, 82, 'incomplete']);
  expect([left?.kermaAreaProductGyCm2, cutOff?.kermaAreaProductGyCm2]).toEqual([40, 82]);
  expect((await openOne(cut.procedureId)).caseNumber).not.toBe(before.caseNumber);
  expect((await merge(cut.procedureId, procedureId)).status).toBe(200);
  expect(await stateOf(procedureId)).toEqual(before);
  expect(await standingsOf(procedureId)).toEqual(['superseded', 'adds', 'adds']);
});

test('exposures that meet again count once, and part again with their reports', async () => {
  const [first, second] = await sendTwoStudies(420);
  // The second machine's list repeats ten exposures of the first study.
  await send(orderless(newStudy(cumulative(420, 2, 0, 25), 421)));
  const before = await statesOf(first, second);
  expect(before.map(({ eventCount }) => eventCount)).toEqual([10, 25]);
  const { body } = await merge(first, second);
  expect(await stateOf(second)).toMatchObject({ eventCount: 25, reportCount: 3 });
  expect((await takeBack(body.regroupingId, second)).status).toBe(200);
  expect(await statesOf(first, second)).toEqual(before);
});

test('a further report of a merged study follows its study, and goes back with it', async () => {
  const [first, second] = await sendTwoStudies(430);
  const { body } = await merge(second, first);
  const further = await send(orderless(later(newStudy(cumulative(430, 2, 10, 30), 431), 1)));
  expect(further.procedureId).toBe(first);
  const merged = await openOne(first);
  expect([merged.eventCount, merged.reports.at(-1)?.origin]).toEqual([30, 'followed']);
  await takeBack(body.regroupingId, first);
  expect((await statesOf(first, second)).map(({ eventCount }) => eventCount)).toEqual([10, 20]);
});

test('a report of a moved one’s study comes to the home of its study', async () => {
  const [first, second] = await sendTwoStudies(440);
  await send(orderless(cumulative(440, 2, 25, 35)));
  const [, moved = ''] = await reportIds(first);
  expect((await move(first, second, [moved])).status).toBe(200);
  expect((await openOne(second)).reports.find(({ id }) => id === moved)).toMatchObject({
    origin: 'moved',
    movedBy: 'Rowan Thistle',
  });
  const next = await send(orderless(cumulative(440, 3, 35, 45)));
  expect(next.procedureId).toBe(first);
});

test('twelve hours decide, not midnight', async () => {
  const at = (sample: number, from: number, startedAt: string): DoseReportContent => {
    const content = orderless(newStudy(cumulative(450, from / 10, from, from + 10), sample));
    return { ...content, events: content.events.map((event) => ({ ...event, startedAt })) };
  };
  const evening = (await send(at(450, 0, '2026-03-04T23:50:00'))).procedureId;
  const night = (await send(at(451, 10, '2026-03-05T00:30:00'))).procedureId;
  const noon = (await send(at(452, 20, '2026-03-05T13:00:00'))).procedureId;
  const refused = await merge(noon, evening);
  expect([refused.status, refused.body.code]).toEqual([422, 'cannot-regroup']);
  expect(refused.body.detail).toContain('13 hours');
  expect((await merge(night, evening)).status).toBe(200);
});

test('two patients, the last report, the procedure itself or a phantom are refused with a sentence', async () => {
  const mine = orderless(cumulative(460, 0, 0, 10));
  const { procedureId } = await send(mine);
  const yours = await send({ ...cumulative(460, 1, 10, 20), patient: { ...mine.patient, id: 'MCR9996' } });
  const details = [(await merge(yours.procedureId, procedureId)).body.detail];
  const [only = ''] = await reportIds(procedureId);
  details.push((await split(procedureId, [only])).body.detail);
  details.push((await merge(procedureId, procedureId)).body.detail);
  const [, second] = await sendTwoStudies(462);
  await physicist
    .patch(`/api/procedures/${second}`)
    .send({ procedureClass: 'phantom', reason: 'a phantom', version: await versionOf(second) })
    .expect(200);
  const third = await send(orderless(newStudy(cumulative(462, 2, 25, 35), 464)));
  details.push((await merge(second, third.procedureId)).body.detail);
  for (const [index, word] of ['patient IDs differ', 'has to stay', 'same procedure', 'clinical'].entries())
    expect(details[index]).toContain(word);
  expect((await openOne(procedureId)).eventCount).toBe(10);
});

test('who saw an older version of either procedure moves nothing', async () => {
  const [first, second] = await sendTwoStudies(470);
  const seen = await between(second, first);
  for (const stale of [{ version: seen.version - 1 }, { targetVersion: seen.targetVersion - 1 }]) {
    const answer = await post(`procedures/${second}/merge`, { ...seen, ...stale });
    expect([answer.status, answer.body.code]).toEqual([409, 'conflict']);
  }
  expect((await openOne(second)).isWithdrawn).toBe(false);
});

test('a try shows both procedures before and after and changes nothing', async () => {
  const [first, second] = await sendTwoStudies(480);
  const before = await statesOf(first, second);
  const shown = await preview(second, { kind: 'merge', targetId: first });
  expect(shown.before).toEqual([before[1], before[0]]);
  expect(shown.after.map(({ eventCount, isWithdrawn }) => [eventCount, isWithdrawn])).toEqual([
    [0, true],
    [25, false],
  ]);
  const cut = await preview(first, { kind: 'split', doseReportIds: await reportIds(first) });
  expect(cut.refusal).toContain('has to stay');
  expect(await statesOf(first, second)).toEqual(before);
  expect(await listOf(first)).toEqual([]);
});

test('both histories tell it in words; an emptied procedure is restored by taking the merge back', async () => {
  const [first, second] = await sendTwoStudies(490);
  const [target, source] = [await openOne(first), await openOne(second)];
  await merge(second, first);
  const actionsOf = async (id: string) =>
    (await openOne(id)).history.map(({ action, reason }) => [action, reason]);
  expect(await actionsOf(second)).toContainEqual([`Merged into ${target.caseNumber}`, 'one case']);
  expect(await actionsOf(first)).toContainEqual([`Took in ${source.caseNumber}`, 'one case']);
  const restored = await physicist
    .patch(`/api/procedures/${second}`)
    .send({ isWithdrawn: false, reason: 'by mistake', version: await versionOf(second) });
  expect([restored.status, restored.body.detail.includes('Take the merge back')]).toEqual([409, true]);
});

test('a later regrouping is taken back first', async () => {
  const [first, second] = await sendTwoStudies(500);
  const { body: merged } = await merge(second, first);
  const moving = (await openOne(first)).reports.find(({ origin }: ProcedureReport) => origin === 'moved');
  const { body: cut } = await split(first, [moving?.id ?? '']);
  const early = await takeBack(merged.regroupingId, first);
  expect([early.status, early.body.detail]).toEqual([
    422,
    'A later regrouping took these reports on. Take that one back first.',
  ]);
  expect((await takeBack(cut.regroupingId, first)).status).toBe(200);
  expect((await takeBack(merged.regroupingId, first)).status).toBe(200);
});

test('only the physicist regroups', async () => {
  const [first, second] = await sendTwoStudies(510);
  await technologist.get(`/api/procedures/${first}/regroupings`).expect(403);
  await technologist
    .post(`/api/procedures/${second}/merge`)
    .send(await between(second, first))
    .expect(403);
});

test('candidates: the patient’s own first, with the reason where one cannot be taken', async () => {
  const [first, second] = await sendTwoStudies(520);
  const far = await send(orderless(newStudy(later(cumulative(520, 2, 25, 35), 60), 523)));
  const { body } = await physicist.get(`/api/procedures/${first}/regroup-candidates`).expect(200);
  const own = body.items.filter(({ isSamePatient }: { isSamePatient: boolean }) => isSamePatient);
  expect(
    own.map(({ id, refusal }: { id: string; refusal: string | null }) => [id, refusal !== null]),
  ).toEqual([
    [second, false],
    [far.procedureId, true],
  ]);
  const { caseNumber } = await openOne(far.procedureId);
  const found = await physicist.get(`/api/procedures/${first}/regroup-candidates?find=${caseNumber}`);
  expect(found.body.items.map(({ id }: { id: string }) => id)).toEqual([far.procedureId]);
});
