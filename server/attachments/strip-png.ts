import { BrokenPicture, partOf } from './picture-parts';

/** Chunks that say something about the picture instead of being it. */
const remarks = new Set(['eXIf', 'tEXt', 'zTXt', 'iTXt', 'tIME']);

/** A PNG without texts, times and Exif, and without anything behind its end; the pixels are the same bytes. Source: PNG 3, 5 and 11. */
export function stripPng(bytes: Buffer): Buffer {
  const kept: Buffer[] = [partOf(bytes, 0, 8)];
  let hasPixels = false;
  for (let at = 8; ;) {
    const head = partOf(bytes, at, at + 8);
    const type = head.toString('latin1', 4, 8);
    const end = at + 12 + head.readUInt32BE(0);
    const chunk = partOf(bytes, at, end);
    if (!remarks.has(type)) kept.push(chunk);
    hasPixels ||= type === 'IDAT';
    if (type === 'IEND') break;
    at = end;
  }
  if (!hasPixels) throw new BrokenPicture('there is no picture in it');
  return Buffer.concat(kept);
}
