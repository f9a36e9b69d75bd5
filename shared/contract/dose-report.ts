import { z } from 'zod';
import { idSchema, remarkSchema } from './common';

export const outcomes = ['stored', 'duplicate', 'held', 'refused'] as const;
export type Outcome = (typeof outcomes)[number];

export const receivedFileSchema = z.object({
  fileName: z.string(),
  outcome: z.enum(outcomes),
  doseReportId: idSchema.nullable(),
  procedureId: idSchema.nullable(),
  reason: remarkSchema.nullable(),
});
export type ReceivedFile = z.infer<typeof receivedFileSchema>;

/** In the order of the files of the request. */
export const receivedFilesSchema = z.object({ results: z.array(receivedFileSchema) });

/** One file that ever came. Fields that may carry an identity are absent for those who must not see it. */
export const doseReportSchema = z.object({
  id: idSchema,
  receivedAt: z.string(),
  receivedBy: z.string().nullable(),
  channel: z.enum(['page', 'generated', 'manual']),
  outcome: z.enum([...outcomes, 'received']),
  reasonCode: z.string().nullable(),
  byteCount: z.int().nullable(),
  hasOriginal: z.boolean(),
  fileName: z.string().optional(),
  reasonDetail: z.string().nullable().optional(),
  procedureId: idSchema.nullable().optional(),
  eventCount: z.int().nullable(),
  warnings: z.array(remarkSchema).optional(),
});
export type DoseReport = z.infer<typeof doseReportSchema>;

export const doseReportFilterSchema = z.object({
  outcome: z.enum(['any', ...outcomes, 'received']).default('any'),
  cursor: z.string().max(400).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
});
export type DoseReportFilter = z.input<typeof doseReportFilterSchema>;

export const doseReportPageSchema = z.object({
  items: z.array(doseReportSchema),
  nextCursor: z.string().nullable(),
  counts: z.record(z.string(), z.int()),
});
export type DoseReportPage = z.infer<typeof doseReportPageSchema>;
