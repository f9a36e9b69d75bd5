import { readFileSync } from 'node:fs';
import { deflateRawSync } from 'node:zlib';
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

it('what unpacks to a thousand times its size is stopped long before it fills the memory', () => {
  const deflated = readFileSync('samples/07-deflated.dcm');
  const implementationName = deflated.indexOf(Buffer.from([0x02, 0x00, 0x13, 0x00]));
  const dataSetStart = implementationName + 8 + deflated.readUInt16LE(implementationName + 6);
  const bomb = deflateRawSync(Buffer.alloc(30_000_000));
  expect(bomb.length).toBeLessThan(31_000);
  expect(readDoseReport(Buffer.concat([deflated.subarray(0, dataSetStart), bomb]))).toMatchObject({
    outcome: 'held',
    reason: { code: 'limit-inflated-size', detail: 'more than 16777216 bytes when inflated' },
  });
});
