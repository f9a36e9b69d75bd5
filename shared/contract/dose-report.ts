import { z } from 'zod';
import { idSchema, remarkSchema } from './common';
import { outcomes } from './received-files';

/** One file that ever came. Fields that may carry an identity are absent for those who must not see it. */
export const doseReportSchema = z.object({
  id: idSchema,
  receivedAt: z.string(),
  receivedBy: z.string().nullable(),
  channel: z.enum(['page', 'generated', 'manual']),
  outcome: z.enum([...outcomes, 'received']),
  reasonCode: z.string().nullable(),
  byteCount: z.int().nullable(),
  /** Whether the bytes can be downloaded: the file's own, or those of the archive that it could not be taken out of. */
  hasOriginal: z.boolean(),
  /** Whether the file's own bytes are kept and a better reader could make something of them. */
  canReadAgain: z.boolean(),
  /** When the bytes of a refused file will be deleted; null: they are kept for as long as the report is. */
  keptUntil: z.string().nullable(),
  purgedAt: z.string().nullable(),
  fileName: z.string().optional(),
  archiveId: idSchema.nullable().optional(),
  archiveName: z.string().nullable().optional(),
  reasonDetail: z.string().nullable().optional(),
  procedureId: idSchema.nullable().optional(),
  eventCount: z.int().nullable(),
  warnings: z.array(remarkSchema).optional(),
});
export type DoseReport = z.infer<typeof doseReportSchema>;

export const doseReportFilterSchema = z.object({
  outcome: z.enum(['any', ...outcomes, 'received']).default('any'),
  /** Part of a file's name or of its archive's; a name may be a patient's, so it counts only for those who see names. */
  text: z.string().trim().max(100).default(''),
  /** Only the entries of one archive; empty: all files. */
  archive: z.union([z.literal(''), idSchema]).default(''),
  cursor: z.string().max(400).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
});
export type DoseReportFilter = z.input<typeof doseReportFilterSchema>;

export const doseReportPageSchema = z.object({
  items: z.array(doseReportSchema),
  nextCursor: z.string().nullable(),
  /** Files of each outcome that the text and the archive leave. */
  counts: z.record(z.string(), z.int()),
  /** Days that the bytes of refused files are kept; 0: for as long as the hospital keeps its records. */
  refusedKeepDays: z.int(),
  archiveName: z.string().nullable().optional(),
});
export type DoseReportPage = z.infer<typeof doseReportPageSchema>;
