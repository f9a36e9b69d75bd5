import { expect, test } from 'vitest';
import { describeUploads } from './describe-uploads';
import type { Upload } from './upload-store';

const upload = (part: Partial<Upload>): Upload => ({
  key: 1,
  file: new File([], 'a.dcm'),
  state: 'waiting',
  share: 0,
  result: null,
  failure: null,
  ...part,
});
const stored = upload({
  state: 'answered',
  result: { fileName: 'a.dcm', outcome: 'stored', doseReportId: null, procedureId: null, reason: null },
});

test('what is under way is told against the whole', () => {
  expect(describeUploads([stored, upload({})])).toBe('1 of 2 read: 1 stored.');
});

test('a file that was not sent is not counted as read', () => {
  expect(describeUploads([stored, upload({ state: 'failed', failure: 'no network' })])).toBe(
    '1 of 2 read: 1 stored, 1 not sent.',
  );
});
