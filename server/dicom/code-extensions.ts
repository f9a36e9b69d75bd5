/** One graphic set of ISO 2022: how many bytes make a character and how such bytes become text. */
export interface GraphicSet {
  bytesPerCharacter: 1 | 2;
  encoding: string;
  /** Put before a character's bytes for the decoder (EUC-JP marks JIS X 0212 with 8F). */
  prefix?: number;
  half: 'G0' | 'G1';
}

const ascii: GraphicSet = { bytesPerCharacter: 1, encoding: 'windows-1252', half: 'G0' };
const single = (encoding: string): GraphicSet => ({ bytesPerCharacter: 1, encoding, half: 'G1' });

/** Escape sequences without the leading ESC (PS3.3 C.12.1.1.2, tables C.12-3 and C.12-4). */
const escapes: [string, GraphicSet][] = [
  ['(B', ascii],
  ['(J', ascii],
  [')I', single('shift_jis')],
  ['-A', single('iso-8859-1')],
  ['-B', single('iso-8859-2')],
  ['-C', single('iso-8859-3')],
  ['-D', single('iso-8859-4')],
  ['-L', single('iso-8859-5')],
  ['-G', single('iso-8859-6')],
  ['-F', single('iso-8859-7')],
  ['-H', single('iso-8859-8')],
  ['-M', single('windows-1254')],
  ['-b', single('iso-8859-15')],
  ['-T', single('windows-874')],
  ['$B', { bytesPerCharacter: 2, encoding: 'euc-jp', half: 'G0' }],
  ['$@', { bytesPerCharacter: 2, encoding: 'euc-jp', half: 'G0' }],
  ['$(D', { bytesPerCharacter: 2, encoding: 'euc-jp', prefix: 0x8f, half: 'G0' }],
  ['$)C', { bytesPerCharacter: 2, encoding: 'euc-kr', half: 'G1' }],
  ['$)A', { bytesPerCharacter: 2, encoding: 'gbk', half: 'G1' }],
];

const ESC = 0x1b;
/** PS3.5 6.1.2.5.3: after these the sets of the first value count again. */
const delimiters = new Set([0x5c, 0x5e, 0x3d, 0x0a, 0x0c, 0x0d, 0x09]);

function decode(encoding: string, bytes: number[]): string {
  return new TextDecoder(encoding).decode(Uint8Array.from(bytes));
}

function findEscape(bytes: Uint8Array, position: number): [string, GraphicSet] | undefined {
  return escapes.find(([sequence]) =>
    [...sequence].every((letter, index) => bytes[position + 1 + index] === letter.charCodeAt(0)),
  );
}

/**
 * Decodes text with code extensions (ISO 2022, PS3.5 6.1.2.5). `initialHigh` is the encoding of bytes above 7F before
 * any escape sequence. Unknown escape sequences are skipped.
 */
export function decodeWithEscapes(bytes: Uint8Array, initialHigh: string): string {
  const startHigh = single(initialHigh);
  let low = ascii;
  let high = startHigh;
  let text = '';
  let position = 0;
  while (position < bytes.length) {
    const byte = bytes[position] as number;
    if (byte === ESC) {
      const found = findEscape(bytes, position);
      if (found?.[1].half === 'G0') low = found[1];
      if (found?.[1].half === 'G1') high = found[1];
      position += found ? 1 + found[0].length : 1;
      continue;
    }
    const isHigh = byte >= 0x80;
    const set = isHigh ? high : low;
    // Control characters are never part of a two-byte character.
    const isControl = !isHigh && byte < 0x21;
    const size = isControl ? 1 : set.bytesPerCharacter;
    const own = [...bytes.subarray(position, position + size)];
    const isDouble = size === 2;
    text += decode(
      isControl ? 'windows-1252' : set.encoding,
      isDouble ? [...(set.prefix ? [set.prefix] : []), ...own.map((one) => one | 0x80)] : own,
    );
    position += size;
    if (!isDouble && delimiters.has(byte)) {
      low = ascii;
      high = startHigh;
    }
  }
  return text;
}
