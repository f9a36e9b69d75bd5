import { createHash } from 'node:crypto';
import { v5 } from 'uuid';
import type { Db } from '../db/db';
import { isZip } from '../kernel/is-zip';
import type { ReceivedArchive } from './archive.entity';
import { readContents, type ArchiveContents, type PlannedEntry } from './archive-contents';
import { ArchiveFailure, refusalOf } from './archive-failure';
import type { ArchiveLimits } from './archive-limits';
import { changeArchive } from './archive.store';
import {
  findByUploadKey,
  isUploadKeyTaken,
  keepArrival,
  noteArrival,
  type Sending,
} from './dose-report.store';
import { nameContent } from './name-content';
import { receiveDoseReport } from './receive-dose-report';
import { unpackEntry, type Unpacked } from './unpack-entry';

/** Which hospital's file, by whom: what every entry has from its archive. */
const sendingOf = (archive: ReceivedArchive, fileName: string, uploadKey: string): Sending => ({
  hospitalId: archive.hospitalId,
  receivedById: archive.receivedById,
  channel: 'page',
  archiveId: archive.id,
  archiveName: archive.fileName,
  fileName,
  uploadKey,
});

/**
 * Brings every entry of a kept archive to its outcome, in order. May be begun again after a crash, or by two at once:
 * an entry's key is made of the archive and its place there, so each is taken in once.
 */
export async function unpackArchive(
  db: Db,
  archive: ReceivedArchive,
  fd: number,
  limits: ArchiveLimits,
  now: Date,
): Promise<void> {
  const contents = await readContents(fd, archive.byteCount, limits).catch((error: unknown) => {
    if (error instanceof ArchiveFailure) return error;
    throw error;
  });
  if (contents instanceof ArchiveFailure) return refuseArchive(db, archive, contents);
  const { files, skipped } = contents;
  await changeArchive(db, archive.id, { entryCount: files.length, skipped });
  const unpacked: Unpacked = { byteCount: 0 };
  for (const [index, file] of files.entries()) {
    const sending = sendingOf(archive, file.path.slice(-255), v5(`${index}/${file.path}`, archive.id));
    await receiveEntry(db, contents, file, sending, { unpacked, archive, limits, now }).catch(ignoreIfTaken);
  }
  await changeArchive(db, archive.id, { state: 'unpacked', settledAt: new Date() });
}

/** Another process unpacks the same archive and was first with this entry. */
function ignoreIfTaken(error: unknown): void {
  if (!isUploadKeyTaken(error)) throw error;
}

type Course = { unpacked: Unpacked; archive: ReceivedArchive; limits: ArchiveLimits; now: Date };

async function receiveEntry(
  db: Db,
  { zip }: ArchiveContents,
  file: PlannedEntry,
  sending: Sending,
  { unpacked, archive, limits, now }: Course,
): Promise<void> {
  if (await findByUploadKey(db, archive.hospitalId, sending.uploadKey ?? '')) return;
  try {
    if (file.refusal) throw new ArchiveFailure(file.refusal.code, file.refusal.detail);
    const bytes = await unpackEntry(zip, file, unpacked, archive.byteCount, limits);
    const packed = namePacked(bytes);
    if (packed) await keepNested(db, sending, bytes, packed);
    else await receiveDoseReport(db, { ...sending, bytes }, now);
  } catch (error) {
    if (!(error instanceof ArchiveFailure)) throw error;
    await noteArrival(db, sending, refusalOf(error));
  }
}

function namePacked(bytes: Buffer): string | null {
  if (isZip(bytes)) return 'zip';
  const name = nameContent(bytes);
  return name?.includes('packed') ? name : null;
}

/** An archive in the archive is kept like any refused file, by itself. */
async function keepNested(db: Db, sending: Sending, bytes: Buffer, kind: string): Promise<void> {
  const sha256 = createHash('sha256').update(bytes).digest('hex');
  const refusal = refusalOf({ code: 'archive-nested', detail: kind });
  await keepArrival(db, { ...sending, bytes, sha256 }, { ...refusal, settledAt: new Date() });
}

/** Nothing of it was read: the archive itself stands in the list of files, refused. */
async function refuseArchive(db: Db, archive: ReceivedArchive, failure: ArchiveFailure): Promise<void> {
  await db.transaction(async (tx) => {
    await noteArrival(
      tx,
      { ...sendingOf(archive, archive.fileName, v5('archive', archive.id)), archiveName: null },
      refusalOf(failure),
    );
    await changeArchive(tx, archive.id, { state: 'refused', entryCount: 0, settledAt: new Date() });
  });
}
