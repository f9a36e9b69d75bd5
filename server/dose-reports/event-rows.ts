import { setImmediate } from 'node:timers/promises';
import type { Report } from '../../shared/contract/report';
import type { ReportEvent } from '../../shared/contract/report-event';
import { newId } from '../kernel/new-id';
import { createInstantReader } from '../procedures/place-in-time';
import type { NewEvent } from '../procedures/irradiation-event.store';

/** Irradiation event UID and plane; an event without UID is known by its place in its report. */
const keyOf = (event: ReportEvent, sopInstanceUid: string | null, index: number) =>
  event.irradiationEventUid === null
    ? `${sopInstanceUid ?? ''}#${index}`
    : `${event.irradiationEventUid}|${event.plane ?? ''}`;

const withOffset = (local: string | null, offset: string | null) =>
  local === null ? null : offset && !/[zZ]|[+-]\d\d:?\d\d$/.test(local) ? `${local}${offset}` : local;

/** Fields of an event that have a column; `kvpMean` and the like are among them. */
const inColumns = new Set<string>([
  'irradiationEventUid',
  'plane',
  'type',
  'protocol',
  'startedAt',
  'utcOffset',
  'kvpValues',
  'kvpMean',
  'tubeCurrentMa',
  'pulseWidthMs',
  'pulseCount',
  'pulseRatePerS',
  'exposureTimeS',
  'irradiationDurationS',
  'kermaAreaProductGyCm2',
  'referenceAirKermaGy',
  'primaryAngleDeg',
  'secondaryAngleDeg',
  'primaryEndAngleDeg',
  'secondaryEndAngleDeg',
  'sourceToDetectorMm',
  'sourceToIsocenterMm',
  'sourceToReferencePointMm',
  'tableLongitudinalMm',
  'tableLateralMm',
  'tableHeightMm',
  'fieldAreaCm2',
  'filters',
  'reported',
]);

/** Everything else that the event says; nulls and empty lists stay out. */
function detailsOf(event: ReportEvent): Record<string, unknown> {
  const details: Record<string, unknown> = {};
  for (const [field, value] of Object.entries(event)) {
    const isEmpty = value === null || (Array.isArray(value) && value.length === 0);
    if (!isEmpty && !inColumns.has(field)) details[field] = value;
  }
  return details;
}

/** Rows made in one go: some milliseconds, between which other requests are answered. */
const rowsInOneGo = 100;

/** The events of a report as rows; the same UID and plane twice counts once. */
export async function toEventRows(
  report: Report,
  doseReportId: string,
  timeZone: string,
  fallback: Date,
): Promise<NewEvent[]> {
  const readInstant = createInstantReader(timeZone);
  const rows = new Map<string, NewEvent>();
  for (const [index, event] of report.events.entries()) {
    if (index > 0 && index % rowsInOneGo === 0) await setImmediate();
    const eventKey = keyOf(event, report.sopInstanceUid, index);
    if (rows.has(eventKey)) continue;
    const localStartedAt = withOffset(event.startedAt, event.utcOffset);
    const { irradiationEventUid, plane, type, protocol, kvpValues, kvpMean, tubeCurrentMa, pulseWidthMs } =
      event;
    rows.set(eventKey, {
      id: newId(),
      doseReportId,
      eventKey,
      startedAt: (localStartedAt && readInstant(localStartedAt)) || fallback,
      localStartedAt,
      irradiationEventUid,
      plane,
      type,
      protocol,
      kvpValues,
      kvpMean,
      tubeCurrentMa,
      pulseWidthMs,
      pulseCount: event.pulseCount,
      pulseRatePerS: event.pulseRatePerS,
      exposureTimeS: event.exposureTimeS,
      irradiationDurationS: event.irradiationDurationS,
      kermaAreaProductGyCm2: event.kermaAreaProductGyCm2,
      referenceAirKermaGy: event.referenceAirKermaGy,
      primaryAngleDeg: event.primaryAngleDeg,
      secondaryAngleDeg: event.secondaryAngleDeg,
      primaryEndAngleDeg: event.primaryEndAngleDeg,
      secondaryEndAngleDeg: event.secondaryEndAngleDeg,
      sourceToDetectorMm: event.sourceToDetectorMm,
      sourceToIsocenterMm: event.sourceToIsocenterMm,
      sourceToReferencePointMm: event.sourceToReferencePointMm,
      tableLongitudinalMm: event.tableLongitudinalMm,
      tableLateralMm: event.tableLateralMm,
      tableHeightMm: event.tableHeightMm,
      fieldAreaCm2: event.fieldAreaCm2,
      filters: event.filters.map(({ type: kind, material, minThicknessMm, maxThicknessMm }) => ({
        type: kind,
        material,
        minThicknessMm,
        maxThicknessMm,
      })),
      reported: event.reported,
      details: detailsOf(event),
    });
  }
  return [...rows.values()];
}
