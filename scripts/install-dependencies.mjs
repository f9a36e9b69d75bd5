import { spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('..', import.meta.url));
const modules = `${root}node_modules`;
const stamp = `${modules}/.leeward-installed`;
const progressMs = 10_000;

const hashLock = () =>
  createHash('sha256')
    .update(readFileSync(`${root}package-lock.json`))
    .update(process.versions.modules)
    .digest('hex');

function runNpmCi() {
  return new Promise((resolve) => {
    const child = spawn('npm', ['ci', '--no-audit', '--no-fund', '--loglevel=error'], {
      cwd: root,
      // npm writes to stderr, so that a command's own last line stays last on stdout.
      stdio: ['ignore', 2, 2],
      // A caller's NODE_ENV=production would leave out what builds and tests need.
      env: { ...process.env, NODE_ENV: 'development' },
    });
    child.once('error', () => resolve(1));
    child.once('close', (code) => resolve(code ?? 1));
  });
}

/**
 * Installs the locked packages unless they are there. The stamp inside node_modules holds the lock
 * file's hash and is written last: an interrupted or outdated installation has none that fits, and is
 * deleted before the retry, because npm stumbles over its own leftovers.
 */
export async function installDependencies() {
  const wanted = hashLock();
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return;
  console.error('Installing packages with npm ci (half a minute to two minutes)');
  if (existsSync(modules)) rmSync(modules, { recursive: true, force: true, maxRetries: 3 });
  const startedMs = Date.now();
  const ticker = setInterval(
    () => console.error(`  still installing: ${Math.round((Date.now() - startedMs) / 1000)} s`),
    progressMs,
  );
  const code = await runNpmCi();
  clearInterval(ticker);
  if (code !== 0) {
    console.error('npm ci failed: see its lines above. The next run begins afresh.');
    process.exit(1);
  }
  writeFileSync(stamp, wanted);
  console.error(`Packages installed in ${Math.round((Date.now() - startedMs) / 1000)} s`);
}
