import { z } from 'zod';
import { idSchema, localDateTimeSchema, namedSchema } from './common';

const measured = z.number().nullable();

/** What a record may still lack. */
export const missingParts = ['procedure-type', 'operator', 'person', 'place', 'garment'] as const;
export type MissingPart = (typeof missingParts)[number];

/** Picture of a procedure in at most 64 bins: seconds from its start, air-kerma rate, kVp. */
export const stripSchema = z.object({
  spanS: z.number(),
  peakRate: z.number(),
  basis: z.enum(['reference-air-kerma', 'kerma-area-product']),
  bins: z.array(
    z.object({
      fromS: z.number(),
      toS: z.number(),
      rate: z.number(),
      kvp: measured,
      part: z.enum(['fluoroscopy', 'acquisition']),
      plane: z.enum(['A', 'B']),
    }),
  ),
});
export type Strip = z.infer<typeof stripSchema>;

export const attentionLevels = ['note', 'notify', 'act'] as const;
export type AttentionLevel = (typeof attentionLevels)[number];
export const attentionSchema = z.object({
  level: z.enum(attentionLevels),
  reasons: z.array(z.object({ level: z.enum(attentionLevels), code: z.string(), detail: z.string() })),
});

export const patientSchema = z.object({
  name: z.string().nullable(),
  id: z.string().nullable(),
  birthDate: z.string().nullable(),
  sex: z.string().nullable(),
  accessionNumber: z.string().nullable(),
});
export type Patient = z.infer<typeof patientSchema>;

export const procedureClasses = ['clinical', 'quality-control', 'phantom', 'service'] as const;

export const procedureRowSchema = z.object({
  id: idSchema,
  caseNumber: z.string(),
  startedAt: localDateTimeSchema,
  timeBasis: z.enum(['event', 'study', 'receipt']),
  procedureType: namedSchema.nullable(),
  studyDescription: z.string().nullable(),
  room: namedSchema.nullable(),
  primaryOperator: namedSchema.nullable(),
  fluoroscopyTimeS: measured,
  referenceAirKermaGy: measured,
  /** Two planes do not irradiate the same skin: their sum is an upper bound. */
  isReferenceAirKermaUpperBound: z.boolean(),
  isCorrected: z.boolean(),
  kermaAreaProductGyCm2: measured,
  kvpMean: measured,
  eventCount: z.int(),
  deviceClass: z.enum(['fluoroscopy', 'radiography']),
  procedureClass: z.enum(procedureClasses),
  strip: stripSchema.nullable(),
  attention: attentionSchema.nullable(),
  recordState: z.enum(['incomplete', 'complete']),
  missing: z.array(z.enum(missingParts)),
  isWithdrawn: z.boolean(),
  /** Where a withdrawn procedure's reports went. */
  mergedInto: z.object({ id: idSchema, caseNumber: z.string() }).nullable(),
  /** Typed from the machine's screen: no report came. */
  isManual: z.boolean(),
  /** A value failed a hard check and nobody settled it: outside every statistic. */
  isInDoubt: z.boolean(),
  /** A physicist decided that it stays outside every statistic. */
  isLeftOut: z.boolean(),
  hasOriginal: z.boolean(),
  patient: patientSchema.optional(),
});
export type ProcedureRow = z.infer<typeof procedureRowSchema>;

export const periods = ['7d', '30d', '90d', '12m', 'all'] as const;
export const periodNames: Record<(typeof periods)[number], string> = {
  '7d': 'the last 7 days',
  '30d': 'the last 30 days',
  '90d': 'the last 90 days',
  '12m': 'the last 12 months',
  all: 'all time',
};

export const procedureSorts = [
  'started',
  'fluoroscopy-time',
  'reference-air-kerma',
  'kerma-area-product',
  'kvp',
] as const;

export const procedureFilterSchema = z.object({
  type: idSchema.optional(),
  room: idSchema.optional(),
  operator: idSchema.optional(),
  period: z.enum(periods).default('90d'),
  attention: z.enum(['any', 'flagged', ...attentionLevels, 'in-doubt']).default('any'),
  record: z.enum(['any', 'incomplete', 'complete']).default('any'),
  kind: z.enum(['fluoroscopy', 'radiography', 'quality-control', 'withdrawn']).default('fluoroscopy'),
  find: z.string().trim().max(80).optional(),
  sort: z.enum(procedureSorts).default('started'),
  order: z.enum(['descending', 'ascending']).default('descending'),
  cursor: z.string().max(400).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
});
export type ProcedureFilter = z.output<typeof procedureFilterSchema>;
export type ProcedureFilterInput = z.input<typeof procedureFilterSchema>;

export const procedurePageSchema = z.object({
  items: z.array(procedureRowSchema),
  nextCursor: z.string().nullable(),
});
export type ProcedurePage = z.infer<typeof procedurePageSchema>;

export const procedureCountSchema = z.object({
  total: z.int(),
  incomplete: z.int(),
  enteredByHand: z.int(),
});
