import { outcomeOfReason, type ReasonCode, type UnreadOutcome } from '../../shared/contract/outcome';
import type { Report, ReportWarning } from '../../shared/contract/report';
import { classifyContent } from './classify-content';
import type { ContentItem } from './content-tree';
import { ContentTreeBuilder } from './content-tree-builder';
import { EventReader } from './event-reader';
import type { SliceableBuffer } from './latin1-text';
import { locateDataSet } from './locate-data-set';
import { parseDoseReport } from './parse-dose-report';
import { parseHeader, type Header } from './parse-header';
import { readHeaderElements } from './read-dicom';
import { ReadFailure } from './read-failure';
import { scanDataSet } from './scan-data-set';
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

/** One reading of one file; see `readDoseReport`. */
class DoseReportReader {
  header: Header | null = null;
  private readonly warnings = new WarningCollector();
  private readonly events = new EventReader(this.warnings);

  read(bytes: Buffer): DoseReportReading {
    const located = locateDataSet(bytes);
    for (const { code, detail } of located.warnings) this.warnings.add(code, detail);
    const data = located.data as SliceableBuffer;
    const readHeader = (end: number) => {
      const elements = readHeaderElements(data.subarray(0, end) as SliceableBuffer, located.encoding);
      this.header = parseHeader(elements, this.warnings);
      return this.header;
    };
    const listener = {
      headerEnds: (contentStart: number) => {
        this.events.utcOffset = readHeader(contentStart).utcOffset;
      },
      takeEvent: (event: ContentItem) => this.events.add(event),
      notice: this.warnings.add,
    };
    const builder = new ContentTreeBuilder(data, listener, located.encoding.isBigEndian);
    scanDataSet(data, located.encoding, builder);
    const tree = builder.finish();
    const header = this.header ?? readHeader(data.length);
    classifyContent(tree, header.sopClassUid, header.templateId);
    const { report, warnings } = parseDoseReport(header, tree.root, this.events.events, this.warnings);
    return { outcome: 'read', report, warnings, contentHash: tree.contentHash };
  }
}

/**
 * Reads an X-Ray Radiation Dose SR (PS3.16 TID 10001) from the bytes of a file: pure, never throws. One pass over the
 * bytes checks their structure, builds the content and reads each irradiation event as soon as it is complete, so
 * that one event's content at a time is in memory. `contentHash` is the SHA-256 of the content tree, the same for
 * any transfer syntax, header or character set.
 */
export function readDoseReport(bytes: Uint8Array): DoseReportReading {
  const reader = new DoseReportReader();
  try {
    return reader.read(Buffer.from(bytes.buffer, bytes.byteOffset, bytes.length));
  } catch (error) {
    return failed(error, reader.header);
  }
}
