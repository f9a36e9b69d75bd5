import { spawn } from 'node:child_process';
import { createHash, type Hash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join, resolve } from 'node:path';

/** Everything the built page is made of. */
const sources = ['src', 'shared', 'public', 'index.html', 'vite.config.ts', 'package-lock.json'];

function addToHash(hash: Hash, path: string): void {
  if (!existsSync(path)) return;
  if (statSync(path).isDirectory()) {
    for (const name of readdirSync(path).sort()) addToHash(hash, join(path, name));
  } else if (!/\.test\.tsx?$/.test(path)) {
    hash.update(`${path}\0`).update(readFileSync(path));
  }
}

function hashSources(): string {
  const hash = createHash('sha256');
  for (const source of sources) addToHash(hash, source);
  return hash.digest('hex');
}

function runVite(): Promise<number> {
  return new Promise((resolveCode, reject) => {
    const child = spawn(process.execPath, ['node_modules/vite/bin/vite.js', 'build', '--logLevel', 'warn'], {
      stdio: ['ignore', 2, 2],
      env: { ...process.env, NODE_ENV: 'production' },
    });
    child.once('error', reject);
    child.once('close', (code) => resolveCode(code ?? 1));
  });
}

/** Builds the page unless the built one is made of the same sources; returns its folder. */
export async function buildClient(report: (line: string) => void): Promise<string> {
  const folder = resolve('dist');
  const stamp = join(folder, '.built-from');
  const wanted = hashSources();
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return folder;
  report('Building the page');
  if ((await runVite()) !== 0) throw new Error('The page could not be built: see the lines above.');
  writeFileSync(stamp, wanted);
  return folder;
}
