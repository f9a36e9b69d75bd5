import type { ReasonCode } from '../../shared/contract/outcome';

/** Thrown inside the reader when a file gives no report; `readDoseReport` turns it into an outcome. */
export class ReadFailure extends Error {
  constructor(
    readonly code: ReasonCode,
    readonly detail: string,
  ) {
    super(`${code}: ${detail}`);
    this.name = 'ReadFailure';
  }
}
