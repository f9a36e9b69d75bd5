/** Value representations (PS3.5 section 6.2), and some that look like one. */
export const valueRepresentations = [
  ...[
    'AE',
    'AS',
    'AT',
    'CS',
    'DA',
    'DS',
    'DT',
    'FD',
    'FL',
    'IS',
    'LO',
    'LT',
    'OB',
    'OD',
    'OF',
    'OL',
    'OV',
    'OW',
  ],
  ...[
    'PN',
    'SH',
    'SL',
    'SQ',
    'SS',
    'ST',
    'SV',
    'TM',
    'UC',
    'UI',
    'UL',
    'UN',
    'UR',
    'US',
    'UT',
    'UV',
    'XX',
    'ZZ',
  ],
];

export const longForms = new Set([
  'OB',
  'OD',
  'OF',
  'OL',
  'OV',
  'OW',
  'SQ',
  'SV',
  'UC',
  'UN',
  'UR',
  'UT',
  'UV',
]);

const known = new Set(valueRepresentations);

/** Where an element or item begins, as far as that can be seen without reading the file from its start. */
export interface Landmark {
  at: number;
  /** Null for an item, a delimiter, or an element without one. */
  valueRepresentation: string | null;
  /** Where its length stands, and in how many bytes. */
  lengthAt: number;
  lengthBytes: 2 | 4;
}

const isUpper = (byte: number | undefined) => byte !== undefined && byte >= 0x41 && byte <= 0x5a;

function landmarkAt(bytes: Buffer, at: number): Landmark | null {
  const second = bytes[at + 1] ?? 0;
  const isItem =
    (bytes[at] === 0xfe && second === 0xff && bytes[at + 3] === 0xe0) ||
    (bytes[at] === 0xff && second === 0xfe && bytes[at + 2] === 0xe0);
  const item = { at, valueRepresentation: null, lengthAt: at + 4, lengthBytes: 4 as const };
  if (isItem) return item;
  if (isUpper(bytes[at + 4]) && isUpper(bytes[at + 5])) {
    const valueRepresentation = bytes.toString('latin1', at + 4, at + 6);
    if (!known.has(valueRepresentation)) return null;
    return longForms.has(valueRepresentation)
      ? { at, valueRepresentation, lengthAt: at + 8, lengthBytes: 4 }
      : { at, valueRepresentation, lengthAt: at + 6, lengthBytes: 2 };
  }
  const isImplicit =
    second === 0 &&
    (bytes[at] ?? 0) >= 8 &&
    bytes[at + 5] === 0 &&
    bytes[at + 6] === 0 &&
    bytes[at + 7] === 0;
  return isImplicit && at % 2 === 0 && (bytes[at + 4] ?? 0) % 2 === 0 ? item : null;
}

/** Every place that looks like the beginning of an element or item, in any of the encodings. */
export function findLandmarks(bytes: Buffer): Landmark[] {
  const found: Landmark[] = [];
  for (let at = 0; at + 8 <= bytes.length; at += 1) {
    const landmark = landmarkAt(bytes, at);
    if (landmark) found.push(landmark);
  }
  return found;
}
