import type {
  CheckDecision,
  CheckOwner,
  CheckSeverity,
  DataCheck,
  SettledFigures,
} from '../../shared/contract/data-check';
import type { CheckContext } from './check-context';
import { noContext } from './check-context';
import type { Bounds, CheckFacts } from './check-rule';
import { checkRules } from './check-rules';

/** How a rule is to be applied; a rule without one follows the product's own setting. */
export type RuleSetting = Bounds & { severity: CheckSeverity; owner: CheckOwner };

/** A decision that nobody took back. */
export type SettlementInForce = {
  id: string;
  ruleCode: string;
  finding: string;
  decision: CheckDecision;
  corrected: SettledFigures | null;
};

/** What the checks of a procedure need beside its own figures. */
export type Checking = {
  settings: ReadonlyMap<string, RuleSetting>;
  /** The newest first. */
  settlements: readonly SettlementInForce[];
  context: CheckContext;
};

export const plainChecking: Checking = { settings: new Map(), settlements: [], context: noContext };

/** A rule's result as the procedure's row keeps it: a rule that found nothing takes little room. */
export type StoredCheck = Pick<DataCheck, 'code' | 'detail' | 'result'> & {
  /** How the rule was set when it found something. */
  severity?: CheckSeverity;
  owner?: CheckOwner;
  finding?: string;
  /** The decision about this very finding. */
  settlementId?: string | null;
};

/** Holds every rule against a procedure. A rule that is switched off is listed and not applied. */
export function checkData(facts: Omit<CheckFacts, 'context'>, checking: Checking): StoredCheck[] {
  const all: CheckFacts = { ...facts, context: checking.context };
  return checkRules.map((rule): StoredCheck => {
    const { code } = rule;
    const { severity, owner, ...bounds } = checking.settings.get(code) ?? rule;
    if (severity === 'off')
      return { code, result: 'not-checked', detail: `${rule.name}: switched off by the department.` };
    const outcome = rule.check(all, bounds);
    if (outcome.kind !== 'found') return { code, result: outcome.kind, detail: outcome.detail };
    const settlement = checking.settlements.find(
      ({ ruleCode, finding }) => ruleCode === code && finding === outcome.finding,
    );
    return {
      code,
      result: severity === 'hard' ? 'failed' : 'noted',
      detail: outcome.detail,
      severity,
      owner,
      finding: outcome.finding,
      settlementId: settlement?.id ?? null,
    };
  });
}

/** Something was found and nobody has settled it. */
export const isOpen = ({ result, settlementId }: StoredCheck): boolean =>
  (result === 'noted' || result === 'failed') && !settlementId;

/** A hard finding waits for a physicist: the value is in doubt. */
export const isDoubtful = (check: StoredCheck): boolean => check.result === 'failed' && isOpen(check);

const inForce = (checks: readonly StoredCheck[], { settlements }: Checking): SettlementInForce[] => {
  const held = new Set<string | null | undefined>(checks.map(({ settlementId }) => settlementId));
  return settlements.filter(({ id }) => held.has(id));
};

/** Outside every statistic: a hard finding is open, or a physicist left the procedure out. */
export const isKeptOut = (checks: readonly StoredCheck[], checking: Checking): boolean =>
  checks.some(isDoubtful) || inForce(checks, checking).some(({ decision }) => decision === 'left-out');

/** Totals that a physicist typed in place of the reported ones, each from the newest decision that gives it. */
export function settledFiguresOf(checks: readonly StoredCheck[], checking: Checking): SettledFigures | null {
  const corrections = inForce(checks, checking).flatMap(({ corrected }) => corrected ?? []);
  if (corrections.length === 0) return null;
  const newest = (field: keyof SettledFigures) =>
    corrections.map((correction) => correction[field]).find((value) => value !== null) ?? null;
  return {
    referenceAirKermaGy: newest('referenceAirKermaGy'),
    kermaAreaProductGyCm2: newest('kermaAreaProductGyCm2'),
    fluoroscopyTimeS: newest('fluoroscopyTimeS'),
  };
}
