import type { DemoIrradiationEvent, DemoPlaneTotals, DemoProcedure } from '../../server/demo/demo-types';

type TotalsField = 'kermaAreaProductGyCm2' | 'referenceAirKermaGy' | 'fluoroscopyTimeS';
const mapTotals = (change: (plane: DemoPlaneTotals) => Partial<DemoPlaneTotals>) => (p: DemoProcedure) => ({
  ...p,
  planes: p.planes.map((plane) => ({ ...plane, ...change(plane) })),
});
const mapEvents =
  (change: (event: DemoIrradiationEvent, place: number) => Partial<DemoIrradiationEvent>) =>
  (p: DemoProcedure) => ({
    ...p,
    events: p.events.map((event, place) => ({ ...event, ...change(event, place) })),
  });
const inTotals = (field: TotalsField, factor: number) =>
  mapTotals((plane) => ({ [field]: plane[field] * factor }));
const inEvents = (field: 'kermaAreaProductGyCm2' | 'referenceAirKermaGy', factor: number) =>
  mapEvents((event) => ({ [field]: event[field] * factor }));
const throughout =
  (field: 'kermaAreaProductGyCm2' | 'referenceAirKermaGy', factor: number) => (p: DemoProcedure) =>
    inEvents(field, factor)(inTotals(field, factor)(p));
const withoutEvents = (p: DemoProcedure): DemoProcedure => ({ ...p, events: [] });
const both = (factor: number) => (p: DemoProcedure) =>
  throughout('kermaAreaProductGyCm2', factor)(throughout('referenceAirKermaGy', factor)(p));

const dayS = 86_400;
const hasTwoPlanes = ({ planes }: DemoProcedure) => planes.length === 2;
const hasEnoughTime = ({ planes }: DemoProcedure) =>
  planes.reduce((sum, { fluoroscopyTimeS }) => sum + fluoroscopyTimeS, 0) > 60;

export type Fault = {
  name: string;
  plant: (procedure: DemoProcedure, before: DemoProcedure) => DemoProcedure;
  /** Which procedures can carry it. */
  fits?: (procedure: DemoProcedure) => boolean;
};

/** Faults that the rules are to find. */
export const findableFaults: Fault[] = [
  { name: 'P KA × 100 in the whole report', plant: throughout('kermaAreaProductGyCm2', 100) },
  { name: 'P KA × 1,000 in the whole report', plant: throughout('kermaAreaProductGyCm2', 1000) },
  { name: 'P KA × 10 in the whole report', plant: throughout('kermaAreaProductGyCm2', 10) },
  { name: 'P KA ÷ 10 in the whole report', plant: throughout('kermaAreaProductGyCm2', 0.1) },
  { name: 'P KA ÷ 100 in the whole report', plant: throughout('kermaAreaProductGyCm2', 0.01) },
  { name: 'P KA × 100 in the totals alone', plant: inTotals('kermaAreaProductGyCm2', 100) },
  { name: 'P KA ÷ 10 in the totals alone', plant: inTotals('kermaAreaProductGyCm2', 0.1) },
  { name: 'P KA × 10 in the events alone', plant: inEvents('kermaAreaProductGyCm2', 10) },
  {
    name: 'P KA × 100, report without events',
    plant: (p) => withoutEvents(inTotals('kermaAreaProductGyCm2', 100)(p)),
  },
  {
    name: 'P KA ÷ 10, report without events',
    plant: (p) => withoutEvents(inTotals('kermaAreaProductGyCm2', 0.1)(p)),
  },
  { name: 'K a,r × 1,000 (mGy as Gy)', plant: throughout('referenceAirKermaGy', 1000) },
  { name: 'K a,r ÷ 1,000 (Gy as mGy)', plant: throughout('referenceAirKermaGy', 0.001) },
  { name: 'K a,r × 1,000 in the totals alone', plant: inTotals('referenceAirKermaGy', 1000) },
  { name: 'K a,r and P KA both × 1,000', plant: both(1000) },
  { name: 'K a,r and P KA both ÷ 1,000', plant: both(0.001) },
  { name: 'K a,r of zero', plant: throughout('referenceAirKermaGy', 0), fits: hasEnoughTime },
  { name: 'Fluoroscopy time in ms as s', plant: inTotals('fluoroscopyTimeS', 1000) },
  { name: 'Fluoroscopy time in s as min', plant: inTotals('fluoroscopyTimeS', 60) },
  { name: 'Fluoroscopy time in min as s', plant: inTotals('fluoroscopyTimeS', 1 / 60) },
  { name: 'Fluoroscopy time of zero', plant: inTotals('fluoroscopyTimeS', 0) },
  {
    name: 'Counter of K a,r not reset',
    plant: (p, before) => ({
      ...p,
      planes: p.planes.map((plane) => ({
        ...plane,
        referenceAirKermaGy:
          plane.referenceAirKermaGy +
          (before.planes.find((one) => one.plane === plane.plane)?.referenceAirKermaGy ?? 0),
      })),
    }),
  },
  {
    name: 'One total written for both planes',
    plant: (p) => ({
      ...p,
      planes: p.planes.map((plane) => ({ ...plane, ...p.planes[0], plane: plane.plane })),
    }),
    fits: hasTwoPlanes,
  },
  {
    name: 'Half of the events missing',
    plant: (p) => ({ ...p, events: p.events.slice(0, Math.ceil(p.events.length / 2)) }),
    fits: ({ events }) => events.length > 3,
  },
  {
    name: 'An event of three days before',
    plant: mapEvents((event, place) => (place === 0 ? { offsetS: event.offsetS - 3 * dayS } : {})),
    fits: ({ events }) => events.length > 1,
  },
  { name: 'Clock an hour ahead', plant: (p) => ({ ...p, deviceClockAheadS: 3600 }) },
  { name: 'Clock back in the year 2000', plant: (p) => ({ ...p, deviceClockAheadS: -26 * 365.25 * dayS }) },
  {
    name: 'A negative P KA',
    plant: mapEvents((event, place) =>
      place === 0 ? { kermaAreaProductGyCm2: -event.kermaAreaProductGyCm2 } : {},
    ),
  },
  { name: 'kVp × 10', plant: mapEvents((event) => ({ kvpValues: event.kvpValues.map((kvp) => kvp * 10) })) },
  {
    name: 'Pulse width in s as ms',
    plant: mapEvents((event) => ({ pulseWidthMs: event.pulseWidthMs / 1000 })),
  },
  { name: 'Angle of 270°', plant: mapEvents(() => ({ primaryAngleDeg: 270 })) },
  {
    name: 'Weight in g as kg',
    plant: (p) => ({ ...p, patient: { ...p.patient, weightKg: (p.patient.weightKg ?? 70) * 1000 } }),
  },
  { name: 'Height in cm as m', plant: (p) => ({ ...p, patient: { ...p.patient, heightM: 172 } }) },
];

/** Faults that no rule can tell from a true value. */
export const hiddenFaults: Fault[] = [
  { name: 'Clock an hour behind', plant: (p) => ({ ...p, deviceClockAheadS: -3600 }) },
  { name: 'Clock five minutes ahead', plant: (p) => ({ ...p, deviceClockAheadS: 300 }) },
  { name: 'K a,r and P KA both a third too high', plant: both(1.33) },
  {
    name: 'P KA twice too high, report without events',
    plant: (p) => withoutEvents(inTotals('kermaAreaProductGyCm2', 2)(p)),
  },
  {
    name: 'Weight in lb as kg',
    plant: (p) => ({ ...p, patient: { ...p.patient, weightKg: (p.patient.weightKg ?? 70) * 2.2 } }),
    fits: ({ patient }) => (patient.weightKg ?? 0) < 150,
  },
  { name: 'Another patient’s name', plant: (p) => ({ ...p, patient: { ...p.patient, name: 'Other^One' } }) },
];
