import { rememberProcedures } from '../../server/demo/check-memory';
import type { DemoProcedure } from '../../server/demo/demo-types';
import { eventKeyOf, toEventRow } from '../../server/demo/event-rows';
import { toProcedureRow, type DemoContext } from '../../server/demo/procedure-row';
import { toReportRows } from '../../server/demo/report-rows';
import { newId } from '../../server/kernel/new-id';
import type { StoredCheck } from '../../server/data-checks/check-data';

/** Registers whose ids are their codes. */
const sameIds = { get: (code: string) => code } as unknown as ReadonlyMap<string, string>;

const newContext = (): DemoContext => ({
  ids: {
    hospitalId: newId(),
    people: sameIds,
    rooms: sameIds,
    equipment: sameIds,
    types: sameIds,
    garments: sameIds,
  },
  factors: [],
  levels: [],
  equipmentLabels: new Map(),
  registers: {
    garments: new Map(),
    staturesM: new Map(),
    typicalKvps: new Map(),
    tubePositions: new Map(),
  },
  checkMemory: rememberProcedures(),
});

/** Checks generated procedures one after another, as if each came by a report; the later ones know the earlier. */
export function startChecking() {
  const context = newContext();
  const run = (procedure: DemoProcedure, memory: DemoContext['checkMemory']): StoredCheck[] => {
    const refer = {
      hospitalId: context.ids.hospitalId,
      procedureId: 'id',
      equipmentId: procedure.equipment.key,
    };
    const reports = toReportRows(procedure, refer);
    const reportOf = new Map(reports.flatMap(({ id, eventKeys }) => eventKeys.map((key) => [key, id])));
    const events = procedure.events.map((event) =>
      toEventRow(event, procedure, {
        procedureId: 'id',
        doseReportId: reportOf.get(eventKeyOf(event)) ?? null,
      }),
    );
    const parts = { id: 'id', caseNumber: '00-00000', patientIdentityId: 'id' };
    return toProcedureRow(procedure, parts, { reports, events }, { ...context, checkMemory: memory })
      .dataChecks;
  };
  return {
    /** Checks one and remembers it. */
    check: (procedure: DemoProcedure) => run(procedure, context.checkMemory),
    /** Checks a spoilt one that nothing later is to know. */
    checkAside: (procedure: DemoProcedure) =>
      run(procedure, { ...context.checkMemory, add: () => undefined }),
  };
}

export const findingsOf = (checks: readonly StoredCheck[]): string[] =>
  checks.filter(({ result }) => result === 'noted' || result === 'failed').map(({ code }) => code);
