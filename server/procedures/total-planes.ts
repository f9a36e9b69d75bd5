import type { PlaneTotals } from '../../shared/contract/procedure';
import type { ReportPlane } from '../../shared/contract/report';
import type { SummaryEvent, SummaryFactor, SummaryInput, SummaryReport } from './summary-input';

type Quantity = 'kermaAreaProductGyCm2' | 'referenceAirKermaGy';

/** Null where no event has the quantity: a missing value is not zero. */
function sum(values: (number | null)[]): number | null {
  const known = values.filter((value) => value !== null);
  return known.length === 0 ? null : known.reduce((total, value) => total + value, 0);
}

const isFluoroscopy = (event: SummaryEvent) => event.type === 'fluoroscopy';
const newestFirst = (a: SummaryReport, b: SummaryReport) =>
  (b.contentAt ?? '').localeCompare(a.contentAt ?? '') || b.receivedAt.getTime() - a.receivedAt.getTime();

/** The newest report that holds every event known of its machine: the one whose totals count. */
export function findCountingReport(reports: SummaryReport[]): SummaryReport | null {
  const known = new Set(reports.flatMap((report) => report.eventKeys));
  const holdsAll = (report: SummaryReport) => new Set(report.eventKeys).size === known.size;
  return reports.toSorted(newestFirst).find(holdsAll) ?? null;
}

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

function totalPlane(
  equipment: { id: string | null; label: string | null },
  plane: PlaneTotals['plane'],
  events: SummaryEvent[],
  reported: ReportPlane | null,
  factors: SummaryFactor[],
  day: string,
): PlaneTotals {
  const add = (quantity: Quantity, list = events) => sum(list.map((event) => event[quantity]));
  const fluoroscopy = events.filter(isFluoroscopy);
  const acquisition = events.filter((event) => !isFluoroscopy(event));
  const summed = {
    kermaAreaProductGyCm2: add('kermaAreaProductGyCm2'),
    referenceAirKermaGy: add('referenceAirKermaGy'),
    fluoroscopyTimeS: sum(fluoroscopy.map((event) => event.irradiationDurationS ?? event.exposureTimeS)),
  };
  const displayed = {
    kermaAreaProductGyCm2: reported?.kermaAreaProductGyCm2 ?? summed.kermaAreaProductGyCm2,
    referenceAirKermaGy: reported?.referenceAirKermaGy ?? summed.referenceAirKermaGy,
    fluoroscopyTimeS: reported?.fluoroscopyTimeS ?? summed.fluoroscopyTimeS,
  };
  const productFactor = factorFor(factors, plane, 'kerma-area-product', day);
  const kermaFactor = factorFor(factors, plane, 'reference-air-kerma', day);
  return {
    equipmentId: equipment.id,
    equipmentLabel: equipment.label,
    plane,
    basis: reported ? 'reported' : 'summed',
    reported: reported && {
      kermaAreaProductGyCm2: reported.kermaAreaProductGyCm2,
      referenceAirKermaGy: reported.referenceAirKermaGy,
      fluoroscopyTimeS: reported.fluoroscopyTimeS,
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
    fluoroscopyKermaAreaProductGyCm2:
      reported?.fluoroscopyKermaAreaProductGyCm2 ?? add('kermaAreaProductGyCm2', fluoroscopy),
    acquisitionKermaAreaProductGyCm2:
      reported?.acquisitionKermaAreaProductGyCm2 ?? add('kermaAreaProductGyCm2', acquisition),
  };
}

/** Planes that count: a report's "all planes" total stands only where no plane is told apart. */
function planesOf(events: SummaryEvent[], reported: ReportPlane[]): PlaneTotals['plane'][] {
  const named = [...new Set([...reported.map(({ plane }) => plane), ...events.map(({ plane }) => plane)])];
  const apart = named.filter((plane) => plane !== 'all' && plane !== null);
  if (apart.length > 0) return apart.toSorted();
  return named.includes('all') ? ['all'] : named.slice(0, 1);
}

/** Totals of each plane of each machine: as reported, as summed over unique events, and corrected. */
export function totalPlanes(input: SummaryInput, day: string): PlaneTotals[] {
  const equipmentIds = [...new Set(input.reports.map((report) => report.equipmentId))];
  return equipmentIds.flatMap((id) => {
    const reports = input.reports.filter((report) => report.equipmentId === id);
    const reportIds = new Set<string | null>(reports.map((report) => report.id));
    const events = input.events.filter((event) => reportIds.has(event.doseReportId));
    const reported = findCountingReport(reports)?.reportedPlanes ?? [];
    const factors = input.factors.filter((factor) => factor.equipmentId === id);
    const label = id === null ? null : (input.equipmentLabels.get(id) ?? null);
    const planes = planesOf(events, reported);
    return planes.map((plane) =>
      totalPlane(
        { id, label },
        plane,
        planes.length === 1 ? events : events.filter((event) => event.plane === plane),
        reported.find((entry) => entry.plane === plane) ?? null,
        factors,
        day,
      ),
    );
  });
}
