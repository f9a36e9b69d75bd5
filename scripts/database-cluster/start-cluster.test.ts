import { spawn, type ChildProcess } from 'node:child_process';
import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { chmod } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import pg from 'pg';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { findClusterOwner } from './cluster-owner';
import { throwAwayPrefix } from './data-folder';
import { startCluster, type Cluster } from './start-cluster';

let folder: string;
let ends: (() => unknown)[];

const start = async (where = folder): Promise<Cluster> => {
  const cluster = await startCluster({ folder: where, mode: 'durable', report: () => undefined });
  ends.push(() => cluster.stop());
  return cluster;
};

async function query(url: string, sql: string): Promise<unknown[]> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return (await client.query(sql)).rows;
  } finally {
    await client.end();
  }
}

async function makeFolder(): Promise<string> {
  const made = mkdtempSync(join(tmpdir(), 'leeward-cluster-test-'));
  await chmod(made, 0o755);
  ends.push(() => rmSync(made, { recursive: true, force: true }));
  return made;
}

const ownPrefix = `${throwAwayPrefix}${process.pid}-`;
const pidFile = () => join(folder, 'postgres', 'postmaster.pid');
const readServerPid = () => Number(readFileSync(pidFile(), 'utf8').split('\n')[0]);

/** Another process of the same checkout that starts the cluster and then only lives. */
async function startElsewhere(): Promise<ChildProcess> {
  const script = `
    import { startCluster } from './scripts/database-cluster/start-cluster.ts';
    await startCluster({ folder: ${JSON.stringify(folder)}, mode: 'durable', report: () => undefined });
    console.log('started');
    setInterval(() => undefined, 1000);`;
  const child = spawn(process.execPath, ['--import', 'tsx', '--input-type=module', '--eval', script], {
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  ends.push(() => child.kill('SIGKILL'));
  await new Promise((resolve) => child.stdout.once('data', resolve));
  return child;
}

async function kill(child: ChildProcess): Promise<void> {
  const gone = new Promise((resolve) => child.once('exit', resolve));
  child.kill('SIGKILL');
  await gone;
}

beforeEach(async () => {
  ends = [];
  folder = await makeFolder();
});

afterEach(async () => {
  for (const end of ends.toReversed()) await end();
}, 60_000);

// Making a durable cluster waits for the disk: up to twenty seconds on a machine that is busy writing.
describe('startCluster', { timeout: 120_000 }, () => {
  it('starts a killed server again, where it was, with everything that was committed', async () => {
    const { url } = await start();
    await query(url, 'create table kept (n integer)');
    await query(url, 'insert into kept values (42)');
    process.kill(readServerPid(), 'SIGKILL');
    const findKept = () => query(url, 'select n from kept').catch(() => null);
    await expect.poll(findKept, { timeout: 60_000, interval: 250 }).toBeNull();
    await expect.poll(findKept, { timeout: 60_000, interval: 250 }).toEqual([{ n: 42 }]);
  });

  it('joins the server that a killed process left running, then stops it', async () => {
    await kill(await startElsewhere());
    const serverPid = readServerPid();
    const cluster = await start();
    expect(readServerPid()).toBe(serverPid);
    await cluster.stop();
    expect(existsSync(pidFile())).toBe(false);
  });

  it('leaves the server to another living process of the checkout', async () => {
    await startElsewhere();
    const cluster = await start();
    await cluster.stop();
    expect(await query(cluster.url, 'SELECT 1 AS one')).toEqual([{ one: 1 }]);
    process.kill(readServerPid(), 'SIGQUIT');
  });

  it('recovers what was committed when the server itself was killed', async () => {
    const first = await start();
    await query(first.url, 'CREATE TABLE kept AS SELECT 42 AS answer');
    process.kill(readServerPid(), 'SIGKILL');
    const second = await start();
    expect(await query(second.url, 'SELECT answer FROM kept')).toEqual([{ answer: 42 }]);
  });

  it('starts although the stale process number now belongs to another program of the same user', async () => {
    await (await start()).stop();
    const stranger = spawn('sleep', ['600'], { cwd: '/', ...findClusterOwner(folder) });
    ends.push(() => stranger.kill('SIGKILL'));
    const lines = [stranger.pid, join(folder, 'postgres'), 1, 5999, '', '127.0.0.1', '', 'ready'];
    writeFileSync(pidFile(), `${lines.join('\n')}\n`, { mode: 0o600 });
    const again = await start();
    expect(await query(again.url, 'SELECT 1 AS one')).toEqual([{ one: 1 }]);
    expect(stranger.exitCode).toBeNull();
  });

  it('gives two checkouts a server and a password each', async () => {
    const [one, other] = await Promise.all([start(), start(await makeFolder())]);
    const crossed = new URL(one.url);
    crossed.port = new URL(other.url).port;
    expect(new URL(one.url).port).not.toBe(new URL(other.url).port);
    await expect(query(crossed.href, 'SELECT 1')).rejects.toThrow(/password/);
  });

  it('lets two starts of one folder at the same moment share one server', async () => {
    const [one, other] = await Promise.all([start(), startElsewhere().then(() => start())]);
    expect(one.url).toBe(other.url);
  });

  it('lets in the application only, and only with its password', async () => {
    const { url } = await start();
    const superuser = new URL(url);
    superuser.username = 'postgres';
    await expect(query(superuser.href, 'SELECT 1')).rejects.toThrow(/no pg_hba.conf entry/);
    const rights = await query(url, 'SELECT rolsuper FROM pg_roles WHERE rolname = current_user');
    expect(rights).toEqual([{ rolsuper: false }]);
    expect(statSync(join(folder, 'database.password')).mode & 0o777).toBe(0o600);
  });

  it('makes a new password when the old one is lost, and keeps the data', async () => {
    const first = await start();
    await query(first.url, 'CREATE TABLE kept AS SELECT 42 AS answer');
    rmSync(join(folder, 'database.password'));
    const second = await start();
    expect(second.url).not.toBe(first.url);
    expect(await query(second.url, 'SELECT answer FROM kept')).toEqual([{ answer: 42 }]);
  });

  it('removes a throw-away cluster when it is stopped', async () => {
    const cluster = await startCluster({ folder: '', mode: 'throw-away', report: () => undefined });
    const folders = () => readdirSync(tmpdir()).filter((name) => name.startsWith(ownPrefix));
    expect(await query(cluster.url, 'SHOW fsync')).toEqual([{ fsync: 'off' }]);
    expect(folders()).toHaveLength(1);
    await cluster.stop();
    await expect(query(cluster.url, 'SELECT 1')).rejects.toThrow(/ECONNREFUSED/);
    expect(folders()).toHaveLength(0);
  });
});
