import type { ReportRequest } from '../../shared/contract/report';
import type { Code } from '../../shared/contract/report-parts';
import type { TextReader } from './character-set';
import { asciiOf, itemsOf, readText, type DicomDataSet } from './read-dicom';

/** The codes of a sequence in the header; an item without a code value is passed over. */
export function readHeaderCodes(dataSet: DicomDataSet, tag: string, reader: TextReader): Code[] {
  return itemsOf(dataSet, tag).flatMap((item) => {
    const value = asciiOf(item, 'x00080100') ?? asciiOf(item, 'x00080119') ?? asciiOf(item, 'x00080120');
    if (value === null) return [];
    const scheme = asciiOf(item, 'x00080102')?.trim() ?? '';
    return [{ value: value.trim(), scheme, meaning: readText(item, 'x00080104', reader) ?? '' }];
  });
}

/** Referenced Request Sequence (PS3.3 C.17.2, SR Document General). */
export function readRequests(dataSet: DicomDataSet, reader: TextReader): ReportRequest[] {
  return itemsOf(dataSet, 'x0040a370').map((item) => ({
    accessionNumber: readText(item, 'x00080050', reader)?.trim() || null,
    requestedProcedureId: readText(item, 'x00401001', reader)?.trim() || null,
    requestedProcedureDescription: readText(item, 'x00321060', reader)?.trim() || null,
    requestedProcedureCodes: readHeaderCodes(item, 'x00321064', reader),
  }));
}
