import { crc32, deflateRawSync } from 'node:zlib';

/** One entry of a zip archive, honest unless told otherwise. */
export type ZipEntry = {
  path: string;
  bytes: Buffer;
  isStored?: boolean;
  /** Unix mode, such as 0o120777 for a symbolic link. */
  mode?: number;
  /** General purpose bits beside "the name is UTF-8": 1 is encryption. */
  flags?: number;
  method?: number;
  statedCrc?: number;
  statedByteCount?: number;
  /** Number of an earlier entry whose local header this one claims too. */
  sharesDataOf?: number;
};

const utf8Names = 0x0800;
const madeByUnix = 0x031e;

/** A zip archive by PKWARE's APPNOTE.TXT, written without the library that the server reads with. */
export function writeZip(entries: ZipEntry[]): Buffer {
  const parts: Buffer[] = [];
  const directory: Buffer[] = [];
  const offsets: number[] = [];
  let offset = 0;
  for (const entry of entries) {
    const name = Buffer.from(entry.path);
    const data = entry.isStored ? entry.bytes : deflateRawSync(entry.bytes);
    const local = describe(entry, data, name, 0x04034b50, 30);
    const start = entry.sharesDataOf === undefined ? offset : (offsets[entry.sharesDataOf] ?? 0);
    offsets.push(start);
    const central = describe(entry, data, name, 0x02014b50, 46);
    central.writeUInt32LE(((entry.mode ?? 0o100644) << 16) >>> 0, 38);
    central.writeUInt32LE(start, 42);
    directory.push(central, name);
    if (entry.sharesDataOf !== undefined) continue;
    parts.push(local, name, data);
    offset += local.length + name.length + data.length;
  }
  const contents = Buffer.concat(directory);
  const end = Buffer.alloc(22);
  end.writeUInt32LE(0x06054b50, 0);
  end.writeUInt16LE(entries.length, 8);
  end.writeUInt16LE(entries.length, 10);
  end.writeUInt32LE(contents.length, 12);
  end.writeUInt32LE(offset, 16);
  return Buffer.concat([...parts, contents, end]);
}

/** The fields that local header and table of contents have in common, at their places in each. */
function describe(entry: ZipEntry, data: Buffer, name: Buffer, signature: number, length: number): Buffer {
  const header = Buffer.alloc(length);
  header.writeUInt32LE(signature, 0);
  let at = 4;
  if (length === 46) {
    header.writeUInt16LE(madeByUnix, at);
    at += 2;
  }
  header.writeUInt16LE(20, at);
  header.writeUInt16LE(utf8Names | (entry.flags ?? 0), at + 2);
  header.writeUInt16LE(entry.method ?? (entry.isStored ? 0 : 8), at + 4);
  header.writeUInt32LE(entry.statedCrc ?? crc32(entry.bytes), at + 10);
  header.writeUInt32LE(data.length, at + 14);
  header.writeUInt32LE(entry.statedByteCount ?? entry.bytes.length, at + 18);
  header.writeUInt16LE(name.length, at + 22);
  return header;
}
