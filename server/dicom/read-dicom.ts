import * as library from 'dicom-parser';
import type { DataSet } from 'dicom-parser';
import { decodeText, type TextReader } from './character-set';
import type { ElementEncoding } from './encoding';
import { sliceLatin1, type SliceableBuffer } from './latin1-text';

/** The package is CommonJS: Node's own loader shows its functions at `default` only, bundlers at the top. */
const dicomParser = 'default' in library ? (library.default as typeof library) : library;

/** A data set or the data set of an item: elements by tag ("x00080018") over shared bytes. */
export type DicomDataSet = Pick<DataSet, 'elements'> & { byteArray: SliceableBuffer };

/**
 * The elements of a data set's header as objects, by the DICOM library. It accepts cut bytes and short lengths in
 * silence and descends by recursion: only for bytes that have been scanned.
 */
export function readHeaderElements(bytes: SliceableBuffer, encoding: ElementEncoding): DicomDataSet {
  const dataSet: DicomDataSet = { elements: {}, byteArray: bytes };
  // The content may come first, with no header before it; the library takes no empty bytes.
  if (bytes.length === 0) return dataSet;
  const parser = encoding.isBigEndian
    ? dicomParser.bigEndianByteArrayParser
    : dicomParser.littleEndianByteArrayParser;
  const parse = encoding.isExplicit
    ? dicomParser.parseDicomDataSetExplicit
    : dicomParser.parseDicomDataSetImplicit;
  parse(
    Object.assign(dataSet, { warnings: [] }) as unknown as DataSet,
    new dicomParser.ByteStream(parser, bytes, 0),
    bytes.length,
  );
  return dataSet;
}

const empty: DicomDataSet[] = [];

/** The items of a sequence; none if it is absent or not a sequence. */
export function itemsOf(dataSet: DicomDataSet, tag: string): DicomDataSet[] {
  const items = dataSet.elements[tag]?.items;
  if (!items) return empty;
  return items.flatMap((item) => (item.dataSet ? [item.dataSet as unknown as DicomDataSet] : []));
}

/** The first item of a sequence. */
export function firstItemOf(dataSet: DicomDataSet, tag: string): DicomDataSet | undefined {
  return dataSet.elements[tag]?.items?.[0]?.dataSet as unknown as DicomDataSet | undefined;
}

/** The value as Latin-1 without trailing padding: for codes, numbers, dates and UIDs. Null if absent or empty. */
export function asciiOf(dataSet: DicomDataSet, tag: string): string | null {
  const element = dataSet.elements[tag];
  if (!element || element.items) return null;
  return sliceLatin1(dataSet.byteArray, element.dataOffset, element.dataOffset + element.length);
}

/** Text of an attribute in the character set of its data set; null if absent or blank. */
export function readText(dataSet: DicomDataSet, tag: string, reader: TextReader): string | null {
  const element = dataSet.elements[tag];
  if (!element || element.items) return null;
  return decodeText(dataSet.byteArray, element.dataOffset, element.dataOffset + element.length, reader);
}
