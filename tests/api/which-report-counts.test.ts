import { afterAll, beforeAll, expect, test } from 'vitest';
import { caseContent, fluoroscopyEvent } from '../../scripts/samples/case-content';
import type { DoseReportContent } from '../../server/dicom-writer/dose-report-content';
import { writeDoseReport } from '../../server/dicom-writer/write-dose-report';
import { makeHospital, makePerson, testPassword } from '../factories';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';

let app: TestApp;
let technologist: Agent;

beforeAll(async () => {
  app = await startTestApp();
  const hospitalId = await makeHospital(app.dataSource);
  await makePerson(app.dataSource, hospitalId, { email: 't@example.org', roles: ['technologist'] });
  technologist = await signIn(app.app, 't@example.org', testPassword);
});
afterAll(() => app.close());

const send = async (content: DoseReportContent) => {
  const { body } = await technologist
    .post('/api/dose-reports')
    .attach('files', Buffer.from(writeDoseReport(content)), 'report.dcm')
    .expect(200);
  return body.results[0] as { outcome: string; procedureId: string; reason: { code: string } | null };
};
const open = async (id: string) => (await technologist.get(`/api/procedures/${id}`).expect(200)).body;

/** A report of one study with events from..to, each of 0.01 Gy, 1 Gy·cm² and 10 s; its totals add up. */
function cumulative(
  sample: number,
  report: number,
  from: number,
  to: number,
  overrides: Partial<DoseReportContent> = {},
) {
  const events = Array.from({ length: to - from }, (_, index) =>
    fluoroscopyEvent(sample, from + index, {
      kermaAreaProductGyCm2: 1,
      referenceAirKermaGy: 0.01,
      irradiationDurationS: 10,
    }),
  );
  const base = caseContent(sample);
  return {
    ...base,
    sopInstanceUid: `${base.sopInstanceUid}${report}`,
    contentAt: `2026-03-04T1${report}:20:00`,
    events,
    planes: [
      {
        plane: 'single' as const,
        kermaAreaProductGyCm2: events.length,
        referenceAirKermaGy: events.length * 0.01,
        fluoroscopyTimeS: events.length * 10,
      },
    ],
    ...overrides,
  };
}

// Own acceptance check: files A (40 events), B (A and 12 more), C (30 others of the same study).
test('a later report that holds the earlier events and a continuation give each event once', async () => {
  const a = cumulative(301, 0, 0, 40);
  const first = await send(a);
  expect((await open(first.procedureId)).eventCount).toBe(40);
  await send(cumulative(301, 1, 0, 52));
  const second = await open(first.procedureId);
  expect(second.eventCount).toBe(52);
  expect(second.kermaAreaProductGyCm2).toBeCloseTo(52, 9);
  expect(second.planes[0].basis).toBe('reported');
  const third = await send(cumulative(301, 2, 52, 82));
  expect(third.procedureId).toBe(first.procedureId);
  const all = await open(first.procedureId);
  expect(all.eventCount).toBe(82);
  expect(all.kermaAreaProductGyCm2).toBeCloseTo(82, 9);
  expect(all.referenceAirKermaGy).toBeCloseTo(0.82, 9);
  expect(all.fluoroscopyTimeS).toBeCloseTo(820, 9);
  expect(all.planes[0].basis).toBe('summed');
  const again = await send(a);
  expect(again.outcome).toBe('duplicate');
  expect((await open(first.procedureId)).kermaAreaProductGyCm2).toBeCloseTo(82, 9);
});

test('the order in which reports come does not matter', async () => {
  await send(cumulative(302, 1, 0, 20));
  const { procedureId } = await send(cumulative(302, 0, 0, 10));
  const procedure = await open(procedureId);
  expect([procedure.eventCount, procedure.kermaAreaProductGyCm2, procedure.planes[0].basis]).toEqual([
    20,
    20,
    'reported',
  ]);
});

test('a copy under a new SOP Instance UID counts its events once', async () => {
  const { procedureId } = await send(cumulative(303, 0, 0, 10));
  const copy = await send(cumulative(303, 1, 0, 10));
  expect([copy.outcome, copy.procedureId]).toEqual(['stored', procedureId]);
  expect((await open(procedureId)).kermaAreaProductGyCm2).toBeCloseTo(10, 9);
});

test('the same SOP Instance UID with other content is held for a person; nothing is overwritten', async () => {
  const { procedureId } = await send(cumulative(304, 0, 0, 10));
  const other = await send({
    ...cumulative(304, 0, 0, 11),
    sopInstanceUid: cumulative(304, 0, 0, 10).sopInstanceUid,
  });
  expect([other.outcome, other.procedureId, other.reason?.code]).toEqual([
    'held',
    null,
    'sop-instance-conflict',
  ]);
  expect((await open(procedureId)).eventCount).toBe(10);
});

test('the same study UID of another patient is another procedure', async () => {
  const mine = cumulative(305, 0, 0, 5);
  const { procedureId } = await send(mine);
  const yours = await send({ ...cumulative(305, 1, 5, 9), patient: { ...mine.patient, id: 'MCR9999' } });
  expect(yours.outcome).toBe('stored');
  expect(yours.procedureId).not.toBe(procedureId);
});

test('two machines of one study: kerma-area product adds up, air kerma is an upper bound', async () => {
  const { procedureId } = await send(cumulative(306, 0, 0, 10));
  const other = cumulative(306, 1, 10, 20);
  await send({ ...other, equipment: { ...other.equipment, serialNumber: 'QR-99999' } });
  const procedure = await open(procedureId);
  expect(procedure.planes).toHaveLength(2);
  expect(procedure.kermaAreaProductGyCm2).toBeCloseTo(20, 9);
  expect([
    procedure.isReferenceAirKermaUpperBound,
    procedure.planes.every((plane: { basis: string }) => plane.basis === 'reported'),
  ]).toEqual([true, true]);
});

test('a quality-control exposure stays outside the ledger', async () => {
  const { procedureId } = await send({
    ...cumulative(307, 0, 0, 3),
    intent: { value: '113680', scheme: 'DCM', meaning: 'Quality Control Intent' },
  });
  expect((await open(procedureId)).procedureClass).toBe('quality-control');
  const ids = async (query: string) =>
    (await technologist.get(`/api/procedures?period=all&${query}`).expect(200)).body.items.map(
      (item: { id: string }) => item.id,
    );
  expect(await ids('kind=fluoroscopy')).not.toContain(procedureId);
  expect(await ids('kind=quality-control')).toContain(procedureId);
});

test('the hospital’s zone decides the day: ten in the evening in Denver is not the next day', async () => {
  const content = cumulative(308, 0, 0, 1);
  const late = content.events.map((event) => ({ ...event, startedAt: '2026-03-04T22:30:00' }));
  const { procedureId } = await send({ ...content, events: late });
  const [row] = await app.dataSource.query(
    'select local_date::text as day, started_at from procedure where id = $1',
    [procedureId],
  );
  expect([row.day, row.started_at.toISOString()]).toEqual(['2026-03-04', '2026-03-05T05:30:00.000Z']);
});
