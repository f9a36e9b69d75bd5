import { spawn, type ChildProcess } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { buildClient } from './build-client';
import { countTestsInFile, formatCounts, type TestCounts } from './count-tests';
import { startCluster } from './database-cluster/start-cluster';
import { runCommand } from './run-command';
import type { Stopper } from './stopper';
import { ensureSystemPackages, testPackages } from './system-packages';

const report = (line: string) => console.error(line);

function startVitest(reportFile: string, databaseUrl: string): ChildProcess {
  return spawn(
    process.execPath,
    [
      ...['node_modules/vitest/vitest.mjs', 'run', ...process.argv.slice(2)],
      ...['--reporter=default', '--reporter=json', `--outputFile.json=${reportFile}`],
    ],
    { stdio: ['ignore', 'inherit', 'inherit'], env: { ...process.env, TEST_DATABASE_URL: databaseUrl } },
  );
}

/** Runs vitest to its end; told to stop, ends it first and the database after it. */
function runVitest(reportFile: string, databaseUrl: string, stopper: Stopper): Promise<number> {
  const child = startVitest(reportFile, databaseUrl);
  const ended = new Promise<number>((resolve) => {
    child.once('error', () => resolve(1));
    child.once('close', (code) => resolve(code ?? 1));
  });
  stopper.add(async () => {
    child.kill('SIGTERM');
    await ended;
  });
  return ended;
}

async function runTests(stopper: Stopper, reportFile: string): Promise<number> {
  await ensureSystemPackages(testPackages, report);
  const starting = startCluster({ folder: '', mode: 'throw-away', report });
  stopper.add(() => starting.then((cluster) => cluster.stop()));
  // The browser tests open the built page.
  const [{ url }] = await Promise.all([starting, buildClient(report)]);
  return runVitest(reportFile, url, stopper);
}

await runCommand(async (stopper) => {
  const folder = mkdtempSync(join(tmpdir(), 'leeward-test-report-'));
  stopper.add(async () => rmSync(folder, { recursive: true, force: true }));
  const reportFile = join(folder, 'report.json');
  let counts: TestCounts = { passed: 0, failed: 0, skipped: 0 };
  let code: number;
  try {
    code = await runTests(stopper, reportFile);
    counts = countTestsInFile(reportFile);
  } finally {
    await stopper.stop();
    // Nothing is written behind this line.
    console.log(formatCounts(counts));
  }
  process.exit(code || (counts.failed > 0 || counts.passed === 0 ? 1 : 0));
}, 130);
