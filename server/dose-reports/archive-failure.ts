import { sentenceOfReason, type ReasonCode } from '../../shared/contract/outcome';
import { sentenceForContent } from './name-content';

/** Thrown while an archive is read: it, or the entry being read, gives nothing. */
export class ArchiveFailure extends Error {
  constructor(
    readonly code: ReasonCode,
    readonly detail: string,
  ) {
    super(`${code}: ${detail}`);
    this.name = 'ArchiveFailure';
  }
}

/** The outcome of a refused archive or entry, in words. For `not-dicom` the detail names the kind of file. */
export const refusalOf = ({ code, detail }: { code: ReasonCode; detail: string }) => ({
  outcome: 'refused' as const,
  reasonCode: code,
  reasonDetail: code === 'not-dicom' ? sentenceForContent(detail) : `${sentenceOfReason(code)} (${detail})`,
});
