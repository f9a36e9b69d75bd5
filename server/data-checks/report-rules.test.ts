import { expect, test } from 'vitest';
import type { SummaryInput } from '../procedures/summary-input';
import { checkOne, makeReport, resultOf } from './given-facts';

test('what the report itself tells: units, events twice, events elsewhere, another reference point', () => {
  const warned = (code: string) => ({
    input: { reports: [makeReport({ warnings: [{ code, detail: 'x in "R"' }] })] },
  });
  expect(resultOf('units', warned('unit-unknown'))).toBe('failed');
  expect(resultOf('units', warned('value-missing'))).toBe('passed');
  expect(resultOf('duplicate-events', warned('event-duplicate'))).toBe('noted');
  const shared = { sharedEvents: { count: 3, caseNumbers: ['26-00007'] } };
  expect(checkOne('shared-events', { context: shared }).detail).toBe(
    '3 irradiation events are in 26-00007 as well',
  );
  const point = (value: string) => ({
    input: {
      reports: [
        makeReport({ reportedPlanes: [{ plane: 'single', referencePointDefinition: { code: { value } } }] }),
      ],
    },
  });
  expect(resultOf('reference-point', point('113860'))).toBe('passed');
  expect(resultOf('reference-point', point('113861'))).toBe('noted');
});

test('a patient of 1.75 kg or 175 m', () => {
  const size = (patientWeightKg: number | null, patientHeightM: number | null) => ({
    input: { procedure: { patientWeightKg, patientHeightM } as SummaryInput['procedure'] },
  });
  expect(resultOf('patient-weight', size(1.75, null))).toBe('noted');
  expect(resultOf('patient-weight', size(2, null))).toBe('passed');
  expect(resultOf('patient-height', size(null, 175))).toBe('noted');
  expect(resultOf('patient-height', size(null, null))).toBe('not-checked');
});
