import { randomBytes } from 'node:crypto';
import { readdirSync, rmSync } from 'node:fs';
import { availableParallelism, loadavg } from 'node:os';
import { join } from 'node:path';
import type { Bench, BenchContext, Measurement } from './bench/bench';
import { copyTree } from './bench/copied-tree';
import { startLeewardIn } from './bench/started-leeward';
import { chooseDataFolder } from './database-cluster/data-folder';
import { startCluster } from './database-cluster/start-cluster';
import { runCommand } from './run-command';
import type { Stopper } from './stopper';

type Row = { bench: Bench } & Measurement;

const report = (line: string) => console.error(line);

/** `npm run bench -- WORD…` runs the modules whose file name holds one of the words. */
const words = process.argv.slice(2);

const listModules = () =>
  readdirSync('scripts/bench')
    .filter((name) => name.endsWith('.bench.ts'))
    .filter((name) => words.length === 0 || words.some((word) => name.includes(word)))
    .sort();

/**
 * Starts a copy of the tree from nothing, then again warm, and leaves it running: what is measured is
 * what `npm start` gives, with the database's full durability and the demo hospital.
 */
async function prepareContext(stopper: Stopper): Promise<BenchContext> {
  const isFresh = words.length === 0;
  const folder = copyTree(!isFresh);
  stopper.add(async () => rmSync(folder, { recursive: true, force: true, maxRetries: 3 }));
  const demoPassword = randomBytes(9).toString('hex');
  report('Starting a copy of the tree from nothing');
  const fresh = await startLeewardIn(folder, demoPassword, report, stopper);
  await fresh.stop();
  report('Starting it again');
  const warm = await startLeewardIn(folder, demoPassword, report, stopper);
  // Joins the running database to learn its address; the running Leeward stops it.
  const dataFolder = chooseDataFolder(join(folder, '.data'));
  const cluster = await startCluster({ folder: dataFolder, mode: 'durable', report });
  stopper.add(() => cluster.stop());
  return {
    url: warm.url,
    processId: warm.processId,
    demoPassword,
    databaseUrl: cluster.url,
    clientFolder: join(folder, 'dist'),
    startTimes: { freshS: isFresh ? fresh.startS : null, warmS: warm.startS },
    demoS: fresh.demoS,
    report,
  };
}

async function runBench(file: string, context: BenchContext): Promise<Row> {
  const { bench } = (await import(`./bench/${file}`)) as { bench: Bench };
  report(`Measuring: ${bench.name}`);
  try {
    return { bench, ...(await bench.run(context)) };
  } catch (error) {
    report(String(error));
    process.exitCode = 1;
    return { bench, measured: 'failed, see above', isMet: false };
  }
}

const verdict = ({ isMet }: Row) => (isMet === null ? 'not measured' : isMet ? 'met' : 'missed');

function printTable(rows: Row[]): void {
  const cells = rows.map((row) => [row.bench.name, row.bench.target, row.measured, verdict(row)]);
  const table = [['Figure', 'Target', 'Measured', 'Verdict'], ...cells];
  const widths = [0, 1, 2, 3].map((column) => Math.max(...table.map((line) => line[column]?.length ?? 0)));
  for (const line of table) {
    console.log(
      line
        .map((cell, column) => cell.padEnd(widths[column] ?? 0))
        .join('  ')
        .trimEnd(),
    );
  }
}

/** What else the machine did before we began: above its processors, the figures are somebody else's too. */
const describeLoad = () =>
  `Load beforehand: ${loadavg()[0]?.toFixed(1)} on ${availableParallelism()} processors`;

await runCommand(async (stopper) => {
  const load = describeLoad();
  report(load);
  const context = await prepareContext(stopper);
  const rows: Row[] = [];
  for (const file of listModules()) rows.push(await runBench(file, context));
  await stopper.stop();
  printTable(rows);
  console.log(load);
  process.exit();
}, 130);
