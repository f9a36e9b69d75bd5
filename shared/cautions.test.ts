import { expect, test } from 'vitest';
import { cautions, writeCaution, type CautionKey } from './cautions';

test('a caution names the factor it rests on, and does without when there is none', () => {
  expect(writeCaution('displayed-tolerance', { ofDate: ' of 2026-03-01' })).toMatch(
    /factor of 2026-03-01\.$/,
  );
  expect(writeCaution('displayed-tolerance')).toMatch(/^The Ka,r and PKA .* factor\.$/);
});

test('no caution leaves a brace in print', () => {
  for (const key of Object.keys(cautions) as CautionKey[]) expect(writeCaution(key)).not.toMatch(/[{}]/);
});
