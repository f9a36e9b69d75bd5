import type { ReportPlane } from '../../shared/contract/report';
import { planeOf } from './coded-values';
import type { ContentItem } from './content-tree';
import { parseDateTime } from './date-time';
import { fieldsByConcept, readFurther } from './further-items';
import { ItemIndex } from './item-index';
import { readDevices } from './participants';
import { planeQuantities } from './quantity-fields.table-data';
import { readQuantityFields } from './read-quantity-fields';
import { readQuantity, type Reported } from './read-quantity';
import type { WarningCollector } from './warning-collector';

const fields = fieldsByConcept(planeQuantities);

const expected = ['plane', 'kermaAreaProductGyCm2', 'referenceAirKermaGy'] as const;
const expectedOfFluoroscopy = [
  'fluoroscopyTimeS',
  'fluoroscopyKermaAreaProductGyCm2',
  'fluoroscopyReferenceAirKermaGy',
  'acquisitionKermaAreaProductGyCm2',
  'acquisitionReferenceAirKermaGy',
  'acquisitionTimeS',
] as const;

function parseCalibration(
  item: ContentItem,
  defaultOffset: string | null,
  warnings: WarningCollector,
): ReportPlane['calibrations'][number] {
  const index = new ItemIndex(item);
  const reported: Reported = {};
  const at = index.text('calibrationDateTime');
  const calibratedAt = at === null ? null : (parseDateTime(at, defaultOffset)?.text ?? null);
  if (at !== null && calibratedAt === null)
    warnings.add('date-time-unreadable', `calibratedAt ${JSON.stringify(at.slice(0, 40))}`);
  return {
    measurementDevice: index.code('doseMeasurementDevice'),
    calibratedAt,
    factor: readQuantity(index.all('calibrationFactor'), 'factor', 'count', reported, warnings),
    uncertaintyPercent: readQuantity(
      index.all('calibrationUncertainty'),
      'uncertaintyPercent',
      'percent',
      reported,
      warnings,
    ),
    responsibleParty: index.text('calibrationResponsibleParty'),
    protocol: index.text('calibrationProtocol'),
    reported,
  };
}

/** What the file reports as accumulated in one plane (TID 10002 with 10004, 10006 or 10007), in canonical units. */
export function parseAccumulated(
  item: ContentItem,
  defaultOffset: string | null,
  warnings: WarningCollector,
): ReportPlane {
  const index = new ItemIndex(item);
  const reported: Reported = {};
  const planeCode = index.code('acquisitionPlane');
  const plane = planeOf(planeCode);
  if (planeCode && !plane) warnings.add('plane-unknown', JSON.stringify(planeCode.meaning));
  return {
    plane,
    planeCode,
    ...readQuantityFields(index, planeQuantities, reported, warnings),
    detectorType: index.code('detectorType'),
    referencePointDefinition: index.referencePoint(),
    calibrations: (index.all('calibration') ?? []).map((one) =>
      parseCalibration(one, defaultOffset, warnings),
    ),
    devices: readDevices(index.all('deviceRole')),
    reported,
    ...readFurther(item, fields),
  };
}

/** A warning for each total that nothing was written for; radiography has no fluoroscopy part. */
export function warnOfMissingTotals(
  plane: ReportPlane,
  isRadiography: boolean,
  warnings: WarningCollector,
): void {
  const fields = isRadiography ? expected : [...expected, ...expectedOfFluoroscopy];
  for (const field of fields) {
    const isUnknownPlane = field === 'plane' && plane.planeCode !== null;
    if (plane[field] === null && !(field in plane.reported) && !isUnknownPlane) {
      warnings.add('value-missing', `total ${field} of plane ${plane.plane ?? 'not named'}`);
    }
  }
}
