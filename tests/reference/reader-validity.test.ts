// Source: dciodvfy of dicom3tools 1.00 (2022-06-18), a validator of DICOM objects; dcmconv of dcmtk inflates for it.
import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it, vi } from 'vitest';
import { expectedSamples, runTool, samplesFolder } from './reader-comparison';

const scratch = mkdtempSync(join(tmpdir(), 'samples-'));
afterAll(() => rmSync(scratch, { recursive: true }));

const validNames = expectedSamples.filter((sample) => sample.isValid).map((sample) => sample.fileName);

/** What the validator prints; it ends with 1 on errors and writes to the error output. */
function validate(path: string): string {
  const run = spawnSync('dciodvfy', [path], { encoding: 'utf8' });
  if (run.error) throw new Error(`dciodvfy cannot be run: ${run.error.message}`);
  return run.stdout + run.stderr;
}

function inflated(fileName: string): string {
  if (!fileName.includes('deflated')) return samplesFolder + fileName;
  const path = join(scratch, fileName);
  runTool('dcmconv', ['+te', samplesFolder + fileName, path]);
  return path;
}

/** Other programs and 300 events on a busy machine. */
vi.setConfig({ testTimeout: 60_000 });

describe('samples that claim to be valid', () => {
  it.each(validNames)('%s has no error for dciodvfy', (fileName) => {
    const printed = validate(inflated(fileName));
    expect(printed).toContain('SR');
    expect(printed.split('\n').filter((line) => /\berror\b/i.test(line))).toEqual([]);
  });

  it('would be found out: dciodvfy names the comma in a decimal string', () => {
    expect(validate(samplesFolder + '16-unknown-unit.dcm')).toMatch(/Error.*Numeric Value/);
  });
});
