import { existsSync, readdirSync } from 'node:fs';
import { delimiter, dirname, join } from 'node:path';

const debianFolder = '/usr/lib/postgresql';

function listDebianMajors(): string[] {
  if (!existsSync(debianFolder)) return [];
  return readdirSync(debianFolder)
    .filter((major) => existsSync(join(debianFolder, major, 'bin', 'initdb')))
    .sort((a, b) => Number(b) - Number(a));
}

/**
 * The folder with PostgreSQL's programs: Debian's newest, or the one on PATH; null if there is none.
 * A cluster can only be run by the major version that made it, so `major` asks for that one.
 */
export function findPostgres(major: string | null): string | null {
  const debian = listDebianMajors().find((candidate) => major === null || candidate === major);
  if (debian) return join(debianFolder, debian, 'bin');
  const initdb = (process.env['PATH'] ?? '')
    .split(delimiter)
    .map((folder) => join(folder, 'initdb'))
    .find(existsSync);
  return initdb ? dirname(initdb) : null;
}
