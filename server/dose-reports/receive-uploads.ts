import { v5 } from 'uuid';
import type { ReceivedFiles } from '../../shared/contract/received-files';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import type { UploadedFile } from '../kernel/uploaded-file';
import { receiveArchive, type ArchiveSending } from './receive-archive';
import { receiveDoseReport } from './receive-dose-report';

export type UploadOptions = Pick<ArchiveSending, 'uploadKey' | 'isAsync' | 'unpackedBytes'>;

/** One key for each file of a request: the given one for the first, others made from it. */
const keyOf = (uploadKey: string | null, index: number) =>
  uploadKey === null || index === 0 ? uploadKey : v5(String(index), uploadKey);

/** The files of one request, one after another, answered in their order; an archive's entries in its place. */
export async function receiveUploads(
  db: Db,
  actor: Actor,
  uploads: UploadedFile[],
  options: UploadOptions,
  now: Date,
): Promise<ReceivedFiles> {
  if (uploads.length === 0)
    throw new Problem('invalid-input', 'No file came. Send one or more in the field "files".', {
      issues: [{ pointer: '/files', detail: 'Choose at least one file.' }],
    });
  const answer: ReceivedFiles = { results: [], archives: [] };
  let taken = 0;
  try {
    for (const upload of uploads) {
      const uploadKey = keyOf(options.uploadKey, taken++);
      await receiveUpload(db, actor, upload, { ...options, uploadKey }, now, answer);
    }
  } finally {
    await closeArchives(uploads.slice(taken));
  }
  return answer;
}

async function receiveUpload(
  db: Db,
  actor: Actor,
  { fileName, content }: UploadedFile,
  options: UploadOptions,
  now: Date,
  answer: ReceivedFiles,
): Promise<void> {
  const { hospitalId, id: receivedById } = actor;
  const { uploadKey } = options;
  if (content.kind === 'archive') {
    const { archive, results } = await receiveArchive(db, actor, content, { ...options, fileName }, now);
    answer.archives.push(archive);
    answer.results.push(...results);
  } else {
    const file = { hospitalId, receivedById, channel: 'page' as const, fileName, uploadKey };
    answer.results.push(await receiveDoseReport(db, { ...file, bytes: content.buffer }, now));
  }
}

/** Those after a failure were not taken over by anyone. */
async function closeArchives(uploads: UploadedFile[]): Promise<void> {
  for (const { content } of uploads) if (content.kind === 'archive') await content.handle.close();
}
