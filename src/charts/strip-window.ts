export type StripWindow = { from: number; to: number };

const leastLength = 2;

/** A window of the given length around a centre, kept inside 0..span. */
export function placeWindow(centre: number, length: number, span: number): StripWindow {
  const kept = Math.min(span, Math.max(leastLength, length));
  const from = Math.min(Math.max(0, centre - kept / 2), span - kept);
  return { from, to: from + kept };
}

/** Narrows (factor < 1) or widens the window; the anchor stays where it is on the screen. */
export function zoomWindow(window: StripWindow, factor: number, anchor: number, span: number): StripWindow {
  const length = window.to - window.from;
  const kept = Math.min(span, Math.max(leastLength, length * factor));
  const share = length > 0 ? (anchor - window.from) / length : 0.5;
  const from = Math.min(Math.max(0, anchor - share * kept), span - kept);
  return { from, to: from + kept };
}

/** Moves the window just so far that from–to is inside it; a longer stretch is met at its start. */
export function showStretch(window: StripWindow, from: number, to: number, span: number): StripWindow {
  const length = window.to - window.from;
  if (from >= window.from && to <= window.to) return window;
  if (to - from > length) return placeWindow(from + length / 2, length, span);
  return placeWindow((from + to) / 2, length, span);
}
