import dicomParser from 'dicom-parser';
import type { Bench } from './bench';
import { comparedReport, countFor, timeReadingMs } from './compared-reports';
import { formatMs, timeMedianMs } from './measure';

const targetRatio = 1.2;

async function compare(eventCount: number): Promise<{ ratio: number; measured: string }> {
  const report = comparedReport(eventCount);
  const readingMs = await timeReadingMs(report);
  const parsingMs = await timeMedianMs(countFor(eventCount, 15), () => dicomParser.parseDicom(report.bytes));
  const ratio = readingMs / parsingMs;
  return {
    ratio,
    measured: `${eventCount} events ${ratio.toFixed(2)} times (${formatMs(readingMs)}, ${formatMs(parsingMs)})`,
  };
}

export const bench: Bench = {
  name: "Bytes to canonical report, against dicom-parser's bare parse of the same bytes",
  target: `at most ${targetRatio} times, 300 and 3000 events`,
  run: async () => {
    const compared = [await compare(300), await compare(3000)];
    return {
      measured: `${compared.map((one) => one.measured).join('; ')}; medians`,
      isMet: compared.every(({ ratio }) => ratio <= targetRatio),
    };
  },
};
