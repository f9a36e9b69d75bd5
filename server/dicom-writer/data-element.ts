/** Value representations the writer uses (PS3.5 section 6.2). */
export type ValueRepresentation =
  | 'AE'
  | 'AS'
  | 'CS'
  | 'DA'
  | 'DS'
  | 'DT'
  | 'FD'
  | 'IS'
  | 'LO'
  | 'OB'
  | 'OW'
  | 'PN'
  | 'SH'
  | 'SL'
  | 'SQ'
  | 'TM'
  | 'UC'
  | 'UI'
  | 'UL'
  | 'UN'
  | 'UR'
  | 'US'
  | 'UT';

/** One data element: text values are joined by a backslash, a sequence holds data sets. */
export interface DataElement {
  tag: number;
  vr: ValueRepresentation;
  value: string | string[] | number[] | Uint8Array | DataSet[];
}

export type DataSet = DataElement[];

/** A data element whose value is text; an empty list gives a zero-length value. */
export function textElement(tag: number, vr: ValueRepresentation, value: string | string[]): DataElement {
  return { tag, vr, value };
}

/** A sequence element with its items. */
export function sequenceElement(tag: number, items: DataSet[]): DataElement {
  return { tag, vr: 'SQ', value: items };
}
