import { z } from 'zod';
import { calendarDateSchema, idSchema, remarkSchema } from './common';

/** `hard`: a failure keeps the procedure out of every statistic until it is settled. `note`: said beside the figures. */
export const checkSeverities = ['hard', 'note', 'off'] as const;
export type CheckSeverity = (typeof checkSeverities)[number];

/** Who is to look at a finding. */
export const checkOwners = ['physicist', 'technologist'] as const;
export type CheckOwner = (typeof checkOwners)[number];

/** `right`: the value is as reported. `corrected`: other values count. `left-out`: it stays out of every statistic. */
export const checkDecisions = ['right', 'corrected', 'left-out'] as const;
export type CheckDecision = (typeof checkDecisions)[number];

const measured = z.number('Type a number.').nonnegative('Not below zero.').nullable();

/** Totals of all planes together that count in place of the reported ones; null: as reported. */
export const settledFiguresSchema = z.object({
  referenceAirKermaGy: measured,
  kermaAreaProductGyCm2: measured,
  fluoroscopyTimeS: measured,
});
export type SettledFigures = z.infer<typeof settledFiguresSchema>;

export const checkResults = ['passed', 'noted', 'failed', 'not-checked'] as const;

/** What a physicist said about one finding; people are named to those who see every procedure. */
export const checkSettlementSchema = z.object({
  id: idSchema,
  finding: z.string(),
  decision: z.enum(checkDecisions),
  corrected: settledFiguresSchema.nullable(),
  reason: z.string(),
  decidedBy: z.string().nullable(),
  decidedAt: z.string(),
  endedBy: z.string().nullable(),
  endedAt: z.string().nullable(),
});
export type CheckSettlement = z.infer<typeof checkSettlementSchema>;

/** One rule held against one procedure, as it was when the procedure was last computed. */
export const dataCheckSchema = remarkSchema.extend({
  name: z.string(),
  /** What to do about a finding. */
  remedy: z.string(),
  result: z.enum(checkResults),
  severity: z.enum(checkSeverities),
  owner: z.enum(checkOwners),
  /** What was found, in short: a settlement holds for this finding only. Null where nothing was found. */
  finding: z.string().nullable(),
  /** What a physicist decided about this very finding, and nobody took back. */
  settlement: checkSettlementSchema.nullable(),
  /** Decisions that no longer hold: taken back, replaced, or about another finding. */
  earlier: z.array(checkSettlementSchema),
});
export type DataCheck = z.infer<typeof dataCheckSchema>;

const reason = z.string().trim().min(3, 'Say why in a few words.').max(500);

/** One decision about one or several findings, as the person saw them. */
export const settlementInputSchema = z
  .object({
    findings: z
      .array(z.object({ ruleCode: z.string().max(60), finding: z.string().max(200) }))
      .min(1, 'Choose what the decision is about.')
      .max(40),
    decision: z.enum(checkDecisions, 'Choose a decision.'),
    corrected: settledFiguresSchema.nullable(),
    reason,
  })
  .superRefine(({ decision, corrected }, issues) => {
    const hasFigure = corrected !== null && Object.values(corrected).some((value) => value !== null);
    if (decision === 'corrected' && !hasFigure)
      issues.addIssue({
        code: 'custom',
        path: ['corrected'],
        message: 'Type at least one total that counts.',
      });
    if (decision !== 'corrected' && corrected !== null)
      issues.addIssue({ code: 'custom', path: ['corrected'], message: 'Only a correction has totals.' });
  });
export type SettlementInput = z.input<typeof settlementInputSchema>;

export const endSettlementSchema = z.object({ reason });

const bound = z.number('Type a number.').nullable();
const standing = z.object({
  severity: z.enum(checkSeverities),
  owner: z.enum(checkOwners),
  low: bound,
  high: bound,
});

/** A rule of the data checks: what it is, what holds today, what held before, and what waits because of it. */
export const checkRuleSchema = z.object({
  code: z.string(),
  name: z.string(),
  looksAt: z.string(),
  /** What to do about a finding. */
  remedy: z.string(),
  source: z.string(),
  /** Unit of the bounds; null where the rule has none. */
  unit: z.string().nullable(),
  product: standing,
  inForce: standing,
  /** The department's own settings, the newest first. */
  settings: z.array(
    standing.extend({
      id: idSchema,
      validFrom: z.string(),
      reason: z.string(),
      setBy: z.string(),
      setAt: z.string(),
    }),
  ),
  /** Procedures in which the rule found something that nobody settled. */
  openCount: z.int(),
  /** Procedures with an open finding of it are being computed again. */
  isBeingRecomputed: z.boolean(),
});
export type CheckRule = z.infer<typeof checkRuleSchema>;

export const checkSettingInputSchema = standing.extend({
  validFrom: calendarDateSchema,
  reason,
  /** The newest setting that the person saw; null: there was none. */
  basedOn: idSchema.nullable(),
});
export type CheckSettingInput = z.input<typeof checkSettingInputSchema>;

/** How many procedures will be computed again. */
export const checkRecomputedSchema = z.object({ procedures: z.int() });
