import { z } from 'zod';
import { idSchema, localDateTimeSchema, namedSchema, versionSchema } from './common';

/** `merge`: a whole procedure into another. `split`: reports into a new one. `move`: reports into a known one. */
export const regroupingKinds = ['merge', 'split', 'move'] as const;
export type RegroupingKind = (typeof regroupingKinds)[number];

const measured = z.number().nullable();
const reason = z.string().trim().min(3, 'Say why in a few words.').max(500);
const someReports = z.array(idSchema).min(1, 'Choose at least one report.').max(2000);

/** The opened procedure goes into another: `version` is its own, `targetVersion` the other's. */
export const mergeInputSchema = z.object({
  targetId: idSchema,
  targetVersion: versionSchema,
  version: versionSchema,
  reason,
});
export type MergeInput = z.input<typeof mergeInputSchema>;

export const splitInputSchema = z.object({ doseReportIds: someReports, version: versionSchema, reason });
export type SplitInput = z.input<typeof splitInputSchema>;

export const moveInputSchema = mergeInputSchema.extend({ doseReportIds: someReports });
export type MoveInput = z.input<typeof moveInputSchema>;

export const regroupedSchema = z.object({
  regroupingId: idSchema,
  /** Where the reports are now. */
  procedureId: idSchema,
  caseNumber: z.string(),
});
export type Regrouped = z.infer<typeof regroupedSchema>;

export const takeBackInputSchema = z.object({
  sourceVersion: versionSchema,
  targetVersion: versionSchema,
  reason,
});
export type TakeBackInput = z.input<typeof takeBackInputSchema>;

/** One procedure before or after a regrouping; its checksum stands for its events to the last figure. */
export const groupedStateSchema = z.object({
  caseNumber: z.string(),
  reportCount: z.int(),
  eventCount: z.int(),
  checksum: z.string(),
  startedAt: localDateTimeSchema,
  fluoroscopyTimeS: measured,
  referenceAirKermaGy: measured,
  isReferenceAirKermaUpperBound: z.boolean(),
  kermaAreaProductGyCm2: measured,
  recordState: z.enum(['incomplete', 'complete']),
  isWithdrawn: z.boolean(),
});
export type GroupedState = z.infer<typeof groupedStateSchema>;

export const previewInputSchema = z.object({
  kind: z.enum(regroupingKinds),
  /** Of a merge or move. */
  targetId: idSchema.nullable(),
  /** Of a split or move. */
  doseReportIds: z.array(idSchema).max(2000),
});
export type PreviewInput = z.input<typeof previewInputSchema>;

export const previewSchema = z.object({
  /** Why it cannot be done; nothing else is told then. */
  refusal: z.string().nullable(),
  /** The opened procedure, then the other; before a split there is no other. */
  before: z.array(groupedStateSchema),
  after: z.array(groupedStateSchema),
});
export type RegroupPreview = z.infer<typeof previewSchema>;

export const regroupingSchema = z.object({
  id: idSchema,
  kind: z.enum(regroupingKinds),
  source: namedSchema,
  target: namedSchema,
  reportCount: z.int(),
  reason: z.string(),
  doneBy: z.string(),
  doneAt: z.string(),
  isUndone: z.boolean(),
  /** The newest that still holds: earlier ones wait until it is taken back. */
  canTakeBack: z.boolean(),
  sourceVersion: versionSchema,
  targetVersion: versionSchema,
});
export type RegroupingLine = z.infer<typeof regroupingSchema>;
export const regroupingsSchema = z.object({ items: z.array(regroupingSchema) });

export const candidateFilterSchema = z.object({ find: z.string().trim().max(20).optional() });

/** A procedure that reports may go to. */
export const candidateSchema = z.object({
  id: idSchema,
  caseNumber: z.string(),
  version: versionSchema,
  startedAt: localDateTimeSchema,
  room: namedSchema.nullable(),
  procedureType: namedSchema.nullable(),
  eventCount: z.int(),
  referenceAirKermaGy: measured,
  recordState: z.enum(['incomplete', 'complete']),
  isSamePatient: z.boolean(),
  isSameRoom: z.boolean(),
  /** Why the whole procedures cannot be one; null where they can. */
  refusal: z.string().nullable(),
});
export type RegroupCandidate = z.infer<typeof candidateSchema>;
export const candidatesSchema = z.object({ items: z.array(candidateSchema) });
