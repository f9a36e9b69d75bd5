import { fileURLToPath } from 'node:url';
import { checkVersions } from './check-versions.mjs';
import { installDependencies } from './install-dependencies.mjs';

/**
 * Runs a TypeScript module of this folder on any machine with Node.js: checks the versions, installs
 * the packages if need be, and only then loads the loader that reads TypeScript.
 */
export async function launch(modulePath) {
  checkVersions();
  await installDependencies();
  process.chdir(fileURLToPath(new URL('..', import.meta.url)));
  const { register } = await import('tsx/esm/api');
  register();
  await import(modulePath);
}
