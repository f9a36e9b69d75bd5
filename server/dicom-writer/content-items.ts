import { sequenceElement, textElement, type DataElement, type DataSet } from './data-element';
import type { WrittenCode } from './dose-report-content';

export type Relationship = 'CONTAINS' | 'HAS CONCEPT MOD' | 'HAS OBS CONTEXT' | 'HAS PROPERTIES';

/** A code sequence item (PS3.3 table 8.8-1). */
export function codeItem(code: WrittenCode): DataSet {
  const isLong = code.value.length > 16;
  return [
    textElement(isLong ? 0x00080119 : 0x00080100, isLong ? 'UT' : 'SH', code.value),
    textElement(0x00080102, 'SH', code.scheme),
    textElement(0x00080104, 'LO', code.meaning),
  ];
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
  text: (r: Relationship, concept: WrittenCode, value: string): DataSet =>
    item(r, 'TEXT', concept, [textElement(0x0040a160, 'UT', value)]),
  uid: (r: Relationship, concept: WrittenCode, value: string): DataSet =>
    item(r, 'UIDREF', concept, [textElement(0x0040a124, 'UI', value)]),
  dateTime: (r: Relationship, concept: WrittenCode, value: string): DataSet =>
    item(r, 'DATETIME', concept, [textElement(0x0040a120, 'DT', value)]),
  personName: (r: Relationship, concept: WrittenCode, value: string, children: DataSet[] = []): DataSet =>
    item(r, 'PNAME', concept, [textElement(0x0040a123, 'PN', value)], children),
  number: (concept: WrittenCode, text: string, unit: string): DataSet =>
    item('CONTAINS', 'NUM', concept, [
      sequenceElement(0x0040a300, [
        [
          textElement(0x0040a30a, 'DS', text),
          sequenceElement(0x004008ea, [codeItem({ value: unit, scheme: 'UCUM', meaning: unit })]),
        ],
      ]),
    ]),
};
