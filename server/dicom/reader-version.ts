/**
 * Counts up whenever the reader gets more or other values out of the same bytes: kept files that an earlier version
 * read, or could not read, may then be read again.
 */
export const readerVersion = '2';
