import { readFileSync } from 'node:fs';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { readDoseReport } from '../dicom/read-dose-report';
import { endReading, readInBounds } from './read-in-bounds';
import { readingLimits } from './reading-limits';

const large = readFileSync('samples/21-300-events.dcm');
const usual = { ...readingLimits };

beforeAll(() => expect(large.length).toBeGreaterThan(usual.apartFromBytes));
afterEach(() => Object.assign(readingLimits, usual));
afterAll(endReading);

// Starting a thread takes ten seconds where many others want the processor.
describe('readInBounds', { timeout: 120_000 }, () => {
  it('gives of a large file what reading it here gives, to the last event', async () => {
    expect(await readInBounds(large)).toEqual(readDoseReport(large));
  });

  it('answers those who wait, one after another', async () => {
    const cut = large.subarray(0, large.length - 1000);
    const outcomes = await Promise.all([large, cut, large].map(readInBounds));
    expect(outcomes.map(({ outcome }) => outcome)).toEqual(['read', 'refused', 'read']);
  });

  it('goes on with other requests while it reads', async () => {
    await readInBounds(large);
    const reading = readInBounds(large);
    const startedMs = performance.now();
    let turns = 0;
    const counting = setInterval(() => (turns += 1), 1);
    await reading;
    clearInterval(counting);
    expect(turns).toBeGreaterThan((performance.now() - startedMs) / 20);
  });

  it('holds what takes too long, and reads the next file', async () => {
    await readInBounds(large);
    Object.assign(readingLimits, { timeMs: 5 });
    expect(await readInBounds(large)).toMatchObject({ outcome: 'held', reason: { code: 'limit-time' } });
    Object.assign(readingLimits, usual);
    expect(await readInBounds(large)).toMatchObject({ outcome: 'read' });
  });

  it('holds what needs too much memory, and reads the next file', async () => {
    await endReading();
    Object.assign(readingLimits, { heapMb: 4 });
    expect(await readInBounds(large)).toMatchObject({ outcome: 'held', reason: { code: 'limit-memory' } });
    Object.assign(readingLimits, usual);
    expect(await readInBounds(large)).toMatchObject({ outcome: 'read' });
  });

  it('reads a deflated file apart, however small it is', async () => {
    const bomb = readFileSync('samples/51-deflate-bomb.dcm');
    Object.assign(readingLimits, { timeMs: 1 });
    expect(await readInBounds(bomb)).toMatchObject({ reason: { code: 'limit-time' } });
    Object.assign(readingLimits, usual);
    expect(await readInBounds(bomb)).toMatchObject({ reason: { code: 'limit-inflated-size' } });
  });

  it('gives no outcome to a file it was reading when it is ended', async () => {
    const reading = Promise.allSettled([readInBounds(large), readInBounds(large)]);
    await endReading();
    expect((await reading).map(({ status }) => status)).toEqual(['rejected', 'rejected']);
    expect(await readInBounds(large)).toMatchObject({ outcome: 'read' });
  });
});
