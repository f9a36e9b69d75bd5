import { afterAll, beforeAll, beforeEach, expect, test } from 'vitest';
import { writeNewReport } from '../../scripts/bench/written-report';
import { readerVersion } from '../../server/dicom/reader-version';
import { makeHospital, makePerson, testPassword } from '../factories';
import { readSample } from '../samples';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';

let app: TestApp;
let technologist: Agent;
let physicist: Agent;

beforeAll(async () => {
  app = await startTestApp();
  const hospitalId = await makeHospital(app.dataSource);
  await makePerson(app.dataSource, hospitalId, { email: 't@example.org', roles: ['technologist'] });
  await makePerson(app.dataSource, hospitalId, { email: 'p@example.org', roles: ['physicist'] });
  technologist = await signIn(app.app, 't@example.org', testPassword);
  physicist = await signIn(app.app, 'p@example.org', testPassword);
});
afterAll(() => app.close());

const query = (sql: string, ...values: unknown[]) => app.dataSource.query(sql, values);
const send = async (bytes: Buffer) =>
  (await technologist.post('/api/dose-reports').attach('files', bytes, 'case.dcm').expect(200)).body
    .results[0] as { doseReportId: string; procedureId: string; outcome: string };
const preview = async (id: string) =>
  (await physicist.get(`/api/dose-reports/${id}/read-again`).expect(200)).body;
const apply = async (...ids: string[]) =>
  (await physicist.post('/api/dose-reports/read-again').send({ ids }).expect(200)).body.results;
const eventsOf = (id: string) =>
  query(
    `select event_key, started_at, kvp_mean, kvp_values, kerma_area_product_gy_cm2, reported, details
       from irradiation_event where dose_report_id = $1 order by event_key`,
    id,
  );
const totalOf = async (procedureId: string) =>
  (await physicist.get(`/api/procedures/${procedureId}`).expect(200)).body.totals;

beforeEach(() => query(`update dose_report set reader_version = $1`, readerVersion));

/** As an earlier reader might have stored it: one kVp missing, one event's product ten times too small. */
async function spoil(id: string): Promise<void> {
  const [first, second] = await eventsOf(id);
  await query(
    `update irradiation_event set kvp_mean = null where dose_report_id = $1 and event_key = $2`,
    id,
    first.event_key,
  );
  await query(
    `update irradiation_event set kerma_area_product_gy_cm2 = kerma_area_product_gy_cm2 / 10
      where dose_report_id = $1 and event_key = $2`,
    id,
    second.event_key,
  );
  await query(`update dose_report set reader_version = '0' where id = $1`, id);
}

test('what would change is told before anything does, with the first values named', async () => {
  const { doseReportId, procedureId } = await send(Buffer.from(writeNewReport(4)));
  const original = await eventsOf(doseReportId);
  await spoil(doseReportId);
  const spoilt = await eventsOf(doseReportId);
  const told = await preview(doseReportId);
  expect(told).toMatchObject({
    verdict: 'changes',
    changedCount: 2,
    before: { outcome: 'stored', readerVersion: '0', eventCount: 4 },
    after: { outcome: 'stored', readerVersion, eventCount: 4 },
  });
  expect(told.changes.map(({ field }: { field: string }) => field)).toEqual([
    'kvpMean',
    'kermaAreaProductGyCm2',
  ]);
  expect(told.changes[0]).toMatchObject({ before: null, after: String(original[0].kvp_mean) });
  expect(await eventsOf(doseReportId)).toEqual(spoilt);

  const [result] = await apply(doseReportId);
  expect(result).toMatchObject({ verdict: 'changes', changedCount: 2, outcome: 'stored' });
  expect(await eventsOf(doseReportId)).toEqual(original);
  expect((await preview(doseReportId)).verdict).toBe('same');
  const [line] = await query(
    `select "before", "after" from audit_entry where "action" = 'dose report read again' and subject_id = $1`,
    procedureId,
  );
  expect(line.before).toMatchObject({ doseReportId, readerVersion: '0', eventCount: 4 });
  expect(line.after).toMatchObject({ doseReportId, readerVersion, changedValues: 2 });
});

test('the procedure is recomputed from the new values', async () => {
  const { doseReportId, procedureId } = await send(Buffer.from(writeNewReport(4)));
  const before = await totalOf(procedureId);
  await query(
    `update dose_report set reported_planes = '[]', reader_version = '0' where id = $1`,
    doseReportId,
  );
  await query(
    `update irradiation_event set kerma_area_product_gy_cm2 = 99 where dose_report_id = $1`,
    doseReportId,
  );
  await apply(doseReportId);
  expect(await totalOf(procedureId)).toEqual(before);
});

test('a report that reads as before only gets the reader’s version noted', async () => {
  const { doseReportId, procedureId } = await send(Buffer.from(writeNewReport(3)));
  await query(`update dose_report set reader_version = '0' where id = $1`, doseReportId);
  const [{ version }] = await query('select "version" from procedure where id = $1', procedureId);
  expect(await apply(doseReportId)).toMatchObject([{ verdict: 'same', changedCount: 0 }]);
  const [row] = await query(
    'select reader_version, procedure_id from dose_report where id = $1',
    doseReportId,
  );
  expect(row.reader_version).toBe(readerVersion);
  expect((await query('select "version" from procedure where id = $1', procedureId))[0].version).toBe(
    version,
  );
});

test('a stored report that cannot be read now stays as it is', async () => {
  const { doseReportId } = await send(Buffer.from(writeNewReport(3)));
  const events = await eventsOf(doseReportId);
  await query(
    `update original_file set deflated_bytes = (select deflated_bytes from original_file other
        join dose_report on original_file_id = other.id where dose_report.id = $2)
      where id = (select original_file_id from dose_report where id = $1)`,
    doseReportId,
    (await send(readSample('42-secondary-capture.dcm'))).doseReportId,
  );
  const told = await preview(doseReportId);
  expect(told).toMatchObject({ verdict: 'fails', after: { reasonCode: 'image' } });
  const [result] = await apply(doseReportId);
  expect(result).toMatchObject({ verdict: 'fails', outcome: 'stored', reason: { code: 'image' } });
  expect(await eventsOf(doseReportId)).toEqual(events);
});

test('an event that another report holds too is not lost when this one reads without it', async () => {
  const first = await send(readSample('109-cumulative-first.dcm'));
  const second = await send(readSample('110-cumulative-second.dcm'));
  expect(second.procedureId).toBe(first.procedureId);
  const all = await query(
    'select event_key from irradiation_event where procedure_id = $1',
    first.procedureId,
  );
  // As if an earlier reader had found one of the second report's events in the first one too.
  const [moved] = await query(
    `update irradiation_event set dose_report_id = $1 where id =
       (select id from irradiation_event where dose_report_id = $2 limit 1) returning event_key`,
    first.doseReportId,
    second.doseReportId,
  ).then(([rows]) => rows);
  await query(`update dose_report set reader_version = '0'`);
  await apply(first.doseReportId);
  expect(
    await query('select dose_report_id from irradiation_event where event_key = $1', moved.event_key),
  ).toEqual([{ dose_report_id: second.doseReportId }]);
  await apply(second.doseReportId);
  const after = await query(
    'select event_key from irradiation_event where procedure_id = $1',
    first.procedureId,
  );
  expect(after.map(({ event_key }: { event_key: string }) => event_key).toSorted()).toEqual(
    all.map(({ event_key }: { event_key: string }) => event_key).toSorted(),
  );
});

test('what may be read again is listed with counts: older versions and held files, not what no reader can help', async () => {
  await query(`update dose_report set reader_version = $1`, readerVersion);
  const { doseReportId } = await send(Buffer.from(writeNewReport(2)));
  const held = await send(readSample('50-no-content.dcm'));
  await send(Buffer.from('no dose report'));
  await query(
    `update dose_report set reader_version = '0' where id = $1 or reason_code = 'not-dicom'`,
    doseReportId,
  );
  const { body } = await physicist.get('/api/dose-reports/read-again?limit=1').expect(200);
  expect(body).toMatchObject({ readerVersion, counts: { stored: 1, held: 1, refused: 0 } });
  const next = await physicist
    .get(`/api/dose-reports/read-again?limit=1&cursor=${body.nextCursor}`)
    .expect(200);
  expect([...body.items, ...next.body.items].map(({ id }: { id: string }) => id)).toEqual([
    doseReportId,
    held.doseReportId,
  ]);
  expect(next.body.nextCursor).toBeNull();
});

test('a held file that becomes readable is foretold and then stored', async () => {
  await query('alter table irradiation_event rename to irradiation_event_away');
  const { doseReportId } = await send(readSample('17-snomed-rt.dcm'));
  await query('alter table irradiation_event_away rename to irradiation_event');
  const told = await preview(doseReportId);
  expect(told).toMatchObject({
    verdict: 'becomes-readable',
    before: { outcome: 'held' },
    after: { outcome: 'stored' },
  });
  expect(await apply(doseReportId)).toMatchObject([{ verdict: 'becomes-readable', outcome: 'stored' }]);
});

test('a technologist reads a held file again, but neither a stored one nor many at once', async () => {
  const stored = await send(Buffer.from(writeNewReport(1)));
  const held = await send(readSample('45-other-template.dcm'));
  await technologist.post(`/api/dose-reports/${stored.doseReportId}/read-again`).expect(403);
  await technologist
    .post('/api/dose-reports/read-again')
    .send({ ids: [held.doseReportId] })
    .expect(403);
  await technologist.get('/api/dose-reports/read-again').expect(403);
  const { body } = await technologist.post(`/api/dose-reports/${held.doseReportId}/read-again`).expect(200);
  expect(body).toMatchObject({ outcome: 'held', verdict: 'still-unread' });
});

test('a file without kept bytes is left out, and says so', async () => {
  const { doseReportId } = await send(Buffer.from(writeNewReport(1)));
  await query(
    `update dose_report set original_file_id = null, reader_version = '0' where id = $1`,
    doseReportId,
  );
  expect(await preview(doseReportId)).toMatchObject({ verdict: 'not-kept', after: null });
  const { body } = await physicist.get('/api/dose-reports/read-again').expect(200);
  expect(body.items.map(({ id }: { id: string }) => id)).not.toContain(doseReportId);
  expect(body.counts.withoutBytes).toBeGreaterThanOrEqual(1);
});
