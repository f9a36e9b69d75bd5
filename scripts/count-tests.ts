import { existsSync, readFileSync } from 'node:fs';

/** The part of vitest's JSON report that is counted. */
interface Report {
  testResults: { status: string; assertionResults: { status: string }[] }[];
}

export interface TestCounts {
  passed: number;
  failed: number;
  skipped: number;
}

/**
 * Counts the tests of a report. A file that could not be loaded has no tests of its own: it counts as
 * one failure. Whatever neither passed nor failed was skipped.
 */
export function countTests({ testResults }: Report): TestCounts {
  const counts: TestCounts = { passed: 0, failed: 0, skipped: 0 };
  for (const { status, assertionResults } of testResults) {
    const failedBefore = counts.failed;
    for (const test of assertionResults) {
      if (test.status === 'passed') counts.passed += 1;
      else if (test.status === 'failed') counts.failed += 1;
      else counts.skipped += 1;
    }
    if (status === 'failed' && counts.failed === failedBefore) counts.failed += 1;
  }
  return counts;
}

/** Counts the tests in a report file; no file means that none ran. */
export function countTestsInFile(file: string): TestCounts {
  if (!existsSync(file)) return { passed: 0, failed: 0, skipped: 0 };
  return countTests(JSON.parse(readFileSync(file, 'utf8')) as Report);
}

/** The line that ends `npm test`. */
export function formatCounts({ passed, failed, skipped }: TestCounts): string {
  return `${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ''}`;
}
