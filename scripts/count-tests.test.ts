import { describe, expect, it } from 'vitest';
import { countTests, formatCounts } from './count-tests';

const tests = (...statuses: string[]) => statuses.map((status) => ({ status }));

describe('countTests', () => {
  it('counts a file that could not be loaded as a failure', () => {
    const counts = countTests({
      testResults: [
        { status: 'passed', assertionResults: tests('passed', 'passed') },
        { status: 'failed', assertionResults: [] },
      ],
    });
    expect(formatCounts(counts)).toBe('2 passed, 1 failed');
  });

  it('counts a failed hook of a file whose tests all passed as a failure', () => {
    const counts = countTests({ testResults: [{ status: 'failed', assertionResults: tests('passed') }] });
    expect(formatCounts(counts)).toBe('1 passed, 1 failed');
  });

  it('does not count a failed test twice, and shows what was skipped', () => {
    const counts = countTests({
      testResults: [{ status: 'failed', assertionResults: tests('failed', 'passed', 'pending', 'todo') }],
    });
    expect(formatCounts(counts)).toBe('1 passed, 1 failed, 2 skipped');
  });
});
