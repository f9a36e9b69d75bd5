import { createHash } from 'node:crypto';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { findDoseReport, keepArrival } from '../../server/dose-reports/dose-report.store';
import { addJob } from '../../server/jobs/job.store';
import { makeHospital } from '../factories';
import { readSample } from '../samples';
import { startTestApp, type TestApp } from '../test-app';

let app: TestApp;
let hospitalId: string;

beforeAll(async () => {
  app = await startTestApp();
  hospitalId = await makeHospital(app.dataSource);
});
afterAll(() => app.close());

/** A file whose bytes were kept so many minutes ago and that nobody read since. */
async function leaveReceived(sample: string, minutesAgo: number): Promise<string> {
  const bytes = readSample(sample);
  const id = await keepArrival(app.dataSource.manager, {
    bytes,
    sha256: createHash('sha256').update(bytes).digest('hex'),
    hospitalId,
    fileName: sample,
    channel: 'page',
    receivedById: null,
    uploadKey: null,
    archiveId: null,
    archiveName: null,
  });
  await app.dataSource.query(
    `update dose_report set received_at = now() - make_interval(mins => $2) where id = $1`,
    [id, minutesAgo],
  );
  return id;
}

const outcomeOf = async (id: string) =>
  (await findDoseReport(app.dataSource.manager, hospitalId, id))?.outcome;

test('a file left between received and its outcome is taken up again; one just come is left to its request', async () => {
  const left = await leaveReceived('01-single-plane.dcm', 10);
  const young = await leaveReceived('02-biplane.dcm', 0);
  await addJob(app.dataSource.manager, 'settle-received', {}, 'settle-received');
  await app.runJobs();
  expect(await outcomeOf(left)).toBe('stored');
  expect(await outcomeOf(young)).toBe('received');
});

test('work put into the queue by a transaction that is rolled back is never done', async () => {
  const left = await leaveReceived('10-mobile-c-arm.dcm', 10);
  const undone = app.dataSource.transaction(async (tx) => {
    await addJob(tx, 'settle-received', {}, 'settle-received');
    throw new Error('changed my mind');
  });
  await expect(undone).rejects.toThrow('changed my mind');
  await app.runJobs();
  expect(await outcomeOf(left)).toBe('received');
});
