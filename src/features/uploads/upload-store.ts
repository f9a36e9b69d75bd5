import { v4 } from 'uuid';
import { whySkipped } from '../../../shared/contract/skipped-file';
import { ApiProblem } from '../../lib/api-problem';
import { mayPass, pauseAfter, waitOrOnline } from './back-off';
import { pathOf } from './path-of';
import { isUnderWay, type Send, type Upload } from './upload.types';

const inFlight = 3;

/** What the list shows beside the files themselves. */
export type UploadNotes = {
  /** No connection for the moment: what waits goes on by itself. */
  isPaused: boolean;
  /** System files of the folders handed over, which were left out. */
  skippedCount: number;
};

const noNotes: UploadNotes = { isPaused: false, skippedCount: 0 };

const start = (file: File, key: number): Upload => ({
  key,
  uploadKey: v4(),
  file,
  path: pathOf(file),
  state: 'waiting',
  share: 0,
  results: [],
  archive: null,
  failure: null,
});

/** The files handed over since the page was opened; they go on while one looks at other places. */
export function createUploadStore(send: Send, onSettled: () => void, pause = waitOrOnline) {
  let uploads: readonly Upload[] = [];
  let notes = noNotes;
  let nextKey = 1;
  let failuresInARow = 0;
  const listeners = new Set<() => void>();
  const publish = (next: readonly Upload[], nextNotes: UploadNotes = notes) => {
    uploads = next;
    notes = nextNotes;
    for (const listener of listeners) listener();
  };
  const change = (key: number, part: Partial<Upload>) =>
    publish(uploads.map((item) => (item.key === key ? { ...item, ...part } : item)));

  async function run(item: Upload): Promise<void> {
    change(item.key, { state: 'sending', share: 0, failure: null });
    try {
      const answer = await send(item, (progress) => change(item.key, progress));
      failuresInARow = 0;
      change(item.key, { state: 'answered', share: 1, ...answer });
    } catch (error) {
      if (mayPass(error)) holdBack(item.key);
      else
        change(item.key, {
          state: 'failed',
          failure: error instanceof ApiProblem ? error.detail : (error as Error).message,
        });
    }
    fill();
    if (!uploads.some(isUnderWay)) onSettled();
  }

  /** The connection is gone, not the file: everything waits, and goes on with the same keys. */
  function holdBack(key: number): void {
    change(key, { state: 'waiting', share: 0 });
    if (notes.isPaused || !uploads.some(isUnderWay)) return;
    failuresInARow += 1;
    publish(uploads, { ...notes, isPaused: true });
    void pause(pauseAfter(failuresInARow)).then(() => {
      publish(uploads, { ...notes, isPaused: false });
      fill();
    });
  }

  function fill(): void {
    for (;;) {
      const next = uploads.find(({ state }) => state === 'waiting');
      const running = uploads.filter(({ state }) => state === 'sending').length;
      if (!next || notes.isPaused || running >= inFlight) return;
      void run(next);
    }
  }

  return {
    subscribe(listener: () => void) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    read: () => uploads,
    readNotes: () => notes,
    add(files: readonly File[]) {
      const wanted = files.filter((file) => whySkipped(pathOf(file)) === null);
      const skippedCount = notes.skippedCount + files.length - wanted.length;
      publish([...wanted.map((file) => start(file, nextKey++)), ...uploads], { ...notes, skippedCount });
      fill();
    },
    sendFailedAgain() {
      publish(uploads.map((item) => (item.state === 'failed' ? { ...item, state: 'waiting' } : item)));
      fill();
    },
    isBusy: () => uploads.some(isUnderWay),
    /** Whoever signs in next sees no names of files, and nothing is sent in another's name. */
    forget() {
      publish([], { ...notes, skippedCount: 0 });
    },
    /** Takes away what is done; what is under way stays. */
    clear() {
      publish(uploads.filter(isUnderWay), { ...notes, skippedCount: 0 });
    },
  };
}
