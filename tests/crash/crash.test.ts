import { createHash, randomUUID } from 'node:crypto';
import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { chmod } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { inflateRawSync } from 'node:zlib';
import type { DataSource } from 'typeorm';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { findFreePort } from '../../scripts/database-cluster/free-port';
import { startCluster, type Cluster } from '../../scripts/database-cluster/start-cluster';
import { writeNewReport } from '../../scripts/bench/written-report';
import { createDataSource } from '../../server/db/data-source';
import { makeHospital, makePerson, testPassword } from '../factories';
import { KillableServer } from './killable-server';
import { sendPatiently, type OutgoingFile } from './patient-sender';

const fileCount = 500;
const eventsOfFile = 3;
/** After so many acknowledged files (and a random few more) the one or the other is killed. */
const kills: { after: number; victim: 'server' | 'database' }[] = [
  { after: 40, victim: 'server' },
  { after: 110, victim: 'database' },
  { after: 190, victim: 'server' },
  { after: 270, victim: 'server' },
  { after: 350, victim: 'database' },
  { after: 430, victim: 'server' },
];

let folder: string;
let cluster: Cluster;
let dataSource: DataSource;
let server: KillableServer;

beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), 'leeward-crash-test-'));
  await chmod(folder, 0o755);
  writeFileSync(join(folder, 'index.html'), '<!doctype html><title>none</title>');
  cluster = await startCluster({ folder, mode: 'durable', report: () => undefined });
  server = new KillableServer(cluster.url, folder, await findFreePort());
  await server.start();
  dataSource = await createDataSource(cluster.url).initialize();
  const hospitalId = await makeHospital(dataSource);
  await makePerson(dataSource, hospitalId, { email: 't@example.org', roles: ['technologist'] });
}, 120_000);

afterAll(async () => {
  await server.kill();
  await dataSource.destroy().catch(() => undefined);
  await cluster.stop();
  rmSync(folder, { recursive: true, force: true });
}, 60_000);

async function signIn(): Promise<string> {
  const response = await fetch(`${server.url}/api/session`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ email: 't@example.org', password: testPassword }),
  });
  return response.headers.getSetCookie()[0]?.split(';')[0] ?? '';
}

const makeFiles = (): OutgoingFile[] =>
  Array.from({ length: fileCount }, (_, index) => {
    const bytes = writeNewReport(eventsOfFile);
    const sha256 = createHash('sha256').update(bytes).digest('hex');
    return { bytes, sha256, uploadKey: index % 2 === 0 ? randomUUID() : null };
  });

/** While the server is starting there may be no file; a killed one's stays until then. */
function readPostmasterPid(): number {
  const file = join(folder, 'postgres', 'postmaster.pid');
  return existsSync(file) ? Number(readFileSync(file, 'utf8').split('\n')[0]) : 0;
}

/** Kills at the planned points, each put off by a random few files; returns what was killed. */
function planKills() {
  const due = kills.map(({ after, victim }) => ({ after: after + Math.floor(Math.random() * 40), victim }));
  const done: string[] = [];
  let busy: Promise<void> = Promise.resolve();
  const strike = async (victim: 'server' | 'database') => {
    done.push(victim);
    if (victim === 'database') {
      const killed = readPostmasterPid();
      process.kill(killed, 'SIGKILL');
      while (readPostmasterPid() === killed) await pause(50);
      return server.recovers();
    }
    await server.kill();
    await server.start();
  };
  return {
    done,
    finished: () => busy,
    look(count: number) {
      while (due[0] && count >= due[0].after) {
        const { victim } = due.shift() as (typeof due)[number];
        busy = busy.then(() => strike(victim));
      }
    },
  };
}

type Kept = { sha256: string; outcomes: string[]; ids: string[]; events: number | null; isWhole: boolean };

/** What the database holds of each file that was sent. */
async function listKept(): Promise<Map<string, Kept>> {
  const rows: (Omit<Kept, 'isWhole'> & { deflated: Buffer })[] = await dataSource.query(`
    select file.sha256, array_agg(report."outcome" order by report.received_at) as outcomes,
           array_agg(report.id::text) as ids,
           (select count(*)::int from irradiation_event event
             where event.dose_report_id = any(array_agg(report.id))) as events,
           (array_agg(file.deflated_bytes))[1] as deflated
      from dose_report report join original_file file on file.id = report.original_file_id
     group by file.sha256`);
  return new Map(
    rows.map(({ deflated, ...row }) => {
      const sha256 = createHash('sha256').update(inflateRawSync(deflated)).digest('hex');
      return [row.sha256, { ...row, isWhole: sha256 === row.sha256 }];
    }),
  );
}

test('killed at random moments, server or database, nothing acknowledged is lost and nothing is there twice', async () => {
  const files = makeFiles();
  const plan = planKills();
  const { acknowledged, failedTries } = await sendPatiently(server.url, await signIn(), files, plan.look);
  await plan.finished();
  expect(plan.done).toEqual(kills.map(({ victim }) => victim));
  expect(failedTries).toBeGreaterThan(0);

  // A last start: what lay received and unread is settled by it.
  await server.kill();
  await server.start();
  const kept = await listKept();
  expect(kept.size).toBe(fileCount);
  for (const { sha256, uploadKey } of files) {
    const file = kept.get(sha256);
    // Sent again under its key, a file is known; without one the second sending is told as such.
    if (uploadKey) expect(file?.outcomes).toEqual(['stored']);
    expect(file?.ids).toContain(acknowledged.get(sha256)?.doseReportId);
    expect(file?.outcomes.filter((outcome) => outcome === 'stored')).toHaveLength(1);
    expect(file?.outcomes.filter((outcome) => !['stored', 'duplicate'].includes(outcome))).toEqual([]);
    expect(file).toMatchObject({ events: eventsOfFile, isWhole: true });
  }
  const [{ procedures }] = await dataSource.query(
    `select count(*)::int as procedures from procedure where event_count = ${eventsOfFile}`,
  );
  expect(procedures).toBe(fileCount);
});
