import type { z } from 'zod';
import type { ReadAgainList, ReadAgainResult, readAgainFilterSchema } from '../../shared/contract/read-again';
import type { Db } from '../db/db';
import { readerVersion } from '../dicom/reader-version';
import type { Actor } from '../kernel/actor';
import { readCursor, writeCursor } from '../kernel/cursor';
import { readAgain } from './read-again';
import { countCandidates, listCandidates } from './read-again.store';

/** Which kept files may be read again, page by page: what was read again since drops out, and nothing is seen twice. */
export async function listReadAgain(
  db: Db,
  { hospitalId }: Actor,
  { cursor, limit }: z.output<typeof readAgainFilterSchema>,
): Promise<ReadAgainList> {
  const after = readCursor(cursor)?.id ?? null;
  const rows = await listCandidates(db, hospitalId, readerVersion, after, limit + 1);
  const items = rows.slice(0, limit);
  const last = rows.length > limit ? items.at(-1) : undefined;
  return {
    readerVersion,
    counts: await countCandidates(db, hospitalId, readerVersion),
    items,
    nextCursor: last ? writeCursor({ value: last.id, id: last.id }) : null,
  };
}

/** Reads the chosen files again, one after another: each is done or not by itself. */
export async function readChosenAgain(
  db: Db,
  actor: Actor,
  ids: string[],
  now: Date,
): Promise<ReadAgainResult[]> {
  const results: ReadAgainResult[] = [];
  for (const id of new Set(ids)) results.push(await readAgain(db, actor, id, now));
  return results;
}
