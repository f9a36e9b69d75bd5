import { ByteSink } from './byte-sink';
import type { DataElement, DataSet, ValueRepresentation } from './data-element';
import { encodeText, type WriterCharacterSet } from './encode-text';

/** How a data set becomes bytes (PS3.5 sections 7 and 10, annex A). */
export interface Encoding {
  isExplicit: boolean;
  isBigEndian: boolean;
  hasUndefinedLengths: boolean;
  characterSet: WriterCharacterSet;
  /** True for the outermost data set, whose declared character set may be a wrong one on purpose. */
  isRoot?: boolean;
}

const SPECIFIC_CHARACTER_SET = 0x00080005;

const longForm = new Set<ValueRepresentation>(['OB', 'OW', 'SQ', 'UC', 'UN', 'UR', 'UT']);
const zeroPadded = new Set<ValueRepresentation>(['OB', 'UI', 'UN']);
const localised = new Set<ValueRepresentation>(['LO', 'PN', 'SH', 'UC', 'UT']);
const UNDEFINED_LENGTH = 0xffffffff;

function addTag(sink: ByteSink, tag: number): void {
  sink.addUint16(tag >>> 16);
  sink.addUint16(tag & 0xffff);
}

/** Adds an item; its length is filled in once its content is written. */
function addItem(sink: ByteSink, item: DataSet, encoding: Encoding): void {
  addTag(sink, 0xfffee000);
  sink.addUint32(UNDEFINED_LENGTH);
  const start = sink.length;
  addElements(sink, item, encoding);
  if (!encoding.hasUndefinedLengths) {
    sink.setUint32(start - 4, sink.length - start);
    return;
  }
  addTag(sink, 0xfffee00d);
  sink.addUint32(0);
}

function addSequence(sink: ByteSink, items: DataSet[], encoding: Encoding): void {
  for (const item of items) addItem(sink, item, encoding);
  if (!encoding.hasUndefinedLengths) return;
  addTag(sink, 0xfffee0dd);
  sink.addUint32(0);
}

function addValue(sink: ByteSink, { vr, value }: DataElement, encoding: Encoding): void {
  if (value instanceof Uint8Array) sink.addBytes(value);
  else if (vr === 'US') for (const number of value as number[]) sink.addUint16(number);
  else if (vr === 'UL') for (const number of value as number[]) sink.addUint32(number);
  else if (vr === 'SL') for (const number of value as number[]) sink.addInt32(number);
  else if (vr === 'FD') for (const number of value as number[]) sink.addFloat64(number);
  else {
    const text = Array.isArray(value) ? value.join('\\') : value;
    // ASCII is the same in every character set that the writer knows.
    if (!sink.addAscii(text))
      sink.addBytes(encodeText(text, localised.has(vr) ? encoding.characterSet : null));
  }
}

/** Adds tag, representation and room for the length; returns where the length goes. */
function openElement(sink: ByteSink, { tag, vr }: DataElement, encoding: Encoding): number {
  addTag(sink, tag);
  if (!encoding.isExplicit) {
    sink.addUint32(0);
    return sink.length - 4;
  }
  sink.addAscii(vr);
  sink.addUint16(0);
  if (!longForm.has(vr)) return sink.length - 2;
  sink.addUint32(0);
  return sink.length - 4;
}

function addElement(sink: ByteSink, element: DataElement, encoding: Encoding): void {
  const { vr } = element;
  const lengthAt = openElement(sink, element, encoding);
  const start = sink.length;
  if (vr === 'SQ') addSequence(sink, element.value as DataSet[], encoding);
  else {
    addValue(sink, element, encoding);
    if ((sink.length - start) % 2 === 1) sink.addByte(zeroPadded.has(vr) ? 0 : 0x20);
  }
  const length = sink.length - start;
  if (encoding.isExplicit && !longForm.has(vr)) {
    if (length > 0xffff) throw new RangeError(`value of ${vr} longer than 65,535 bytes`);
    sink.setUint16(lengthAt, length);
  } else {
    sink.setUint32(lengthAt, vr === 'SQ' && encoding.hasUndefinedLengths ? UNDEFINED_LENGTH : length);
  }
}

/** An item may declare a character set of its own, which counts for what is inside (PS3.3 C.12.1.1.2). */
function encodingWithin(dataSet: DataSet, encoding: Encoding): Encoding {
  const own = dataSet.find((element) => element.tag === SPECIFIC_CHARACTER_SET)?.value;
  if (own === undefined || encoding.isRoot) return encoding;
  return { ...encoding, characterSet: (Array.isArray(own) ? own.at(-1) : own) as WriterCharacterSet };
}

function addElements(sink: ByteSink, dataSet: DataSet, outer: Encoding): void {
  const encoding = encodingWithin(dataSet, outer);
  const inner = encoding.isRoot ? { ...encoding, isRoot: false } : encoding;
  for (const element of dataSet.toSorted((a, b) => a.tag - b.tag)) addElement(sink, element, inner);
}

/** Encodes a data set, its elements in ascending order of tag (PS3.5 7.1). */
export function encodeDataSet(dataSet: DataSet, encoding: Encoding): Buffer {
  const sink = new ByteSink(encoding.isBigEndian);
  addElements(sink, dataSet, encoding);
  return sink.take();
}
