import type { PlaneTotals } from '../../shared/contract/procedure';
import type { SummaryEvent, SummaryInput } from '../procedures/summary-input';
import { totalTogether } from '../procedures/total-together';
import { noContext, type CheckContext } from './check-context';
import { checkData, plainChecking, type Checking } from './check-data';

type Figures = { kermaGy?: number | null; productGyCm2?: number | null; minutes?: number | null };
export type Given = Figures & {
  /** Sums of events, where they differ from the totals. */
  summed?: Figures;
  /** A second plane. */
  planeB?: Figures & { summed?: Figures };
  events?: Partial<SummaryEvent>[];
  input?: Partial<SummaryInput>;
  context?: Partial<CheckContext>;
};

const receivedAt = new Date('2026-11-30T12:00:00Z');
const toTotals = ({ kermaGy = 0.35, productGyCm2 = 43, minutes = 6.5 }: Figures) => ({
  kermaAreaProductGyCm2: productGyCm2,
  referenceAirKermaGy: kermaGy,
  fluoroscopyTimeS: minutes === null ? null : minutes * 60,
});
const toPlane = (plane: 'single' | 'A' | 'B', figures: Figures, summed: Figures): PlaneTotals =>
  ({
    equipmentId: 'machine',
    plane,
    basis: 'reported',
    reported: toTotals(figures),
    summed: toTotals({ ...figures, ...summed }),
    displayed: toTotals(figures),
    corrected: { kermaAreaProductGyCm2: null, referenceAirKermaGy: null },
    factors: { kermaAreaProduct: null, referenceAirKerma: null, validFrom: null },
  }) as PlaneTotals;

/** Every rule held against a procedure of the given figures; a sound one where nothing is given. */
export function checkGiven(given: Given, checking: Partial<Checking> = {}) {
  const { planeB, summed = {}, events = [], input = {}, context = {} } = given;
  const planes = planeB
    ? [toPlane('A', given, summed), toPlane('B', planeB, planeB.summed ?? {})]
    : [toPlane('single', given, summed)];
  const whole = {
    procedure: { patientHeightM: null, patientWeightKg: null },
    events: events.map((event) => ({
      type: 'fluoroscopy',
      kvpValues: [80],
      startedAt: new Date('2026-11-30T10:00:00Z'),
      localStartedAt: '2026-11-30T10:00:00',
      plane: null,
      ...event,
    })),
    reports: [],
    receivedAt,
    timeZone: 'UTC',
    now: new Date('2026-12-01T00:00:00Z'),
    ...input,
  } as unknown as SummaryInput;
  const facts = { input: whole, planes, together: totalTogether(planes, null) };
  return checkData(facts, { ...plainChecking, context: { ...noContext, ...context }, ...checking });
}
/** One rule's result. */
export const checkOne = (code: string, given: Given, checking?: Partial<Checking>) => {
  const found = checkGiven(given, checking).find((item) => item.code === code);
  if (!found) throw new Error(`No rule ${code}`);
  return found;
};
export const resultOf = (code: string, given: Given) => checkOne(code, given).result;
/** A stored report that says what is given. */
export const makeReport = (overrides: object) =>
  ({ id: 'r', receivedAt, reportedPlanes: [], warnings: [], context: null, ...overrides }) as never;
