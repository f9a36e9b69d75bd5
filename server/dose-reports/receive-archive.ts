import { setTimeout as wait } from 'node:timers/promises';
import type { ArchiveProgress } from '../../shared/contract/received-files';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import type { UploadedArchive } from '../kernel/uploaded-file';
import type { ReceivedArchive } from './archive.entity';
import { runArchive } from './archive-runs';
import { countSettled, findArchive, findArchiveByKey, keepArchive, listEntryResults } from './archive.store';
import { isUploadKeyTaken } from './dose-report.store';

/** An answer comes within this time, with what is read by then. */
const answerWithinMs = 8_000;
/** Results of one answer at most; an archive has up to 2,000 entries. */
const pageSize = 2_000;

export type ArchiveSending = {
  fileName: string;
  uploadKey: string | null;
  /** The sender asks for progress itself and wants no more than "kept". */
  isAsync: boolean;
  /** Bytes that all entries together may unpack to. */
  unpackedBytes: number;
};

/** Keeps an archive, then unpacks it; answers when that is done, or after some seconds with what is. */
export async function receiveArchive(
  db: Db,
  actor: Actor,
  content: UploadedArchive,
  sending: ArchiveSending,
  now: Date,
): Promise<ArchiveProgress> {
  const { archive, isNew } = await keepOnce(db, actor, content, sending).catch(async (error: unknown) => {
    await content.handle.close();
    throw error;
  });
  const handle = isNew ? content.handle : null;
  if (!isNew) await content.handle.close();
  const done =
    archive.state === 'received'
      ? runArchive(db, archive, handle, sending.unpackedBytes, now)
      : Promise.resolve();
  const cancel = new AbortController();
  if (!sending.isAsync)
    await Promise.race([
      done,
      wait(answerWithinMs, undefined, { signal: cancel.signal, ref: false }).catch(() => undefined),
    ]);
  cancel.abort();
  return describeArchive(db, actor, archive.id, 0);
}

async function keepOnce(
  db: Db,
  actor: Actor,
  { handle, byteCount, sha256 }: UploadedArchive,
  { fileName, uploadKey }: ArchiveSending,
): Promise<{ archive: ReceivedArchive; isNew: boolean }> {
  const { hospitalId } = actor;
  const findFirst = () => (uploadKey ? findArchiveByKey(db, hospitalId, uploadKey) : null);
  const known = await findFirst();
  if (known) return { archive: refuseOther(known, sha256), isNew: false };
  try {
    const id = await keepArchive(
      db,
      { hospitalId, fileName: fileName.slice(0, 255), uploadKey, sha256, byteCount, receivedById: actor.id },
      handle,
    );
    return { archive: await getArchive(db, hospitalId, id), isNew: true };
  } catch (error) {
    const other = isUploadKeyTaken(error) && (await findFirst());
    if (!other) throw error;
    return { archive: refuseOther(other, sha256), isNew: false };
  }
}

function refuseOther(archive: ReceivedArchive, sha256: string): ReceivedArchive {
  if (archive.sha256 === sha256) return archive;
  throw new Problem('already-exists', 'This upload key belongs to another file. Send this one with its own.');
}

async function getArchive(db: Db, hospitalId: string, id: string): Promise<ReceivedArchive> {
  const archive = await findArchive(db, hospitalId, id);
  if (!archive) throw new Problem('not-found');
  return archive;
}

/** How far an archive is, and the outcomes from the one numbered `after` on. */
export async function describeArchive(
  db: Db,
  actor: Actor,
  archiveId: string,
  after: number,
): Promise<ArchiveProgress> {
  const { id, fileName, state, entryCount, skipped } = await getArchive(db, actor.hospitalId, archiveId);
  return {
    archive: { id, fileName, state, entryCount, skipped, settledCount: await countSettled(db, id) },
    results: await listEntryResults(db, id, after, pageSize),
  };
}
