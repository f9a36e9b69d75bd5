import { expect, test } from 'vitest';
import type { ReceivedFile } from '../../../shared/contract/received-files';
import { createUploadStore } from './upload-store';

const files = (count: number) => Array.from({ length: count }, (_, index) => new File(['x'], `${index}.dcm`));
const stored = (file: File): ReceivedFile => ({
  fileName: file.name,
  outcome: 'stored',
  doseReportId: null,
  procedureId: null,
  reason: null,
});

test('three files are under way at a time, and all are answered', async () => {
  let running = 0;
  let most = 0;
  const settled = new Promise<void>((resolve) => {
    const store = createUploadStore(async (file) => {
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

test('a file that could not be sent holds up no other and can be sent again', async () => {
  let isDown = true;
  const done: (() => void)[] = [];
  const store = createUploadStore(
    (file) =>
      isDown && file.name === '1.dcm'
        ? Promise.reject(new Error('no network'))
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
    (file) => {
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
