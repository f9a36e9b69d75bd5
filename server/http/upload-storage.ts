import { createHash } from 'node:crypto';
import type { FileHandle } from 'node:fs/promises';
import { MulterError, type StorageEngine } from 'multer';
import { joinBytes } from '../kernel/join-bytes';
import { isZip, zipHeadBytes } from '../kernel/is-zip';
import { openNamelessFile } from '../kernel/nameless-file';
import type { UploadedContent } from '../kernel/uploaded-file';

const megabyte = 1_048_576;

/** A dose report of 3,000 events has about 21 MB; nothing that is one comes near this. */
export const maxFileBytes = 64 * megabyte;
/** An archive waits on disk, not in memory, and may be larger. */
export const maxArchiveBytes = 256 * megabyte;

class DiskCopy {
  private readonly hash = createHash('sha256');
  private byteCount = 0;

  private constructor(private readonly handle: FileHandle) {}

  static async start(): Promise<DiskCopy> {
    return new DiskCopy(await openNamelessFile());
  }

  async add(chunk: Buffer): Promise<void> {
    this.hash.update(chunk);
    this.byteCount += chunk.length;
    await this.handle.appendFile(chunk);
  }

  finish(): UploadedContent {
    const { handle, byteCount } = this;
    return { kind: 'archive', handle, byteCount, sha256: this.hash.digest('hex') };
  }

  discard = () => this.handle.close();
}

async function takeIn(stream: AsyncIterable<Buffer>): Promise<UploadedContent> {
  let chunks: Buffer[] = [];
  let byteCount = 0;
  let isDecided = false;
  let disk: DiskCopy | null = null;
  const decide = async () => {
    isDecided = true;
    if (!isZip(Buffer.concat(chunks))) return;
    disk = await DiskCopy.start();
    for (const chunk of chunks) await disk.add(chunk);
    chunks = [];
  };
  try {
    for await (const chunk of stream) {
      byteCount += chunk.length;
      if (disk) await (disk as DiskCopy).add(chunk);
      else {
        if (byteCount > maxFileBytes) throw new MulterError('LIMIT_FILE_SIZE');
        chunks.push(chunk);
        if (!isDecided && byteCount >= zipHeadBytes) await decide();
      }
    }
    if (!isDecided) await decide();
    return disk ? (disk as DiskCopy).finish() : { kind: 'file', buffer: await joinBytes(chunks) };
  } catch (error) {
    await (disk as DiskCopy | null)?.discard();
    throw error;
  }
}

/** Keeps files in memory and archives on disk, told apart by their first bytes, never by their names. */
export const uploadStorage: StorageEngine = {
  _handleFile(request, file, done) {
    // A sender that goes away never ends its file: without this the reading would wait for ever.
    request.once('close', () => {
      if (!request.complete) file.stream.destroy();
    });
    takeIn(file.stream).then(
      (content) => done(null, { content } as unknown as Partial<Express.Multer.File>),
      (error: unknown) => done(error),
    );
  },
  _removeFile(_request, file, done) {
    const { content } = file as unknown as { content?: UploadedContent };
    if (content?.kind === 'archive')
      void content.handle.close().then(
        () => done(null),
        (error: Error) => done(error),
      );
    else done(null);
  },
};
