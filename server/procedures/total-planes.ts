import type { PlaneTotals } from '../../shared/contract/procedure';
import type { ReportPlane } from '../../shared/contract/report';
import { standReports } from './stand-reports';
import type { SummaryEvent, SummaryFactor, SummaryInput } from './summary-input';

type Quantity = 'kermaAreaProductGyCm2' | 'referenceAirKermaGy';

/** Null where no event has the quantity: a missing value is not zero. */
function sum(values: (number | null)[]): number | null {
  const known = values.filter((value) => value !== null);
  return known.length === 0 ? null : known.reduce((total, value) => total + value, 0);
}

const isFluoroscopy = (event: SummaryEvent) => event.type === 'fluoroscopy';
/** Adds what is known; null where nothing is. */
const addKnown = (...values: (number | null | undefined)[]) => sum(values.map((value) => value ?? null));

/** The factor in force for a plane on a day: the newest that had begun. */
function factorFor(
  factors: SummaryFactor[],
  plane: PlaneTotals['plane'],
  quantity: SummaryFactor['quantity'],
  day: string,
) {
  return (
    factors
      .filter(
        (factor) =>
          factor.plane === (plane ?? 'single') && factor.quantity === quantity && factor.validFrom <= day,
      )
      .toSorted((a, b) => b.validFrom.localeCompare(a.validFrom))[0] ?? null
  );
}

const times = (value: number | null, factor: number | undefined) =>
  value === null || factor === undefined ? null : value * factor;

type PlaneInput = {
  equipment: { id: string | null; label: string | null };
  plane: PlaneTotals['plane'];
  events: SummaryEvent[];
  /** Of the report that holds every event of the machine. */
  held: ReportPlane | null;
  /** Of reports without events, which tell what no event tells. */
  totalsOnly: ReportPlane[];
  factors: SummaryFactor[];
  day: string;
};

function totalPlane(input: PlaneInput): PlaneTotals {
  const { equipment, plane, events, held, totalsOnly, factors, day } = input;
  const add = (quantity: Quantity, list = events) => sum(list.map((event) => event[quantity]));
  const fluoroscopy = events.filter(isFluoroscopy);
  const acquisition = events.filter((event) => !isFluoroscopy(event));
  const summed = {
    kermaAreaProductGyCm2: add('kermaAreaProductGyCm2'),
    referenceAirKermaGy: add('referenceAirKermaGy'),
    fluoroscopyTimeS: sum(fluoroscopy.map((event) => event.irradiationDurationS ?? event.exposureTimeS)),
  };
  const alone = (quantity: keyof PlaneTotals['summed']) =>
    addKnown(...totalsOnly.map((total) => total[quantity]));
  const together = (quantity: keyof PlaneTotals['summed']) =>
    addKnown(held?.[quantity] ?? summed[quantity], alone(quantity));
  const displayed = {
    kermaAreaProductGyCm2: together('kermaAreaProductGyCm2'),
    referenceAirKermaGy: together('referenceAirKermaGy'),
    fluoroscopyTimeS: together('fluoroscopyTimeS'),
  };
  // Beside the sum over events stands only what a report says of these same events.
  const isTotalsOnly = held === null && events.length === 0 && totalsOnly.length > 0;
  const told = isTotalsOnly ? displayed : held;
  const productFactor = factorFor(factors, plane, 'kerma-area-product', day);
  const kermaFactor = factorFor(factors, plane, 'reference-air-kerma', day);
  return {
    equipmentId: equipment.id,
    equipmentLabel: equipment.label,
    plane,
    basis: told ? 'reported' : 'summed',
    reported: told && {
      kermaAreaProductGyCm2: told.kermaAreaProductGyCm2,
      referenceAirKermaGy: told.referenceAirKermaGy,
      fluoroscopyTimeS: told.fluoroscopyTimeS,
    },
    summed,
    displayed,
    corrected: {
      kermaAreaProductGyCm2: times(displayed.kermaAreaProductGyCm2, productFactor?.factor),
      referenceAirKermaGy: times(displayed.referenceAirKermaGy, kermaFactor?.factor),
    },
    factors: {
      kermaAreaProduct: productFactor?.factor ?? null,
      referenceAirKerma: kermaFactor?.factor ?? null,
      validFrom: kermaFactor?.validFrom ?? productFactor?.validFrom ?? null,
    },
    fluoroscopyKermaAreaProductGyCm2: addKnown(
      held?.fluoroscopyKermaAreaProductGyCm2 ?? add('kermaAreaProductGyCm2', fluoroscopy),
      ...totalsOnly.map((total) => total.fluoroscopyKermaAreaProductGyCm2),
    ),
    acquisitionKermaAreaProductGyCm2: addKnown(
      held?.acquisitionKermaAreaProductGyCm2 ?? add('kermaAreaProductGyCm2', acquisition),
      ...totalsOnly.map((total) => total.acquisitionKermaAreaProductGyCm2),
    ),
  };
}

/** Planes that count: a report's "all planes" total stands only where no plane is told apart. */
function planesOf(events: SummaryEvent[], reported: ReportPlane[]): PlaneTotals['plane'][] {
  const named = [...new Set([...reported.map(({ plane }) => plane), ...events.map(({ plane }) => plane)])];
  const apart = named.filter((plane) => plane !== 'all' && plane !== null);
  if (apart.length > 0) return apart.toSorted();
  return named.includes('all') ? ['all'] : named.slice(0, 1);
}

/** A total that names no plane of the machine goes to the only one, else it stands as a row of its own. */
function toPlane(total: ReportPlane, planes: PlaneTotals['plane'][]): PlaneTotals['plane'] {
  if (planes.includes(total.plane)) return total.plane;
  return planes.length === 1 ? (planes[0] ?? null) : 'all';
}

/** Totals of each plane of each machine: as reported, as summed over unique events, and corrected. */
export function totalPlanes(input: SummaryInput, day: string): PlaneTotals[] {
  const machineOf = new Map<string | null, string | null>(
    input.reports.map((one) => [one.id, one.equipmentId]),
  );
  const { machines } = standReports(input.reports);
  const told = new Set(machines.flatMap(({ eventKeys }) => [...eventKeys]));
  return machines.flatMap(({ equipmentId: id, holder, totalsOnly, eventKeys }) => {
    const events = input.events.filter((event) =>
      told.has(event.eventKey) ? eventKeys.has(event.eventKey) : machineOf.get(event.doseReportId) === id,
    );
    const held = holder?.reportedPlanes ?? [];
    // One report's "all planes" beside its planes is their total, not a further plane.
    const alone = totalsOnly.flatMap(({ reportedPlanes }) => {
      const planes = planesOf([], reportedPlanes);
      return reportedPlanes.filter(({ plane }) => planes.includes(plane));
    });
    const factors = input.factors.filter((factor) => factor.equipmentId === id);
    const label = id === null ? null : (input.equipmentLabels.get(id) ?? null);
    const known = planesOf(events, held);
    const planes = known.length > 0 ? known : planesOf([], alone);
    const rows = [...new Set([...planes, ...alone.map((total) => toPlane(total, planes))])];
    // Summed, an event that names no plane counts too, apart from the planes.
    if (rows.length > 1 && !holder && events.some(({ plane }) => !rows.includes(plane))) rows.push(null);
    const placeOf = (event: SummaryEvent) => (rows.includes(event.plane) ? event.plane : null);
    return rows.map((plane) =>
      totalPlane({
        equipment: { id, label },
        plane,
        events: rows.length === 1 ? events : events.filter((event) => placeOf(event) === plane),
        held: held.find((entry) => entry.plane === plane) ?? null,
        totalsOnly: alone.filter((total) => toPlane(total, planes) === plane),
        factors,
        day,
      }),
    );
  });
}
