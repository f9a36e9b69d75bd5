import type { Report, ReportWarning } from '../../shared/contract/report';
import { availabilityOf, procedureOf, singleValueOf } from './coded-values';
import type { ContentItem } from './content-tree';
import type { ConceptName } from './concepts.table-data';
import { classifyDevice } from './device-class';
import { readFurther } from './further-items';
import { findContainers, ItemIndex } from './item-index';
import { parseAccumulated, warnOfMissingTotals } from './parse-accumulated';
import type { Header } from './parse-header';
import { readObservers, readPersons } from './participants';
import { readImages } from './read-images';
import type { WarningCollector } from './warning-collector';

/** The first start; offsets, where all events have them, are taken into account. */
function findStart(events: Report['events']): { startedAt: string; utcOffset: string | null } | null {
  const started = events.flatMap(({ startedAt, utcOffset }) =>
    startedAt === null ? [] : [{ startedAt, utcOffset }],
  );
  const isAbsolute = started.every((one) => one.utcOffset !== null);
  const order = (one: { startedAt: string }) =>
    isAbsolute ? new Date(one.startedAt).toISOString() : one.startedAt;
  return started.reduce<(typeof started)[number] | null>(
    (first, one) => (first === null || order(one) < order(first) ? one : first),
    null,
  );
}

/** The header's maker, model and serial; where it has none, those of the irradiating device (TID 1021). */
function completeEquipment(
  header: Header,
  planes: Report['planes'],
  events: Report['events'],
): Report['equipment'] {
  const devices = [...planes, ...events].flatMap((one) => one.devices);
  const irradiating = devices.find((device) => singleValueOf(device.role) === 'irradiatingDevice');
  const { equipment } = header;
  return {
    ...equipment,
    manufacturer: equipment.manufacturer ?? irradiating?.manufacturer ?? null,
    modelName: equipment.modelName ?? irradiating?.modelName ?? null,
    serialNumber: equipment.serialNumber ?? irradiating?.serialNumber ?? null,
  };
}

const noFields = new Map<ConceptName, string>();

/** What the machine says it could state at all (TID 10001, CID 230). */
function readAvailabilities(index: ItemIndex, warnings: WarningCollector) {
  const read = (name: 'detectorDataAvailable' | 'sourceDataAvailable' | 'mechanicalDataAvailable') => {
    const code = index.code(name);
    const value = availabilityOf(code);
    if (code && !value) warnings.add('code-unknown', `${name} ${JSON.stringify(code.meaning)}`);
    return value;
  };
  return {
    detectorDataAvailable: read('detectorDataAvailable'),
    sourceDataAvailable: read('sourceDataAvailable'),
    mechanicalDataAvailable: read('mechanicalDataAvailable'),
  };
}

function parseScope(index: ItemIndex): Report['scopeOfAccumulation'] {
  const item = index.all('scopeOfAccumulation')?.[0];
  if (!item) return null;
  const uid = item.children.find((child) => child.valueType === 'UIDREF');
  return { code: item.code, uidType: uid?.concept ?? null, uid: uid?.text ?? null };
}

function warnOfGaps(report: Report, warnings: WarningCollector): void {
  const { patient, equipment } = report;
  const expected: [string, unknown][] = [
    ['sopInstanceUid', report.sopInstanceUid],
    ['studyInstanceUid', report.studyInstanceUid],
    ['accessionNumber', report.accessionNumber],
    ['startedAt', report.startedAt],
    ['patient.id', patient.id],
    ['patient.name', patient.name],
    ['patient.heightM', patient.heightM],
    ['patient.weightKg', patient.weightKg],
    ['equipment.manufacturer', equipment.manufacturer],
    ['equipment.modelName', equipment.modelName],
    ['equipment.serialNumber', equipment.serialNumber],
  ];
  for (const [field, value] of expected) if (value === null) warnings.add('value-missing', field);
  if (procedureOf(report.procedureReported) === null) warnings.add('procedure-unknown', 'procedureReported');
  if (report.events.length === 0) warnings.add('events-missing', 'events');
  if (report.planes.length === 0) warnings.add('totals-missing', 'planes');
  if (report.completionFlag === 'PARTIAL') warnings.add('completion-partial', 'completionFlag');
}

/** The whole report from its header, content tree and events; everything missing is null with a warning. */
export function parseDoseReport(
  header: Header,
  root: ContentItem,
  events: Report['events'],
  warnings: WarningCollector,
): { report: Report; warnings: ReportWarning[] } {
  const index = new ItemIndex(root);
  const planes = findContainers(root, 'accumulated').map((item) =>
    parseAccumulated(item, header.utcOffset, warnings),
  );
  const start = findStart(events) ?? {
    startedAt: header.studyAt,
    utcOffset: header.studyAt && header.utcOffset,
  };
  const intent = index.below('procedureReported')?.code('hasIntent') ?? index.code('hasIntent');
  const acquisitionDeviceType = index.code('acquisitionDeviceType');
  const report: Report = {
    ...header,
    equipment: completeEquipment(header, planes, events),
    startedAt: start.startedAt,
    utcOffset: start.utcOffset,
    planes,
    events,
    procedureReported: index.code('procedureReported'),
    intent,
    isQualityControl: singleValueOf(intent) === 'qualityControl',
    acquisitionDeviceType,
    deviceClass: classifyDevice({ acquisitionDeviceType, planes, events }),
    detectorType: planes.find((plane) => plane.detectorType !== null)?.detectorType ?? null,
    ...readAvailabilities(index, warnings),
    scopeOfAccumulation: parseScope(index),
    sourcesOfInformation: (index.all('sourceOfDoseInformation') ?? []).flatMap(({ code }) =>
      code ? [code] : [],
    ),
    observers: readObservers(root),
    persons: readPersons(index.all('personName')),
    comment: index.text('comment'),
    language: index.code('language'),
    country: index.below('language')?.code('country') ?? index.code('country'),
    doseImages: readImages(index.all('doseImage')),
    furtherItems: readFurther(root, noFields).furtherItems,
  };
  for (const plane of planes) warnOfMissingTotals(plane, report.deviceClass === 'radiography', warnings);
  warnOfGaps(report, warnings);
  return { report, warnings: warnings.list() };
}
