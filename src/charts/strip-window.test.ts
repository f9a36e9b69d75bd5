import { expect, test } from 'vitest';
import { placeWindow, showStretch, zoomWindow } from './strip-window';

test('zooming keeps the point under the pointer in its place', () => {
  const zoomed = zoomWindow({ from: 0, to: 1000 }, 0.5, 250, 1000);
  expect(zoomed).toEqual({ from: 125, to: 625 });
  expect((250 - zoomed.from) / (zoomed.to - zoomed.from)).toBeCloseTo(0.25, 12);
});
test('a window never leaves the recording', () => {
  expect(zoomWindow({ from: 0, to: 100 }, 40, 10, 1000)).toEqual({ from: 0, to: 1000 });
  expect(placeWindow(990, 100, 1000)).toEqual({ from: 900, to: 1000 });
});
test('what is already in sight moves nothing', () => {
  const window = { from: 100, to: 200 };
  expect(showStretch(window, 120, 130, 1000)).toBe(window);
  expect(showStretch(window, 300, 310, 1000)).toEqual({ from: 255, to: 355 });
});
test('a stretch longer than the window is met at its start', () => {
  expect(showStretch({ from: 0, to: 100 }, 400, 700, 1000)).toEqual({ from: 400, to: 500 });
});
