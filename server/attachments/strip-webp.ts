import { BrokenPicture, partOf } from './picture-parts';

/** Flags of the extended header: Exif and XMP follow. */
const remarkFlags = 0x08 | 0x04;

/** A WebP without Exif and XMP; the pixels are the same bytes. Source: RFC 9649, section 2. */
export function stripWebp(bytes: Buffer): Buffer {
  const size = partOf(bytes, 4, 8).readUInt32LE();
  const body = partOf(bytes, 12, 8 + size);
  const kept: Buffer[] = [];
  let hasPixels = false;
  for (let at = 0; at < body.length;) {
    const head = partOf(body, at, at + 8);
    const type = head.toString('latin1', 0, 4);
    const length = head.readUInt32LE(4);
    const end = Math.min(at + 8 + length + (length % 2), body.length);
    const chunk = Buffer.from(partOf(body, at, end));
    if (type === 'VP8X') chunk[8] = (chunk[8] ?? 0) & ~remarkFlags;
    if (type !== 'EXIF' && type !== 'XMP ') kept.push(chunk);
    hasPixels ||= ['VP8 ', 'VP8L', 'ANMF'].includes(type);
    at = end;
  }
  if (!hasPixels) throw new BrokenPicture('there is no picture in it');
  const stripped = Buffer.concat([Buffer.from('RIFF\0\0\0\0WEBP', 'latin1'), ...kept]);
  stripped.writeUInt32LE(stripped.length - 8, 4);
  return stripped;
}
