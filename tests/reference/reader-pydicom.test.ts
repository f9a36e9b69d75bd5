// Source: pydicom 2.3.1 (Debian's python3-pydicom), an independent DICOM reader.
import { fileURLToPath } from 'node:url';
import { beforeAll, describe, expect, it, vi } from 'vitest';
import type { ReportEvent } from '../../shared/contract/report-event';
import { outsideValuesOf, ownEventValues, ownRootValues, type OutsideValues } from './outside-values';
import {
  compareReports,
  readableNames,
  readSample,
  runTool,
  samplesFolder,
  type OutsideNumber,
} from './reader-comparison';

interface DumpedPart {
  numbers: OutsideNumber[];
  values: OutsideValues;
}
interface Dump {
  header: Record<string, string>;
  root: OutsideValues;
  totals: DumpedPart[];
  events: DumpedPart[];
}

const script = fileURLToPath(new URL('data/dump-dose-report.py', import.meta.url));
const dumps = new Map<string, Dump>();

beforeAll(() => {
  const printed = runTool('/usr/bin/python3', [script, ...readableNames.map((name) => samplesFolder + name)]);
  const lines = printed.trim().split('\n');
  readableNames.forEach((name, index) => dumps.set(name, JSON.parse(lines[index] ?? 'null') as Dump));
}, 120_000);

function dumpOf(fileName: string): Dump {
  const dump = dumps.get(fileName);
  if (!dump) throw new Error(`pydicom gave nothing for ${fileName}`);
  return dump;
}

const isoDate = (text: string) => text.replace(/^(\d{4})(\d{2})(\d{2})$/, '$1-$2-$3');
const orNull = (text: string | undefined) => text || null;

/** "2026-03-04T09:00:00.250+01:00" → digits, point and sign alone, as the file has them. */
const bareDateTime = (text: string) => text.replace(/[-:T](?!\d\d:?\d\d$)/g, '').replace(':', '');

/** The start as the file has it: the reader completes what is cut, and takes second 60 for 59. */
function expectSameStart(event: ReportEvent, outside: string | undefined): void {
  const raw = event.reported['startedAt']?.text[0];
  if (event.startedAt === null || outside === undefined) expect(raw).toBe(outside);
  else expect(bareDateTime(event.startedAt)).toContain(outside.replace(/(?<=^\d{12})60/, '59'));
}

/** pydicom decodes these as declared, wrongly or not at all; the writer's input is what tells (reader-samples). */
const decodedOtherwise = [
  // It leaves the letters of the escape sequence in.
  '60-chinese-extension.dcm',
  '62-undeclared-utf-8.dcm',
  '63-undeclared-latin-1.dcm',
  '64-latin-1-that-is-utf-8.dcm',
  '65-utf-8-that-is-latin-1.dcm',
  '66-invalid-term.dcm',
];
const decodedAlike = readableNames.filter((name) => !decodedOtherwise.includes(name));

/** Other programs and 300 events on a busy machine. */
vi.setConfig({ testTimeout: 60_000 });

describe('the reader beside pydicom', () => {
  it.each(readableNames)('finds the same events and decimal strings in %s', (fileName) => {
    const { events, totals } = dumpOf(fileName);
    compareReports(readSample(fileName).report, {
      events: events.map((one) => one.numbers),
      totals: totals.map((one) => one.numbers),
    });
  });

  it.each(decodedAlike)('finds the same identity and study in %s', (fileName) => {
    const { header } = dumpOf(fileName);
    const { report } = readSample(fileName);
    expect({
      sopInstanceUid: report.sopInstanceUid,
      sopClassUid: report.sopClassUid,
      studyInstanceUid: report.studyInstanceUid,
      accessionNumber: report.accessionNumber,
      studyDescription: report.studyDescription,
      name: report.patient.name,
      id: report.patient.id,
      birthDate: report.patient.birthDate,
      sex: report.patient.sex,
      heightM: report.patient.heightM,
      weightKg: report.patient.weightKg,
      stationName: report.equipment.stationName,
      institutionName: report.equipment.institutionName,
    }).toEqual({
      sopInstanceUid: orNull(header['SOPInstanceUID']),
      sopClassUid: orNull(header['SOPClassUID']),
      studyInstanceUid: orNull(header['StudyInstanceUID']),
      accessionNumber: orNull(header['AccessionNumber']),
      studyDescription: orNull(header['StudyDescription']),
      name: orNull(header['PatientName']),
      id: orNull(header['PatientID']),
      // One sample has the 99th of July.
      birthDate: orNull(isoDate((header['PatientBirthDate'] ?? '').replace('19610799', ''))),
      sex: orNull(header['PatientSex']),
      heightM: Number(header['PatientSize']) || null,
      weightKg: Number(header['PatientWeight']) || null,
      stationName: orNull(header['StationName']),
      institutionName: orNull(header['InstitutionName']),
    });
  });

  it.each(decodedAlike)('finds the same codes, texts, names, images and times in %s', (fileName) => {
    const { events, root } = dumpOf(fileName);
    const { report } = readSample(fileName);
    const ownRoot = ownRootValues(report);
    expect(ownRoot).toEqual(outsideValuesOf(root, Object.keys(ownRoot)));
    report.events.forEach((event, index) => {
      const outside = events[index]?.values ?? {};
      const own = ownEventValues(event);
      expect(own).toEqual(outsideValuesOf(outside, Object.keys(own)));
      expectSameStart(event, outside['111526']?.[0] as string | undefined);
    });
  });
});
