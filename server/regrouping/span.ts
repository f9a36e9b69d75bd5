/** From the first exposure to the end of the last; without an end it is a moment. */
export type Span = { startedAt: Date; endedAt: Date | null };

/** Longest pause, in hours, inside one procedure: between the end of one part and the start of the next. */
export const longestPauseH = 12;

/** Hours between the end of the earlier and the start of the later; 0 where they overlap. Midnight means nothing. */
export function pauseBetweenH(a: Span, b: Span): number {
  const [first, second] = a.startedAt <= b.startedAt ? [a, b] : [b, a];
  const endMs = (first.endedAt ?? first.startedAt).getTime();
  return Math.max(0, second.startedAt.getTime() - endMs) / 3_600_000;
}

export const mayBelongTogether = (a: Span, b: Span): boolean => pauseBetweenH(a, b) <= longestPauseH;

/** The span of several; null of none. */
export function spanOfAll(spans: Span[]): Span | null {
  const first = spans[0];
  if (!first) return null;
  const endMs = Math.max(...spans.map((span) => (span.endedAt ?? span.startedAt).getTime()));
  return {
    startedAt: new Date(Math.min(...spans.map((span) => span.startedAt.getTime()))),
    endedAt: new Date(endMs),
  };
}
