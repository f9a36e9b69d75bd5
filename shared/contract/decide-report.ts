import { z } from 'zod';
import { idSchema, localDateTimeSchema } from './common';
import { printedPlaneSchema } from './report';

/** A held report whose identity another one has: what was decided can be decided anew. */
export const conflictCodes = [
  'sop-instance-conflict',
  'sop-instance-declined',
  'sop-instance-replaced',
] as const;
export type ConflictCode = (typeof conflictCodes)[number];

export const isConflictCode = (code: string | null): code is ConflictCode =>
  conflictCodes.some((known) => known === code);

/** `keep`: the stored one stays. `replace`: this one takes its place; the other is kept and can be put back. */
export const decideInputSchema = z.object({
  decision: z.enum(['keep', 'replace']),
  /** The report that the person saw in place; null where there was none. */
  storedId: idSchema.nullable(),
  reason: z.string().trim().min(3, 'Say why in a few words.').max(500),
});
export type DecideInput = z.input<typeof decideInputSchema>;

export const decidedSchema = z.object({ doseReportId: idSchema, procedureId: idSchema.nullable() });

/** One of two reports with one identity. */
export const conflictSideSchema = z.object({
  doseReportId: idSchema,
  fileName: z.string(),
  receivedAt: z.string(),
  contentAt: z.string().nullable(),
  isPartial: z.boolean(),
  machine: z.string().nullable(),
  procedure: z.object({ id: idSchema, caseNumber: z.string() }).nullable(),
  eventCount: z.int(),
  /** Exposures that the other does not have. */
  ownEventCount: z.int(),
  firstEventAt: localDateTimeSchema.nullable(),
  lastEventAt: localDateTimeSchema.nullable(),
  planes: z.array(printedPlaneSchema),
});
export type ConflictSide = z.infer<typeof conflictSideSchema>;

export const conflictSchema = z.object({
  code: z.enum(conflictCodes),
  /** The one that counts now; null where none does. */
  stored: conflictSideSchema.nullable(),
  held: conflictSideSchema,
  isSamePatient: z.boolean().nullable(),
  isSameStudy: z.boolean().nullable(),
  /** Exposures that both have, but with other figures. */
  changedEventCount: z.int(),
});
export type ReportConflict = z.infer<typeof conflictSchema>;
