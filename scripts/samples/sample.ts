import type { ReasonCode, WarningCode } from '../../shared/contract/outcome';
import type { PrintedReport } from '../../shared/contract/report';

/** What the reader must make of a sample, known from how the sample was made. */
export type Expectation =
  | { outcome: 'read'; report: Omit<PrintedReport, 'warnings'>; warningCodes: WarningCode[] }
  | { outcome: 'refused'; reasonCode: ReasonCode };

export interface Sample {
  fileName: string;
  /** How it was made, for the table in samples/README.md. */
  how: string;
  /** True if dciodvfy finds no error in it. */
  isValid: boolean;
  bytes: Uint8Array;
  expected: Expectation;
}
