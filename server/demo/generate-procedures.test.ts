import { beforeAll, describe, expect, it } from 'vitest';
import { quantile, sampleCorrelation, standardDeviation } from 'simple-statistics';
import type { DemoIrradiationEvent, DemoProcedure, DemoProcedureType } from './demo-types';
import { generateProcedures } from './generate-procedures';
import { demoProcedureTypes } from './procedure-types.table-data';

const anchor = new Date('2026-12-01T00:00:00Z');
let procedures: DemoProcedure[] = [];
let events: DemoIrradiationEvent[] = [];
beforeAll(() => {
  procedures = [...generateProcedures(anchor)];
  events = procedures.flatMap((procedure) => procedure.events);
}, 60_000);

const totalOf = (
  procedure: DemoProcedure,
  quantity: 'fluoroscopyTimeS' | 'referenceAirKermaGy' | 'kermaAreaProductGyCm2',
) => procedure.planes.reduce((sum, plane) => sum + plane[quantity], 0);
const spoilt = ['kap-unit-slip', 'kerma-not-reset', 'no-report', 'manual-entry'];
const isSound = (procedure: DemoProcedure) => !spoilt.includes(procedure.defect ?? '');
const soundOf = (type: DemoProcedureType) =>
  procedures.filter((procedure) => procedure.type.key === type.key && isSound(procedure));

describe('the demo as a whole', () => {
  it('has 7,356 procedures in order of start, inside the 24 months before the anchor', () => {
    expect(procedures).toHaveLength(7356);
    const starts = procedures.map((procedure) => procedure.startedAt.getTime());
    expect(starts).toEqual([...starts].sort((a, b) => a - b));
    expect(procedures[0]?.startedAtLocal.slice(0, 7)).toBe('2024-12');
    expect(procedures.at(-1)?.startedAtLocal.slice(0, 7)).toBe('2026-11');
  });

  it('is the same again for the same anchor', () => {
    const [first] = generateProcedures(anchor);
    expect(first).toEqual(procedures[0]);
  });

  it('has between 200,000 and 300,000 irradiation events', () => {
    expect(events.length).toBeGreaterThan(200_000);
    expect(events.length).toBeLessThan(300_000);
  });

  it('gives every study, accession number and irradiation event of a plane its own identifier', () => {
    expect(new Set(procedures.map((p) => p.studyInstanceUid)).size).toBe(7356);
    expect(new Set(procedures.map((p) => p.accessionNumber)).size).toBe(7356);
    const keys = events.map((event) => `${event.irradiationEventUid}/${event.plane}`);
    expect(new Set(keys).size).toBe(keys.length);
    expect(procedures.every((p) => p.studyInstanceUid.length <= 58)).toBe(true);
  });

  it('has adults only', () => {
    const youngest =
      procedures
        .map((p) => p.patient.birthDate)
        .sort()
        .at(-1) ?? '';
    expect(youngest < '2006').toBe(true);
  });
});

describe.each(demoProcedureTypes.map((type) => [type.key, type] as const))('%s', (_, type) => {
  it.each([
    ['fluoroscopyTimeS', 'fluoroscopyTimeMin', 1 / 60],
    ['referenceAirKermaGy', 'referenceAirKermaMGy', 1000],
    ['kermaAreaProductGyCm2', 'kermaAreaProductGyCm2', 1],
  ] as const)(
    'has the median of %s within 5 % and its third quartile within 10 %',
    (total, target, scale) => {
      const values = soundOf(type).map((procedure) => totalOf(procedure, total) * scale);
      expect(Math.abs(quantile(values, 0.5) / type[target].median - 1)).toBeLessThan(0.05);
      expect(Math.abs(quantile(values, 0.75) / type[target].p75 - 1)).toBeLessThan(0.1);
    },
  );

  it('irradiates longer where kerma is higher', () => {
    const log = (total: 'fluoroscopyTimeS' | 'referenceAirKermaGy') =>
      soundOf(type).map((procedure) => Math.log(totalOf(procedure, total)));
    const correlation = sampleCorrelation(log('fluoroscopyTimeS'), log('referenceAirKermaGy'));
    expect(correlation).toBeGreaterThan(0.6);
    expect(correlation).toBeLessThan(0.85);
  });

  it('spreads kVp, angles and copper over its events', () => {
    const ofType = soundOf(type).flatMap((procedure) => procedure.events);
    expect(standardDeviation(ofType.map((event) => event.kvpValues[0] ?? 0))).toBeGreaterThan(2);
    expect(standardDeviation(ofType.map((event) => event.primaryAngleDeg))).toBeGreaterThan(2);
    const copper = ofType.map((event) => event.filters.find((f) => f.material === 'Cu')?.minThicknessMm ?? 0);
    expect(new Set(copper).size).toBeGreaterThan(1);
  });
});

describe('another anchor', () => {
  it('moves the calendar and keeps number and medians', () => {
    const kermaMGy: number[] = [];
    let count = 0;
    for (const procedure of generateProcedures(new Date('2028-03-01T00:00:00Z'))) {
      count += 1;
      if (procedure.type.key === 'IR-PTBD') kermaMGy.push(1000 * totalOf(procedure, 'referenceAirKermaGy'));
    }
    expect(count).toBe(7356);
    expect(Math.abs(quantile(kermaMGy, 0.5) / 160 - 1)).toBeLessThan(0.05);
  }, 60_000);
});

describe('irradiation events', () => {
  it('add up to the totals of their plane within 0.5 %, unless the kerma was not reset', () => {
    const sumOf = (rows: DemoIrradiationEvent[], quantity: 'kermaAreaProductGyCm2' | 'referenceAirKermaGy') =>
      rows.reduce((sum, row) => sum + row[quantity], 0);
    const isOff = (sum: number, total: number) => Math.abs(sum / total - 1) > 0.005;
    const off = procedures.filter(
      (procedure) =>
        procedure.defect !== 'manual-entry' &&
        procedure.planes.some((plane) => {
          const rows = procedure.events.filter((event) => event.plane === plane.plane);
          return (
            isOff(sumOf(rows, 'kermaAreaProductGyCm2'), plane.kermaAreaProductGyCm2) ||
            isOff(sumOf(rows, 'referenceAirKermaGy'), plane.referenceAirKermaGy)
          );
        }),
    );
    expect(new Set(off.map((procedure) => procedure.defect))).toEqual(new Set(['kerma-not-reset']));
  });

  it('follow one another: none begins before the one before has ended', () => {
    const overlapping = procedures.filter((procedure) =>
      procedure.events.some((event, index) => {
        const previous = procedure.events[index - 1];
        if (!previous || previous.irradiationEventUid === event.irradiationEventUid) return false;
        return event.offsetS < previous.offsetS + previous.irradiationDurationS;
      }),
    );
    expect(overlapping).toEqual([]);
  });

  it('keep beam-on time inside the wall-clock time', () => {
    expect(events.filter((event) => event.exposureTimeS > event.irradiationDurationS)).toEqual([]);
  });

  it('stay inside the tube: kVp, current, copper', () => {
    const outside = events.filter(
      (event) =>
        event.kvpValues.some((kvp) => kvp < 48 || kvp > 127) ||
        event.tubeCurrentMa <= 0 ||
        event.tubeCurrentMa > 1000,
    );
    expect(outside).toEqual([]);
  });

  it('come in pairs of planes in the neuro room, the lateral plane with about a quarter of K a,r', () => {
    const neuro = procedures.filter((procedure) => procedure.room === 'NR1' && isSound(procedure));
    const shares = neuro.map(
      (procedure) =>
        (procedure.planes.find(({ plane }) => plane === 'B')?.referenceAirKermaGy ?? 0) /
        totalOf(procedure, 'referenceAirKermaGy'),
    );
    expect(quantile(shares, 0.5)).toBeGreaterThan(0.22);
    expect(quantile(shares, 0.5)).toBeLessThan(0.28);
    const lonely = neuro.filter((procedure) => {
      const uidsOf = (name: 'A' | 'B') =>
        procedure.events.filter((event) => event.plane === name).map((event) => event.irradiationEventUid);
      const frontal = new Set(uidsOf('A'));
      return uidsOf('B').some((uid) => !frontal.has(uid));
    });
    expect(lonely).toEqual([]);
  });
});

describe('the stories', () => {
  const rateOf = (procedure: DemoProcedure) =>
    totalOf(procedure, 'referenceAirKermaGy') / totalOf(procedure, 'fluoroscopyTimeS');
  const medianRate = (isIn: (procedure: DemoProcedure) => boolean) =>
    quantile(procedures.filter((p) => isSound(p) && isIn(p)).map(rateOf), 0.5);

  it('IC-2 works at a clearly lower kerma rate from month 13, and at 7.5 pulses per second', () => {
    const isHis = (p: DemoProcedure) => p.operatorCode === 'IC-2' && p.type.key === 'CA-PCI';
    const before = medianRate((p) => isHis(p) && p.month < 13);
    const after = medianRate((p) => isHis(p) && p.month >= 13);
    expect(after / before).toBeGreaterThan(0.6);
    expect(after / before).toBeLessThan(0.82);
    const pulses = (isIn: (month: number) => boolean) =>
      new Set(
        procedures
          .filter((p) => isHis(p) && isIn(p.month))
          .flatMap((p) => p.events.filter((e) => e.type === 'fluoroscopy').map((e) => e.pulseRatePerS)),
      );
    expect([...pulses((month) => month < 13)]).toEqual([15]);
    expect([...pulses((month) => month >= 13)]).toEqual([7.5]);
  });

  it('the second interventional room has a new machine and about two thirds of the kerma from month 15', () => {
    const isDrainage = (p: DemoProcedure) => p.type.key === 'IR-NEPH';
    const ratio =
      medianRate((p) => isDrainage(p) && p.month >= 15) / medianRate((p) => isDrainage(p) && p.month < 15);
    expect(ratio).toBeGreaterThan(0.55);
    expect(ratio).toBeLessThan(0.75);
    const serials = (month: number) =>
      new Set(
        procedures.filter((p) => p.room === 'IR2' && p.month === month).map((p) => p.equipment.serialNumber),
      );
    expect([...serials(14)]).not.toEqual([...serials(15)]);
    expect(serials(15).size).toBe(1);
  });

  it('asks for few substantial reviews: at most 1.5 a week at 5 Gy', () => {
    const substantial = procedures.filter((p) => isSound(p) && totalOf(p, 'referenceAirKermaGy') >= 5).length;
    expect(substantial).toBeGreaterThan(35);
    expect(substantial / 104).toBeLessThan(1.5);
  });

  it('leaves regular work inside opening hours', () => {
    const late = procedures.filter((p) => {
      const time = p.startedAtLocal.slice(11, 16);
      return !p.isOutOfHours && (time < '07:30' || time > '17:30');
    });
    expect(late).toEqual([]);
  });
});

describe('planted faults', () => {
  it('are as many as were meant, and none without a file is among the newest', () => {
    const count = (defect: string) => procedures.filter((p) => p.defect === defect).length;
    expect(count('missing-weight')).toBe(147);
    expect(count('manual-entry')).toBe(37);
    expect(count('no-report')).toBe(12);
    const newest = procedures.filter((p) => p.startedAtLocal >= '2026-11-01');
    expect(newest.filter((p) => p.events.length === 0)).toEqual([]);
  });

  it('leave more records unfinished in the first half year than in the last', () => {
    const unfinished = (isIn: (month: number) => boolean) =>
      procedures.filter((p) => p.defect === 'record-incomplete' && isIn(p.month)).length;
    expect(unfinished((month) => month <= 6)).toBeGreaterThan(unfinished((month) => month > 18));
  });
});
