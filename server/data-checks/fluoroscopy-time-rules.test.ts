import { expect, test } from 'vitest';
import { resultOf } from './given-facts';

test('zero kerma with fluoroscopy, zero time with events, and kerma too much or too little for its time', () => {
  expect(resultOf('kerma-missing', { kermaGy: 0, minutes: 0.6 })).toBe('failed');
  expect(resultOf('kerma-missing', { kermaGy: 0, minutes: 0.4 })).toBe('passed');
  expect(resultOf('fluoroscopy-time-missing', { minutes: 0, events: [{ irradiationDurationS: 5 }] })).toBe(
    'failed',
  );
  expect(resultOf('fluoroscopy-time-missing', { minutes: 0 })).toBe('passed');
  expect(resultOf('kerma-rate', { kermaGy: 6.1, minutes: 10 })).toBe('noted');
  expect(resultOf('kerma-rate', { kermaGy: 5.9, minutes: 10 })).toBe('passed');
  expect(resultOf('kerma-rate', { kermaGy: 0.0004, minutes: 10 })).toBe('noted');
});

test.each([
  ['ms as s', 6500, 'failed'],
  ['s as min', 390, 'failed'],
  ['min as s', 6.5 / 60, 'failed'],
  ['the same', 6.5, 'passed'],
  ['twice', 13, 'passed'],
])('fluoroscopy time against durations: %s', (_, minutes, result) => {
  const events = [{ irradiationDurationS: 390 }];
  expect(resultOf('fluoroscopy-time-unit', { minutes, summed: { minutes: 6.5 }, events })).toBe(result);
});

test('beam-on times are no durations: nothing is concluded from them', () => {
  const events = [{ irradiationDurationS: null, exposureTimeS: 6.5 }];
  const given = { minutes: 6.5, summed: { minutes: 6.5 / 60 }, events };
  expect(resultOf('fluoroscopy-time-unit', given)).toBe('not-checked');
});

test('fluoroscopy of eleven hours, and longer than the procedure lasted', () => {
  expect(resultOf('fluoroscopy-time-range', { minutes: 660 })).toBe('failed');
  const events = [
    { irradiationDurationS: 10 },
    { irradiationDurationS: 10, startedAt: new Date('2026-11-30T10:05:00Z') },
  ];
  expect(resultOf('fluoroscopy-time-span', { minutes: 6.5, events })).toBe('noted');
  expect(resultOf('fluoroscopy-time-span', { minutes: 5, events })).toBe('passed');
});
