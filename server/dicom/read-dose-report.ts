import { outcomeOfReason, type ReasonCode, type UnreadOutcome } from '../../shared/contract/outcome';
import type { Report, ReportWarning } from '../../shared/contract/report';
import { classifyContent } from './classify-content';
import { hashContent } from './content-hash';
import { ContentTreeReader } from './content-tree';
import { parseDoseReport } from './parse-dose-report';
import { parseHeader, readTemplateId, type Header } from './parse-header';
import { readDicom } from './read-dicom';
import { ReadFailure } from './read-failure';
import { WarningCollector } from './warning-collector';

export type DoseReportReading =
  | { outcome: 'read'; report: Report; warnings: ReportWarning[]; contentHash: string }
  | {
      outcome: UnreadOutcome;
      reason: { code: ReasonCode; detail: string };
      /** Known where the header could be read. */
      sopInstanceUid: string | null;
    };

function failed(error: unknown, header: Header | null): DoseReportReading {
  const reason =
    error instanceof ReadFailure
      ? { code: error.code, detail: error.detail }
      : { code: 'reader-failure' as const, detail: error instanceof Error ? error.message : String(error) };
  return { outcome: outcomeOfReason(reason.code), reason, sopInstanceUid: header?.sopInstanceUid ?? null };
}

/**
 * Reads an X-Ray Radiation Dose SR (PS3.16 TID 10001) from the bytes of a file: pure, never throws. `contentHash` is
 * the SHA-256 of the content tree, the same for any transfer syntax, header or character set.
 */
export function readDoseReport(bytes: Uint8Array): DoseReportReading {
  let header: Header | null = null;
  try {
    const warnings = new WarningCollector();
    const file = readDicom(bytes);
    for (const { code, detail } of file.warnings) warnings.add(code, detail);
    header = parseHeader(file.dataSet, warnings);
    const root = new ContentTreeReader(warnings.add).read(file.dataSet);
    classifyContent(root, header.sopClassUid, readTemplateId(file.dataSet));
    return { outcome: 'read', ...parseDoseReport(header, root, warnings), contentHash: hashContent(root) };
  } catch (error) {
    return failed(error, header);
  }
}
