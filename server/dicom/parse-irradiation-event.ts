import type { ContrastAgent, ReportEvent } from '../../shared/contract/report-event';
import { eventTypeOf, fluoroModeOf, planeOf } from './coded-values';
import type { ContentItem } from './content-tree';
import { parseDateTime } from './date-time';
import { fieldsByConcept, readFurther } from './further-items';
import { ItemIndex } from './item-index';
import { parseFilter } from './parse-filter';
import { readDevices, readPersons } from './participants';
import { eventQuantities, eventQuantityLists } from './quantity-fields.table-data';
import { readImages } from './read-images';
import { readQuantityFields, readQuantityLists } from './read-quantity-fields';
import { meanOf, type Reported } from './read-quantity';
import type { WarningCollector } from './warning-collector';
import { warnOfMissingEventValues } from './missing-event-values';

const fields = fieldsByConcept(eventQuantities, eventQuantityLists);

/** Every code of a concept that may repeat. */
const codesOf = (items: ContentItem[] | undefined) =>
  (items ?? []).flatMap(({ code }) => (code === null ? [] : [code]));

/** Contrast agents by code or by name: which concept carries them differs between makers (from memory). */
function readContrastAgents(index: ItemIndex): ContrastAgent[] {
  const names = ['contrastAgent', 'contrastAdministered', 'drugAdministered'] as const;
  return names
    .flatMap((name) => index.all(name) ?? [])
    .flatMap(({ code, text }) => (code === null && text === null ? [] : [{ code, text }]));
}

function readStart(
  index: ItemIndex,
  defaultOffset: string | null,
  reported: Reported,
  warnings: WarningCollector,
) {
  const text = index.text('startedAt');
  if (text === null) return null;
  const parsed = parseDateTime(text, defaultOffset);
  if (!parsed) {
    // What could not be read is kept as written.
    reported['startedAt'] = { text: [text], unit: null };
    warnings.add('date-time-unreadable', `startedAt ${JSON.stringify(text.slice(0, 40))}`);
  }
  if (parsed?.isImprecise) warnings.add('date-time-imprecise', 'startedAt');
  return parsed;
}

function readCodes(index: ItemIndex, warnings: WarningCollector) {
  const planeCode = index.code('acquisitionPlane');
  const plane = planeOf(planeCode);
  const typeCode = index.code('eventType');
  const type = eventTypeOf(typeCode);
  if (planeCode && !plane) warnings.add('plane-unknown', JSON.stringify(planeCode.meaning));
  const fluoroModeCode = index.code('fluoroMode');
  const fluoroMode = fluoroModeOf(fluoroModeCode);
  if (fluoroModeCode && !fluoroMode)
    warnings.add('code-unknown', `fluoro mode ${JSON.stringify(fluoroModeCode.meaning)}`);
  if (typeCode && !type) warnings.add('event-type-unknown', JSON.stringify(typeCode.meaning));
  return {
    plane,
    planeCode,
    type,
    typeCode,
    fluoroMode,
    fluoroModeCode,
    pulseCountDerivation: index.below('pulseCount')?.code('derivation') ?? null,
    labelType: index.below('eventLabel')?.code('labelType') ?? null,
    anatomy: index.code('anatomy'),
    laterality: index.below('anatomy')?.code('laterality') ?? index.code('laterality'),
    targetRegion: index.code('targetRegion'),
    imageView: index.code('imageView'),
    imageViewModifiers: codesOf(
      index.below('imageView')?.all('imageViewModifier') ?? index.all('imageViewModifier'),
    ),
    projectionName: index.code('projectionName'),
    patientTableRelationship: index.code('patientTableRelationship'),
    patientOrientation: index.code('patientOrientation'),
    patientOrientationModifier:
      index.below('patientOrientation')?.code('patientOrientationModifier') ??
      index.code('patientOrientationModifier'),
    anodeMaterial: index.code('anodeTargetMaterial'),
    mechanicalConfiguration: index.code('mechanicalConfiguration'),
    grids: codesOf(index.all('grid')),
  };
}

/**
 * One irradiation event of one plane (TID 10003 with 10003A–C) in canonical units. `kvpMean`, `tubeCurrentMa` and
 * `pulseWidthMs` are plain means of the values given; the tube current falls back to the average that the device
 * states (113767). What is absent is null, with a warning where the event should have it.
 */
export function parseIrradiationEvent(
  item: ContentItem,
  defaultOffset: string | null,
  warnings: WarningCollector,
): ReportEvent {
  const index = new ItemIndex(item);
  const reported: Reported = {};
  const start = readStart(index, defaultOffset, reported, warnings);
  const quantities = readQuantityFields(index, eventQuantities, reported, warnings);
  const lists = readQuantityLists(index, eventQuantityLists, reported, warnings);
  const event: ReportEvent = {
    irradiationEventUid: index.text('irradiationEventUid'),
    startedAt: start?.text ?? null,
    utcOffset: start?.utcOffset ?? null,
    protocol: index.text('protocol'),
    label: index.text('eventLabel'),
    comment: index.text('comment'),
    ...readCodes(index, warnings),
    ...quantities,
    ...lists,
    kvpMean: meanOf(lists.kvpValues),
    tubeCurrentMa: meanOf(lists.tubeCurrentValuesMa) ?? quantities.averageTubeCurrentMa,
    pulseWidthMs: meanOf(lists.pulseWidthValuesMs),
    filters: (index.all('filters') ?? []).map((filter) => parseFilter(filter, reported, warnings)),
    referencePointDefinition: index.referencePoint(),
    contrastAgents: readContrastAgents(index),
    acquiredImages: readImages(index.all('acquiredImage')),
    persons: readPersons(index.all('personName')),
    devices: readDevices(index.all('deviceRole')),
    // A copy takes two thirds of the memory of an object that grew key by key.
    reported: { ...reported },
    ...readFurther(item, fields),
  };
  warnOfMissingEventValues(event, warnings);
  return event;
}
