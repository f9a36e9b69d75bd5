// Source: pydicom 2.3.1 (Debian's python3-pydicom), an independent DICOM reader.
import { fileURLToPath } from 'node:url';
import { beforeAll, describe, expect, it, vi } from 'vitest';
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
  values: Record<string, string | string[]>;
}
interface Dump {
  header: Record<string, string>;
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

/** "20260304090000.250+0100" → digits and sign alone, as the reader's ISO text has them too. */
const bareDateTime = (text: string | null) =>
  (text ?? '').replace(/[-:T](?!\d\d:?\d\d$)/g, '').replace(':', '');

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

  it.each(readableNames)('finds the same identity and study in %s', (fileName) => {
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
      birthDate: orNull(isoDate(header['PatientBirthDate'] ?? '')),
      sex: orNull(header['PatientSex']),
      heightM: Number(header['PatientSize']),
      weightKg: Number(header['PatientWeight']),
      stationName: orNull(header['StationName']),
      institutionName: orNull(header['InstitutionName']),
    });
  });

  it.each(readableNames)('finds the same UIDs, types, planes, times and protocols in %s', (fileName) => {
    const { events } = dumpOf(fileName);
    const own = readSample(fileName).report.events.map((event) => [
      event.irradiationEventUid,
      event.typeCode?.value ?? null,
      event.planeCode?.value ?? null,
      event.protocol,
      bareDateTime(event.startedAt),
    ]);
    const outside = events.map(({ values }) => [
      values['113769'],
      values['113721']?.[0],
      values['113764']?.[0] ?? null,
      values['125203'] ?? null,
      values['111526'],
    ]);
    expect(own).toEqual(outside);
  });
});
