import { z } from 'zod';
import { remarkSchema } from './common';

/** `hard`: a failure keeps the procedure out of every statistic until it is settled. `note`: said beside the figures. */
export const checkSeverities = ['hard', 'note', 'off'] as const;
export type CheckSeverity = (typeof checkSeverities)[number];

/** Who is to look at a finding. */
export const checkOwners = ['physicist', 'technologist'] as const;
export type CheckOwner = (typeof checkOwners)[number];

/** `right`: the value is as reported. `corrected`: other values count. `left-out`: it stays out of every statistic. */
export const checkDecisions = ['right', 'corrected', 'left-out'] as const;
export type CheckDecision = (typeof checkDecisions)[number];

const measured = z.number().nonnegative().nullable();

/** Totals of all planes together that count in place of the reported ones; null: as reported. */
export const settledFiguresSchema = z.object({
  referenceAirKermaGy: measured,
  kermaAreaProductGyCm2: measured,
  fluoroscopyTimeS: measured,
});
export type SettledFigures = z.infer<typeof settledFiguresSchema>;

export const checkResults = ['passed', 'noted', 'failed', 'not-checked'] as const;

export const dataCheckSchema = remarkSchema.extend({ result: z.enum(checkResults) });
export type DataCheck = z.infer<typeof dataCheckSchema>;
