import { deviceTypes, scopes, snomed } from './codes.table-data';
import { codeItem, contentItem, dcm } from './content-items';
import { sequenceElement, textElement, type DataSet } from './data-element';
import type { DoseReportContent } from './dose-report-content';
import type { WrittenCode } from './written-parts';
import { eventItem } from './event-items';
import { headerElements } from './header-elements';
import {
  deviceObserverItems,
  irradiatingDeviceItems,
  personItem,
  personObserverItems,
} from './participant-items';
import { totalsItem } from './totals-items';
import { writeFile, type FileOptions } from './write-file';

/** CID 10020. */
const sourceCodes: Record<string, WrittenCode> = {
  automated: dcm('113856', 'Automated Data Collection'),
  manual: dcm('113857', 'Manual Entry'),
  mpps: dcm('113858', 'MPPS Content'),
  calculated: dcm('113940', 'System Calculated'),
};

/** TID 1204. */
function languageItems({ language, country }: DoseReportContent): DataSet[] {
  if (!language) return [];
  const concept = dcm('121049', 'Language of Content Item and Descendants');
  const below = country
    ? [contentItem.code('HAS CONCEPT MOD', dcm('121046', 'Country of Language'), country)]
    : [];
  return [contentItem.code('HAS CONCEPT MOD', concept, language, below)];
}

function contextItems(content: DoseReportContent): DataSet[] {
  const terminology = content.terminology ?? 'SCT';
  const intent = content.intent ?? snomed.combinedIntent[terminology];
  const device = content.acquisitionDeviceType ? deviceTypes[content.acquisitionDeviceType] : undefined;
  const { kind, uid } = content.scope ?? { kind: 'study', uid: content.studyInstanceUid };
  const scope = scopes[kind];
  if (!scope) throw new RangeError(`unknown scope ${kind}`);
  const { detector = 'yes', source = 'yes', mechanical = 'yes' } = content.availability ?? {};
  return [
    ...languageItems(content),
    contentItem.code('HAS CONCEPT MOD', dcm('121058', 'Procedure reported'), snomed.projectionXRay, [
      contentItem.code('HAS CONCEPT MOD', snomed.hasIntent[terminology], intent),
    ]),
    ...(device ? [contentItem.code('CONTAINS', dcm('122142', 'Acquisition Device Type'), device)] : []),
    ...deviceObserverItems(content),
    ...(content.personObservers ?? []).flatMap(personObserverItems),
    contentItem.code('HAS OBS CONTEXT', dcm('113705', 'Scope of Accumulation'), scope.scope, [
      contentItem.uid('HAS PROPERTIES', scope.uid, uid),
    ]),
    contentItem.code(
      'CONTAINS',
      dcm('113945', 'X-Ray Detector Data Available'),
      snomed[detector][terminology],
    ),
    contentItem.code('CONTAINS', dcm('113943', 'X-Ray Source Data Available'), snomed[source][terminology]),
    contentItem.code(
      'CONTAINS',
      dcm('113944', 'X-Ray Mechanical Data Available'),
      snomed[mechanical][terminology],
    ),
  ];
}

/** The content tree of TID 10001 as the elements of the root. */
function treeElements(content: DoseReportContent): DataSet {
  const terminology = content.terminology ?? 'SCT';
  const device = irradiatingDeviceItems(content);
  const sources = content.sourcesOfInformation ?? ['automated'];
  return [
    textElement(0x0040a040, 'CS', 'CONTAINER'),
    sequenceElement(0x0040a043, [codeItem(dcm('113701', 'X-Ray Radiation Dose Report'))]),
    textElement(0x0040a050, 'CS', 'SEPARATE'),
    sequenceElement(0x0040a504, [
      [textElement(0x00080105, 'CS', 'DCMR'), textElement(0x0040db00, 'CS', '10001')],
    ]),
    sequenceElement(0x0040a730, [
      ...contextItems(content),
      ...content.planes.map((totals) => totalsItem(totals, content, device)),
      ...content.events.map((event) => eventItem(event, terminology, device)),
      ...(content.comment ? [contentItem.text('CONTAINS', dcm('121106', 'Comment'), content.comment)] : []),
      ...(content.doseImages ?? []).map((image) =>
        contentItem.image('CONTAINS', dcm('121342', 'Dose Image'), image),
      ),
      ...(content.persons ?? []).map(personItem),
      ...sources.map((source) =>
        contentItem.code(
          'CONTAINS',
          dcm('113854', 'Source of Dose Information'),
          sourceCodes[source] ?? snomed.dosimeter[terminology],
        ),
      ),
    ]),
  ];
}

/** The data set of an X-Ray Radiation Dose SR, before it is encoded. */
export function doseReportDataSet(content: DoseReportContent): DataSet {
  return [...headerElements(content), ...treeElements(content)];
}

/**
 * Writes an X-Ray Radiation Dose SR (PS3.16 TID 10001 with 10002, 10003, 10003A–C, 10004, 10007, 1002, 1004, 1020,
 * 1021) as a DICOM file. Made without any part of the reader, so that each can check the other.
 */
export function writeDoseReport(content: DoseReportContent, options: FileOptions = {}): Uint8Array {
  return writeFile(doseReportDataSet(content), options);
}
