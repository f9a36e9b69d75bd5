import { isUtf8 } from 'node:buffer';
import type { WarningCode } from '../../shared/contract/outcome';
import { decodeWithEscapes } from './code-extensions';
import type { SliceableBuffer } from './latin1-text';

/** Defined Terms of Specific Character Set (PS3.3 C.12.1.1.2) without code extensions → name for TextDecoder. */
const encodings = new Map([
  ['ISO_IR 6', 'ascii'],
  ['ISO_IR 100', 'iso-8859-1'],
  ['ISO_IR 101', 'iso-8859-2'],
  ['ISO_IR 109', 'iso-8859-3'],
  ['ISO_IR 110', 'iso-8859-4'],
  ['ISO_IR 144', 'iso-8859-5'],
  ['ISO_IR 127', 'iso-8859-6'],
  ['ISO_IR 126', 'iso-8859-7'],
  ['ISO_IR 138', 'iso-8859-8'],
  ['ISO_IR 148', 'windows-1254'],
  ['ISO_IR 203', 'iso-8859-15'],
  ['ISO_IR 13', 'shift_jis'],
  ['ISO_IR 166', 'windows-874'],
  ['ISO_IR 192', 'utf-8'],
  ['GB18030', 'gb18030'],
  ['GBK', 'gbk'],
]);

const utf8 = new TextDecoder('utf-8');
const windows1252 = new TextDecoder('windows-1252');

export interface TextReader {
  decode(bytes: Uint8Array): string;
}

export type CharacterSetNotice = (code: WarningCode, detail: string) => void;

function isAscii(bytes: Uint8Array, start: number, end: number): boolean {
  for (let position = start; position < end; position += 1) {
    const byte = bytes[position] as number;
    if (byte >= 0x80 || byte === 0x1b) return false;
  }
  return true;
}

function decodeUtf8(bytes: Uint8Array): string | null {
  return isUtf8(bytes) ? utf8.decode(bytes) : null;
}

/** NUL cannot be stored and pads odd lengths; trailing blanks are padding by the standard. */
function trimPadding(text: string): string {
  const kept = text.includes('\0') ? text.replaceAll('\0', '') : text;
  // Not by a pattern: / +$/ looks at each run of blanks inside a long text again and again.
  let end = kept.length;
  while (end > 0 && kept.charCodeAt(end - 1) === 0x20) end -= 1;
  return kept.slice(0, end);
}

/** UTF-8 if the bytes are that, else Windows-1252: the two that undeclared bytes turn out to be. */
function decodeUndeclared(bytes: Uint8Array): string {
  return decodeUtf8(bytes) ?? windows1252.decode(bytes);
}

/** Every character that a set of one byte has. */
function repertoireOf(encoding: string): Set<string> {
  return new Set(new TextDecoder(encoding).decode(Uint8Array.from({ length: 256 }, (_, byte) => byte)));
}

function readerOf(terms: string[], notice: CharacterSetNotice): (bytes: Uint8Array) => string {
  // "ISO 2022 IR 100" is the same set as "ISO_IR 100", prepared for code extensions.
  const first = (terms[0] ?? '').replace(/^ISO 2022 IR (\d+)$/, 'ISO_IR $1').replace('ISO-IR', 'ISO_IR');
  const encoding = encodings.get(first === '' ? 'ISO_IR 6' : first);
  const isExtended = terms.length > 1 || terms[0]?.startsWith('ISO 2022') === true;
  if (isExtended) {
    const initial = encoding === undefined || encoding === 'ascii' ? 'windows-1252' : encoding;
    return (bytes) => decodeWithEscapes(bytes, initial);
  }
  if (encoding === undefined || encoding === 'ascii') {
    if (encoding === undefined) notice('character-set-unknown', JSON.stringify(terms[0]));
    return (bytes) => {
      if (encoding) notice('character-set-undeclared', 'no Specific Character Set');
      return decodeUndeclared(bytes);
    };
  }
  if (encoding === 'utf-8') {
    return (bytes) => {
      const text = decodeUtf8(bytes);
      if (text !== null) return text;
      notice('character-set-wrong', `declared ${first}`);
      return windows1252.decode(bytes);
    };
  }
  const decoder = new TextDecoder(encoding);
  const isSingleByte = !['gb18030', 'gbk', 'shift_jis'].includes(encoding);
  const repertoire = isSingleByte && encoding !== 'iso-8859-1' ? repertoireOf(encoding) : null;
  return (bytes) => {
    // Latin-1 is hardly ever valid UTF-8 by chance: "é" alone is not, "Ã©" is no name. In other sets letters are
    // ("ТА" in Cyrillic), but then what UTF-8 would make of them is no letter of the set.
    const utf8 = isSingleByte ? decodeUtf8(bytes) : null;
    if (utf8 === null || (repertoire && ![...utf8].every((letter) => repertoire.has(letter))))
      return decoder.decode(bytes);
    notice('character-set-wrong', `declared ${first}, written in UTF-8`);
    return utf8;
  };
}

/**
 * A reader of text for a value of Specific Character Set (0008,0005); null or empty means ASCII. Bytes that do not
 * fit the declared set are still read, as UTF-8 or Windows-1252, with a warning through `notice`.
 */
export function createTextReader(declared: string | null, notice: CharacterSetNotice): TextReader {
  const terms = (declared ?? '').split('\\').map((term) => term.trim());
  const read = readerOf(terms, notice);
  return {
    decode(bytes) {
      if (isAscii(bytes, 0, bytes.length))
        return trimPadding(Buffer.from(bytes.buffer, bytes.byteOffset, bytes.length).toString('latin1'));
      return trimPadding(read(bytes));
    },
  };
}

/** Text of a value that lies in a data set; null if it is empty or blank. */
export function decodeText(
  bytes: SliceableBuffer,
  start: number,
  end: number,
  reader: TextReader,
): string | null {
  if (isAscii(bytes, start, end)) return trimPadding(bytes.latin1Slice(start, end)) || null;
  return reader.decode(bytes.subarray(start, end)) || null;
}
