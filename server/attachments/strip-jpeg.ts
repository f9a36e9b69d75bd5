import { readExifOrientation, writeExifOrientation } from './exif-orientation';
import { BrokenPicture, partOf } from './picture-parts';

const startOfScan = 0xda;
const endOfImage = 0xd9;
const exif = Buffer.from('Exif\0\0', 'latin1');
const colourProfile = Buffer.from('ICC_PROFILE\0', 'latin1');
const startsWith = (bytes: Buffer, head: Buffer) => bytes.subarray(0, head.length).equals(head);

/** Segments without which the pixels would look different: JFIF, colour profile, Adobe's colour transform. */
const isNeeded = (marker: number, data: Buffer) =>
  marker === 0xe0 || marker === 0xee || (marker === 0xe2 && startsWith(data, colourProfile));

/** Where the entropy-coded data of a scan end: at the next marker that is neither stuffing nor a restart. */
function findScanEnd(bytes: Buffer, from: number): number {
  for (let at = from; at + 1 < bytes.length; at++) {
    const next = bytes[at + 1] ?? 0;
    const isInside = next === 0 || next === 0xff || (next >= 0xd0 && next <= 0xd7);
    if (bytes[at] === 0xff && !isInside) return at;
  }
  throw new BrokenPicture('a scan has no end');
}

/**
 * A JPEG without what its maker wrote beside the picture: place, time, camera, comments, thumbnails and further pictures
 * behind the end. The coded pixels are the same bytes; the orientation is kept. Source: ITU-T T.81 annex B, Exif 2.3.
 */
export function stripJpeg(bytes: Buffer): Buffer {
  const kept: Buffer[] = [partOf(bytes, 0, 2)];
  let at = 2;
  let hasScan = false;
  for (;;) {
    if (bytes[at] !== 0xff) throw new BrokenPicture('a marker is missing');
    // Any number of fill bytes may stand before a marker.
    while (bytes[at + 1] === 0xff) at++;
    const marker = bytes[at + 1] ?? 0;
    if (marker === endOfImage) {
      if (!hasScan) throw new BrokenPicture('there is no picture in it');
      kept.push(partOf(bytes, at, at + 2));
      return Buffer.concat(kept);
    }
    const length = partOf(bytes, at + 2, at + 4).readUInt16BE();
    const end = at + 2 + length;
    const data = partOf(bytes, at + 4, end);
    const isApplication = marker >= 0xe0 && marker <= 0xef;
    const isComment = marker === 0xfe;
    if (marker === 0xe1 && startsWith(data, exif)) {
      const orientation = readExifOrientation(data.subarray(exif.length));
      if (orientation !== null) kept.push(writeExifOrientation(orientation));
    } else if ((!isApplication && !isComment) || isNeeded(marker, data)) kept.push(partOf(bytes, at, end));
    at = end;
    if (marker === startOfScan) {
      hasScan = true;
      const scanEnd = findScanEnd(bytes, at);
      kept.push(partOf(bytes, at, scanEnd));
      at = scanEnd;
    }
  }
}
