import { deflateRawSync } from 'node:zlib';
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

/** Ends with an outcome that the table knows, within the second of computing that intake allows. */
function settle(bytes: Uint8Array, limitMs = 1000): string {
  const started = process.cpuUsage();
  const reading = readDoseReport(bytes);
  const { user, system } = process.cpuUsage(started);
  expect((user + system) / 1000).toBeLessThan(limitMs);
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

/** Where lengths of four bytes stand: those of items, and of sequences (explicit little endian). */
function lengthPositions(bytes: Uint8Array): number[] {
  const positions: number[] = [];
  const isAt = (position: number, ...expected: number[]) =>
    expected.every((byte, index) => bytes[position + index] === byte);
  for (let position = 0; position < bytes.length - 12; position += 2) {
    if (isAt(position, 0xfe, 0xff, 0x00, 0xe0)) positions.push(position + 4);
    if (isAt(position + 4, 0x53, 0x51, 0, 0)) positions.push(position + 8);
  }
  return positions;
}

describe('files with one length changed', () => {
  it('are refused, or read with every event', () => {
    const whole = small('explicit-little-endian');
    const positions = lengthPositions(whole);
    expect(positions.length).toBeGreaterThan(100);
    const outcomes = new Set<string>();
    for (const position of positions) {
      const stated = new DataView(whole.buffer, whole.byteOffset).getUint32(position, true);
      for (const length of [
        0,
        stated - 2,
        stated + 2,
        stated + 8,
        2 * stated,
        0x7fffffff,
        0xfffffffe,
        0xffffffff,
      ]) {
        const bytes = whole.slice();
        new DataView(bytes.buffer).setUint32(position, length >>> 0, true);
        const outcome = settle(bytes);
        outcomes.add(outcome);
        if (outcome === 'read' && stated !== length)
          expectAllEvents(bytes, `length ${length} at ${position}`);
      }
    }
    expect([...outcomes]).toEqual(expect.arrayContaining(['truncated', 'malformed']));
  });
});

function expectAllEvents(bytes: Uint8Array, what: string): void {
  const reading = readDoseReport(bytes);
  expect(reading.outcome === 'read' && reading.report.events.length, what).toBe(3);
}

describe('a content of 1.5 million empty items', () => {
  const count = 1_500_000;
  const items = Buffer.alloc(8 * count);
  for (let position = 0; position < items.length; position += 8) items.writeUInt32LE(0xe000fffe, position);
  const sequence = Buffer.from([0x40, 0x00, 0x30, 0xa7, 0x53, 0x51, 0, 0, 0, 0, 0, 0]);
  sequence.writeUInt32LE(items.length, 8);
  const start = Buffer.from([0x08, 0x00, 0x16, 0x00, 0x55, 0x49, 0x02, 0x00, 0x31, 0x00]);
  const bare = Buffer.concat([start, sequence, items]);

  it('stops at the limit in seconds and without filling the memory', () => {
    const before = process.memoryUsage().rss;
    expect(settle(bare, 3000)).toBe('limit-items');
    expect(process.memoryUsage().rss - before).toBeLessThan(150 * 1024 * 1024);
  });

  it('does so when deflated to a few kilobytes too', () => {
    const bytes = new Uint8Array(Buffer.concat([metaOf(small('deflated')), deflateRawSync(bare)]));
    expect(bytes.length).toBeLessThan(100_000);
    expect(settle(bytes, 3000)).toBe('limit-items');
  });
});

/** Preamble, prefix and group 2 of a file. */
function metaOf(file: Uint8Array): Uint8Array {
  const groupLength = new DataView(file.buffer, file.byteOffset).getUint32(140, true);
  return file.subarray(0, 144 + groupLength);
}

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
