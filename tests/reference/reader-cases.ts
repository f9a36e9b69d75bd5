import { sequenceElement, type DataSet } from '../../server/dicom-writer/data-element';
import type { DoseReportContent, WrittenEvent } from '../../server/dicom-writer/dose-report-content';
import { doseReportDataSet, writeDoseReport } from '../../server/dicom-writer/write-dose-report';
import { writeFile, type FileOptions } from '../../server/dicom-writer/write-file';
import { changeEveryItem, changeItems, conceptOf } from '../../scripts/samples/edit-content';
import { readDoseReport } from '../../server/dicom/read-dose-report';

export const event = (overrides: Partial<WrittenEvent> = {}): WrittenEvent => ({
  irradiationEventUid: '2.25.5001',
  plane: 'single',
  type: 'fluoroscopy',
  startedAt: '2026-03-04T09:00:00',
  kermaAreaProductGyCm2: 1.5,
  referenceAirKermaGy: 0.012,
  kvpValues: [80],
  ...overrides,
});

export const content = (overrides: Partial<DoseReportContent> = {}): DoseReportContent => ({
  sopInstanceUid: '2.25.1001',
  studyInstanceUid: '2.25.1002',
  seriesInstanceUid: '2.25.1003',
  studyAt: '2026-03-04T08:00:00',
  contentAt: '2026-03-04T10:00:00',
  patient: { name: 'Fernhill^Ada', id: 'MCR1' },
  equipment: { manufacturer: 'Quillon Roentgen', deviceUid: '2.25.1004' },
  planes: [{ plane: 'single', kermaAreaProductGyCm2: 1.5, referenceAirKermaGy: 0.012, fluoroscopyTimeS: 60 }],
  events: [event()],
  ...overrides,
});

export function read(bytes: Uint8Array) {
  const reading = readDoseReport(bytes);
  if (reading.outcome !== 'read') throw new Error(`${reading.reason.code}: ${reading.reason.detail}`);
  return { ...reading, codes: reading.warnings.map((warning) => warning.code) };
}

export const readContent = (overrides: Partial<DoseReportContent> = {}, options?: FileOptions) =>
  read(writeDoseReport(content(overrides), options));

/** The report with its root's content items rewritten. */
export function withItems(change: (items: DataSet[]) => DataSet[], options?: FileOptions): Uint8Array {
  return writeFile(
    doseReportDataSet(content()).map((element) =>
      element.tag === 0x0040a730 ? sequenceElement(0x0040a730, change(element.value as DataSet[])) : element,
    ),
    options,
  );
}

/** The report with the items of its one event rewritten. */
export function withEventItems(change: (items: DataSet[]) => DataSet[], options?: FileOptions): Uint8Array {
  return writeFile(
    changeEveryItem(doseReportDataSet(content()), (item) =>
      conceptOf(item) === '113706' ? changeItems(item, change) : item,
    ),
    options,
  );
}
