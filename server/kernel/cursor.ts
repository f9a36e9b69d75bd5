import { Problem } from './problem';

/** Where a page ended: the sort value of its last row and the row's id, sealed so that nobody counts on its form. */
export type Cursor = { value: string | number; id: string };

export const writeCursor = (cursor: Cursor): string =>
  Buffer.from(JSON.stringify(cursor)).toString('base64url');

export function readCursor(text: string | undefined): Cursor | null {
  if (text === undefined) return null;
  try {
    const { value, id } = JSON.parse(Buffer.from(text, 'base64url').toString()) as Partial<Cursor>;
    if (
      (typeof value === 'string' || typeof value === 'number') &&
      typeof id === 'string' &&
      /^[0-9a-f-]{36}$/.test(id)
    )
      return { value, id };
  } catch {
    // Told below, like any other text that is no cursor.
  }
  throw new Problem('invalid-input', 'The list cannot go on from there. Open it from the start.', {
    issues: [{ pointer: '/cursor', detail: 'This is not a place in the list.' }],
  });
}
