import { readdirSync, readFileSync } from 'node:fs';
import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { expect } from 'vitest';
import { readDoseReport } from '../../server/dicom/read-dose-report';
import type { Report, ReportWarning } from '../../shared/contract/report';

export const samplesFolder = fileURLToPath(new URL('../../samples/', import.meta.url));

export interface ExpectedSample {
  fileName: string;
  isValid: boolean;
  outcome: 'read' | 'refused';
  reasonCode?: string;
  warningCodes?: string[];
  report?: Record<string, unknown>;
}

export const expectedSamples: ExpectedSample[] = readdirSync(samplesFolder)
  .filter((name) => name.endsWith('.expected.json'))
  .map((name) => JSON.parse(readFileSync(samplesFolder + name, 'utf8')) as ExpectedSample);

export const readableNames = expectedSamples
  .filter((sample) => sample.outcome === 'read')
  .map((sample) => sample.fileName);

export const readBytes = (fileName: string) => new Uint8Array(readFileSync(samplesFolder + fileName));

/** The report of a sample that must be readable. */
export function readSample(fileName: string): {
  report: Report;
  warnings: ReportWarning[];
  contentHash: string;
} {
  const reading = readDoseReport(readBytes(fileName));
  if (reading.outcome !== 'read')
    throw new Error(`${fileName}: ${reading.reason.code}, ${reading.reason.detail}`);
  return reading;
}

/** Runs a tool and gives its output; a tool that is missing or fails is a failed test. */
export function runTool(command: string, parameters: string[], allowedStatus = [0]): string {
  const run = spawnSync(command, parameters, { encoding: 'utf8', maxBuffer: 256 * 1024 * 1024 });
  if (run.error) throw new Error(`${command} cannot be run: ${run.error.message}`);
  if (run.status === null || !allowedStatus.includes(run.status)) {
    throw new Error(`${command} ended with ${String(run.status)}: ${run.stderr.slice(0, 400)}`);
  }
  return run.stdout;
}

/** A NUM as another tool shows it: concept code, decimal string, unit code and its scheme. */
export type OutsideNumber = [code: string, text: string, unit: string | null, unitScheme: string | null];
export interface OutsideReport {
  events: OutsideNumber[][];
  totals: OutsideNumber[][];
}

/** Concept codes of TID 10003 and 10004 (PS3.16) → the contract's field, stated apart from the reader's table. */
export const eventFields: Record<string, string> = {
  '122130': 'kermaAreaProductGyCm2',
  '113738': 'referenceAirKermaGy',
  '113791': 'pulseRatePerS',
  '113768': 'pulseCount',
  '113793': 'pulseWidthValuesMs',
  '113742': 'irradiationDurationS',
  '113733': 'kvpValues',
  '113734': 'tubeCurrentValuesMa',
  '113767': 'averageTubeCurrentMa',
  '113824': 'exposureTimeS',
  '113736': 'exposureValuesMas',
  '113766': 'focalSpotSizeMm',
  '113758': 'filters.minThicknessMm',
  '113773': 'filters.maxThicknessMm',
  '113790': 'fieldAreaCm2',
  '113788': 'fieldHeightMm',
  '113789': 'fieldWidthMm',
  '113845': 'exposureIndex',
  '113846': 'targetExposureIndex',
  '113847': 'deviationIndex',
  '112011': 'primaryAngleDeg',
  '112012': 'secondaryAngleDeg',
  '113739': 'primaryEndAngleDeg',
  '113740': 'secondaryEndAngleDeg',
  '113770': 'columnAngulationDeg',
  '113754': 'tableHeadTiltDeg',
  '113755': 'tableHorizontalRotationDeg',
  '113756': 'tableCradleTiltDeg',
  '113748': 'sourceToIsocenterMm',
  '113737': 'sourceToReferencePointMm',
  '113750': 'sourceToDetectorMm',
  '113751': 'tableLongitudinalMm',
  '113752': 'tableLateralMm',
  '113753': 'tableHeightMm',
  '113792': 'sourceToTableMm',
  '113759': 'tableLongitudinalEndMm',
  '113760': 'tableLateralEndMm',
  '113761': 'tableHeightEndMm',
  '128766': 'tableXToIsocenterMm',
  '128767': 'tableYToIsocenterMm',
  '128768': 'tableZToIsocenterMm',
  '128769': 'tableXToIsocenterEndMm',
  '128770': 'tableYToIsocenterEndMm',
  '128771': 'tableZToIsocenterEndMm',
  '128757': 'isocenterPrimaryAngleDeg',
  '128758': 'isocenterSecondaryAngleDeg',
  '128759': 'isocenterDetectorRotationDeg',
  '128760': 'isocenterPrimaryEndAngleDeg',
  '128761': 'isocenterSecondaryEndAngleDeg',
  '128762': 'isocenterDetectorRotationEndDeg',
  '111634': 'halfValueLayerMm',
  '111638': 'patientEquivalentThicknessMm',
  '111636': 'entranceExposureGy',
  '111633': 'compressionThicknessMm',
};
export const totalFields: Record<string, string> = {
  '113722': 'kermaAreaProductGyCm2',
  '113725': 'referenceAirKermaGy',
  '113726': 'fluoroscopyKermaAreaProductGyCm2',
  '113728': 'fluoroscopyReferenceAirKermaGy',
  '113730': 'fluoroscopyTimeS',
  '113727': 'acquisitionKermaAreaProductGyCm2',
  '113729': 'acquisitionReferenceAirKermaGy',
  '113855': 'acquisitionTimeS',
  '113737': 'sourceToReferencePointMm',
  '113731': 'frameCount',
};

/** UCUM units → [what the contract's field ends in, factor]; a unit that is missing here has no canonical value. */
export const conversions: Record<string, [string, number][]> = {
  'Gy.m2': [['GyCm2', 10_000]],
  'uGy.m2': [['GyCm2', 0.01]],
  'Gy.cm2': [['GyCm2', 1]],
  'dGy.cm2': [['GyCm2', 0.1]],
  'cGy.cm2': [['GyCm2', 0.01]],
  'mGy.cm2': [['GyCm2', 0.001]],
  Gy: [['Gy', 1]],
  mGy: [['Gy', 0.001]],
  uGy: [['Gy', 0.000001]],
  s: [
    ['TimeS', 1],
    ['DurationS', 1],
  ],
  ms: [
    ['Ms', 1],
    ['TimeS', 0.001],
    ['DurationS', 0.001],
  ],
  min: [['TimeS', 60]],
  mm: [['Mm', 1]],
  cm: [['Mm', 10]],
  m2: [['Cm2', 10_000]],
  kV: [['kvpValues', 1]],
  mA: [['Ma', 1]],
  'uA.s': [['Mas', 0.001]],
  deg: [['Deg', 1]],
  '{pulse}/s': [['PerS', 1]],
  '1': [['', 1]],
};

interface Gathered {
  text: string[];
  unit: string | null;
  /** One factor's unit each; null for a unit whose scheme is not UCUM. */
  ucumUnits: (string | null)[];
}

/** Decimal strings gathered field by field, as the reader keeps them: a backslash parts values, blanks are none. */
function gather(numbers: OutsideNumber[], fields: Record<string, string>): Record<string, Gathered> {
  const gathered: Record<string, Gathered> = {};
  for (const [code, text, unit, scheme] of numbers) {
    const field = fields[code];
    if (field === undefined) continue;
    const values = text === '' ? [] : text.split('\\').map((one) => one.trim());
    const known = (gathered[field] ??= { text: [], unit: null, ucumUnits: [] });
    const units = new Set([...(known.unit?.split(', ') ?? []), ...(unit === null ? [] : [unit])]);
    known.unit = units.size === 0 ? null : [...units].join(', ');
    known.text.push(...values);
    known.ucumUnits.push(...values.map(() => (scheme === 'UCUM' ? unit : null)));
  }
  return gathered;
}

function canonicalOf(field: string, text: string, unit: string | null): number | null {
  const factor = conversions[unit ?? '']?.find(([ending]) => field.endsWith(ending))?.[1];
  const isNumber = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(text);
  return factor === undefined || !isNumber ? null : Number(text) * factor;
}

/** A field's values as the contract holds them: a list, or the first one of a value that stands once. */
function valuesOf(holder: Record<string, unknown>, field: string, { text, ucumUnits }: Gathered) {
  const all = text.map((one, index) => canonicalOf(field, one, ucumUnits[index] ?? null));
  const value = holder[field];
  return Array.isArray(value)
    ? { actual: value as number[], outside: all.filter((one) => one !== null) }
    : { actual: [value as number | null], outside: [all[0] ?? null] };
}

function compareHolder(
  holder: Record<string, unknown> & { reported: Report['events'][number]['reported'] },
  numbers: OutsideNumber[],
  fields: Record<string, string>,
): void {
  const outside = gather(numbers, fields);
  // An unreadable start keeps its text beside the numbers' and is compared with the other values.
  const { startedAt: _startedAt, ...reported } = holder.reported;
  const given = Object.entries(reported).filter(([, { text, unit }]) => text.length > 0 || unit !== null);
  expect(Object.fromEntries(given)).toEqual(
    Object.fromEntries(Object.entries(outside).map(([field, { text, unit }]) => [field, { text, unit }])),
  );
  for (const [field, gathered] of Object.entries(outside)) {
    if (field.includes('.')) continue;
    const { actual, outside: expected } = valuesOf(holder, field, gathered);
    expect(actual, field).toHaveLength(expected.length);
    actual.forEach((value, index) => {
      const outsideValue = expected[index] ?? null;
      if (value === null || outsideValue === null) expect(value, field).toBe(outsideValue);
      else expect(Math.abs(value - outsideValue), field).toBeLessThanOrEqual(1e-12 * Math.abs(outsideValue));
    });
  }
}

/** Same number of events and totals, same decimal strings and units, canonical values within 1e-12. */
export function compareReports(report: Report, outside: OutsideReport): void {
  expect(report.events).toHaveLength(outside.events.length);
  expect(report.planes).toHaveLength(outside.totals.length);
  report.events.forEach((event, index) => compareHolder(event, outside.events[index] ?? [], eventFields));
  report.planes.forEach((plane, index) => compareHolder(plane, outside.totals[index] ?? [], totalFields));
}
