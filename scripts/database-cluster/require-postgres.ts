import { ensureSystemPackages } from '../system-packages';
import { findPostgres } from './find-postgres';

/**
 * The folder with PostgreSQL's programs, installed first if need be. `major` is the version that made
 * an existing cluster.
 */
export async function requirePostgres(major: string | null, report: (line: string) => void): Promise<string> {
  if (findPostgres(null) === null) await ensureSystemPackages(['postgresql'], report);
  const programs = findPostgres(major);
  if (programs) return programs;
  throw new Error(`The database was made by PostgreSQL ${major}: install postgresql-${major}.`);
}
