import { describe, expect, it } from 'vitest';
import { readDoseReport, type DoseReportReading } from '../../server/dicom/read-dose-report';
import { judge } from './judge';
import { loadSamples } from './samples';

const bytes = new Uint8Array(8);
const good = loadSamples().find(({ name }) => name === '01-single-plane.dcm')?.bytes ?? Buffer.alloc(0);
const failing = (code: string, outcome: string) => () =>
  ({ outcome, reason: { code, detail: 'x' }, sopInstanceUid: null }) as DoseReportReading;

function work(ms: number): void {
  const before = process.cpuUsage();
  const startedMs = performance.now();
  const hadMs = () => process.cpuUsage(before).user / 1000;
  while (hadMs() < ms || performance.now() - startedMs < ms);
}

describe('judge', () => {
  it('finds nothing wrong with a report that is read, nor with files refused and held', () => {
    expect(judge(readDoseReport, good)).toMatchObject({ result: 'read', fault: null });
    expect(judge(readDoseReport, bytes)).toMatchObject({ result: 'not-dicom', fault: null });
    expect(judge(failing('limit-depth', 'held'), bytes)).toMatchObject({
      result: 'limit-depth',
      fault: null,
    });
  });

  it('finds a reader that throws', () => {
    const throwing = () => {
      throw new RangeError('out of range');
    };
    expect(judge(throwing, bytes).fault).toMatchObject({ kind: 'threw' });
    expect(judge(throwing, bytes).fault?.detail).toContain('out of range');
  });

  it('finds a failure on our side behind an outcome', () => {
    expect(judge(failing('reader-failure', 'held'), bytes).fault).toMatchObject({ kind: 'reader-failure' });
  });

  it('finds a code that nobody knows, and one with the wrong outcome', () => {
    expect(judge(failing('no-such-code', 'held'), bytes).fault).toMatchObject({ kind: 'outcome' });
    expect(judge(failing('limit-depth', 'refused'), bytes).fault).toMatchObject({ kind: 'outcome' });
  });

  it('finds a reader that is slow every time, not one that is slow once', () => {
    const limitMs = 40;
    const slow = () => {
      work(2 * limitMs);
      return readDoseReport(bytes);
    };
    expect(judge(slow, bytes, limitMs).fault).toMatchObject({ kind: 'slow' });
    let calls = 0;
    const slowOnce = () => (calls++ === 0 ? slow() : readDoseReport(bytes));
    expect(judge(slowOnce, bytes, limitMs).fault).toBeNull();
  });

  it('finds a report that breaks the contract', () => {
    const spoilt = () => {
      const reading = readDoseReport(good);
      if (reading.outcome === 'read' && reading.report.events[0])
        reading.report.events[0].kvpMean = Number.NaN;
      return reading;
    };
    expect(judge(spoilt, good).fault).toMatchObject({ kind: 'contract' });
    expect(judge(spoilt, good).fault?.detail).toContain('events.0.kvpMean');
  });
});
