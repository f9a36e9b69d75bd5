/** A picture whose structure does not hold: it is not what its first bytes say. */
export class BrokenPicture extends Error {}

/** Part of the bytes; a length that reaches beyond the end breaks the picture. */
export function partOf(bytes: Buffer, from: number, to: number): Buffer {
  if (from < 0 || to < from || to > bytes.length) throw new BrokenPicture('a part reaches beyond the end');
  return bytes.subarray(from, to);
}
