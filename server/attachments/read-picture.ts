import type { PictureType } from '../../shared/contract/attachment';
import { BrokenPicture } from './picture-parts';
import { stripJpeg } from './strip-jpeg';
import { stripPng } from './strip-png';
import { stripWebp } from './strip-webp';

const latin1 = (bytes: Buffer, from: number, to: number) => bytes.toString('latin1', from, to);

/** What kind of picture the bytes are, whatever their name says. */
function findType(bytes: Buffer): PictureType | null {
  if (latin1(bytes, 0, 3) === '\xff\xd8\xff') return 'image/jpeg';
  if (latin1(bytes, 0, 8) === '\x89PNG\r\n\x1a\n') return 'image/png';
  if (latin1(bytes, 0, 4) === 'RIFF' && latin1(bytes, 8, 12) === 'WEBP') return 'image/webp';
  return null;
}

const strip = { 'image/jpeg': stripJpeg, 'image/png': stripPng, 'image/webp': stripWebp };

/** HEIC and its kin: an ISO base media file with a brand of theirs. */
export const isHeic = (bytes: Buffer): boolean =>
  latin1(bytes, 4, 8) === 'ftyp' && /^(hei[cfmsx]|hev[cx]|mif1|msf1|avif)$/.test(latin1(bytes, 8, 12));

/** A picture with its pixels as they came and nothing beside them; null for what is none, or broken. */
export function readPicture(bytes: Buffer): { mediaType: PictureType; bytes: Buffer } | null {
  const mediaType = findType(bytes);
  if (mediaType === null) return null;
  try {
    return { mediaType, bytes: strip[mediaType](bytes) };
  } catch (error) {
    if (error instanceof BrokenPicture) return null;
    throw error;
  }
}
