/** Terms of Specific Character Set (0008,0005) the writer can encode; null writes ASCII and leaves the element out. */
export type WriterCharacterSet =
  null | 'ISO_IR 100' | 'ISO_IR 144' | 'ISO_IR 192' | 'GB18030' | 'ISO 2022 IR 87' | 'ISO 2022 IR 149';

interface DoubleByteSet {
  escape: number[];
  encoding: string;
  /** EUC bytes carry the high bit; ISO 2022 IR 87 is designated to G0, where it is cleared. */
  clearsHighBit: boolean;
}

const ASCII_ESCAPE = [0x1b, 0x28, 0x42];
const doubleByteSets: Record<string, DoubleByteSet> = {
  'ISO 2022 IR 87': { escape: [0x1b, 0x24, 0x42], encoding: 'euc-jp', clearsHighBit: true },
  'ISO 2022 IR 149': { escape: [0x1b, 0x24, 0x29, 0x43], encoding: 'euc-kr', clearsHighBit: false },
};

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
function encodeWithEscapes(text: string, set: DoubleByteSet): Uint8Array {
  const table = reverseTable(set.encoding);
  const bytes: number[] = [];
  for (const run of text.split(/([\\^=\r\n\f\t])/)) {
    let isDouble = false;
    for (const character of run) {
      const encoded = table.get(character) ?? [0x3f];
      const needsDouble = encoded.length === 2;
      if (needsDouble !== isDouble) {
        if (needsDouble) bytes.push(...set.escape);
        else if (set.clearsHighBit) bytes.push(...ASCII_ESCAPE);
        isDouble = needsDouble;
      }
      bytes.push(...encoded.map((byte) => (needsDouble && set.clearsHighBit ? byte & 0x7f : byte)));
    }
    if (isDouble && set.clearsHighBit) bytes.push(...ASCII_ESCAPE);
  }
  return Uint8Array.from(bytes);
}

/**
 * Encodes text in one of DICOM's character sets (PS3.3 C.12.1.1.2, PS3.5 6.1.2.5); a character the set lacks
 * becomes "?". "é" in ISO_IR 100 is the byte E9, in ISO_IR 192 the bytes C3 A9.
 */
export function encodeText(text: string, characterSet: WriterCharacterSet): Uint8Array {
  switch (characterSet) {
    case 'ISO_IR 192':
      return new TextEncoder().encode(text);
    case 'ISO_IR 100':
      return encodeByTable(text, 'windows-1252');
    case 'ISO_IR 144':
      return encodeByTable(text, 'iso-8859-5');
    case 'GB18030':
      return encodeByTable(text, 'gb18030');
    case null:
      return Uint8Array.from([...text].map((c) => (c.charCodeAt(0) < 0x80 ? c.charCodeAt(0) : 0x3f)));
    default: {
      const set = doubleByteSets[characterSet];
      if (!set) throw new RangeError(`no encoder for ${String(characterSet)}`);
      return encodeWithEscapes(text, set);
    }
  }
}
