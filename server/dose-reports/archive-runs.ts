import type { FileHandle } from 'node:fs/promises';
import type { Db } from '../db/db';
import { openNamelessFile } from '../kernel/nameless-file';
import type { ReceivedArchive } from './archive.entity';
import { archiveLimits } from './archive-limits';
import { readParts } from './archive.store';
import { unpackArchive } from './unpack-archive';

/** Archives that this process unpacks now. Others may do so too: entries are taken in once whoever is first. */
const running = new Map<string, Promise<void>>();

async function fetchParts(db: Db, archive: ReceivedArchive): Promise<FileHandle> {
  const handle = await openNamelessFile();
  for await (const part of readParts(db, archive.id)) await handle.appendFile(part);
  return handle;
}

async function run(
  db: Db,
  archive: ReceivedArchive,
  given: FileHandle | null,
  unpackedBytes: number,
  now: Date,
): Promise<void> {
  const handle = given ?? (await fetchParts(db, archive));
  try {
    await unpackArchive(db, archive, handle.fd, { ...archiveLimits, unpackedBytes }, now);
  } finally {
    await handle.close();
  }
}

/**
 * Unpacks a kept archive, or joins who does so in this process already. Never rejects: what fails here leaves the
 * archive "received", and the next start, or the sender's next try, takes it up.
 */
export function runArchive(
  db: Db,
  archive: ReceivedArchive,
  handle: FileHandle | null,
  unpackedBytes: number,
  now: Date,
): Promise<void> {
  const known = running.get(archive.id);
  if (known) return handle ? handle.close().then(() => known) : known;
  const started = run(db, archive, handle, unpackedBytes, now)
    .catch((error: Error & { code?: string }) => {
      console.error(`Archive ${archive.id} waits: unpacking it failed with ${error.code ?? error.name}`);
    })
    .finally(() => running.delete(archive.id));
  running.set(archive.id, started);
  return started;
}
