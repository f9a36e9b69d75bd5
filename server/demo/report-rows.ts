import type { ReportPlane } from '../../shared/contract/report';
import type { DoseReport } from '../dose-reports/dose-report.entity';
import { bulkId } from './bulk-ids';
import type { DemoPlaneTotals, DemoProcedure } from './demo-types';
import { eventKeyOf } from './event-rows';
import { localTimeAfter } from './local-time';
import { endOf, sopInstanceUidOf, splitIntoReports } from './split-into-reports';

/** Code of the reference point 15 cm from the isocentre towards the focus (CID 10025). */
const referencePoint = {
  code: { value: '113860', scheme: 'DCM', meaning: '15cm from Isocenter toward Source' },
  text: null,
};

const toReportPlane = (plane: DemoPlaneTotals, procedure: DemoProcedure): ReportPlane => ({
  ...plane,
  planeCode: null,
  sourceToReferencePointMm: procedure.equipment.sourceToIsocenterMm - 150,
  frameCount: null,
  detectorType: null,
  referencePointDefinition: referencePoint,
  calibrations: [],
  devices: [],
  reported: {},
  qualifiers: {},
  preciseValues: {},
  furtherItems: [],
});

/** Minutes from the last irradiation to the report's arrival. */
const deliveryMin = 11;

/** When the report of a procedure came in: after its last irradiation by the true clock. */
export const arrivalOf = (procedure: DemoProcedure): Date =>
  new Date(procedure.startedAt.getTime() + 1000 * (endOf(procedure) + 60 * deliveryMin));

/** Rows of a procedure's reports: one for each file that would have come. */
export function toReportRows(
  procedure: DemoProcedure,
  refer: { hospitalId: string; procedureId: string; equipmentId: string },
): DoseReport[] {
  if (procedure.defect === 'no-report') return [];
  const isManual = procedure.defect === 'manual-entry';
  const seen = new Set<string>();
  return splitIntoReports(procedure).map((part, index): DoseReport => {
    const sopInstanceUid = sopInstanceUidOf(procedure, part);
    const isRepeated = seen.has(sopInstanceUid);
    seen.add(sopInstanceUid);
    const receivedAt = new Date(arrivalOf(procedure).getTime() + 60_000 * index);
    return {
      id: bulkId(receivedAt),
      ...refer,
      originalFileId: null,
      fileName: isManual ? 'entered by hand' : `${procedure.accessionNumber}-${part.number}.dcm`,
      archiveName: null,
      archiveId: null,
      uploadKey: null,
      channel: 'generated',
      receivedById: null,
      receivedAt,
      outcome: isRepeated ? 'duplicate' : 'stored',
      settledAt: receivedAt,
      reasonCode: null,
      reasonDetail: null,
      sopInstanceUid,
      contentHash: null,
      contentAt: localTimeAfter(procedure, endOf(part) + 60),
      eventCount: part.events.length,
      eventKeys: isRepeated ? [] : part.events.map(eventKeyOf),
      reportedPlanes: isRepeated ? [] : part.planes.map((plane) => toReportPlane(plane, procedure)),
      warnings: isManual
        ? [{ code: 'events-missing', detail: 'Typed from the machine’s screen: totals without exposures' }]
        : [],
      readerVersion: null,
      context: null,
      purgedAt: null,
    };
  });
}
