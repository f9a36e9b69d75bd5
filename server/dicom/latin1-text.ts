/** Node's own slice to text, several times faster on short values than `toString`; its types leave it out. */
export type SliceableBuffer = Buffer & { latin1Slice(start: number, end: number): string };

/** Where a value ends without its padding: blanks and, for UIDs, NUL. */
export function endOfContent(bytes: Uint8Array, start: number, end: number): number {
  let last = end;
  while (last > start && (bytes[last - 1] === 0x20 || bytes[last - 1] === 0)) last -= 1;
  return last;
}

/** A value as Latin-1 without trailing padding: for codes, numbers, dates and UIDs. Null if nothing is left. */
export function sliceLatin1(bytes: SliceableBuffer, start: number, end: number): string | null {
  const last = endOfContent(bytes, start, end);
  return last > start ? bytes.latin1Slice(start, last) : null;
}
