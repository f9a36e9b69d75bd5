import { z } from 'zod';
import { idSchema, localDateTimeSchema, namedSchema } from './common';
import { dataCheckSchema, settledFiguresSchema } from './data-check';
import { missingParts, recordSchema } from './record';

const measured = z.number().nullable();

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

/** The totals of one plane of one machine: as reported, as summed over events, and corrected. */
const totals = z.object({
  kermaAreaProductGyCm2: measured,
  referenceAirKermaGy: measured,
  fluoroscopyTimeS: measured,
});
export const planeTotalsSchema = z.object({
  equipmentId: idSchema.nullable(),
  equipmentLabel: z.string().nullable(),
  plane: z.enum(['single', 'A', 'B', 'all']).nullable(),
  basis: z.enum(['reported', 'summed']),
  reported: totals.nullable(),
  summed: totals,
  displayed: totals,
  corrected: totals.omit({ fluoroscopyTimeS: true }),
  factors: z.object({
    kermaAreaProduct: measured,
    referenceAirKerma: measured,
    validFrom: z.string().nullable(),
  }),
  fluoroscopyKermaAreaProductGyCm2: measured,
  acquisitionKermaAreaProductGyCm2: measured,
});
export type PlaneTotals = z.infer<typeof planeTotalsSchema>;

/** Where this case lies among the procedures of its type. */
export const comparisonSchema = z.object({
  quantity: z.enum(['fluoroscopy-time', 'reference-air-kerma', 'kerma-area-product']),
  n: z.int(),
  lowerQuartile: measured,
  median: measured,
  upperQuartile: measured,
  notifyLevel: measured,
});
export type Comparison = z.infer<typeof comparisonSchema>;

/** A report of a procedure, what it is worth beside the others, and why it is here. */
export const procedureReportSchema = z.object({
  id: idSchema,
  receivedAt: z.string(),
  /** The machine's own time of writing. */
  contentAt: z.string().nullable(),
  machine: z.string().nullable(),
  eventCount: z.int().nullable(),
  isPartial: z.boolean(),
  /** Its totals are taken as reported. */
  counts: z.boolean(),
  /**
   * `adds`: a part of the sum. `superseded`: another report tells everything it tells. `repeats`: another holds
   * exactly the same exposures.
   */
  standing: z.enum(['counts', 'adds', 'superseded', 'repeats']),
  /** The report that supersedes it or that it repeats. */
  byId: idSchema.nullable(),
  /** `followed`: its study's procedure was merged into this one before it came. */
  origin: z.enum(['study', 'order', 'moved', 'followed']),
  movedBy: z.string().nullable(),
  hasOriginal: z.boolean(),
  isGenerated: z.boolean(),
  isManual: z.boolean(),
});
export type ProcedureReport = z.infer<typeof procedureReportSchema>;

export const procedureSchema = procedureRowSchema.omit({ patient: true, strip: true }).extend({
  endedAt: localDateTimeSchema.nullable(),
  planes: z.array(planeTotalsSchema),
  fieldsOverlap: z.boolean().nullable(),
  comparisons: z.array(comparisonSchema),
  /** Totals that a physicist typed in place of wrong ones; they alone count and decide about levels. */
  settledFigures: settledFiguresSchema.nullable(),
  dataChecks: z.array(dataCheckSchema),
  reports: z.array(procedureReportSchema),
  record: recordSchema,
  history: z.array(
    z.object({ at: z.string(), by: z.string(), action: z.string(), reason: z.string().nullable() }),
  ),
});
export type Procedure = z.infer<typeof procedureSchema>;

/** A mark that a physicist (class, overlap of fields) or the record's owner (withdrawal) sets, with a reason. */
export const procedureMarkSchema = z.object({
  procedureClass: z.enum(procedureClasses).optional(),
  fieldsOverlap: z.boolean().nullable().optional(),
  isWithdrawn: z.boolean().optional(),
  reason: z.string().trim().min(3, 'Say why in a few words.').max(500),
  version: z.int().min(1),
});
export type ProcedureMark = z.input<typeof procedureMarkSchema>;
