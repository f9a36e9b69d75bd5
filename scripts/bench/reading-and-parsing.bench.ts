import { readFileSync } from 'node:fs';
import dicomParser from 'dicom-parser';
import { readDoseReport } from '../../server/dicom/read-dose-report';
import type { Bench } from './bench';
import { formatMs, timeMedianMs } from './measure';

/** What reading may add to the parse it rests on: our own aim, no outside figure. */
const targetRatio = 2;
const count = 15;

export const bench: Bench = {
  name: "Reading a 300-event report, against dicom-parser's bare parse",
  target: `own aim: under ${targetRatio} times`,
  run: async () => {
    const bytes = new Uint8Array(readFileSync('samples/21-300-events.dcm'));
    const readingMs = await timeMedianMs(count, () => {
      const reading = readDoseReport(bytes);
      if (reading.outcome !== 'read' || reading.report.events.length !== 300) throw new Error('Not read.');
    });
    const parsingMs = await timeMedianMs(count, () => dicomParser.parseDicom(bytes));
    const ratio = readingMs / parsingMs;
    return {
      measured: `${ratio.toFixed(2)} times: ${formatMs(readingMs)} and ${formatMs(parsingMs)} (medians of ${count})`,
      isMet: ratio < targetRatio,
    };
  },
};
