import { describe, expect, it } from 'vitest';
import { reasons } from '../../shared/contract/outcome';
import { writeDoseReport } from '../../server/dicom-writer/write-dose-report';
import type { WriterTransferSyntax } from '../../server/dicom-writer/write-file';
import { readDoseReport } from '../../server/dicom/read-dose-report';

const syntaxes: WriterTransferSyntax[] = [
  'explicit-little-endian',
  'implicit-little-endian',
  'explicit-big-endian',
  'deflated',
];

const small = (transferSyntax: WriterTransferSyntax, hasUndefinedLengths = false) =>
  writeDoseReport(
    {
      sopInstanceUid: '2.25.1001',
      studyInstanceUid: '2.25.1002',
      seriesInstanceUid: '2.25.1003',
      studyAt: '2026-03-04T08:00:00',
      contentAt: '2026-03-04T10:00:00',
      patient: { name: 'Fernhill^Ada', id: 'MCR1' },
      equipment: { deviceUid: '2.25.1004' },
      planes: [{ plane: 'single', kermaAreaProductGyCm2: 1.5 }],
      events: [1, 2, 3].map((index) => ({
        irradiationEventUid: `2.25.50${index}`,
        plane: 'single',
        type: 'fluoroscopy',
        startedAt: '2026-03-04T09:00:00',
        kermaAreaProductGyCm2: 0.5,
        kvpValues: [80, 81],
      })),
    },
    { transferSyntax, hasUndefinedLengths },
  );

/** Park and Miller's generator: the same files every time. */
function createRandom(seed: number): () => number {
  let state = seed;
  return () => (state = (state * 48_271) % 2_147_483_647) / 2_147_483_647;
}

/** Ends with an outcome that the table knows, within the second that intake allows. */
function settle(bytes: Uint8Array): string {
  const started = performance.now();
  const reading = readDoseReport(bytes);
  expect(performance.now() - started).toBeLessThan(1000);
  if (reading.outcome === 'read') return 'read';
  expect(reasons[reading.reason.code].outcome).toBe(reading.outcome);
  expect(reading.reason.code, reading.reason.detail).not.toBe('reader-failure');
  return reading.reason.code;
}

describe.each(syntaxes)('files in %s', (syntax) => {
  it.each([false, true])('cut anywhere are never read (undefined lengths: %s)', (hasUndefinedLengths) => {
    const whole = small(syntax, hasUndefinedLengths);
    expect(settle(whole)).toBe('read');
    const step = Math.max(1, Math.floor(whole.length / 700));
    for (let length = 0; length < whole.length - 1; length += step) {
      const outcome = settle(whole.subarray(0, length));
      expect(outcome, `cut at ${length} of ${whole.length}`).not.toBe('read');
    }
  });

  it('with flipped bits end in an outcome', () => {
    const random = createRandom(20_260_304);
    for (let round = 0; round < 600; round += 1) {
      const bytes = small(syntax, round % 2 === 0).slice();
      const flips = 1 + Math.floor(random() * 8);
      for (let flip = 0; flip < flips; flip += 1) {
        const position = Math.floor(random() * bytes.length);
        bytes[position] = (bytes[position] ?? 0) ^ (1 << Math.floor(random() * 8));
      }
      settle(bytes);
    }
  });
});

describe('files of chance', () => {
  it('end in an outcome, bare and behind a DICOM prefix', () => {
    const random = createRandom(7);
    for (let round = 0; round < 300; round += 1) {
      const bytes = Uint8Array.from({ length: Math.floor(random() * 4000) }, () =>
        Math.floor(random() * 256),
      );
      if (round % 2 === 0 && bytes.length > 140) bytes.set(new TextEncoder().encode('DICM'), 128);
      expect(settle(bytes)).not.toBe('read');
    }
  });

  it('of other kinds are no DICOM files', () => {
    const text = (value: string) => new TextEncoder().encode(value.padEnd(600, ' '));
    for (const bytes of [
      text('%PDF-1.7'),
      text('{"a":1}'),
      text('\u0089PNG\r\n'),
      text('<html>'),
      new Uint8Array(5000),
    ]) {
      expect(settle(bytes)).toBe('not-dicom');
    }
  });
});
