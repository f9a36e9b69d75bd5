import { describe, expect, it } from 'vitest';
import { settleAnchor } from './settle-anchor';

describe('settleAnchor', () => {
  it('takes the first of the given date’s month', () => {
    expect(settleAnchor('2026-07-19', new Date()).toISOString()).toBe('2026-07-01T00:00:00.000Z');
  });

  it('takes the current month at the hospital, where it may still be the month before', () => {
    const now = new Date('2026-12-01T03:00:00Z');
    expect(settleAnchor(null, now).toISOString()).toBe('2026-11-01T00:00:00.000Z');
  });
});
