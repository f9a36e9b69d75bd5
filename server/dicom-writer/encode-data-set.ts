import type { DataElement, DataSet, ValueRepresentation } from './data-element';
import { encodeText, type WriterCharacterSet } from './encode-text';

/** How a data set becomes bytes (PS3.5 sections 7 and 10, annex A). */
export interface Encoding {
  isExplicit: boolean;
  isBigEndian: boolean;
  hasUndefinedLengths: boolean;
  characterSet: WriterCharacterSet;
}

const longForm = new Set<ValueRepresentation>(['OB', 'OW', 'SQ', 'UT']);
const zeroPadded = new Set<ValueRepresentation>(['OB', 'UI']);
const localised = new Set<ValueRepresentation>(['LO', 'PN', 'SH', 'UT']);
const UNDEFINED_LENGTH = 0xffffffff;

function uint16(value: number, encoding: Encoding): Buffer {
  const bytes = Buffer.alloc(2);
  if (encoding.isBigEndian) bytes.writeUInt16BE(value);
  else bytes.writeUInt16LE(value);
  return bytes;
}

function uint32(value: number, encoding: Encoding): Buffer {
  const bytes = Buffer.alloc(4);
  if (encoding.isBigEndian) bytes.writeUInt32BE(value);
  else bytes.writeUInt32LE(value);
  return bytes;
}

function encodeTag(tag: number, encoding: Encoding): Buffer {
  return Buffer.concat([uint16(tag >>> 16, encoding), uint16(tag & 0xffff, encoding)]);
}

function encodeItem(item: DataSet, encoding: Encoding): Buffer {
  const content = encodeDataSet(item, encoding);
  const start = encodeTag(0xfffee000, encoding);
  if (!encoding.hasUndefinedLengths) {
    return Buffer.concat([start, uint32(content.length, encoding), content]);
  }
  const end = [encodeTag(0xfffee00d, encoding), uint32(0, encoding)];
  return Buffer.concat([start, uint32(UNDEFINED_LENGTH, encoding), content, ...end]);
}

function encodeSequence(items: DataSet[], encoding: Encoding): Buffer {
  const content = items.map((item) => encodeItem(item, encoding));
  if (encoding.hasUndefinedLengths) content.push(encodeTag(0xfffee0dd, encoding), uint32(0, encoding));
  return Buffer.concat(content);
}

function encodeValue(element: DataElement, encoding: Encoding): Buffer {
  const { vr, value } = element;
  if (vr === 'SQ') return encodeSequence(value as DataSet[], encoding);
  if (value instanceof Uint8Array) return Buffer.from(value);
  if (vr === 'US') return Buffer.concat((value as number[]).map((n) => uint16(n, encoding)));
  if (vr === 'UL') return Buffer.concat((value as number[]).map((n) => uint32(n, encoding)));
  const text = Array.isArray(value) ? value.join('\\') : value;
  return Buffer.from(encodeText(text, localised.has(vr) ? encoding.characterSet : null));
}

function encodeElement(element: DataElement, encoding: Encoding): Buffer {
  const bare = encodeValue(element, encoding);
  const padding = Buffer.from(zeroPadded.has(element.vr) ? [0] : [0x20]);
  const value = bare.length % 2 === 1 ? Buffer.concat([bare, padding]) : bare;
  const length = element.vr === 'SQ' && encoding.hasUndefinedLengths ? UNDEFINED_LENGTH : value.length;
  const tag = encodeTag(element.tag, encoding);
  if (!encoding.isExplicit) return Buffer.concat([tag, uint32(length, encoding), value]);
  const vr = Buffer.from(element.vr, 'latin1');
  if (longForm.has(element.vr)) {
    return Buffer.concat([tag, vr, Buffer.alloc(2), uint32(length, encoding), value]);
  }
  if (value.length > 0xffff) throw new RangeError(`value of ${element.vr} longer than 65,535 bytes`);
  return Buffer.concat([tag, vr, uint16(length, encoding), value]);
}

/** Encodes a data set, its elements in ascending order of tag (PS3.5 7.1). */
export function encodeDataSet(dataSet: DataSet, encoding: Encoding): Buffer {
  const ordered = [...dataSet].sort((a, b) => a.tag - b.tag);
  return Buffer.concat(ordered.map((element) => encodeElement(element, encoding)));
}
