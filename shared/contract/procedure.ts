import { z } from 'zod';
import { idSchema, localDateTimeSchema } from './common';
import { dataCheckSchema, settledFiguresSchema } from './data-check';
import { procedureClasses, procedureRowSchema } from './procedure-row';
import { recordSchema } from './record';

const measured = z.number().nullable();

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
