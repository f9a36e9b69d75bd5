import type { ConflictCode, ConflictSide, ReportConflict } from '../../shared/contract/decide-report';
import type { Db } from '../db/db';
import { labelsOf } from '../equipment/factors-in-use.store';
import { findHospital } from '../hospital/hospital.store';
import type { Actor } from '../kernel/actor';
import type { NewEvent } from '../procedures/irradiation-event.store';
import { listEventFigures } from '../procedures/irradiation-event.store';
import { patientKeyOf } from '../procedures/patient-identity.store';
import { findProcedure } from '../procedures/procedure.store';
import { readHeld } from './decide-conflict';
import type { DoseReport } from './dose-report.entity';
import { findInstance } from './dose-report.store';
import { toEventRows } from './event-rows';

type Figures = Pick<
  NewEvent,
  | 'eventKey'
  | 'localStartedAt'
  | 'type'
  | 'kermaAreaProductGyCm2'
  | 'referenceAirKermaGy'
  | 'irradiationDurationS'
>;

const isSameFigures = (a: Figures, b: Figures) =>
  a.localStartedAt === b.localStartedAt &&
  a.type === b.type &&
  a.kermaAreaProductGyCm2 === b.kermaAreaProductGyCm2 &&
  a.referenceAirKermaGy === b.referenceAirKermaGy &&
  a.irradiationDurationS === b.irradiationDurationS;

type SideInput = {
  report: DoseReport;
  events: Figures[];
  others: Figures[];
  planes: ConflictSide['planes'];
  machine: string | null;
  contentAt: string | null;
  isPartial: boolean;
  procedure: ConflictSide['procedure'];
};

function describeSide({ report, events, others, ...side }: SideInput): ConflictSide {
  const otherKeys = new Set(others.map(({ eventKey }) => eventKey));
  const times = events.flatMap(({ localStartedAt }) => localStartedAt ?? []).toSorted();
  return {
    ...side,
    doseReportId: report.id,
    fileName: report.fileName,
    receivedAt: report.receivedAt.toISOString(),
    eventCount: events.length,
    ownEventCount: events.filter(({ eventKey }) => !otherKeys.has(eventKey)).length,
    firstEventAt: times[0] ?? null,
    lastEventAt: times.at(-1) ?? null,
  };
}

/** Two reports with one identity side by side: the one that counts and the one that is held. */
export async function describeConflict(db: Db, actor: Actor, id: string): Promise<ReportConflict> {
  const { hospitalId } = actor;
  const { held, read } = await readHeld(db, hospitalId, id);
  const { report } = read;
  const stored = await findInstance(db, hospitalId, held.sopInstanceUid ?? '');
  const procedure = stored?.procedureId ? await findProcedure(db, hospitalId, stored.procedureId) : null;
  const { timeZone } = await findHospital(db, hospitalId);
  const heldEvents: Figures[] = await toEventRows(report, held.id, timeZone, held.receivedAt);
  const keys = new Set(stored?.eventKeys);
  const storedEvents: Figures[] = procedure
    ? (await listEventFigures(db, procedure.id)).filter(({ eventKey }) => keys.has(eventKey))
    : [];
  const labels = await labelsOf(db, hospitalId, stored?.equipmentId ? [stored.equipmentId] : []);
  const heldByKey = new Map(heldEvents.map((event) => [event.eventKey, event]));
  const { manufacturer, modelName, stationName } = report.equipment;
  return {
    code: held.reasonCode as ConflictCode,
    held: describeSide({
      report: held,
      events: heldEvents,
      others: storedEvents,
      planes: report.planes,
      machine: [manufacturer, modelName, stationName].filter(Boolean).join(' ') || null,
      contentAt: report.contentAt,
      isPartial: report.completionFlag === 'PARTIAL',
      procedure: null,
    }),
    stored:
      stored &&
      describeSide({
        report: stored,
        events: storedEvents,
        others: heldEvents,
        planes: stored.reportedPlanes,
        machine: (stored.equipmentId && labels.get(stored.equipmentId)) || null,
        contentAt: stored.contentAt,
        isPartial: stored.context?.completionFlag === 'PARTIAL',
        procedure: procedure && { id: procedure.id, caseNumber: procedure.caseNumber },
      }),
    isSamePatient: procedure && procedure.patientKey === patientKeyOf(hospitalId, report.patient.id),
    isSameStudy: stored?.context ? stored.context.studyInstanceUid === report.studyInstanceUid : null,
    changedEventCount: storedEvents.filter((event) => {
      const other = heldByKey.get(event.eventKey);
      return other && !isSameFigures(event, other);
    }).length,
  };
}
