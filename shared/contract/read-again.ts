import { z } from 'zod';
import { idSchema } from './common';
import { receivedFileSchema } from './received-files';

/** What the reader makes of the same bytes, at one time. Totals are summed over the planes as reported. */
export const readingSummarySchema = z.object({
  outcome: z.enum(['stored', 'duplicate', 'held', 'refused', 'received']),
  reasonCode: z.string().nullable(),
  readerVersion: z.string().nullable(),
  eventCount: z.int().nullable(),
  kermaAreaProductGyCm2: z.number().nullable(),
  referenceAirKermaGy: z.number().nullable(),
  fluoroscopyTimeS: z.number().nullable(),
});
export type ReadingSummary = z.infer<typeof readingSummarySchema>;

export const valueChangeSchema = z.object({
  /** "event 3", "plane A", "report". */
  where: z.string(),
  field: z.string(),
  before: z.string().nullable(),
  after: z.string().nullable(),
});
export type ValueChange = z.infer<typeof valueChangeSchema>;

export const readAgainPreviewSchema = z.object({
  doseReportId: idSchema,
  fileName: z.string(),
  /**
   * `same`: only the reader's version would be noted. `changes`: values of a stored report. `becomes-readable`: a held or
   * refused file gives a report. `still-unread`: it does not. `fails`: a stored report cannot be read now and stays as it
   * is. `not-kept`: there are no bytes to read.
   */
  verdict: z.enum(['same', 'changes', 'becomes-readable', 'still-unread', 'fails', 'not-kept']),
  before: readingSummarySchema,
  after: readingSummarySchema.nullable(),
  changedCount: z.int(),
  /** The first few. */
  changes: z.array(valueChangeSchema),
  /** The reader's sentence where it gives no report now. */
  reason: z.string().nullable(),
});
export type ReadAgainPreview = z.infer<typeof readAgainPreviewSchema>;

export const readAgainFilterSchema = z.object({
  cursor: z.string().max(400).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
});

export const readAgainCandidateSchema = z.object({
  id: idSchema,
  fileName: z.string(),
  outcome: z.enum(['stored', 'held', 'refused']),
  readerVersion: z.string().nullable(),
});
export type ReadAgainCandidate = z.infer<typeof readAgainCandidateSchema>;

/** What may be read again, and what is left out for want of bytes. */
export const readAgainListSchema = z.object({
  readerVersion: z.string(),
  counts: z.object({
    stored: z.int(),
    held: z.int(),
    refused: z.int(),
    withoutBytes: z.int(),
  }),
  items: z.array(readAgainCandidateSchema),
  nextCursor: z.string().nullable(),
});
export type ReadAgainList = z.infer<typeof readAgainListSchema>;

export const readAgainChosenSchema = z.object({ ids: z.array(idSchema).min(1).max(25) });

export const readAgainResultSchema = receivedFileSchema.extend({
  verdict: readAgainPreviewSchema.shape.verdict,
  changedCount: z.int(),
});
export type ReadAgainResult = z.infer<typeof readAgainResultSchema>;
export const readAgainResultsSchema = z.object({ results: z.array(readAgainResultSchema) });
