// Source: dsrdump of dcmtk 3.6.7 (OFFIS), an independent reader of DICOM structured reports.
import { describe, expect, it, vi } from 'vitest';
import {
  compareReports,
  readableNames,
  readSample,
  runTool,
  samplesFolder,
  type OutsideNumber,
  type OutsideReport,
} from './reader-comparison';

const item = /^( *)<.*?(CONTAINER|NUM):\((\d+),DCM,"[^"]*"\)=(?:"([^"]*)" \(([^,]*),)?/;

/** Containers and numbers from the printed tree; the indentation tells what stands inside what. */
function parsePrintedTree(printed: string): OutsideReport {
  const report: OutsideReport = { events: [], totals: [] };
  let current: { indent: number; numbers: OutsideNumber[] } | null = null;
  for (const line of printed.split('\n')) {
    const match = item.exec(line);
    if (!match) continue;
    const [, blanks = '', type, code = '', text = '', unit = ''] = match;
    if (current && blanks.length <= current.indent) current = null;
    if (type === 'NUM') {
      current?.numbers.push([code, text.trim(), unit]);
    } else if (code === '113706' || code === '113702') {
      current = { indent: blanks.length, numbers: [] };
      report[code === '113706' ? 'events' : 'totals'].push(current.numbers);
    }
  }
  return report;
}

/** Other programs and 300 events on a busy machine. */
vi.setConfig({ testTimeout: 60_000 });

describe('the reader beside dcmtk', () => {
  it.each(readableNames)('finds the same events and decimal strings in %s', (fileName) => {
    // -Ev reads on past the value that breaks the rules of its type, which one sample has on purpose.
    const options = ['+Pc', '+Pu', '+Pl', '-Ev', '-Ec'];
    const outside = parsePrintedTree(runTool('dsrdump', [...options, samplesFolder + fileName]));
    expect(outside.totals.length + outside.events.length).toBeGreaterThan(0);
    compareReports(readSample(fileName).report, outside);
  });
});
