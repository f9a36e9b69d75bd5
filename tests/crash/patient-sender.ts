import { setTimeout as pause } from 'node:timers/promises';
import { receivedFilesSchema, type ReceivedFile } from '../../shared/contract/received-files';

/** Every second file has an upload key, as the page gives one; a script may send without. */
export type OutgoingFile = { sha256: string; bytes: Uint8Array<ArrayBuffer>; uploadKey: string | null };

const inFlight = 3;
const patienceMs = 150;

async function sendOnce(url: string, cookie: string, file: OutgoingFile): Promise<ReceivedFile | null> {
  const form = new FormData();
  form.append('files', new Blob([file.bytes]), `${file.sha256.slice(0, 8)}.dcm`);
  try {
    const response = await fetch(`${url}/api/dose-reports`, {
      method: 'POST',
      headers: file.uploadKey ? { cookie, 'upload-key': file.uploadKey } : { cookie },
      body: form,
      signal: AbortSignal.timeout(30_000),
    });
    if (response.status >= 500) return null;
    if (!response.ok) throw new Error(`refused with ${response.status}: ${await response.text()}`);
    return receivedFilesSchema.parse(await response.json()).results[0] ?? null;
  } catch (error) {
    // No answer, or half of one: nobody knows whether the file arrived.
    if (error instanceof TypeError || (error as Error).name === 'TimeoutError') return null;
    throw error;
  }
}

/**
 * Sends files as a page with a bad connection would: three at a time, each again until it is acknowledged.
 * `onAcknowledged` is told how many are.
 */
export async function sendPatiently(
  url: string,
  cookie: string,
  files: readonly OutgoingFile[],
  onAcknowledged: (count: number) => void,
): Promise<{ acknowledged: Map<string, ReceivedFile>; failedTries: number }> {
  const acknowledged = new Map<string, ReceivedFile>();
  const waiting = [...files];
  let failedTries = 0;
  async function work(): Promise<void> {
    for (let file = waiting.shift(); file; file = waiting.shift()) {
      const result = await sendOnce(url, cookie, file);
      if (result) {
        acknowledged.set(file.sha256, result);
        onAcknowledged(acknowledged.size);
      } else {
        failedTries += 1;
        waiting.push(file);
        await pause(patienceMs);
      }
    }
  }
  await Promise.all(Array.from({ length: inFlight }, work));
  return { acknowledged, failedTries };
}
