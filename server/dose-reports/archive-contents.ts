import { fromFdPromise, getFileNameLowLevel, validateFileName, type Entry, type ZipFile } from 'yauzl';
import type { ReasonCode } from '../../shared/contract/outcome';
import type { SkippedEntry } from '../../shared/contract/received-files';
import { whySkipped } from '../../shared/contract/skipped-file';
import { ArchiveFailure } from './archive-failure';
import type { ArchiveLimits } from './archive-limits';
import { nameZipDocument } from './name-content';

/** One entry that gets an outcome; `refusal` where it is not even to be unpacked. */
export type PlannedEntry = {
  path: string;
  entry: Entry;
  refusal: { code: ReasonCode; detail: string } | null;
};

export type ArchiveContents = { zip: ZipFile; files: PlannedEntry[]; skipped: SkippedEntry[] };

/** Deflate and stored (APPNOTE.TXT 4.4.5). */
const knownMethods = new Set([0, 8]);
/** Bytes of a local header before its name (APPNOTE.TXT 4.3.7). */
const localHeaderBytes = 30;

/** File type of the Unix mode in the upper half of the external attributes: none, regular, folder. */
const plainModes = new Set([0, 0x8000, 0x4000]);

/**
 * Reads the table of contents and judges every entry by it. Nothing is unpacked here. Names are decoded here, not by
 * the library: it would give up the whole archive for one bad name.
 *
 * @throws ArchiveFailure when nothing of the archive may be read.
 */
export async function readContents(
  fd: number,
  byteCount: number,
  limits: ArchiveLimits,
): Promise<ArchiveContents> {
  const entries: Entry[] = [];
  let zip: ZipFile;
  try {
    zip = await fromFdPromise(fd, { autoClose: false, decodeStrings: false, validateEntrySizes: false });
    if (zip.entryCount > limits.entryCount) throw tooMany(limits);
    for await (const entry of zip.eachEntry()) {
      entries.push(entry);
      if (entries.length > limits.entryCount) throw tooMany(limits);
    }
  } catch (error) {
    if (error instanceof ArchiveFailure) throw error;
    const detail = error instanceof Error ? error.message : String(error);
    // Encrypted by the newer method, even the table of contents cannot be read.
    const code = detail.includes('encryption') ? 'archive-entry-encrypted' : 'archive-unreadable';
    throw new ArchiveFailure(code, detail);
  }
  const document = nameZipDocument(entries.map(nameOf));
  if (document) throw new ArchiveFailure('not-dicom', document);
  refuseOverlap(entries, byteCount);
  refuseSize(entries, byteCount, limits);
  const contents = { zip, ...sortOut(entries, limits) };
  if (contents.files.length === 0)
    throw new ArchiveFailure('archive-empty', `${contents.skipped.length} entries, none a file to read`);
  return contents;
}

const nameOf = (entry: Entry): string =>
  getFileNameLowLevel(entry.generalPurposeBitFlag, entry.fileNameRaw, entry.extraFields, true);

const tooMany = ({ entryCount }: ArchiveLimits) =>
  new ArchiveFailure('archive-too-many-entries', `more than ${entryCount} entries`);

function refuseOverlap(entries: Entry[], byteCount: number): void {
  const ranges = entries
    .map((entry) => ({
      start: entry.relativeOffsetOfLocalHeader,
      end:
        entry.relativeOffsetOfLocalHeader +
        localHeaderBytes +
        entry.fileNameRaw.length +
        entry.compressedSize,
    }))
    .toSorted((a, b) => a.start - b.start);
  ranges.forEach(({ end }, index) => {
    const next = ranges[index + 1];
    if (next && end > next.start)
      throw new ArchiveFailure('archive-overlap', `bytes ${next.start} to ${end} belong to two entries`);
    if (end > byteCount)
      throw new ArchiveFailure('archive-unreadable', `an entry reaches beyond the end (${byteCount} bytes)`);
  });
}

/** By what the archive states of itself; what it really unpacks to is counted while that happens. */
function refuseSize(entries: Entry[], byteCount: number, limits: ArchiveLimits): void {
  const stated = entries
    .filter((entry) => entry.uncompressedSize <= limits.entryBytes)
    .reduce((sum, entry) => sum + entry.uncompressedSize, 0);
  if (stated > limits.unpackedBytes)
    throw new ArchiveFailure(
      'archive-unpacked-size',
      `${Math.ceil(stated / 1_048_576)} MB unpacked, ${Math.floor(limits.unpackedBytes / 1_048_576)} MB allowed`,
    );
  if (stated > limits.ratio * byteCount)
    throw new ArchiveFailure(
      'archive-ratio',
      `${Math.ceil(stated / byteCount)} times its size, ${limits.ratio} allowed`,
    );
}

/** Deflate writes two bytes for nothing. */
const isEmpty = (entry: Entry) => entry.uncompressedSize === 0 && entry.compressedSize <= 2;

function sortOut(
  entries: Entry[],
  limits: ArchiveLimits,
): { files: PlannedEntry[]; skipped: SkippedEntry[] } {
  const files: PlannedEntry[] = [];
  const skipped: SkippedEntry[] = [];
  const seen = new Set<string>();
  for (const entry of entries) {
    const path = nameOf(entry);
    const why = path.endsWith('/') ? 'a folder' : isEmpty(entry) ? 'empty' : whySkipped(path);
    const refusal = judge(entry, path, seen, limits);
    seen.add(path);
    if (why !== null && refusal?.code !== 'archive-entry-link' && refusal?.code !== 'archive-entry-path')
      skipped.push({ path, reason: why });
    else files.push({ path, entry, refusal });
  }
  return { files, skipped };
}

function judge(
  entry: Entry,
  path: string,
  seen: Set<string>,
  limits: ArchiveLimits,
): PlannedEntry['refusal'] {
  const wrongPath = path === '' ? 'an empty name' : validateFileName(path);
  if (wrongPath !== null) return { code: 'archive-entry-path', detail: wrongPath };
  if (/^[A-Za-z]:/.test(path) || [...path].some((letter) => letter < ' '))
    return { code: 'archive-entry-path', detail: 'a drive letter or control character' };
  const mode = (entry.externalFileAttributes >>> 16) & 0xf000;
  if (!plainModes.has(mode)) return { code: 'archive-entry-link', detail: `Unix mode 0${mode.toString(8)}` };
  if (seen.has(path)) return { code: 'archive-entry-repeated', detail: 'the same path twice' };
  if (entry.isEncrypted()) return { code: 'archive-entry-encrypted', detail: 'encryption flag set' };
  if (!knownMethods.has(entry.compressionMethod))
    return { code: 'archive-entry-method', detail: `method ${entry.compressionMethod}` };
  if (entry.uncompressedSize > limits.entryBytes)
    return { code: 'archive-entry-size', detail: `${Math.ceil(entry.uncompressedSize / 1_048_576)} MB` };
  return null;
}
