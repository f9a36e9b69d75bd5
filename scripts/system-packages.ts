import { spawn, spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { findPostgres } from './database-cluster/find-postgres';

/** Debian's own Python, whatever other Python comes first on PATH: Debian's packages belong to it. */
const systemPython = '/usr/bin/python3';

const hasProgram = (name: string) =>
  (process.env['PATH'] ?? '').split(delimiter).some((folder) => existsSync(join(folder, name)));

const hasPythonModule = (name: string) =>
  spawnSync(systemPython, ['-c', `import ${name}`], { stdio: 'ignore' }).status === 0;

/** What the project needs from Debian: package name → whether it is there. */
const presenceChecks = {
  postgresql: () => findPostgres(null) !== null,
  chromium: () => existsSync('/usr/bin/chromium'),
  dcmtk: () => hasProgram('dcmdump') && hasProgram('dsrdump'),
  dicom3tools: () => hasProgram('dciodvfy'),
  'python3-pydicom': () => hasPythonModule('pydicom'),
  'python3-numpy': () => hasPythonModule('numpy'),
  'python3-xraylib': () => hasPythonModule('xraylib'),
};

export type SystemPackage = keyof typeof presenceChecks;

/** Everything that `npm test` needs. */
export const testPackages = Object.keys(presenceChecks) as SystemPackage[];

/** Packages that are missing and that this user may not install; the command ends with exit code 2. */
export class MissingPackagesError extends Error {
  readonly exitCode = 2;
}

function runAptGet(parameters: string[]): Promise<number> {
  return new Promise((resolve, reject) => {
    const child = spawn('apt-get', parameters, {
      env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
      // apt-get's own lines are the progress; they go to stderr so that stdout keeps its last line.
      stdio: ['ignore', 2, 2],
    });
    child.once('error', reject);
    child.once('close', (code) => resolve(code ?? 1));
  });
}

/** Installs what is missing with apt-get as root; as another user says which one line does it. */
export async function ensureSystemPackages(
  wanted: readonly SystemPackage[],
  report: (line: string) => void,
): Promise<void> {
  const findMissing = () => wanted.filter((name) => !presenceChecks[name]());
  const missing = findMissing();
  if (missing.length === 0) return;
  const installLine = `apt-get install -y ${missing.join(' ')}`;
  if (process.getuid?.() !== 0) {
    throw new MissingPackagesError(`Missing: ${missing.join(', ')}. Run this once:\n  sudo ${installLine}`);
  }
  report(`Installing ${missing.join(', ')} with apt-get (a minute or two)`);
  await runAptGet(['update']);
  await runAptGet(['install', '-y', '--no-install-recommends', ...missing]);
  const stillMissing = findMissing();
  if (stillMissing.length > 0) throw new Error(`apt-get did not install ${stillMissing.join(', ')}.`);
}
