import type { CheckContext, DisplayedTotals } from '../data-checks/check-context';
import { sumDisplayed } from '../data-checks/sum-displayed';
import type { Procedure } from '../procedures/procedure.entity';

/** So many procedures of a type tell what is usual, as in the intake. */
const newestOfType = 200;

const medianOf = (values: readonly number[]): number => {
  const sorted = values.toSorted((a, b) => a - b);
  const middle = Math.floor(sorted.length / 2);
  return sorted.length % 2 === 1
    ? (sorted[middle] as number)
    : ((sorted[middle - 1] as number) + (sorted[middle] as number)) / 2;
};

type Remembered = Pick<
  Procedure,
  | 'procedureTypeId'
  | 'equipmentId'
  | 'planes'
  | 'isQuarantined'
  | 'displayedKermaAreaProductGyCm2'
  | 'displayedReferenceAirKermaGy'
>;

/** What the procedures written so far say about the next one, without asking the database; made in order of time. */
export function rememberProcedures() {
  const areasCm2 = new Map<string, number[]>();
  const displayed = new Map<string, DisplayedTotals>();
  return {
    contextOf(typeId: string, equipmentId: string): CheckContext {
      const areas = areasCm2.get(typeId) ?? [];
      const previous = displayed.get(equipmentId);
      return {
        typeFieldArea: areas.length === 0 ? null : { medianCm2: medianOf(areas), count: areas.length },
        previousTotals: new Map(previous ? [[equipmentId, previous]] : []),
        sharedEvents: { count: 0, caseNumbers: [] },
      };
    },
    add(procedure: Remembered): void {
      const { procedureTypeId, equipmentId, planes } = procedure;
      if (equipmentId !== null) displayed.set(equipmentId, sumDisplayed(planes));
      const { displayedKermaAreaProductGyCm2: product, displayedReferenceAirKermaGy: kerma } = procedure;
      if (procedureTypeId === null || procedure.isQuarantined || !product || !kerma) return;
      const areas = areasCm2.get(procedureTypeId) ?? [];
      areas.push(product / kerma);
      if (areas.length > newestOfType) areas.shift();
      areasCm2.set(procedureTypeId, areas);
    },
  };
}
export type CheckMemory = ReturnType<typeof rememberProcedures>;
