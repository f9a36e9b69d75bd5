import { crc32 } from 'node:zlib';
import type { ZipFile } from 'yauzl';
import { ArchiveFailure } from './archive-failure';
import type { PlannedEntry } from './archive-contents';
import type { ArchiveLimits } from './archive-limits';

/** What the archive has unpacked to so far; shared by all of its entries. */
export type Unpacked = { byteCount: number };

/**
 * The bytes of one entry. Counts while inflating: what headers state is believed of nothing.
 *
 * @throws ArchiveFailure when a limit is reached or the bytes are not those that were packed.
 */
export async function unpackEntry(
  zip: ZipFile,
  { entry }: PlannedEntry,
  unpacked: Unpacked,
  archiveByteCount: number,
  limits: ArchiveLimits,
): Promise<Buffer> {
  const chunks: Buffer[] = [];
  let byteCount = 0;
  let checksum = 0;
  try {
    for await (const chunk of await zip.openReadStreamPromise(entry)) {
      const bytes = chunk as Buffer;
      byteCount += bytes.length;
      unpacked.byteCount += bytes.length;
      refuseExcess(byteCount, entry.compressedSize, unpacked.byteCount, archiveByteCount, limits);
      checksum = crc32(bytes, checksum);
      chunks.push(bytes);
    }
  } catch (error) {
    if (error instanceof ArchiveFailure) throw error;
    throw new ArchiveFailure('archive-entry-broken', error instanceof Error ? error.message : String(error));
  }
  if (byteCount !== entry.uncompressedSize)
    throw new ArchiveFailure('archive-entry-broken', `${byteCount} bytes, not ${entry.uncompressedSize}`);
  if (checksum !== entry.crc32) throw new ArchiveFailure('archive-entry-broken', 'the checksum differs');
  return Buffer.concat(chunks, byteCount);
}

function refuseExcess(
  byteCount: number,
  packedByteCount: number,
  unpackedByteCount: number,
  archiveByteCount: number,
  limits: ArchiveLimits,
): void {
  const allowedMb = (bytes: number) => `more than ${Math.floor(bytes / 1_048_576)} MB`;
  if (byteCount > limits.entryBytes)
    throw new ArchiveFailure('archive-entry-size', allowedMb(limits.entryBytes));
  if (unpackedByteCount > limits.unpackedBytes)
    throw new ArchiveFailure('archive-unpacked-size', allowedMb(limits.unpackedBytes));
  if (byteCount > limits.ratio * packedByteCount || unpackedByteCount > limits.ratio * archiveByteCount)
    throw new ArchiveFailure('archive-ratio', `more than ${limits.ratio} times its packed size`);
}
