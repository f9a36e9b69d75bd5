const megabyte = 1_048_576;

/** What an archive may ask of the server; each limit has a sentence of its own in the table of reasons. */
export const archiveLimits = {
  /** Entries of any kind, folders included. */
  entryCount: 2000,
  /** All entries together, unpacked; the environment may set another. */
  unpackedBytes: 200 * megabyte,
  /** One entry, unpacked: as large as a file sent by itself. */
  entryBytes: 64 * megabyte,
  /** Unpacked to packed size, of one entry and of the archive. Dose reports of real size stay below 40. */
  ratio: 100,
};

export type ArchiveLimits = typeof archiveLimits;
