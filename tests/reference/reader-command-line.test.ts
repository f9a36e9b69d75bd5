// Own acceptance checks of the command line that scripts and support rely on.
import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { describe, expect, it, vi } from 'vitest';
import { samplesFolder } from './reader-comparison';

/** npm, the loader and the reader start anew for each call. */
vi.setConfig({ testTimeout: 60_000 });

interface Line {
  file: string;
  outcome: string;
  reason: { code: string } | null;
  report: { events: unknown[] } | null;
}

function readReport(...files: string[]): { status: number | null; lines: Line[] } {
  const run = spawnSync('npm', ['run', '--silent', 'read-report', '--', ...files], {
    cwd: fileURLToPath(new URL('../../', import.meta.url)),
    encoding: 'utf8',
  });
  const lines = run.stdout.split('\n').filter((line) => line !== '');
  return { status: run.status, lines: lines.map((line) => JSON.parse(line) as Line) };
}

describe('npm run read-report', () => {
  it('prints one line a file and ends with 0 if all were read', () => {
    const { status, lines } = readReport('samples/01-single-plane.dcm', `${samplesFolder}02-biplane.dcm`);
    expect(status).toBe(0);
    expect(lines.map(({ outcome, reason, report }) => [outcome, reason, report?.events.length])).toEqual([
      ['read', null, 4],
      ['read', null, 7],
    ]);
    expect(lines[0]?.file).toBe('samples/01-single-plane.dcm');
  });

  it('prints refused and held files, and paths without a file, as refused with their codes and ends with 1', () => {
    const { status, lines } = readReport(
      'samples/43-text.txt',
      'samples/50-no-content.dcm',
      'samples/none.dcm',
      'samples/01-single-plane.dcm',
    );
    expect(status).toBe(1);
    expect(lines.map(({ outcome, reason }) => [outcome, reason?.code ?? null])).toEqual([
      ['refused', 'not-dicom'],
      ['refused', 'no-content'],
      ['refused', 'file-unreadable'],
      ['read', null],
    ]);
  });
});
