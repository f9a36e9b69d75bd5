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

const item =
  /^( *)<.*?(CONTAINER|NUM):\((\d+),(?:DCM),"[^"]*"\)=(?:"([^"]*)" \(([^,]*),([^,]*),|(?:<empty>|empty))?/;

/** Containers and numbers from the printed tree; the indentation tells what stands inside what. */
function parsePrintedTree(printed: string): OutsideReport {
  const report: OutsideReport = { events: [], totals: [] };
  let current: { indent: number; numbers: OutsideNumber[] } | null = null;
  for (const line of printed.split('\n')) {
    const match = item.exec(line);
    if (!match) continue;
    const [, blanks = '', type, code = '', text, unit = '', scheme = ''] = match;
    if (current && blanks.length <= current.indent) current = null;
    if (type === 'NUM') {
      // Without a value, dcmtk prints none of it.
      if (text !== undefined) current?.numbers.push([code, text.trim(), unit || null, scheme || null]);
    } else if (code === '113706' || code === '113702') {
      current = { indent: blanks.length, numbers: [] };
      report[code === '113706' ? 'events' : 'totals'].push(current.numbers);
    }
  }
  return report;
}

/** Other programs and 300 events on a busy machine. */
vi.setConfig({ testTimeout: 60_000 });

/** The errors that it is told to read past are in samples on purpose. */
const options = ['+Pc', '+Pu', '+Pl', '-Ev', '-Ec', '-Er', '-Ee'];

/** What dcmtk does not read: it trusts the declared transfer syntax, and stops at an item without a concept. */
const unreadByDcmtk = ['26-wrong-transfer-syntax.dcm', '93-items-without-concept.dcm'];

/** What dcmtk takes otherwise: the first of a list, no item without unit or value, no container without meaning. */
const takenOtherwise = [
  '70-number-lists.dcm',
  '71-units-absent-or-foreign.dcm',
  '74-empty-numbers.dcm',
  '89-code-meanings-foreign-or-empty.dcm',
];
const different = [...unreadByDcmtk, ...takenOtherwise];

const dump = (fileName: string) =>
  parsePrintedTree(runTool('dsrdump', [...options, samplesFolder + fileName]));

describe('the reader beside dcmtk', () => {
  it.each(takenOtherwise)('takes %s otherwise than dcmtk, which is a known difference', (fileName) => {
    const outside = dump(fileName);
    expect(() => compareReports(readSample(fileName).report, outside)).toThrow();
  });

  it.each(unreadByDcmtk)('reads %s, which dcmtk does not', (fileName) => {
    expect(() => dump(fileName)).toThrow(/dsrdump ended with/);
    expect(readSample(fileName).report.events.length).toBeGreaterThan(0);
  });

  it.each(readableNames.filter((name) => !different.includes(name)))(
    'finds the same events and decimal strings in %s',
    (fileName) => {
      const outside = dump(fileName);
      expect(outside.totals.length + outside.events.length).toBeGreaterThan(0);
      compareReports(readSample(fileName).report, outside);
    },
  );
});
