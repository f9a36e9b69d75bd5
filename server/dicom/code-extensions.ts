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
const escapes = new Map<string, GraphicSet>([
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
]);

const ESC = 0x1b;
/** PS3.5 6.1.2.5.3: after these the sets of the first value count again. */
const delimiters = new Set([0x5c, 0x5e, 0x3d, 0x0a, 0x0c, 0x0d, 0x09]);

const decoders = new Map<string, InstanceType<typeof TextDecoder>>();

function decoderFor(encoding: string): InstanceType<typeof TextDecoder> {
  let decoder = decoders.get(encoding);
  if (!decoder) decoders.set(encoding, (decoder = new TextDecoder(encoding)));
  return decoder;
}

/** The bytes of an escape sequence as one number; comparing those is cheaper than comparing texts. */
const keyOf = (letters: Iterable<number>) => [...letters].reduce((key, letter) => (key << 8) | letter, 0);
const setsByKey = new Map([...escapes].map(([letters, set]) => [keyOf(Buffer.from(letters)), set]));

/** The set that the escape sequence behind an ESC at this position calls in, and its letters: two or three. */
function findEscape(bytes: Uint8Array, position: number): { set: GraphicSet; length: number } | null {
  const two = ((bytes[position + 1] ?? 0) << 8) | (bytes[position + 2] ?? 0);
  const three = (two << 8) | (bytes[position + 3] ?? 0);
  const long = setsByKey.get(three);
  if (long) return { set: long, length: 3 };
  const short = setsByKey.get(two);
  return short ? { set: short, length: 2 } : null;
}

/** Gathers bytes of one encoding after the other and decodes each stretch at once. */
class StretchDecoder {
  private readonly stretch: Uint8Array;
  private length = 0;
  private encoding = ascii.encoding;
  private readonly texts: string[] = [];

  constructor(mostBytes: number) {
    this.stretch = new Uint8Array(mostBytes);
  }

  add(byte: number): void {
    this.stretch[this.length] = byte;
    this.length += 1;
  }

  /** What is added from now on is in this encoding. */
  use(encoding: string): void {
    if (encoding === this.encoding) return;
    this.flush();
    this.encoding = encoding;
  }

  finish(): string {
    this.flush();
    return this.texts.join('');
  }

  private flush(): void {
    if (this.length === 0) return;
    this.texts.push(decoderFor(this.encoding).decode(this.stretch.subarray(0, this.length)));
    this.length = 0;
  }
}

/**
 * Decodes text with code extensions (ISO 2022, PS3.5 6.1.2.5). `initialHigh` is the encoding of bytes above 7F before
 * any escape sequence. Unknown escape sequences are skipped.
 */
export function decodeWithEscapes(bytes: Uint8Array, initialHigh: string): string {
  const startHigh = single(initialHigh);
  let low = ascii;
  let high = startHigh;
  // A two-byte character may grow by its prefix.
  const decoder = new StretchDecoder(bytes.length * 2);
  let position = 0;
  while (position < bytes.length) {
    const byte = bytes[position] as number;
    if (byte === ESC) {
      const found = findEscape(bytes, position);
      if (found?.set.half === 'G0') low = found.set;
      if (found?.set.half === 'G1') high = found.set;
      position += 1 + (found?.length ?? 0);
      continue;
    }
    // Control characters are never part of a two-byte character.
    const set = byte < 0x21 ? ascii : byte < 0x80 ? low : high;
    // ASCII is the same in every encoding used here, so that it does not end a stretch.
    if (set !== ascii) decoder.use(set.encoding);
    if (set.bytesPerCharacter === 2) {
      if (set.prefix) decoder.add(set.prefix);
      decoder.add(byte | 0x80);
      if (position + 1 < bytes.length) decoder.add((bytes[position + 1] as number) | 0x80);
    } else {
      decoder.add(byte);
      if (delimiters.has(byte)) {
        low = ascii;
        high = startHigh;
      }
    }
    position += set.bytesPerCharacter;
  }
  return decoder.finish();
}
