import type {
  DoseReportContent,
  WrittenEvent,
  WrittenPlaneTotals,
} from '../../server/dicom-writer/dose-report-content';
import type { Quantity } from '../../server/dicom-writer/written-parts';
import type { PrintedReport } from '../../shared/contract/report';

/** UCUM code → factor to Gy, Gy·cm², s or mm; spelt out here so that the reader's own table is checked by it. */
const factors: Record<string, number> = {
  Gy: 1,
  mGy: 1e-3,
  uGy: 1e-6,
  'Gy.m2': 1e4,
  'mGy.m2': 1e1,
  'uGy.m2': 1e-2,
  'Gy.cm2': 1,
  'dGy.cm2': 1e-1,
  'cGy.cm2': 1e-2,
  'mGy.cm2': 1e-3,
  s: 1,
  ms: 1e-3,
  min: 60,
  mm: 1,
  cm: 10,
  kV: 1,
};

type Maybe = Quantity | null | undefined;

function value(quantity: Maybe): number | null {
  if (quantity === null || quantity === undefined) return null;
  if (typeof quantity === 'number') return quantity;
  if ('qualifier' in quantity || quantity.unit === null || (quantity.scheme ?? 'UCUM') !== 'UCUM')
    return null;
  const factor = factors[quantity.unit];
  return factor === undefined || !/^[ +-]*(\d+\.?\d*|\.\d+)(e[+-]?\d+)?\s*$/i.test(quantity.text)
    ? null
    : Number(quantity.text) * factor;
}

function values(quantities: Quantity[] | undefined): number[] {
  return (quantities ?? []).map(value).filter((one) => one !== null);
}

function mean(numbers: number[]): number | null {
  return numbers.length === 0 ? null : numbers.reduce((a, b) => a + b) / numbers.length;
}

function expectedPlane(totals: WrittenPlaneTotals): PrintedReport['planes'][number] {
  return {
    plane: totals.plane,
    kermaAreaProductGyCm2: value(totals.kermaAreaProductGyCm2),
    referenceAirKermaGy: value(totals.referenceAirKermaGy),
    fluoroscopyTimeS: value(totals.fluoroscopyTimeS),
    fluoroscopyKermaAreaProductGyCm2: value(totals.fluoroscopyKermaAreaProductGyCm2),
    fluoroscopyReferenceAirKermaGy: value(totals.fluoroscopyReferenceAirKermaGy),
    acquisitionKermaAreaProductGyCm2: value(totals.acquisitionKermaAreaProductGyCm2),
    acquisitionReferenceAirKermaGy: value(totals.acquisitionReferenceAirKermaGy),
    acquisitionTimeS: value(totals.acquisitionTimeS),
  };
}

function expectedEvent(event: WrittenEvent): PrintedReport['events'][number] {
  const kvpValues = values(event.kvpValues);
  return {
    irradiationEventUid: event.irradiationEventUid,
    plane: event.plane ?? null,
    type: typeof event.type === 'string' ? event.type : null,
    startedAt: event.startedAt,
    protocol: event.protocol ?? null,
    kvpValues,
    kvpMean: mean(kvpValues),
    tubeCurrentMa: mean(values(event.tubeCurrentValuesMa)) ?? value(event.averageTubeCurrentMa),
    pulseWidthMs: mean(values(event.pulseWidthValuesMs)),
    pulseCount: value(event.pulseCount),
    pulseRatePerS: value(event.pulseRatePerS),
    exposureTimeS: value(event.exposureTimeS),
    irradiationDurationS: value(event.irradiationDurationS),
    kermaAreaProductGyCm2: value(event.kermaAreaProductGyCm2),
    referenceAirKermaGy: value(event.referenceAirKermaGy),
    primaryAngleDeg: value(event.primaryAngleDeg),
    secondaryAngleDeg: value(event.secondaryAngleDeg),
    primaryEndAngleDeg: value(event.primaryEndAngleDeg),
    secondaryEndAngleDeg: value(event.secondaryEndAngleDeg),
    sourceToDetectorMm: value(event.sourceToDetectorMm),
    sourceToIsocenterMm: value(event.sourceToIsocenterMm),
    fieldAreaCm2: value(event.fieldAreaCm2),
    filters: (event.filters ?? []).map((filter) => ({
      type: filter.type,
      material: filter.material ?? null,
      minThicknessMm: value(filter.minThicknessMm),
      maxThicknessMm: value(filter.maxThicknessMm),
    })),
  };
}

/** What the reader must report, from what the writer was given; no part of the reader is used. */
export function expectedReport(content: DoseReportContent): Omit<PrintedReport, 'warnings'> {
  const { patient, equipment } = content;
  const starts = content.events.map((event) => event.startedAt).sort();
  return {
    sopInstanceUid: content.sopInstanceUid,
    sopClassUid: content.sopClassUid ?? '1.2.840.10008.5.1.4.1.1.88.67',
    studyInstanceUid: content.studyInstanceUid,
    accessionNumber: content.accessionNumber ?? null,
    studyDescription: content.studyDescription ?? null,
    startedAt: starts[0] ?? content.studyAt,
    patient: {
      name: patient.name,
      id: patient.id,
      birthDate: patient.birthDate ?? null,
      sex: patient.sex ?? null,
      heightM: patient.heightM ?? null,
      weightKg: patient.weightKg ?? null,
    },
    equipment: {
      manufacturer: equipment.manufacturer ?? null,
      modelName: equipment.modelName ?? null,
      serialNumber: equipment.serialNumber ?? null,
      stationName: equipment.stationName ?? null,
      institutionName: equipment.institutionName ?? null,
    },
    planes: content.planes.map(expectedPlane),
    events: content.events.map(expectedEvent),
  };
}
