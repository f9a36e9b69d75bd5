import { afterAll, beforeAll, expect, test } from 'vitest';
import { caseContent, fluoroscopyEvent } from '../../scripts/samples/case-content';
import type { DoseReportContent } from '../../server/dicom-writer/dose-report-content';
import type { CheckRule } from '../../shared/contract/data-check';
import { checkOf, currentSample, startCheckStory, totalsOf, type CheckStory } from '../check-story';

let story: CheckStory;
beforeAll(async () => {
  story = await startCheckStory();
});
afterAll(() => story.app.close());

test('a counter that went on from the procedure before is found; so are events that another procedure holds', async () => {
  const machine = { ...caseContent(1).equipment, serialNumber: 'QR-77001' };
  const study = (day: number, kermaGy: number): DoseReportContent => ({
    ...totalsOf(day, 6),
    equipment: machine,
    events: [0, 1].map((index) =>
      fluoroscopyEvent(currentSample(), index, {
        startedAt: `2026-03-${day}T09:0${index}:00`,
        kermaAreaProductGyCm2: 3,
        referenceAirKermaGy: 0.02,
      }),
    ),
    planes: [
      { plane: 'single', kermaAreaProductGyCm2: 6, referenceAirKermaGy: kermaGy, fluoroscopyTimeS: 24.8 },
    ],
  });
  const before = await story.send(study(10, 0.04));
  expect(before.isInDoubt).toBe(false);
  const after = await story.send(study(11, 0.08));
  expect(checkOf(after, 'reset-failure')).toMatchObject({ result: 'failed' });
  const first = study(12, 0.04);
  const { caseNumber } = await story.send(first);
  const other = totalsOf(12, 6);
  const twin = await story.send({
    ...first,
    sopInstanceUid: other.sopInstanceUid,
    studyInstanceUid: other.studyInstanceUid,
    patient: other.patient,
    accessionNumber: other.accessionNumber,
  });
  expect(twin.caseNumber).not.toBe(caseNumber);
  expect(checkOf(twin, 'shared-events').detail).toBe(`2 irradiation events are in ${caseNumber} as well`);
});

test('an event that stands twice in one report counts once, and its total is held against the events', async () => {
  const content = totalsOf(15, 6);
  const event = fluoroscopyEvent(currentSample(), 0, {
    startedAt: '2026-03-15T09:00:00',
    kermaAreaProductGyCm2: 3,
    referenceAirKermaGy: 0.02,
  });
  const doubled = await story.send({
    ...content,
    events: [event, event],
    planes: [
      { plane: 'single', kermaAreaProductGyCm2: 6, referenceAirKermaGy: 0.04, fluoroscopyTimeS: 24.8 },
    ],
  });
  expect(doubled.eventCount).toBe(1);
  expect(checkOf(doubled, 'duplicate-events').result).toBe('noted');
  expect(checkOf(doubled, 'totals-against-events').result).toBe('noted');
});

const rules = async (agent = story.physicist): Promise<CheckRule[]> =>
  (await agent.get('/api/data-checks').expect(200)).body.items;
const rule = async (code: string): Promise<CheckRule> => {
  const found = (await rules()).find((one) => one.code === code);
  if (!found) throw new Error(`No rule ${code}`);
  return found;
};

test('a rule is set with a reason from a day on; what was found follows when it is asked to', async () => {
  const wide = await story.send(totalsOf(13, 300));
  expect(wide.isInDoubt).toBe(true);
  const before = await rule('mean-field-area');
  expect(before).toMatchObject({
    inForce: { severity: 'hard', low: 4, high: 600 },
    settings: [],
    unit: 'cm²',
  });
  const change = {
    severity: 'hard',
    owner: 'physicist',
    low: 4,
    high: 1000,
    validFrom: '2999-01-01',
    reason: 'large fields on purpose',
    basedOn: null,
  };
  const put = (body: object) =>
    story.physicist.put('/api/data-checks/mean-field-area').send({ ...change, ...body });
  await put({ reason: '' }).expect(422);
  await put({ low: null }).expect(422);
  await put({ low: 2000 }).expect(422);
  await put({ validFrom: '2020-01-01' }).expect(422);
  const { body: later } = await put({}).expect(200);
  expect(later).toMatchObject({ inForce: { high: 600 }, settings: [{ high: 1000, setBy: 'P-01' }] });
  await put({}).expect(409);
  const day = new Intl.DateTimeFormat('en-CA', { timeZone: 'America/Denver' }).format(new Date());
  const { body: now } = await put({ validFrom: day, basedOn: later.settings[0].id }).expect(200);
  expect(now.inForce).toMatchObject({ high: 1000 });
  expect((await story.open(wide.id)).isInDoubt).toBe(true);
  expect(now.openCount).toBeGreaterThan(0);
  await story.technologist.post('/api/data-checks/mean-field-area/recompute').expect(403);
  const { body: asked } = await story.physicist
    .post('/api/data-checks/mean-field-area/recompute')
    .expect(200);
  expect(asked.procedures).toBe(now.openCount);
  expect((await rule('mean-field-area')).isBeingRecomputed).toBe(true);
  await story.app.runJobs();
  expect((await story.open(wide.id)).isInDoubt).toBe(false);
  expect(await rule('mean-field-area')).toMatchObject({ isBeingRecomputed: false });
  expect((await rule('mean-field-area')).openCount).toBe(now.openCount - 1);
});

test('a rule that is switched off finds nothing and is listed so', async () => {
  const { body } = await story.physicist
    .put('/api/data-checks/area-product-total')
    .send({
      severity: 'off',
      owner: 'physicist',
      low: null,
      high: 5000,
      validFrom: new Intl.DateTimeFormat('en-CA', { timeZone: 'America/Denver' }).format(new Date()),
      reason: 'not of use here',
      basedOn: null,
    })
    .expect(200);
  expect(body.inForce.severity).toBe('off');
  const huge = await story.send(totalsOf(14, 9000, 9));
  expect(checkOf(huge, 'area-product-total')).toMatchObject({
    result: 'not-checked',
    detail: 'P KA of the whole: switched off by the department.',
  });
});
