import type { TypedQuantity } from '../../shared/contract/manual-entry';
import type { ReportPlane } from '../../shared/contract/report';
import { readTypedQuantity } from '../../shared/read-typed-quantity';

/** Which field of a report each typed quantity fills. */
const fields = {
  'reference-air-kerma': 'referenceAirKermaGy',
  'kerma-area-product': 'kermaAreaProductGyCm2',
  'fluoroscopy-time': 'fluoroscopyTimeS',
  'frame-count': 'frameCount',
} as const satisfies Record<TypedQuantity['quantity'], keyof ReportPlane>;

const emptyPlane = (plane: ReportPlane['plane']): ReportPlane => ({
  plane,
  planeCode: null,
  kermaAreaProductGyCm2: null,
  referenceAirKermaGy: null,
  fluoroscopyTimeS: null,
  fluoroscopyKermaAreaProductGyCm2: null,
  fluoroscopyReferenceAirKermaGy: null,
  acquisitionKermaAreaProductGyCm2: null,
  acquisitionReferenceAirKermaGy: null,
  acquisitionTimeS: null,
  sourceToReferencePointMm: null,
  frameCount: null,
  detectorType: null,
  referencePointDefinition: null,
  calibrations: [],
  devices: [],
  reported: {},
  preciseValues: {},
  qualifiers: {},
  furtherItems: [],
});

/** Typed figures as the planes of a report, canonical with the typed text beside; what was not typed is null. */
export function toReportPlanes(quantities: readonly TypedQuantity[]): ReportPlane[] {
  const planes = new Map<TypedQuantity['plane'], ReportPlane>();
  for (const figure of quantities) {
    const { quantity, plane: name, text, unit } = figure;
    const plane = planes.get(name) ?? emptyPlane(name);
    const field = fields[quantity];
    plane[field] = readTypedQuantity(figure).value ?? null;
    plane.reported[field] = { text: [text], unit };
    planes.set(name, plane);
  }
  return [...planes.values()].toSorted((a, b) => (a.plane ?? '').localeCompare(b.plane ?? ''));
}
