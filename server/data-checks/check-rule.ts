import { formatSignificant } from '../../shared/units';
import type { CheckOwner, CheckSeverity } from '../../shared/contract/data-check';
import type { PlaneTotals } from '../../shared/contract/procedure';
import type { SummaryInput } from '../procedures/summary-input';
import type { Together } from '../procedures/total-together';
import type { CheckContext } from './check-context';

/** What a rule may look at: the procedure's own figures, and what other procedures say about them. */
export type CheckFacts = {
  input: SummaryInput;
  planes: PlaneTotals[];
  together: Together;
  context: CheckContext;
};

export type Outcome =
  | { kind: 'passed' | 'not-checked'; detail: string }
  /** `finding` stands for what was found; a settlement holds for it alone. */
  | { kind: 'found'; detail: string; finding: string };

export type Bounds = { low: number | null; high: number | null };

/** A named rule with the product's own setting; a department may set it otherwise. */
export type CheckRule = Bounds & {
  code: string;
  name: string;
  looksAt: string;
  /** What to do about a finding. */
  remedy: string;
  source: string;
  severity: Exclude<CheckSeverity, 'off'>;
  owner: CheckOwner;
  unit: string | null;
  check: (facts: CheckFacts, bounds: Bounds) => Outcome;
};

export const practice = 'common practice, from memory';
export const arithmetic = 'own arithmetic';

export const passed = (detail: string): Outcome => ({ kind: 'passed', detail });
export const notChecked = (detail: string): Outcome => ({ kind: 'not-checked', detail });

/** A finding with the marks by which it is known again: numbers to three digits, so that rounding opens nothing anew. */
export const found = (detail: string, ...marks: (number | string)[]): Outcome => ({
  kind: 'found',
  detail,
  finding: marks.map((mark) => (typeof mark === 'number' ? Number(mark.toPrecision(3)) : mark)).join(' '),
});

export const isOutside = (value: number, { low, high }: Bounds): boolean =>
  (low !== null && value < low) || (high !== null && value > high);

/** "4 to 600", "above 600", "below 4": bounds in words. */
export const writeBounds = ({ low, high }: Bounds): string =>
  low !== null && high !== null ? `${low} to ${high}` : low !== null ? `from ${low}` : `up to ${high ?? '–'}`;

/** Three significant digits, thousands apart. */
export const write = (value: number): string => formatSignificant(value, 3);

/** A share as per cent. */
export const writePercent = (share: number): string => `${write(share * 100)} %`;

/** " of plane A" where there is more than one; nothing for a single plane. */
export const ofPlane = (plane: PlaneTotals, planes: PlaneTotals[]): string =>
  planes.length > 1 && plane.plane !== null ? ` of plane ${plane.plane}` : '';

export const kermaQuantities = [
  {
    field: 'referenceAirKermaGy',
    sign: 'K a,r',
    /** As it is printed. */
    print: (value: number) => `${write(value * 1000)} mGy`,
  },
  { field: 'kermaAreaProductGyCm2', sign: 'P KA', print: (value: number) => `${write(value)} Gy·cm²` },
] as const;
