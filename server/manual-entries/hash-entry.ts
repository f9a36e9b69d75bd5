import { createHash } from 'node:crypto';

/** Tells whether a request with a known key is the same entry again; one-way, since it stands outside the identity table. */
export const hashEntry = (entry: unknown): string =>
  createHash('sha256').update(JSON.stringify(entry)).digest('hex');
