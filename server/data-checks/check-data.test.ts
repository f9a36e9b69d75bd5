import { expect, test } from 'vitest';
import { checkGiven, checkOne, type Given } from './given-facts';
import { isKeptOut, plainChecking, settledFiguresOf, type Checking } from './check-data';
import { checkRules } from './check-rules';

test('every rule has a code of its own and says what it looks at and what to do', () => {
  expect(new Set(checkRules.map(({ code }) => code)).size).toBe(checkRules.length);
  for (const rule of checkRules) {
    expect(rule.looksAt.length, rule.code).toBeGreaterThan(20);
    expect(rule.remedy.length, rule.code).toBeGreaterThan(15);
    expect(rule.unit === null, rule.code).toBe(rule.low === null && rule.high === null);
  }
});

const set = (severity: 'hard' | 'note' | 'off', high = 600): Partial<Checking> => ({
  settings: new Map([['mean-field-area', { severity, owner: 'technologist', low: 4, high }]]),
});
const slip = { productGyCm2: 4300 };

test('a department’s setting decides about severity, owner and bounds', () => {
  expect(checkOne('mean-field-area', slip, set('note'))).toMatchObject({
    result: 'noted',
    owner: 'technologist',
  });
  expect(checkOne('mean-field-area', slip, set('off')).result).toBe('not-checked');
  expect(checkOne('mean-field-area', slip, set('hard', 20_000)).result).toBe('passed');
});

const decide = (decision: 'right' | 'corrected' | 'left-out', finding = '12300') => ({
  settlements: [
    {
      id: 'decision',
      ruleCode: 'mean-field-area',
      finding,
      decision,
      corrected:
        decision === 'corrected'
          ? { kermaAreaProductGyCm2: 43, referenceAirKermaGy: null, fluoroscopyTimeS: null }
          : null,
    },
  ],
});

test('a hard finding keeps a procedure out until it is settled, and a settlement holds for this finding only', () => {
  const standing = (checking: Partial<Checking>, given: Given = slip) => {
    const whole = { ...plainChecking, ...checking };
    const checks = checkGiven(given, checking);
    return [isKeptOut(checks, whole), settledFiguresOf(checks, whole)?.kermaAreaProductGyCm2 ?? null];
  };
  expect(standing({})).toEqual([true, null]);
  expect(standing(decide('right'))).toEqual([false, null]);
  expect(standing(decide('corrected'))).toEqual([false, 43]);
  expect(standing(decide('left-out'))).toEqual([true, null]);
  expect(standing(decide('corrected', '12400'))).toEqual([true, null]);
  expect(standing(decide('corrected'), {})).toEqual([false, null]);
  expect(standing(decide('right'), { productGyCm2: 4300.4 })).toEqual([false, null]);
});
