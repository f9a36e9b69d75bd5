import type { CheckRule } from './check-rule';
import { clockRules } from './clock-rules';
import { eventRules } from './event-rules';
import { fieldAreaRules } from './field-area-rules';
import { fluoroscopyTimeRules } from './fluoroscopy-time-rules';
import { planeRules } from './plane-rules';
import { reportRules } from './report-rules';
import { totalRules } from './total-rules';

/** Every named rule, in the order in which they are shown. */
export const checkRules: readonly CheckRule[] = [
  ...fieldAreaRules,
  ...totalRules,
  ...planeRules,
  ...fluoroscopyTimeRules,
  ...eventRules,
  ...clockRules,
  ...reportRules,
];

const byCode = new Map(checkRules.map((rule) => [rule.code, rule]));

export const findRule = (code: string): CheckRule | null => byCode.get(code) ?? null;
