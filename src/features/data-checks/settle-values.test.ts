import { expect, test } from 'vitest';
import type { DataCheck } from '../../../shared/contract/data-check';
import { entryOf, startDraft, toSettlementInput } from './settle-values';

const check = (code: string, severity: 'hard' | 'note') =>
  ({ code, severity, finding: `${code} 1`, result: severity === 'hard' ? 'failed' : 'noted' }) as DataCheck;
const open = [check('mean-field-area', 'hard'), check('kvp-range', 'note')];

test('hard findings are chosen from the start, notes only where nothing is hard', () => {
  expect(startDraft(open).chosen).toEqual(['mean-field-area']);
  expect(startDraft([check('kvp-range', 'note')]).chosen).toEqual(['kvp-range']);
});

test('typed totals are sent in canonical units, an empty one as none', () => {
  const draft = {
    ...startDraft(open),
    decision: 'corrected' as const,
    referenceAirKermaMgy: '350',
    fluoroscopyTimeMin: '6,5',
    reason: 'screen',
  };
  expect(toSettlementInput(draft, open)).toEqual({
    findings: [{ ruleCode: 'mean-field-area', finding: 'mean-field-area 1' }],
    decision: 'corrected',
    corrected: { referenceAirKermaGy: 0.35, kermaAreaProductGyCm2: null, fluoroscopyTimeS: 390 },
    reason: 'screen',
  });
});

test('totals typed before the decision was changed are not sent', () => {
  const draft = { ...startDraft(open), decision: 'right' as const, referenceAirKermaMgy: '350' };
  expect(toSettlementInput(draft, open).corrected).toBeNull();
});

test('an issue is shown at the entry that it is about', () => {
  expect(entryOf('corrected.referenceAirKermaGy')).toBe('referenceAirKermaMgy');
  expect(entryOf('corrected')).toBe('kermaAreaProductGyCm2');
  expect(entryOf('findings.0.finding')).toBe('chosen');
});
