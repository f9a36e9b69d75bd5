import { z } from 'zod';
import { idSchema, remarkSchema } from './common';

export const outcomes = ['stored', 'duplicate', 'held', 'refused'] as const;
export type Outcome = (typeof outcomes)[number];

/** One file and what became of it. An entry of an archive is named by its path there. */
export const receivedFileSchema = z.object({
  fileName: z.string(),
  archiveName: z.string().nullable().optional(),
  outcome: z.enum(outcomes),
  doseReportId: idSchema.nullable(),
  procedureId: idSchema.nullable(),
  reason: remarkSchema.nullable(),
});
export type ReceivedFile = z.infer<typeof receivedFileSchema>;

/** A folder or system file of an archive: seen, but nobody's dose report. */
export const skippedEntrySchema = z.object({ path: z.string(), reason: z.string() });
export type SkippedEntry = z.infer<typeof skippedEntrySchema>;

/** How far an archive has come. `entryCount` is null until its table of contents was read. */
export const receivedArchiveSchema = z.object({
  id: idSchema,
  fileName: z.string(),
  state: z.enum(['received', 'unpacked', 'refused']),
  entryCount: z.int().nullable(),
  settledCount: z.int(),
  skipped: z.array(skippedEntrySchema),
});
export type ReceivedArchive = z.infer<typeof receivedArchiveSchema>;

/**
 * Results in the order of the files of the request; the entries of an archive stand in its place, in its order. While an
 * archive is still being read the answer is 202 and the rest comes from `archives/:id`.
 */
export const receivedFilesSchema = z.object({
  results: z.array(receivedFileSchema),
  archives: z.array(receivedArchiveSchema),
});
export type ReceivedFiles = z.infer<typeof receivedFilesSchema>;

/** Results of an archive from the one numbered `after` (0: the first) on. */
export const archiveProgressFilterSchema = z.object({
  after: z.coerce.number().int().min(0).max(100_000).default(0),
});
export const archiveProgressSchema = z.object({
  archive: receivedArchiveSchema,
  results: z.array(receivedFileSchema),
});
export type ArchiveProgress = z.infer<typeof archiveProgressSchema>;
