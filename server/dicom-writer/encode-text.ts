/** Sets of one byte, and of several without escape sequences → name for TextDecoder (PS3.3 C.12.1.1.2). */
const plainSets = {
  'ISO_IR 13': 'shift_jis',
  'ISO_IR 100': 'windows-1252',
  'ISO_IR 101': 'iso-8859-2',
  'ISO_IR 109': 'iso-8859-3',
  'ISO_IR 110': 'iso-8859-4',
  'ISO_IR 126': 'iso-8859-7',
  'ISO_IR 127': 'iso-8859-6',
  'ISO_IR 138': 'iso-8859-8',
  'ISO_IR 144': 'iso-8859-5',
  'ISO_IR 148': 'windows-1254',
  'ISO_IR 166': 'windows-874',
  'ISO_IR 203': 'iso-8859-15',
  GB18030: 'gb18030',
  GBK: 'gbk',
} as const;

interface EscapedSet {
  escape: number[];
  encoding: string;
  /** Bytes in a designated half: G0 clears the high bit. */
  clearsHighBit: boolean;
  bytesPerCharacter: 1 | 2;
}

const escaped = (
  escape: string,
  encoding: string,
  bytesPerCharacter: 1 | 2,
  clearsHighBit = false,
): EscapedSet => ({
  escape: [0x1b, ...Buffer.from(escape, 'latin1')],
  encoding,
  bytesPerCharacter,
  clearsHighBit,
});

/** Sets that start with an escape sequence (PS3.3 tables C.12-3 and C.12-4). */
const escapedSets = {
  'ISO 2022 IR 58': escaped('$)A', 'gbk', 2),
  'ISO 2022 IR 87': escaped('$B', 'euc-jp', 2, true),
  'ISO 2022 IR 101': escaped('-B', 'iso-8859-2', 1),
  'ISO 2022 IR 126': escaped('-F', 'iso-8859-7', 1),
  'ISO 2022 IR 144': escaped('-L', 'iso-8859-5', 1),
  'ISO 2022 IR 149': escaped('$)C', 'euc-kr', 2),
} as const satisfies Record<string, EscapedSet>;

/** Terms of Specific Character Set (0008,0005) the writer can encode; null writes ASCII and leaves the element out. */
export type WriterCharacterSet = null | 'ISO_IR 192' | keyof typeof plainSets | keyof typeof escapedSets;

const ASCII_ESCAPE = [0x1b, 0x28, 0x42];
const tables = new Map<string, Map<string, number[]>>();

/** Character → bytes, found by decoding every one- and two-byte combination once. */
function reverseTable(encoding: string): Map<string, number[]> {
  const known = tables.get(encoding);
  if (known) return known;
  const decoder = new TextDecoder(encoding);
  const table = new Map<string, number[]>();
  const note = (bytes: number[]) => {
    const text = decoder.decode(Uint8Array.from(bytes));
    if ([...text].length === 1 && text !== '\ufffd' && !table.has(text)) table.set(text, bytes);
  };
  for (let first = 0; first < 256; first += 1) note([first]);
  for (let first = 0x81; first < 0xff; first += 1) {
    for (let second = 0x40; second < 0xff; second += 1) note([first, second]);
  }
  tables.set(encoding, table);
  return table;
}

function encodeByTable(text: string, encoding: string): Uint8Array {
  const table = reverseTable(encoding);
  return Uint8Array.from([...text].flatMap((character) => table.get(character) ?? [0x3f]));
}

/** Each run between the delimiters of PS3.5 6.1.2.5.3 starts and ends in ASCII, as the standard asks. */
function encodeWithEscapes(text: string, set: EscapedSet): Uint8Array {
  const table = reverseTable(set.encoding);
  const bytes: number[] = [];
  for (const run of text.split(/([\\^=\r\n\f\t])/)) {
    let isEscaped = false;
    for (const character of run) {
      const encoded = table.get(character) ?? [0x3f];
      const isHigh = (encoded[0] ?? 0) >= 0x80 && encoded.length === set.bytesPerCharacter;
      if (isHigh !== isEscaped) {
        if (isHigh) bytes.push(...set.escape);
        else if (set.clearsHighBit) bytes.push(...ASCII_ESCAPE);
        isEscaped = isHigh;
      }
      bytes.push(...encoded.map((byte) => (isHigh && set.clearsHighBit ? byte & 0x7f : byte)));
    }
    if (isEscaped && set.clearsHighBit) bytes.push(...ASCII_ESCAPE);
  }
  return Uint8Array.from(bytes);
}

/**
 * Encodes text in one of DICOM's character sets (PS3.3 C.12.1.1.2, PS3.5 6.1.2.5); a character the set lacks
 * becomes "?". "é" in ISO_IR 100 is the byte E9, in ISO_IR 192 the bytes C3 A9.
 */
export function encodeText(text: string, characterSet: WriterCharacterSet): Uint8Array {
  if (characterSet === null)
    return Uint8Array.from([...text].map((c) => (c.charCodeAt(0) < 0x80 ? c.charCodeAt(0) : 0x3f)));
  if (characterSet === 'ISO_IR 192') return new TextEncoder().encode(text);
  if (isPlain(characterSet)) return encodeByTable(text, plainSets[characterSet]);
  return encodeWithEscapes(text, escapedSets[characterSet]);
}

function isPlain(
  characterSet: keyof typeof plainSets | keyof typeof escapedSets,
): characterSet is keyof typeof plainSets {
  return characterSet in plainSets;
}
