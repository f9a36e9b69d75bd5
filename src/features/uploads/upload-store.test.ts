import { expect, test } from 'vitest';
import type { ReceivedFile } from '../../../shared/contract/received-files';
import { buildUnreachableProblem } from '../../lib/api-problem';
import { pauseAfter } from './back-off';
import { createUploadStore } from './upload-store';

const files = (count: number) => Array.from({ length: count }, (_, index) => new File(['x'], `${index}.dcm`));
const stored = (file: File) => ({
  results: [
    { fileName: file.name, outcome: 'stored', doseReportId: null, procedureId: null, reason: null },
  ] as ReceivedFile[],
  archive: null,
});

test('three files are under way at a time, and all are answered', async () => {
  let running = 0;
  let most = 0;
  const settled = new Promise<void>((resolve) => {
    const store = createUploadStore(async ({ file }) => {
      most = Math.max(most, ++running);
      await new Promise((done) => setTimeout(done, 1));
      running -= 1;
      return stored(file);
    }, resolve);
    store.add(files(20));
    expect(store.read().filter(({ state }) => state === 'sending')).toHaveLength(3);
  });
  await settled;
  expect(most).toBe(3);
});

test('a file that the server does not take holds up no other and can be sent again', async () => {
  let isDown = true;
  const done: (() => void)[] = [];
  const store = createUploadStore(
    ({ file }) =>
      isDown && file.name === '1.dcm'
        ? Promise.reject(new Error('too large'))
        : Promise.resolve(stored(file)),
    () => done.shift()?.(),
  );
  const nextSettled = () => new Promise<void>((resolve) => done.push(resolve));
  const first = nextSettled();
  store.add(files(3));
  await first;
  expect(store.read().map(({ state }) => state)).toEqual(['answered', 'failed', 'answered']);
  isDown = false;
  const second = nextSettled();
  store.sendFailedAgain();
  await second;
  expect(store.read().every(({ state }) => state === 'answered')).toBe(true);
});

test('without a connection everything waits, then goes on by itself under the same keys', async () => {
  let isOnline = false;
  const keysOf = new Map<string, Set<string>>();
  const pauses: number[] = [];
  const continues: (() => void)[] = [];
  let settle = () => undefined as void;
  const settled = new Promise<void>((resolve) => (settle = resolve));
  const store = createUploadStore(
    async ({ file, uploadKey }) => {
      keysOf.set(file.name, (keysOf.get(file.name) ?? new Set()).add(uploadKey));
      await Promise.resolve();
      if (!isOnline) throw buildUnreachableProblem();
      return stored(file);
    },
    settle,
    (ms) => {
      pauses.push(ms);
      return new Promise((resolve) => continues.push(resolve));
    },
  );
  store.add(files(5));
  const tick = () => new Promise((resolve) => setTimeout(resolve, 5));
  await tick();
  expect(store.readNotes().isPaused).toBe(true);
  expect(store.read().every(({ state }) => state === 'waiting')).toBe(true);
  continues.shift()?.();
  await tick();
  isOnline = true;
  continues.shift()?.();
  await settled;
  expect(pauses).toEqual([1000, 2000]);
  expect(store.read().every(({ state }) => state === 'answered')).toBe(true);
  expect(store.readNotes().isPaused).toBe(false);
  expect([...keysOf.values()].every((keys) => keys.size === 1)).toBe(true);
  expect(new Set([...keysOf.values()].flatMap((keys) => [...keys])).size).toBe(5);
});

test('the pauses between tries grow to half a minute', () => {
  expect([1, 2, 3, 6, 60].map(pauseAfter)).toEqual([1000, 2000, 4000, 30_000, 30_000]);
});

test('system files of a folder are left out and counted', () => {
  const store = createUploadStore(
    () => new Promise(() => undefined),
    () => undefined,
  );
  store.add([new File([''], '.DS_Store'), new File(['x'], 'a.dcm'), new File(['x'], 'DICOMDIR')]);
  expect(store.read().map(({ path }) => path)).toEqual(['a.dcm']);
  expect(store.readNotes().skippedCount).toBe(2);
});

test('clearing leaves what is under way', () => {
  const store = createUploadStore(
    () => new Promise(() => undefined),
    () => undefined,
  );
  store.add(files(5));
  store.clear();
  expect(store.read()).toHaveLength(5);
});

test('once forgotten, nothing waiting is sent and a late answer does not bring a file back', async () => {
  const answers: (() => void)[] = [];
  let sent = 0;
  const store = createUploadStore(
    ({ file }) => {
      sent += 1;
      return new Promise((resolve) => answers.push(() => resolve(stored(file))));
    },
    () => undefined,
  );
  store.add(files(5));
  store.forget();
  for (const answer of answers) answer();
  await new Promise((done) => setTimeout(done, 1));
  expect(store.read()).toEqual([]);
  expect(store.isBusy()).toBe(false);
  expect(sent).toBe(3);
});
