import { expect, test } from 'vitest';
import { judgeAttention } from './judge-attention';
import type { SummaryInput } from './summary-input';
import type { Together } from './total-together';

const input = (overrides: Partial<SummaryInput['procedure']> = {}) =>
  ({
    procedure: { fieldsOverlap: null, procedureClass: 'clinical', deviceClass: 'fluoroscopy', ...overrides },
    levels: [
      { quantity: 'reference-air-kerma', strength: 'notify', value: 3 },
      { quantity: 'reference-air-kerma', strength: 'act', value: 5 },
      { quantity: 'fluoroscopy-time', strength: 'act', value: 3600 },
    ],
  }) as SummaryInput;

const together = (
  displayed: number | null,
  corrected: number | null = null,
  fluoroscopyTimeS: number | null = 600,
): Together => ({
  fluoroscopyTimeS,
  kermaAreaProduct: { displayed: displayed === null ? null : 50, corrected: null },
  referenceAirKerma: { displayed, corrected },
  isUpperBound: false,
  isCorrected: corrected !== null,
});
const levelOf = (figures: Together, of = input()) => judgeAttention(of, figures, [], null).attentionLevel;

// Own acceptance check: 4,999, 5,000 and 5,001 mGy against a level of 5 Gy: no, yes, yes.
test.each([
  [4.999, 'notify'],
  [5, 'act'],
  [5.001, 'act'],
  [2.999, null],
  [4.9999999, 'act'],
])('%d Gy reaches %s', (kermaGy, level) => {
  expect(levelOf(together(kermaGy))).toBe(level);
});

test('the larger of displayed and corrected triggers, whichever it is', () => {
  expect(levelOf(together(4.8, 5.376))).toBe('act');
  expect(levelOf(together(5.2, 4.7))).toBe('act');
});

test('fluoroscopy time counts only where both kerma figures are missing', () => {
  expect(levelOf(together(0.5, null, 4000))).toBeNull();
  expect(levelOf(together(null, null, 4000))).toBe('act');
});

test('a failed data check is a note and never silences a level', () => {
  const failed = [{ code: 'mean-field-area', result: 'failed' as const, detail: 'a unit slip?' }];
  const reached = judgeAttention(input(), together(6), failed, null);
  expect(reached.attentionLevel).toBe('act');
  expect(reached.attentionReasons[0]?.detail).toContain('5000 mGy; value in doubt');
  expect(judgeAttention(input(), together(1), failed, null).attentionLevel).toBe('note');
});

test('a settled finding asks for nobody any more', () => {
  const settled = [
    { code: 'mean-field-area', result: 'failed' as const, detail: 'a unit slip?', settlementId: 'some id' },
  ];
  expect(judgeAttention(input(), together(1), settled, null).attentionLevel).toBeNull();
  const reached = judgeAttention(input(), together(6), settled, null);
  expect(reached.attentionReasons[0]?.detail).not.toContain('in doubt');
});

test('once a physicist typed the total in place of a wrong one, it alone decides', () => {
  const typed = (referenceAirKermaGy: number) => ({
    referenceAirKermaGy,
    kermaAreaProductGyCm2: null,
    fluoroscopyTimeS: null,
  });
  expect(judgeAttention(input(), together(350), [], typed(0.35)).attentionLevel).toBeNull();
  const reached = judgeAttention(input(), together(0.006, 0.007), [], typed(6));
  expect(reached.attentionLevel).toBe('act');
  expect(reached.attentionReasons[0]?.detail).toContain('6000 mGy as corrected by the physicist');
});

test('a phantom exposure calls for nobody', () => {
  expect(levelOf(together(20), input({ procedureClass: 'phantom' }))).toBeNull();
});
