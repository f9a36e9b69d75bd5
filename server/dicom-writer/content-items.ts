import { sequenceElement, textElement, type DataElement, type DataSet } from './data-element';
import type { WrittenCode, WrittenImage, WrittenNumber } from './written-parts';

export type Relationship = 'CONTAINS' | 'HAS CONCEPT MOD' | 'HAS OBS CONTEXT' | 'HAS PROPERTIES';

/** A code sequence item (PS3.3 table 8.8-1): a URN, a long value or a plain one; a URN needs no scheme. */
export function codeItem(code: WrittenCode): DataSet {
  return [
    valueElement(code.value),
    ...(code.scheme === '' ? [] : [textElement(0x00080102, 'SH', code.scheme)]),
    textElement(0x00080104, 'LO', code.meaning),
  ];
}

function valueElement(value: string): DataElement {
  if (value.startsWith('urn:')) return textElement(0x00080120, 'UR', value);
  return value.length > 16 ? textElement(0x00080119, 'UC', value) : textElement(0x00080100, 'SH', value);
}

/** A concept of the DICOM controlled terminology (PS3.16 annex D). */
export function dcm(value: string, meaning: string): WrittenCode {
  return { value, scheme: 'DCM', meaning };
}

function item(
  relationship: Relationship,
  valueType: string,
  concept: WrittenCode,
  value: DataElement[],
  children: DataSet[] = [],
): DataSet {
  const own = [
    textElement(0x0040a010, 'CS', relationship),
    textElement(0x0040a040, 'CS', valueType),
    sequenceElement(0x0040a043, [codeItem(concept)]),
    ...value,
  ];
  return children.length > 0 ? [...own, sequenceElement(0x0040a730, children)] : own;
}

/** The content items of PS3.3 C.17.3, one function for each value type. */
export const contentItem = {
  container: (concept: WrittenCode, children: DataSet[]): DataSet =>
    item('CONTAINS', 'CONTAINER', concept, [textElement(0x0040a050, 'CS', 'SEPARATE')], children),
  code: (r: Relationship, concept: WrittenCode, value: WrittenCode, children: DataSet[] = []): DataSet =>
    item(r, 'CODE', concept, [sequenceElement(0x0040a168, [codeItem(value)])], children),
  text: (r: Relationship, concept: WrittenCode, value: string, children: DataSet[] = []): DataSet =>
    item(r, 'TEXT', concept, [textElement(0x0040a160, 'UT', value)], children),
  image: (
    r: Relationship,
    concept: WrittenCode,
    { sopClassUid, sopInstanceUid, frameNumbers }: WrittenImage,
  ) =>
    item(r, 'IMAGE', concept, [
      sequenceElement(0x00081199, [
        [
          textElement(0x00081150, 'UI', sopClassUid),
          textElement(0x00081155, 'UI', sopInstanceUid),
          ...(frameNumbers ? [textElement(0x00081160, 'IS', frameNumbers.map(String))] : []),
        ],
      ]),
    ]),
  uid: (r: Relationship, concept: WrittenCode, value: string): DataSet =>
    item(r, 'UIDREF', concept, [textElement(0x0040a124, 'UI', value)]),
  dateTime: (r: Relationship, concept: WrittenCode, value: string): DataSet =>
    item(r, 'DATETIME', concept, [textElement(0x0040a120, 'DT', value)]),
  personName: (r: Relationship, concept: WrittenCode, value: string, children: DataSet[] = []): DataSet =>
    item(r, 'PNAME', concept, [textElement(0x0040a123, 'PN', value)], children),
  /** A NUM; with a qualifier in place of a value its Measured Value Sequence stays empty (PS3.3 C.18.1). */
  number: (concept: WrittenCode, value: WrittenNumber, children: DataSet[] = []): DataSet =>
    item(
      'CONTAINS',
      'NUM',
      concept,
      'qualifier' in value
        ? [sequenceElement(0x0040a300, []), sequenceElement(0x0040a301, [codeItem(value.qualifier)])]
        : [sequenceElement(0x0040a300, [measuredValue(value)])],
      children,
    ),
};

function measuredValue({
  text,
  unit,
  scheme = 'UCUM',
  precise,
}: Exclude<WrittenNumber, { qualifier: WrittenCode }>) {
  return [
    textElement(0x0040a30a, 'DS', text),
    ...(precise === undefined ? [] : [{ tag: 0x0040a161, vr: 'FD' as const, value: [precise] }]),
    ...(unit === null
      ? []
      : [sequenceElement(0x004008ea, [codeItem({ value: unit, scheme, meaning: unit })])]),
  ];
}
