import type { DemoIrradiationEvent, DemoPlane, DemoPlaneTotals } from './demo-types';

const sumOf = (
  events: readonly DemoIrradiationEvent[],
  quantity: 'kermaAreaProductGyCm2' | 'referenceAirKermaGy' | 'irradiationDurationS',
): number => Number(events.reduce((sum, event) => sum + event[quantity], 0).toPrecision(6));

/** The accumulated values that the machine writes at the end, one set for each plane. */
export function totalPlanes(events: readonly DemoIrradiationEvent[]): DemoPlaneTotals[] {
  const planes = [...new Set(events.map((event) => event.plane))].sort();
  return planes.map((plane: DemoPlane): DemoPlaneTotals => {
    const inPlane = events.filter((event) => event.plane === plane);
    const fluoroscopy = inPlane.filter((event) => event.type === 'fluoroscopy');
    const acquisition = inPlane.filter((event) => event.type !== 'fluoroscopy');
    return {
      plane,
      kermaAreaProductGyCm2: sumOf(inPlane, 'kermaAreaProductGyCm2'),
      referenceAirKermaGy: sumOf(inPlane, 'referenceAirKermaGy'),
      fluoroscopyTimeS: sumOf(fluoroscopy, 'irradiationDurationS'),
      fluoroscopyKermaAreaProductGyCm2: sumOf(fluoroscopy, 'kermaAreaProductGyCm2'),
      fluoroscopyReferenceAirKermaGy: sumOf(fluoroscopy, 'referenceAirKermaGy'),
      acquisitionKermaAreaProductGyCm2: sumOf(acquisition, 'kermaAreaProductGyCm2'),
      acquisitionReferenceAirKermaGy: sumOf(acquisition, 'referenceAirKermaGy'),
      acquisitionTimeS: sumOf(acquisition, 'irradiationDurationS'),
    };
  });
}
