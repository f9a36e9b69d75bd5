import { execFileSync } from 'node:child_process';

/** The oldest Node.js and npm the project is tried with. */
const needs = { node: [20, 19], npm: [10, 0] };

const isAtLeast = (version, [major, minor]) => {
  const [hasMajor = 0, hasMinor = 0] = version.split('.').map(Number);
  return hasMajor > major || (hasMajor === major && hasMinor >= minor);
};

function readNpmVersion() {
  const announced = /^npm\/(\d+\.\d+\.\d+)/.exec(process.env.npm_config_user_agent ?? '')?.[1];
  return announced ?? execFileSync('npm', ['--version'], { encoding: 'utf8' }).trim();
}

/** Ends the process with a plain sentence if Node.js or npm is too old. */
export function checkVersions() {
  const found = { node: process.versions.node, npm: readNpmVersion() };
  for (const [name, version] of Object.entries(needs)) {
    if (isAtLeast(found[name], version)) continue;
    console.error(`Leeward needs ${name} ${version.join('.')} or newer; this is ${name} ${found[name]}.`);
    process.exit(1);
  }
}
