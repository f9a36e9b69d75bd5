import { expect, test } from 'vitest';
import type { Outcome, ReceivedFile } from '../../../shared/contract/received-files';
import { describeUploads, shareOf } from './describe-uploads';
import type { Upload } from './upload.types';

const result = (outcome: Outcome): ReceivedFile => ({
  fileName: 'a.dcm',
  outcome,
  doseReportId: null,
  procedureId: null,
  reason: null,
});
const upload = (part: Partial<Upload>): Upload => ({
  key: 1,
  uploadKey: 'k',
  file: new File([], 'a.dcm'),
  path: 'a.dcm',
  state: 'waiting',
  share: 0,
  results: [],
  archive: null,
  failure: null,
  ...part,
});
const stored = upload({ state: 'answered', results: [result('stored')] });

test('what is under way is told against the whole', () => {
  expect(describeUploads([stored, upload({})])).toBe('1 of 2 read: 1 stored.');
});

test('a file that was not sent is not counted as read', () => {
  expect(describeUploads([stored, upload({ state: 'failed', failure: 'no network' })])).toBe(
    '1 of 2 read: 1 stored, 1 not sent.',
  );
});

test('an archive counts by its entries as soon as they are known', () => {
  const archive = {
    id: 'x',
    fileName: 'z.zip',
    state: 'received' as const,
    entryCount: 1000,
    settledCount: 2,
    skipped: [],
  };
  const half = upload({ state: 'sending', archive, results: [result('stored'), result('duplicate')] });
  expect(describeUploads([stored, half])).toBe('3 of 1\u202f001 read: 2 stored, 1 already here.');
  expect(shareOf([half])).toBeCloseTo(0.002);
});
