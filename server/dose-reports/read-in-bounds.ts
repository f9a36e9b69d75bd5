import { outcomeOfReason, type ReasonCode } from '../../shared/contract/outcome';
import { readDoseReport, type DoseReportReading } from '../dicom/read-dose-report';
import { readingLimits } from './reading-limits';
import { ReadingThread } from './reading-thread';
import { TookTooLong } from './time-limit';

/** Starting a thread takes some tenths of a second; its memory is given back when no large file comes for a while. */
const keptWarmMs = 30_000;

let thread: ReadingThread | null = null;
let lastTurn: Promise<unknown> = Promise.resolve();
let idle: NodeJS.Timeout | undefined;
let closing: Error | null = null;

/** The head of a file with the UID of the deflated transfer syntax: its size says nothing of what it unpacks to. */
const isDeflated = (bytes: Buffer) => bytes.subarray(0, 2048).includes('1.2.840.10008.1.2.1.99');

/**
 * Reads the bytes of a file as `readDoseReport` does: a small one at once, a large one in a thread of its own, one
 * after another. There, what takes too long or too much memory is stopped, and the file is held.
 */
export async function readInBounds(bytes: Buffer): Promise<DoseReportReading> {
  if (bytes.length <= readingLimits.apartFromBytes && !isDeflated(bytes)) return readDoseReport(bytes);
  const turn = lastTurn.then(() => readApart(bytes));
  lastTurn = turn.catch(() => undefined);
  return turn;
}

async function readApart(bytes: Buffer): Promise<DoseReportReading> {
  clearTimeout(idle);
  try {
    if (closing) throw closing;
    thread ??= await ReadingThread.start();
    return await thread.read(bytes);
  } catch (error) {
    // Whoever closes ends the thread in the midst of reading: the file then stays received, for the next start.
    if (closing) throw closing;
    await endThread();
    return hold(reasonFor(error), error);
  } finally {
    idle = setTimeout(() => void endThread(), keptWarmMs).unref();
  }
}

async function endThread(): Promise<void> {
  const ending = thread;
  thread = null;
  await ending?.end();
}

/** Ends the reading thread and whatever it reads; a file read after that starts another. */
export async function endReading(): Promise<void> {
  clearTimeout(idle);
  closing = new Error('Reading was ended because the server stops.');
  await endThread();
  await lastTurn;
  await endThread();
  closing = null;
}

function reasonFor(error: unknown): ReasonCode {
  const { code, cause } = error as { code?: string; cause?: unknown };
  if (code === 'ERR_WORKER_OUT_OF_MEMORY') return 'limit-memory';
  return cause instanceof TookTooLong ? 'limit-time' : 'reader-failure';
}

const details: Partial<Record<ReasonCode, string>> = {
  'limit-time': `more than ${readingLimits.timeMs / 1000} s`,
  'limit-memory': `more than ${readingLimits.heapMb} MB of memory`,
};

function hold(code: ReasonCode, error: unknown): DoseReportReading {
  const detail = details[code] ?? (error instanceof Error ? error.message : String(error));
  return { outcome: outcomeOfReason(code), reason: { code, detail }, sopInstanceUid: null };
}
