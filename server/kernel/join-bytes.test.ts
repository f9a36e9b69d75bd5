import fc from 'fast-check';
import { expect, test } from 'vitest';
import { joinBytes } from './join-bytes';

test('pieces of any size, also none, follow one another in memory of their own', async () => {
  const pieces = fc.array(fc.uint8Array({ maxLength: 300 }), { maxLength: 20 });
  await fc.assert(
    fc.asyncProperty(pieces, async (given) => {
      const joined = await joinBytes(given);
      expect(joined.equals(Buffer.concat(given))).toBe(true);
      expect(joined.buffer.byteLength).toBe(joined.length);
    }),
  );
});

test('several megabytes stay the same, whatever is cut where, and let others through', async () => {
  const bytes = Buffer.from(Array.from({ length: 1000 }, (_, index) => index % 251));
  const large = Buffer.concat(Array.from({ length: 5000 }, () => bytes));
  let turns = 0;
  const counting = setInterval(() => (turns += 1), 0);
  const joined = await joinBytes([
    large.subarray(0, 77),
    large.subarray(77, 2_500_001),
    large.subarray(2_500_001),
  ]);
  clearInterval(counting);
  expect(joined.equals(large)).toBe(true);
  expect(turns).toBeGreaterThan(0);
});
