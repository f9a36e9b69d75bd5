import { crc32, deflateSync } from 'node:zlib';

// Pictures as small as they can be, for tests: each says where it was taken.

const segment = (marker: number, data: Buffer) => {
  const head = Buffer.from([0xff, marker, 0, 0]);
  head.writeUInt16BE(data.length + 2, 2);
  return Buffer.concat([head, data]);
};

/** Exif with an orientation and a place: a directory of two entries, in either byte order. */
export function makeExif(orientation: number, isLittle: boolean): Buffer {
  const tiff = Buffer.alloc(8 + 2 + 2 * 12 + 4);
  const write16 = (value: number, at: number) =>
    isLittle ? tiff.writeUInt16LE(value, at) : tiff.writeUInt16BE(value, at);
  const write32 = (value: number, at: number) =>
    isLittle ? tiff.writeUInt32LE(value, at) : tiff.writeUInt32BE(value, at);
  tiff.write(isLittle ? 'II' : 'MM', 0, 'latin1');
  write16(42, 2);
  write32(8, 4);
  write16(2, 8);
  const entry = (at: number, tag: number, type: number, value: number) => {
    write16(tag, at);
    write16(type, at + 2);
    write32(1, at + 4);
    if (type === 3) write16(value, at + 8);
    else write32(value, at + 8);
  };
  entry(10, 0x0112, 3, orientation);
  // Where the directory of the place begins.
  entry(22, 0x8825, 4, 999);
  return Buffer.concat([Buffer.from('Exif\0\0', 'latin1'), tiff]);
}

export const scan = Buffer.from([0x12, 0xff, 0x00, 0x34, 0xff, 0xd0, 0x56, 0x78]);

/** The frame of a JPEG, with remarks of the maker's between its needed parts and a second picture behind its end. */
export const makeJpeg = ({ orientation = 6, isLittle = true } = {}): Buffer =>
  Buffer.concat([
    Buffer.from([0xff, 0xd8]),
    segment(0xe0, Buffer.from('JFIF\0\x01\x01\0\0\x01\0\x01\0\0', 'latin1')),
    segment(0xe1, makeExif(orientation, isLittle)),
    segment(0xe1, Buffer.from('http://ns.adobe.com/xap/1.0/\0<GPS>47.1</GPS>', 'latin1')),
    segment(0xe2, Buffer.from('ICC_PROFILE\0profile', 'latin1')),
    segment(0xfe, Buffer.from('taken at 47.1 north', 'latin1')),
    segment(0xdb, Buffer.alloc(65, 1)),
    segment(0xda, Buffer.from([1, 1, 0, 0, 63, 0])),
    scan,
    Buffer.from([0xff, 0xd9]),
    Buffer.from('a further picture, 47.1 north', 'latin1'),
  ]);

const chunk = (type: string, data: Buffer) => {
  const body = Buffer.concat([Buffer.from(type, 'latin1'), data]);
  const [length, sum] = [Buffer.alloc(4), Buffer.alloc(4)];
  length.writeUInt32BE(data.length);
  sum.writeUInt32BE(crc32(body));
  return Buffer.concat([length, body, sum]);
};

/** A PNG of one grey pixel, with a text beside it. */
export const makePng = (): Buffer =>
  Buffer.concat([
    Buffer.from('\x89PNG\r\n\x1a\n', 'latin1'),
    chunk('IHDR', Buffer.from([0, 0, 0, 1, 0, 0, 0, 1, 8, 0, 0, 0, 0])),
    chunk('tEXt', Buffer.from('Comment\0taken at 47.1 north', 'latin1')),
    chunk('IDAT', deflateSync(Buffer.from([0, 128]))),
    chunk('IEND', Buffer.alloc(0)),
    Buffer.from('47.1 north', 'latin1'),
  ]);

const riff = (type: string, data: Buffer) => {
  const size = Buffer.alloc(4);
  size.writeUInt32LE(data.length);
  return Buffer.concat([Buffer.from(type, 'latin1'), size, data, Buffer.alloc(data.length % 2)]);
};

/** The frame of a WebP with an extended header that announces Exif and XMP. */
export function makeWebp(): Buffer {
  const body = Buffer.concat([
    Buffer.from('WEBP', 'latin1'),
    riff('VP8X', Buffer.from([0x0c, 0, 0, 0, 0, 0, 0, 0, 0, 0])),
    riff('VP8L', Buffer.from([0x2f, 0, 0, 0, 0])),
    riff('EXIF', Buffer.from('taken at 47.1 north', 'latin1')),
    riff('XMP ', Buffer.from('<GPS>47.1</GPS>', 'latin1')),
  ]);
  return riff('RIFF', body);
}
