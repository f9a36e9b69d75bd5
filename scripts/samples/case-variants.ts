import type { DoseReportContent, WrittenEvent } from '../../server/dicom-writer/dose-report-content';
import { acquisitionEvent, caseContent, clock, fluoroscopyEvent, round } from './case-content';

/** A rotational run with end angles and a wedge beside the copper. */
export function rotationalEvent(sample: number, index: number): WrittenEvent {
  return acquisitionEvent(sample, index, {
    type: 'rotational-acquisition',
    protocol: 'Rotation 200 deg',
    primaryAngleDeg: -100,
    primaryEndAngleDeg: 100,
    secondaryAngleDeg: 0,
    secondaryEndAngleDeg: 0,
    filters: [
      { type: 'flat', material: 'Cu', minThicknessMm: 0.2, maxThicknessMm: 0.2 },
      { type: 'wedge', material: 'Al', minThicknessMm: 0.5, maxThicknessMm: 3 },
    ],
  });
}

/** Two planes: pairs of events with equal start. */
export function biplaneCase(sample: number): DoseReportContent {
  const lateral = { plane: 'B', primaryAngleDeg: 88.5, secondaryAngleDeg: 0 } as const;
  const base = caseContent(sample);
  const totals = base.planes.flatMap((one) => [
    { ...one, plane: 'A' as const },
    { ...one, plane: 'B' as const, kermaAreaProductGyCm2: 5.5, referenceAirKermaGy: 0.0312 },
  ]);
  const events = [0, 2, 4].flatMap((index) => [
    fluoroscopyEvent(sample, index, { plane: 'A' }),
    fluoroscopyEvent(sample, index + 1, { ...lateral, startedAt: clock(index * 40) }),
  ]);
  return { ...base, planes: totals, events: [...events, { ...rotationalEvent(sample, 6), plane: 'A' }] };
}

/** Units other than the standard's, decimal strings in every legal form. */
export function oddUnitsCase(sample: number): DoseReportContent {
  const base = caseContent(sample);
  return {
    ...base,
    planes: [
      {
        plane: 'single',
        kermaAreaProductGyCm2: { text: '786.3', unit: 'cGy.cm2' },
        referenceAirKermaGy: { text: '45.77', unit: 'mGy' },
        fluoroscopyKermaAreaProductGyCm2: { text: '161.3', unit: 'uGy.m2' },
        fluoroscopyReferenceAirKermaGy: { text: '8270', unit: 'uGy' },
        fluoroscopyTimeS: { text: '.413', unit: 'min' },
        acquisitionKermaAreaProductGyCm2: { text: '62.5', unit: 'dGy.cm2' },
        acquisitionReferenceAirKermaGy: { text: '+3.75E+1', unit: 'mGy' },
        acquisitionTimeS: { text: '8000', unit: 'ms' },
        referencePointDefinition: 'isocenter-15-cm-toward-source',
      },
    ],
    events: [
      fluoroscopyEvent(sample, 0, {
        kermaAreaProductGyCm2: { text: '0.8e+3', unit: 'mGy.cm2' },
        referenceAirKermaGy: { text: '4.1', unit: 'mGy' },
        exposureTimeS: { text: '0.558', unit: 's' },
        sourceToDetectorMm: { text: '112', unit: 'cm' },
      }),
      acquisitionEvent(sample, 1, {
        kermaAreaProductGyCm2: { text: '6.25', unit: 'Gy.cm2' },
        irradiationDurationS: { text: '8000', unit: 'ms' },
      }),
    ],
  };
}

/** 300 events in one procedure, all different, made by arithmetic alone. */
export function manyEventsCase(sample: number): DoseReportContent {
  const events = Array.from({ length: 300 }, (_, index) => {
    const isAcquisition = index % 12 === 11;
    const make = isAcquisition ? acquisitionEvent : fluoroscopyEvent;
    return make(sample, index, {
      kermaAreaProductGyCm2: round((isAcquisition ? 4 : 0.35) * (1 + 0.6 * Math.sin(index))),
      referenceAirKermaGy: round((isAcquisition ? 0.024 : 0.0021) * (1 + 0.6 * Math.sin(index))),
      primaryAngleDeg: round(35 * Math.sin(index / 17), 3),
      secondaryAngleDeg: round(20 * Math.cos(index / 11), 3),
      kvpValues: [70 + (index % 23), 70.5 + (index % 23)],
    });
  });
  const sum = (key: 'kermaAreaProductGyCm2' | 'referenceAirKermaGy') =>
    round(
      events.reduce((total, event) => total + Number(event[key]), 0),
      9,
    );
  const totals = {
    plane: 'single' as const,
    kermaAreaProductGyCm2: sum('kermaAreaProductGyCm2'),
    referenceAirKermaGy: sum('referenceAirKermaGy'),
    fluoroscopyTimeS: 3410,
    referencePointDefinition: 'isocenter-15-cm-toward-source',
  };
  return caseContent(sample, { planes: [totals], events });
}

/** Totals from a performed procedure step, no events. */
export function totalsOnlyCase(sample: number): DoseReportContent {
  return caseContent(sample, {
    sourcesOfInformation: ['mpps'],
    planes: [{ plane: 'single', kermaAreaProductGyCm2: 31.4, fluoroscopyTimeS: 612, frameCount: 18 }],
    events: [],
  });
}
