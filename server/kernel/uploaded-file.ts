import type { FileHandle } from 'node:fs/promises';

/** A zip archive in a nameless file on disk. Whoever is handed it closes it. */
export type UploadedArchive = { kind: 'archive'; handle: FileHandle; byteCount: number; sha256: string };

/** What came in one file field: an ordinary file in memory, or an archive. */
export type UploadedContent = { kind: 'file'; buffer: Buffer } | UploadedArchive;

export type UploadedFile = { fileName: string; content: UploadedContent };
