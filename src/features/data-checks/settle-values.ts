import type { CheckDecision, DataCheck, SettlementInput } from '../../../shared/contract/data-check';
import { convertMgyToGy, convertMinutesToSeconds } from '../../../shared/units';
import { parseDecimal } from '../../lib/parse-decimal';

/** The dialog's entries, as typed: K a,r in mGy, P KA in Gy·cm², fluoroscopy time in minutes. */
export type SettleDraft = {
  chosen: string[];
  decision: CheckDecision | '';
  referenceAirKermaMgy: string;
  kermaAreaProductGyCm2: string;
  fluoroscopyTimeMin: string;
  reason: string;
};

/** What is wrong with an entry. */
export type EntryErrors = Partial<Record<keyof SettleDraft, string>>;

/** Hard findings are what keeps a procedure out: they are chosen from the start, or all where there is none. */
export function startDraft(open: readonly DataCheck[]): SettleDraft {
  const hard = open.filter(({ severity }) => severity === 'hard');
  return {
    chosen: (hard.length > 0 ? hard : open).map(({ code }) => code),
    decision: '',
    referenceAirKermaMgy: '',
    kermaAreaProductGyCm2: '',
    fluoroscopyTimeMin: '',
    reason: '',
  };
}

const inUnit = (text: string, convert: (value: number) => number): number | null => {
  const value = parseDecimal(text);
  return value === null ? null : convert(value);
};

/** What is sent: findings as they are shown, typed totals in canonical units. */
export function toSettlementInput(draft: SettleDraft, open: readonly DataCheck[]): SettlementInput {
  return {
    findings: open
      .filter(({ code }) => draft.chosen.includes(code))
      .map(({ code, finding }) => ({ ruleCode: code, finding: finding ?? '' })),
    decision: draft.decision as CheckDecision,
    corrected:
      draft.decision === 'corrected'
        ? {
            referenceAirKermaGy: inUnit(draft.referenceAirKermaMgy, convertMgyToGy),
            kermaAreaProductGyCm2: inUnit(draft.kermaAreaProductGyCm2, (value) => value),
            fluoroscopyTimeS: inUnit(draft.fluoroscopyTimeMin, convertMinutesToSeconds),
          }
        : null,
    reason: draft.reason,
  };
}

/** Field of the request → entry of the dialog: where an issue is shown. */
export function entryOf(path: string): keyof SettleDraft {
  if (path.startsWith('findings')) return 'chosen';
  if (path.endsWith('referenceAirKermaGy')) return 'referenceAirKermaMgy';
  if (path.endsWith('fluoroscopyTimeS')) return 'fluoroscopyTimeMin';
  if (path.startsWith('corrected')) return 'kermaAreaProductGyCm2';
  return path.startsWith('decision') ? 'decision' : 'reason';
}
