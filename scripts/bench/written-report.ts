import { setTimeout } from 'node:timers/promises';
import { writeDoseReport } from '../../server/dicom-writer/write-dose-report';
import { newUid } from './new-uid';
import { manyEventsCase } from '../samples/case-variants';

const sampleNumber = 21;

/** The same event some seconds later, for each time that the sample's events have been used before. */
const later = (startedAt: string, rounds: number) =>
  new Date(Date.parse(`${startedAt}Z`) + rounds * 3000).toISOString().slice(0, -1);

/**
 * A dose report of so many events as a file, with a study, report and events that no database has seen before. A file
 * of 100 events has about 0.8 MB.
 */
export function writeNewReport(eventCount: number): Uint8Array<ArrayBuffer> {
  const content = manyEventsCase(sampleNumber);
  const given = content.events;
  const events = Array.from({ length: Math.ceil(eventCount / given.length) }, (_, round) =>
    given.map((event) => ({
      ...event,
      startedAt: later(event.startedAt, round),
      irradiationEventUid: newUid(),
    })),
  );
  const bytes = writeDoseReport({
    ...content,
    sopInstanceUid: newUid(),
    studyInstanceUid: newUid(),
    seriesInstanceUid: newUid(),
    accessionNumber: `BM${String(Math.floor(Math.random() * 1e9))}`,
    events: events.flat().slice(0, eventCount),
  });
  return new Uint8Array(bytes);
}

/** So many of them. Between two the connections kept open get a turn, to notice what the server has closed. */
export async function writeNewReports(
  fileCount: number,
  eventCount: number,
): Promise<Uint8Array<ArrayBuffer>[]> {
  const files: Uint8Array<ArrayBuffer>[] = [];
  for (let index = 0; index < fileCount; index += 1) {
    files.push(writeNewReport(eventCount));
    await setTimeout(1);
  }
  return files;
}
