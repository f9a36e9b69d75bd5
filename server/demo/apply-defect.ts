import type { DemoPlaneTotals, DemoProcedure } from './demo-types';
import { createRandom } from './random';

function multiplyKermaAreaProduct(procedure: DemoProcedure, factor: number): DemoProcedure {
  const times = (value: number | null) => (value === null ? null : Number((value * factor).toPrecision(6)));
  return {
    ...procedure,
    planes: procedure.planes.map((plane) => ({
      ...plane,
      kermaAreaProductGyCm2: plane.kermaAreaProductGyCm2 * factor,
      fluoroscopyKermaAreaProductGyCm2: times(plane.fluoroscopyKermaAreaProductGyCm2),
      acquisitionKermaAreaProductGyCm2: times(plane.acquisitionKermaAreaProductGyCm2),
    })),
    events: procedure.events.map((event) => ({
      ...event,
      kermaAreaProductGyCm2: event.kermaAreaProductGyCm2 * factor,
    })),
  };
}

/** Somebody typed what the machine's screen showed: totals of all planes, nothing else. */
function enterByHand(procedure: DemoProcedure): DemoProcedure {
  const sumOf = (quantity: 'kermaAreaProductGyCm2' | 'referenceAirKermaGy' | 'fluoroscopyTimeS') =>
    procedure.planes.reduce((sum, plane) => sum + plane[quantity], 0);
  return {
    ...procedure,
    events: [],
    planes: [
      {
        plane: 'single',
        kermaAreaProductGyCm2: Number(sumOf('kermaAreaProductGyCm2').toPrecision(3)),
        referenceAirKermaGy: Number(sumOf('referenceAirKermaGy').toFixed(3)),
        fluoroscopyTimeS: 6 * Math.max(1, Math.round(sumOf('fluoroscopyTimeS') / 6)),
        fluoroscopyKermaAreaProductGyCm2: null,
        fluoroscopyReferenceAirKermaGy: null,
        acquisitionKermaAreaProductGyCm2: null,
        acquisitionReferenceAirKermaGy: null,
        acquisitionTimeS: null,
      },
    ],
  };
}

/** The counter of K a,r went on from what it showed at the end of the machine's procedure before. */
function leaveKermaStanding(procedure: DemoProcedure, before: readonly DemoPlaneTotals[]): DemoProcedure {
  return {
    ...procedure,
    planes: procedure.planes.map((plane) => {
      const shownGy = before.find((one) => one.plane === plane.plane)?.referenceAirKermaGy ?? 0;
      return { ...plane, referenceAirKermaGy: Number((plane.referenceAirKermaGy + shownGy).toPrecision(6)) };
    }),
  };
}

/**
 * What the planted fault does to the procedure's data; faults of the record's life change nothing here. `before` are
 * the totals that the same machine displayed at its procedure before.
 */
export function applyDefect(procedure: DemoProcedure, before: readonly DemoPlaneTotals[]): DemoProcedure {
  const random = createRandom('defect', procedure.studyInstanceUid);
  switch (procedure.defect) {
    case 'missing-weight':
      return { ...procedure, patient: { ...procedure.patient, weightKg: null } };
    case 'clock-offset':
      return { ...procedure, deviceClockAheadS: random.pick([-1, 1]) * random.integer(600, 5400) };
    case 'kap-unit-slip':
      return multiplyKermaAreaProduct(procedure, random.pick([100, 0.1]));
    case 'manual-entry':
      return enterByHand(procedure);
    case 'no-report':
      return { ...procedure, planes: [], events: [] };
    case 'kerma-not-reset':
      return leaveKermaStanding(procedure, before);
    default:
      return procedure;
  }
}
