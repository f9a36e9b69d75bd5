import type { DoseReportReading } from '../../server/dicom/read-dose-report';
import { reasons } from '../../shared/contract/outcome';
import { reportSchema } from '../../shared/contract/report';

/** What the reader may never do, whatever the file. */
export type FaultKind = 'threw' | 'reader-failure' | 'outcome' | 'slow' | 'contract' | 'hang' | 'memory';

export interface Verdict {
  /** "read", or the code of the reason. */
  result: string;
  tookMs: number;
  fault: { kind: FaultKind; detail: string } | null;
}

export type Reader = (bytes: Uint8Array) => DoseReportReading;

/** The longest that reading a file of up to 1 MB may take. */
export const maxReadingMs = 1000;
/** Memory may be tidied up in between: what takes too long must do so every time. */
const tries = 3;

/** How long a deed took; where the machine was busy with others, how long it had a processor. */
function time<T>(deed: () => T): { value: T; tookMs: number } {
  const startedMs = performance.now();
  const usedBefore = process.cpuUsage();
  const value = deed();
  const { user, system } = process.cpuUsage(usedBefore);
  return { value, tookMs: Math.min(performance.now() - startedMs, (user + system) / 1000) };
}

function findFault(reading: DoseReportReading): Verdict['fault'] {
  if (reading.outcome === 'read') {
    const { error } = reportSchema.safeParse(reading.report);
    return error
      ? { kind: 'contract', detail: error.issues.slice(0, 3).map(describeIssue).join('; ') }
      : null;
  }
  const { code, detail } = reading.reason;
  if (code === 'reader-failure') return { kind: 'reader-failure', detail };
  return Object.hasOwn(reasons, code) && reasons[code].outcome === reading.outcome
    ? null
    : { kind: 'outcome', detail: `${reading.outcome} with ${code}` };
}

const describeIssue = (issue: { path: PropertyKey[]; message: string }) =>
  `${issue.path.map(String).join('.')}: ${issue.message}`;

/** Lets a reader read a file, and says what is wrong with how it went. */
export function judge(read: Reader, bytes: Uint8Array, limitMs = maxReadingMs): Verdict {
  try {
    const first = time(() => read(bytes));
    const reading = first.value;
    let { tookMs } = first;
    for (let again = 1; tookMs > limitMs && again < tries; again += 1)
      tookMs = Math.min(tookMs, time(() => read(bytes)).tookMs);
    const result = reading.outcome === 'read' ? 'read' : reading.reason.code;
    const isSlow = tookMs > limitMs;
    const fault = isSlow ? { kind: 'slow' as const, detail: `${tookMs.toFixed(0)} ms` } : findFault(reading);
    return { result, tookMs, fault };
  } catch (error) {
    const detail = error instanceof Error ? (error.stack ?? error.message) : String(error);
    return { result: 'threw', tookMs: 0, fault: { kind: 'threw', detail } };
  }
}
