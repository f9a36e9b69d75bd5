import { receivedFilesSchema, type ReceivedFile } from '../../../shared/contract/received-files';
import { ApiProblem } from '../../lib/api-problem';
import { upload } from '../../lib/api';

/** One file on its way: waiting, leaving (share 0..1), read, or not sent. */
export type Upload = {
  key: number;
  file: File;
  state: 'waiting' | 'sending' | 'answered' | 'failed';
  share: number;
  result: ReceivedFile | null;
  failure: string | null;
};

const inFlight = 3;

const isUnderWay = ({ state }: Upload) => state === 'waiting' || state === 'sending';

type Send = (file: File, onProgress: (share: number) => void) => Promise<ReceivedFile>;

/** Without an answer nobody knows whether the file arrived. */
const describeFailure = ({ status, detail }: ApiProblem) => (status === 0 ? 'No answer came.' : detail);

/** One file a request, so that each has its outcome as soon as it is read. */
export const sendFile: Send = async (file, onProgress) => {
  const form = new FormData();
  form.append('files', file, file.name);
  const { results } = await upload('/api/dose-reports', form, { schema: receivedFilesSchema, onProgress });
  const [result] = results;
  if (!result) throw new Error('The server answered nothing for this file.');
  return result;
};

/** The files handed over since the page was opened; they go on while one looks at other places. */
export function createUploadStore(send: Send, onSettled: () => void) {
  let uploads: readonly Upload[] = [];
  let nextKey = 1;
  const listeners = new Set<() => void>();
  const publish = (next: readonly Upload[]) => {
    uploads = next;
    for (const listener of listeners) listener();
  };
  const change = (key: number, part: Partial<Upload>) =>
    publish(uploads.map((item) => (item.key === key ? { ...item, ...part } : item)));

  async function run(item: Upload): Promise<void> {
    change(item.key, { state: 'sending', share: 0, failure: null });
    try {
      const result = await send(item.file, (share) => change(item.key, { share }));
      change(item.key, { state: 'answered', share: 1, result });
    } catch (error) {
      change(item.key, {
        state: 'failed',
        failure: error instanceof ApiProblem ? describeFailure(error) : String(error),
      });
    }
    start();
    if (!uploads.some(isUnderWay)) onSettled();
  }

  function start(): void {
    for (;;) {
      const next = uploads.find(({ state }) => state === 'waiting');
      const running = uploads.filter(({ state }) => state === 'sending').length;
      if (!next || running >= inFlight) return;
      void run(next);
    }
  }

  return {
    subscribe(listener: () => void) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    read: () => uploads,
    add(files: readonly File[]) {
      const added = files.map((file): Upload => ({
        key: nextKey++,
        file,
        state: 'waiting',
        share: 0,
        result: null,
        failure: null,
      }));
      publish([...added, ...uploads]);
      start();
    },
    sendFailedAgain() {
      publish(uploads.map((item) => (item.state === 'failed' ? { ...item, state: 'waiting' } : item)));
      start();
    },
    isBusy: () => uploads.some(isUnderWay),
    /** Whoever signs in next sees no names of files, and nothing is sent in another's name. */
    forget() {
      publish([]);
    },
    /** Takes away what is done; what is under way stays. */
    clear() {
      publish(uploads.filter(isUnderWay));
    },
  };
}

export type UploadStore = ReturnType<typeof createUploadStore>;
