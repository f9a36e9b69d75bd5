import { expect, test } from 'vitest';
import { buildStripPaths } from './strip-paths';
import type { StripBlock } from './strip.types';

const frame = { width: 100, height: 28, span: 10, peak: 4 };
const block = (part: Partial<StripBlock>): StripBlock => ({
  from: 0,
  to: 5,
  height: 4,
  shade: 1,
  side: 'above',
  isPatterned: false,
  ...part,
});

test('the highest rate fills the room above the line, a quarter of it half of that', () => {
  // One plane: the line lies at 26.5, 24 px are left above it.
  expect(buildStripPaths([block({})], frame).shades[0]?.path).toBe('M0 2.5h50v24h-50z');
  expect(buildStripPaths([block({ height: 1 })], frame).shades[0]?.path).toBe('M0 14.5h50v12h-50z');
});

test('blocks of one shade share a path; what has no shade keeps its own', () => {
  const { shades } = buildStripPaths([block({}), block({ shade: null }), block({ from: 5, to: 10 })], frame);
  expect(shades.map(({ shade, path }) => [shade, path.split('M').length - 1])).toEqual([
    [1, 2],
    [null, 1],
  ]);
});

test('only acquisitions have caps, and an instant still has a breadth', () => {
  expect(buildStripPaths([block({})], frame).caps).toBe('');
  expect(buildStripPaths([block({ to: 0, isPatterned: true })], frame).caps).toBe('M-0.3 0.5h2v2h-2z');
});

test('the second plane hangs below the line', () => {
  const { base, shades } = buildStripPaths([block({ side: 'below' })], frame);
  expect(shades[0]?.path).toMatch(new RegExp(`^M0 ${base.toFixed(1)}h50v9h`));
});
