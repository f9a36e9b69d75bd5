import { parentPort } from 'node:worker_threads';
import type { ReportEvent } from '../../shared/contract/report-event';
import { readDoseReport } from '../dicom/read-dose-report';
import type { ReadingAnswer, ReadingQuestion } from './reading-messages';

/** Events in one message: some milliseconds of work for the one who takes them in. */
const eventsPerMessage = 100;

const answer = (message: ReadingAnswer) => parentPort?.postMessage(message);

let events: ReportEvent[] = [];

function read(bytes: Uint8Array): void {
  const reading = readDoseReport(bytes);
  if (reading.outcome !== 'read') return answer({ kind: 'reading', reading, eventCount: 0 });
  events = reading.report.events;
  const withoutEvents = { ...reading, report: { ...reading.report, events: [] } };
  answer({ kind: 'reading', reading: withoutEvents, eventCount: events.length });
}

parentPort?.on('message', (question: ReadingQuestion) => {
  if (question === 'next events') answer({ kind: 'events', events: events.splice(0, eventsPerMessage) });
  else read(question.bytes);
});
answer({ kind: 'ready' });
