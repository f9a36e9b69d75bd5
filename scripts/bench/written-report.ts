import { writeDoseReport } from '../../server/dicom-writer/write-dose-report';
import { newUid } from './new-uid';
import { manyEventsCase } from '../samples/case-variants';

const sampleNumber = 21;

/**
 * A dose report of so many events (at most 300) as a file, with a study, report and events that no
 * database has seen before.
 */
export function writeNewReport(eventCount: number): Uint8Array<ArrayBuffer> {
  const content = manyEventsCase(sampleNumber);
  const bytes = writeDoseReport({
    ...content,
    sopInstanceUid: newUid(),
    studyInstanceUid: newUid(),
    seriesInstanceUid: newUid(),
    accessionNumber: `BM${String(Math.floor(Math.random() * 1e9))}`,
    events: content.events.slice(0, eventCount).map((event) => ({ ...event, irradiationEventUid: newUid() })),
  });
  return new Uint8Array(bytes);
}
