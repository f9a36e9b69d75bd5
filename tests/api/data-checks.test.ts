import { afterAll, beforeAll, expect, test } from 'vitest';
import { fluoroscopyEvent } from '../../scripts/samples/case-content';
import type { DataCheck } from '../../shared/contract/data-check';
import type { Procedure } from '../../shared/contract/procedure';
import { placeFromPreset } from '../../shared/dosimetry/room-positions';
import {
  checkOf,
  corrected,
  currentSample,
  startCheckStory,
  totalsOf,
  type CheckStory,
} from '../check-story';

let story: CheckStory;
beforeAll(async () => {
  story = await startCheckStory();
});
afterAll(() => story.app.close());

const medianSeenBy = ({ comparisons }: Procedure) =>
  comparisons.find(({ quantity }) => quantity === 'kerma-area-product')?.median;
const idsInDoubt = async (): Promise<string[]> =>
  (await story.physicist.get('/api/procedures?period=all&attention=in-doubt').expect(200)).body.items.map(
    (row: { id: string }) => row.id,
  );

// Own acceptance check: a quarantined 43,000 Gy·cm² leaves the typical value as it was.
test('a unit slip is outside the typical value until it is settled, and never silences a level', async () => {
  for (const product of [41, 42, 43, 44, 45]) await story.send(totalsOf(2, product));
  const slipped = await story.send(totalsOf(3, 43_000));
  expect(slipped).toMatchObject({ isInDoubt: true, isLeftOut: false, kermaAreaProductGyCm2: 43_000 });
  expect(slipped.attention?.level).toBe('act');
  expect(slipped.attention?.reasons[0]?.detail).toContain('value in doubt');
  expect(checkOf(slipped, 'mean-field-area')).toMatchObject({
    result: 'failed',
    severity: 'hard',
    owner: 'physicist',
    settlement: null,
  });
  expect(await idsInDoubt()).toContain(slipped.id);
  const next = await story.send(totalsOf(4, 43));
  expect(medianSeenBy(next)).toBe(43);
  expect(next.comparisons[0]?.n).toBe(6);

  const { body: settled } = await story
    .settle(slipped, corrected({ kermaAreaProductGyCm2: 43.2 }))
    .expect(201);
  expect(settled).toMatchObject({
    isInDoubt: false,
    kermaAreaProductGyCm2: 43.2,
    isCorrected: true,
    settledFigures: { kermaAreaProductGyCm2: 43.2, referenceAirKermaGy: null },
  });
  expect(settled.planes[0].displayed.kermaAreaProductGyCm2).toBe(43_000);
  expect(settled.attention).toBeNull();
  expect(checkOf(settled, 'mean-field-area').settlement).toMatchObject({
    decision: 'corrected',
    reason: 'compared with the screen',
    decidedBy: 'P-01',
    endedAt: null,
  });
  expect((await story.open(next.id)).comparisons[0]?.n).toBe(7);
  expect(await idsInDoubt()).not.toContain(slipped.id);
  expect(settled.history[0]).toMatchObject({
    by: 'P-01',
    action: 'finding settled: totals corrected',
    reason: 'compared with the screen',
  });
});

test('an audit line holds what counted before and after', async () => {
  const slipped = await story.send(totalsOf(5, 4300));
  await story.settle(slipped, corrected({ kermaAreaProductGyCm2: 43 })).expect(201);
  const [line] = await story.app.dataSource.query(
    `select "before", "after" from audit_entry where subject_id = $1 and action like 'finding settled%'`,
    [slipped.id],
  );
  expect(line.before).toMatchObject({
    isQuarantined: true,
    kermaAreaProductGyCm2: 4300,
    settledFigures: null,
  });
  expect(line.after).toMatchObject({ isQuarantined: false, kermaAreaProductGyCm2: 43, openFindings: [] });
});

test('a decision holds for its finding only: a further report opens it anew', async () => {
  const content = totalsOf(6, 4300);
  const slipped = await story.send(content);
  await story.settle(slipped, { decision: 'right' }).expect(201);
  expect((await story.open(slipped.id)).isInDoubt).toBe(false);
  const further = await story.send({
    ...content,
    sopInstanceUid: `${content.sopInstanceUid}9`,
    contentAt: '2026-03-06T11:00:00',
    planes: [
      { plane: 'single', kermaAreaProductGyCm2: 900, referenceAirKermaGy: 0.01, fluoroscopyTimeS: 60 },
    ],
  });
  expect(further.id).toBe(slipped.id);
  expect(further.isInDoubt).toBe(true);
  const check = checkOf(further, 'mean-field-area');
  expect([check.settlement, check.earlier.map(({ decision }) => decision)]).toEqual([null, ['right']]);
});

test('a decision is taken back with a reason, and a later one replaces it; none is edited', async () => {
  const slipped = await story.send(totalsOf(7, 4300));
  const { body: first } = await story.settle(slipped, corrected({ kermaAreaProductGyCm2: 43 })).expect(201);
  const { body: second } = await story
    .settle(first, { decision: 'left-out', reason: 'no screen was kept' })
    .expect(201);
  expect(second).toMatchObject({ isInDoubt: false, isLeftOut: true, kermaAreaProductGyCm2: 4300 });
  expect(await idsInDoubt()).not.toContain(slipped.id);
  const check = checkOf(second, 'mean-field-area');
  expect([check.settlement?.decision, check.earlier[0]?.decision, check.earlier[0]?.endedBy]).toEqual([
    'left-out',
    'corrected',
    'P-01',
  ]);
  const pathOf = (id?: string) => `/api/procedures/${slipped.id}/check-settlements/${id}/end`;
  await story.physicist.post(pathOf(check.settlement?.id)).send({ reason: '' }).expect(422);
  let last: Procedure = second;
  for (const { settlement } of second.dataChecks as DataCheck[])
    if (settlement) {
      const answer = await story.physicist
        .post(pathOf(settlement.id))
        .send({ reason: 'the screen was found' });
      expect(answer.status).toBe(200);
      last = answer.body;
    }
  expect(last).toMatchObject({ isInDoubt: true, isLeftOut: false });
  await story.physicist.post(pathOf(check.settlement?.id)).send({ reason: 'once more' }).expect(409);
});

test('only a physicist decides, on what is there now, and a correction has a figure', async () => {
  const slipped = await story.send(totalsOf(8, 4300));
  await story.settle(slipped, { decision: 'right' }, story.technologist).expect(403);
  await story.settle(slipped, { decision: 'right' }, story.operator).expect(403);
  const stale = [{ ruleCode: 'mean-field-area', finding: '99' }];
  await story.settle(slipped, { findings: stale }).expect(409);
  await story.settle(slipped, corrected({})).expect(422);
  await story.settle(slipped, corrected({ kermaAreaProductGyCm2: -1 })).expect(422);
  expect((await story.open(slipped.id)).isInDoubt).toBe(true);
});

test('the estimate of a complete record follows the typed P KA; its operator sees the decision, not who took it', async () => {
  const content = totalsOf(9, 0);
  const events = [0, 1, 2].map((index) =>
    fluoroscopyEvent(currentSample(), index, {
      startedAt: `2026-03-09T09:0${index}:00`,
      kermaAreaProductGyCm2: 100,
      referenceAirKermaGy: 0.01,
    }),
  );
  const slipped = await story.send({
    ...content,
    events,
    planes: [
      { plane: 'single', kermaAreaProductGyCm2: 300, referenceAirKermaGy: 0.03, fluoroscopyTimeS: 37 },
    ],
  });
  const place = placeFromPreset('operator');
  await story.technologist
    .put(`/api/procedures/${slipped.id}/record`)
    .send({
      procedureTypeId: story.typeId,
      primaryOperatorId: story.operatorId,
      secondOperatorId: null,
      traineeId: null,
      accessSide: 'right',
      isFeetFirst: false,
      isProne: false,
      isEmergency: false,
      patientHeightM: 1.7,
      patientWeightKg: 1.7,
      presences: [
        {
          personId: story.operatorId,
          visitorName: null,
          duty: 'primary-operator',
          fluoroscopyPlace: place,
          acquisitionPlace: place,
          garmentAnswer: 'worn',
          garmentId: story.garmentId,
          hasThyroidCollar: true,
        },
      ],
      version: slipped.record.version,
      reason: null,
    })
    .expect(200);
  const completed = await story.open(slipped.id);
  expect(checkOf(completed, 'patient-weight')).toMatchObject({ result: 'noted', owner: 'technologist' });
  const nominal = async (): Promise<number> =>
    (await story.physicist.get(`/api/procedures/${slipped.id}/staff-exposures`).expect(200)).body.items[0]
      .collarHp10USv.nominal;
  const before = await nominal();
  await story.settle(completed, corrected({ kermaAreaProductGyCm2: 3 })).expect(201);
  expect(before / (await nominal())).toBeCloseTo(100, 0);
  const seen = checkOf(await story.open(slipped.id, story.operator), 'mean-field-area');
  expect(seen.settlement).toMatchObject({ decision: 'corrected', decidedBy: null });
});
