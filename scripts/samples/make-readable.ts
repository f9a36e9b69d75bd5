import type { DataSet } from '../../server/dicom-writer/data-element';
import type { DoseReportContent } from '../../server/dicom-writer/dose-report-content';
import { doseReportDataSet } from '../../server/dicom-writer/write-dose-report';
import { writeFile, type FileOptions } from '../../server/dicom-writer/write-file';
import type { WarningCode } from '../../shared/contract/outcome';
import type { PrintedReport } from '../../shared/contract/report';
import { expectedReport } from './expected-report';
import type { Sample } from './sample';

export type ExpectedReport = Omit<PrintedReport, 'warnings'>;

export interface Further {
  options?: FileOptions;
  warningCodes?: WarningCode[];
  /** Default true. */
  isValid?: boolean;
  /** What the content cannot say: an edit of the data set before it is encoded. */
  change?: (dataSet: DataSet) => DataSet;
  /** Where the reader must find something else than what the content says. */
  expect?: (report: ExpectedReport) => ExpectedReport;
}

/** A sample that the reader reads. */
export function readable(
  name: string,
  how: string,
  content: DoseReportContent,
  { options, warningCodes = [], isValid = true, change, expect }: Further = {},
): Sample {
  const dataSet = doseReportDataSet(content);
  const report = expectedReport(content);
  return {
    fileName: `${name}.dcm`,
    how,
    isValid,
    bytes: writeFile(change ? change(dataSet) : dataSet, options),
    expected: { outcome: 'read', report: expect ? expect(report) : report, warningCodes },
  };
}

/** Some fields of single events in place of what the content says. */
export function withEvents(
  report: ExpectedReport,
  ...changes: Partial<ExpectedReport['events'][number]>[]
): ExpectedReport {
  return {
    ...report,
    events: report.events.map((event, index) => ({ ...event, ...changes[index] })),
  };
}
