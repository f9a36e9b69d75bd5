import { expect, test } from 'vitest';
import { makeJpeg, makePng, makeWebp, scan } from './example-pictures';
import { isHeic, readPicture } from './read-picture';

const says = (bytes: Buffer, text: string) => bytes.includes(Buffer.from(text, 'latin1'));

test.each([
  ['image/jpeg', makeJpeg()],
  ['image/png', makePng()],
  ['image/webp', makeWebp()],
])('%s is known by its content and loses every word about where it was taken', (mediaType, bytes) => {
  expect(says(bytes, '47.1')).toBe(true);
  const read = readPicture(bytes);
  expect(read?.mediaType).toBe(mediaType);
  expect(read && says(read.bytes, '47.1')).toBe(false);
});

test('a stripped picture is stripped no further', () => {
  for (const bytes of [makeJpeg(), makePng(), makeWebp()]) {
    const once = readPicture(bytes)?.bytes ?? Buffer.alloc(0);
    expect(readPicture(once)?.bytes.equals(once)).toBe(true);
  }
});

test.each([true, false])(
  'a JPEG keeps its pixels, colours and orientation (little endian: %s)',
  (isLittle) => {
    const stripped = readPicture(makeJpeg({ orientation: 8, isLittle }))?.bytes ?? Buffer.alloc(0);
    expect(stripped.includes(scan)).toBe(true);
    expect(says(stripped, 'ICC_PROFILE')).toBe(true);
    // Big-endian directory of one entry: tag 0x0112, type 3, one value, 8.
    expect(stripped.includes(Buffer.from('0001011200030000000100080000', 'hex'))).toBe(true);
    expect(stripped.includes(Buffer.from('8825', 'hex'))).toBe(false);
    expect(stripped.subarray(-2).toString('hex')).toBe('ffd9');
  },
);

test('a WebP no longer announces what was taken out', () => {
  const stripped = readPicture(makeWebp())?.bytes ?? Buffer.alloc(0);
  expect(stripped[20]).toBe(0);
  expect(stripped.readUInt32LE(4)).toBe(stripped.length - 8);
});

test.each([
  ['a text', Buffer.from('not a picture')],
  ['nothing', Buffer.alloc(0)],
  ['a JPEG cut short', makeJpeg().subarray(0, 150)],
  ['a PNG cut short', makePng().subarray(0, 40)],
  ['a page that begins like a picture', Buffer.from('\xff\xd8\xff<script>alert(1)</script>', 'latin1')],
])('%s is no picture', (_name, bytes) => {
  expect(readPicture(bytes)).toBeNull();
});

test('no cut of a picture brings the reader down', () => {
  for (const bytes of [makeJpeg(), makePng(), makeWebp()])
    for (let length = 0; length < bytes.length; length++)
      expect(() => readPicture(bytes.subarray(0, length))).not.toThrow();
});

test('HEIC is told apart, so that the words can say what to do', () => {
  expect(isHeic(Buffer.from('\0\0\0\x18ftypheic\0\0\0\0', 'latin1'))).toBe(true);
  expect(isHeic(Buffer.from('\0\0\0\x18ftypisom\0\0\0\0', 'latin1'))).toBe(false);
});
