import {
  archiveProgressSchema,
  receivedFilesSchema,
  type ReceivedArchive,
  type ReceivedFile,
} from '../../../shared/contract/received-files';
import { request, upload } from '../../lib/api';
import { mayPass, pauseAfter, waitOrOnline } from './back-off';
import type { Send, UploadProgress } from './upload.types';

/** So often an archive is asked how far it is. */
const followEveryMs = 400;

/**
 * One file a request, so that each has its outcome as soon as it is read. The server answers an archive at once when it
 * is kept; its entries are then followed.
 */
export const sendFile: Send = async ({ file, uploadKey }, onProgress) => {
  await refuseUnreadable(file);
  const form = new FormData();
  form.append('files', file, file.name);
  const { results, archives } = await upload('/api/dose-reports', form, {
    schema: receivedFilesSchema,
    headers: { 'Upload-Key': uploadKey, Prefer: 'respond-async' },
    onProgress: (share) => onProgress({ share }),
  });
  const [archive] = archives;
  if (archive) return followArchive(archive, results, onProgress);
  if (results.length === 0) throw new Error('The server answered nothing for this file.');
  return { results, archive: null };
};

/** A file that was moved or changed since it was chosen fails as a broken connection does, and would for ever. */
async function refuseUnreadable(file: File): Promise<void> {
  try {
    await file.slice(0, 1).arrayBuffer();
  } catch {
    throw new Error('The file was moved or changed since it was chosen. Choose it again.');
  }
}

async function followArchive(
  first: ReceivedArchive,
  begun: ReceivedFile[],
  onProgress: (progress: UploadProgress) => void,
) {
  let archive = first;
  let results: readonly ReceivedFile[] = begun;
  for (let failures = 0; archive.state === 'received' || results.length < archive.settledCount;) {
    onProgress({ share: 1, archive, results });
    await waitOrOnline(failures === 0 ? followEveryMs : pauseAfter(failures));
    try {
      const next = await request(`/api/dose-reports/archives/${archive.id}?after=${results.length}`, {
        schema: archiveProgressSchema,
      });
      archive = next.archive;
      results = [...results, ...next.results];
      failures = 0;
    } catch (error) {
      // The archive is kept: only how far it is cannot be asked for the moment.
      if (!mayPass(error)) throw error;
      failures += 1;
    }
  }
  return { results, archive };
}
