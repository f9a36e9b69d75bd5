import { filterMaterials, filterTypes, planeCodes, acquisitionTypes, snomed } from './codes.table-data';
import { contentItem, dcm, type Relationship } from './content-items';
import type { DataSet } from './data-element';
import type { DoseReportContent, WrittenEvent, WrittenFilter } from './dose-report-content';
import type { WrittenCode } from './written-parts';
import * as places from './event-quantities.table-data';
import { formatDateTime, formatQuantity } from './format-values';
import { personItem } from './participant-items';
import { quantityItems } from './quantity-items';
import { referencePointItems } from './reference-point-items';

type Terminology = NonNullable<DoseReportContent['terminology']>;

function typeCode(type: WrittenEvent['type'], terminology: Terminology): WrittenCode {
  if (typeof type !== 'string') return type;
  return acquisitionTypes[type] ?? snomed.fluoroscopy[terminology];
}

function filterItem(filter: WrittenFilter, terminology: Terminology): DataSet {
  const children: DataSet[] = [];
  const type = filterTypes[filter.type];
  if (type) children.push(contentItem.code('CONTAINS', dcm('113772', 'X-Ray Filter Type'), type));
  const material = filter.material ? filterMaterials[filter.material]?.[terminology] : undefined;
  if (material) children.push(contentItem.code('CONTAINS', dcm('113757', 'X-Ray Filter Material'), material));
  const bounds = [
    ['113758', 'X-Ray Filter Thickness Minimum', filter.minThicknessMm],
    ['113773', 'X-Ray Filter Thickness Maximum', filter.maxThicknessMm],
  ] as const;
  for (const [code, meaning, quantity] of bounds) {
    if (quantity === null || quantity === undefined) continue;
    children.push(contentItem.number(dcm(code, meaning), formatQuantity(quantity, 'mm', 1)));
  }
  return contentItem.container(dcm('113771', 'X-Ray Filters'), children);
}

function orientationItems(event: WrittenEvent, terminology: Terminology): DataSet[] {
  const items: DataSet[] = [];
  const { patientTableRelationship: relationship, patientOrientationModifier: modifier } = event;
  if (relationship) {
    const code = relationship === 'headfirst' ? snomed.headfirst : snomed.feetFirst;
    items.push(contentItem.code('CONTAINS', dcm('113745', 'Patient Table Relationship'), code[terminology]));
  }
  if (modifier) {
    const code = modifier === 'prone' ? snomed.prone : snomed.supine;
    const child = contentItem.code(
      'HAS CONCEPT MOD',
      dcm('113744', 'Patient Orientation Modifier'),
      code[terminology],
    );
    const orientation = dcm('113743', 'Patient Orientation');
    items.push(contentItem.code('CONTAINS', orientation, snomed.recumbent[terminology], [child]));
  }
  return items;
}

function optionalCode(
  relationship: Relationship,
  concept: WrittenCode,
  value: WrittenCode | null | undefined,
): DataSet[] {
  return value ? [contentItem.code(relationship, concept, value)] : [];
}

function viewItems({ imageView, imageViewModifiers = [], projectionName }: WrittenEvent): DataSet[] {
  const modifiers = imageViewModifiers.map((modifier) =>
    contentItem.code('HAS CONCEPT MOD', dcm('111032', 'Image View Modifier'), modifier),
  );
  const view = imageView
    ? [contentItem.code('CONTAINS', dcm('111031', 'Image View'), imageView, modifiers)]
    : [];
  return [...view, ...optionalCode('CONTAINS', dcm('113946', 'Projection Eponymous Name'), projectionName)];
}

function contrastItem(agent: WrittenCode | string): DataSet {
  const concept = dcm('123011', 'Contrast/Bolus Agent');
  return typeof agent === 'string'
    ? contentItem.text('CONTAINS', concept, agent)
    : contentItem.code('CONTAINS', concept, agent);
}

function fluoroModeItems(mode: WrittenEvent['fluoroMode']): DataSet[] {
  const known = { continuous: dcm('113630', 'Continuous'), pulsed: dcm('113631', 'Pulsed') };
  return optionalCode(
    'CONTAINS',
    dcm('113732', 'Fluoro Mode'),
    typeof mode === 'string' ? known[mode] : mode,
  );
}

function pulseCountItems({ pulseCount, pulseCountDerivation }: WrittenEvent): DataSet[] {
  if (pulseCount === null || pulseCount === undefined) return [];
  const derivation = optionalCode('HAS CONCEPT MOD', dcm('121401', 'Derivation'), pulseCountDerivation);
  return [
    contentItem.number(dcm('113768', 'Number of Pulses'), formatQuantity(pulseCount, '1', 1), derivation),
  ];
}

function headItems(event: WrittenEvent, terminology: Terminology): DataSet[] {
  const plane = event.plane ? planeCodes[event.plane] : undefined;
  const laterality = event.laterality
    ? [contentItem.code('HAS CONCEPT MOD', snomed.laterality[terminology], event.laterality)]
    : [];
  return [
    ...(plane ? [contentItem.code('HAS CONCEPT MOD', dcm('113764', 'Acquisition Plane'), plane)] : []),
    contentItem.uid('CONTAINS', dcm('113769', 'Irradiation Event UID'), event.irradiationEventUid),
    ...(event.label
      ? [
          contentItem.text(
            'CONTAINS',
            dcm('113605', 'Irradiation Event Label'),
            event.label,
            optionalCode('HAS CONCEPT MOD', dcm('113606', 'Label Type'), event.labelType),
          ),
        ]
      : []),
    contentItem.dateTime('CONTAINS', dcm('111526', 'DateTime Started'), formatDateTime(event.startedAt)),
    contentItem.code('CONTAINS', dcm('113721', 'Irradiation Event Type'), typeCode(event.type, terminology)),
    ...(event.protocol
      ? [contentItem.text('CONTAINS', dcm('125203', 'Acquisition Protocol'), event.protocol)]
      : []),
    ...(event.anatomy
      ? [contentItem.code('CONTAINS', snomed.anatomicalStructure[terminology], event.anatomy, laterality)]
      : []),
    ...viewItems(event),
    ...orientationItems(event, terminology),
    contentItem.code(
      'CONTAINS',
      dcm('123014', 'Target Region'),
      event.targetRegion ?? snomed.entireBody[terminology],
    ),
  ];
}

/** TID 10003B. */
function sourceItems(event: WrittenEvent, terminology: Terminology): DataSet[] {
  return [
    ...quantityItems(event, [
      { field: 'referenceAirKermaGy', code: '113738', meaning: 'Dose (RP)', unit: 'Gy', perWrittenUnit: 1 },
    ]),
    ...referencePointItems(event.referencePointDefinition),
    ...fluoroModeItems(event.fluoroMode),
    ...quantityItems(event, places.pulseRate),
    ...pulseCountItems(event),
    ...quantityItems(event, places.sourceQuantities),
    ...optionalCode('CONTAINS', dcm('111632', 'Anode Target Material'), event.anodeMaterial),
    ...(event.filters ?? []).map((filter) => filterItem(filter, terminology)),
    ...quantityItems(event, places.fieldQuantities),
    ...(event.grids ?? []).map((grid) => contentItem.code('CONTAINS', dcm('111635', 'X-Ray Grid'), grid)),
  ];
}

/** TID 10003 with 10003A, B and C: one irradiation event of one plane. */
export function eventItem(event: WrittenEvent, terminology: Terminology, device: DataSet[]): DataSet {
  const image = dcm('113795', 'Acquired Image');
  const configuration = dcm('113956', 'CR/DR Mechanical Configuration');
  return contentItem.container(dcm('113706', 'Irradiation Event X-Ray Data'), [
    ...headItems(event, terminology),
    ...quantityItems(event, places.eventQuantities),
    ...(event.contrastAgents ?? []).map(contrastItem),
    ...(event.comment ? [contentItem.text('CONTAINS', dcm('121106', 'Comment'), event.comment)] : []),
    ...(event.persons ?? []).map(personItem),
    ...quantityItems(event, places.detectorQuantities),
    ...(event.acquiredImages ?? []).map((one) => contentItem.image('CONTAINS', image, one)),
    ...sourceItems(event, terminology),
    ...device,
    ...optionalCode('CONTAINS', configuration, event.mechanicalConfiguration),
    ...quantityItems(event, places.mechanicalQuantities),
  ]);
}
