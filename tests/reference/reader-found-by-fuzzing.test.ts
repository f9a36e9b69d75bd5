import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { readDoseReport } from '../../server/dicom/read-dose-report';

/** Files that made the reader fail, each as small as it could be made: found by `npm run fuzz`. */

const sample = readFileSync('samples/01-single-plane.dcm');
const contentSequence = Buffer.from([0x40, 0x00, 0x30, 0xa7, 0x53, 0x51]);
const firstElement = Buffer.from([0x08, 0x00]);

it('a data set that begins with its content, without any header, has no failure of the reader', () => {
  const content = sample.subarray(sample.indexOf(contentSequence));
  // The meta header ends where group 8 begins.
  const metaHeader = sample.subarray(0, sample.indexOf(firstElement, 140));
  const reading = readDoseReport(Buffer.concat([metaHeader, content]));
  expect(reading).toMatchObject({ outcome: 'held', reason: { code: 'other-template' } });
});
