import { setImmediate } from 'node:timers/promises';

const megabyte = 1_048_576;

/**
 * Pieces as one run of bytes, in memory of its own. New memory costs some milliseconds a megabyte when it is first
 * touched, so the other requests get their turn after each.
 */
export async function joinBytes(pieces: readonly Uint8Array[]): Promise<Buffer<ArrayBuffer>> {
  const joined = Buffer.from(new ArrayBuffer(pieces.reduce((total, { length }) => total + length, 0)));
  let end = 0;
  for (const piece of pieces) {
    for (let start = 0; start < piece.length; start += megabyte) {
      const part = piece.subarray(start, start + megabyte);
      joined.set(part, end);
      if (Math.floor((end + part.length) / megabyte) > Math.floor(end / megabyte)) await setImmediate();
      end += part.length;
    }
  }
  return joined;
}
