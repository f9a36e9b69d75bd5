// Source: the writer's input (scripts/samples), from which each sample and its expected JSON were made.
import { describe, expect, it, vi } from 'vitest';
import { readDoseReport } from '../../server/dicom/read-dose-report';
import { reportSchema, toPrintedReport } from '../../shared/contract/report';
import { readableSamples } from '../../scripts/samples/readable-samples';
import { unreadableSamples } from '../../scripts/samples/unreadable-samples';
import { expectedSamples, readBytes, readSample } from './reader-comparison';

/** Numbers within 1e-12 of each other are one; everything else must be equal. */
function expectSame(actual: unknown, expected: unknown, path: string): void {
  if (typeof expected === 'number' && typeof actual === 'number') {
    expect(Math.abs(actual - expected), path).toBeLessThanOrEqual(1e-12 * Math.abs(expected));
  } else if (typeof expected === 'object' && expected !== null) {
    expect(Object.keys(actual as object), path).toEqual(Object.keys(expected));
    for (const [key, value] of Object.entries(expected)) {
      expectSame((actual as Record<string, unknown>)[key], value, `${path}.${key}`);
    }
  } else {
    expect(actual, path).toBe(expected);
  }
}

const readable = expectedSamples.filter((sample) => sample.outcome === 'read');
const unreadable = expectedSamples.filter((sample) => sample.outcome === 'refused');

/** Writing all samples anew takes seconds, more on a busy machine. */
vi.setConfig({ testTimeout: 60_000 });

describe('samples', () => {
  it('are at least 64 and are the bytes that their descriptions give today', () => {
    const made = [...readableSamples(), ...unreadableSamples()];
    expect(made.length).toBeGreaterThanOrEqual(64);
    expect(made.map((one) => one.fileName).sort()).toEqual(expectedSamples.map((one) => one.fileName).sort());
    for (const { fileName, bytes } of made)
      expect(Buffer.compare(readBytes(fileName), bytes), fileName).toBe(0);
  });

  it.each(readable.map((sample) => [sample.fileName, sample] as const))(
    '%s is read as it was meant',
    (name, sample) => {
      const { report, warnings } = readSample(name);
      const { warnings: _warnings, ...printed } = toPrintedReport(report, warnings);
      expectSame(printed, sample.report, name);
      expect([...new Set(warnings.map((warning) => warning.code))].sort()).toEqual(
        [...(sample.warningCodes ?? [])].sort(),
      );
      expect(reportSchema.parse(report)).toEqual(report);
    },
  );

  it.each(unreadable.map((sample) => [sample.fileName, sample.reasonCode] as const))(
    '%s is not read, because: %s',
    (name, reasonCode) => {
      const reading = readDoseReport(readBytes(name));
      expect(reading).toMatchObject({ reason: { code: reasonCode } });
    },
  );
});
