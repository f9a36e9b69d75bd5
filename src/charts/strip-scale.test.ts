import { expect, test } from 'vitest';
import { buildStripScale, findBlockAt } from './strip-scale';
import type { StripBlock } from './strip.types';

const block = (from: number, to: number, height: number, side: 'above' | 'below' = 'above'): StripBlock => ({
  from,
  to,
  height,
  side,
  shade: 2,
  isPatterned: false,
});
const blocks = [block(0, 40, 100), block(10, 12, 400), block(60, 80, 100, 'below')];
const scale = buildStripScale(blocks, { from: 0, to: 100 }, 1054, 232);

test('both sides share one scale: a quarter of the rate is half as tall', () => {
  expect(scale.tall(100)).toBeCloseTo(scale.tall(400) / 2, 9);
  expect(scale.base + scale.tall(100)).toBeCloseTo(scale.plotBottom, 9);
});
test('a place on the picture reads back as the same time', () => {
  expect(scale.readX(scale.placeX(37))).toBeCloseTo(37, 9);
});
test('the pointer finds the narrow block inside the wide one, on its own side only', () => {
  const at = (time: number, py: number) => findBlockAt(blocks, scale, scale.placeX(time), py);
  expect(at(11, 20)).toBe(1);
  expect(at(30, 20)).toBe(0);
  expect(at(70, 20)).toBeNull();
  expect(at(70, scale.base + 5)).toBe(2);
});
