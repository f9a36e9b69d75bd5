import * as library from 'dicom-parser';
import type { DataSet } from 'dicom-parser';
import type { WarningCode } from '../../shared/contract/outcome';
import { locateDataSet } from './locate-data-set';
import { scanStructure } from './scan-structure';

/** The package is CommonJS: Node's own loader shows its functions at `default` only, bundlers at the top. */
const dicomParser = 'default' in library ? (library.default as typeof library) : library;

/** Node's own slice to text, several times faster on short values than `toString`; its types leave it out. */
type SliceableBuffer = Buffer & { latin1Slice(start: number, end: number): string };

/** A data set or the data set of an item: elements by tag ("x00080018") over shared bytes. */
export type DicomDataSet = Pick<DataSet, 'elements'> & { byteArray: SliceableBuffer };

export interface DicomFile {
  dataSet: DicomDataSet;
  warnings: { code: WarningCode; detail: string }[];
}

/**
 * Reads a DICOM file or bare data set in any of the transfer syntaxes a structured report comes in (PS3.5 annex A,
 * PS3.10 section 7). Throws a ReadFailure for anything that is not whole.
 */
export function readDicom(bytes: Uint8Array): DicomFile {
  const { data, encoding, warnings } = locateDataSet(
    Buffer.from(bytes.buffer, bytes.byteOffset, bytes.length),
  );
  scanStructure(data, encoding);
  const dataSet: DicomDataSet = { elements: {}, byteArray: data as SliceableBuffer };
  const parser = encoding.isBigEndian
    ? dicomParser.bigEndianByteArrayParser
    : dicomParser.littleEndianByteArrayParser;
  const parse = encoding.isExplicit
    ? dicomParser.parseDicomDataSetExplicit
    : dicomParser.parseDicomDataSetImplicit;
  parse(
    Object.assign(dataSet, { warnings: [] }) as unknown as DataSet,
    new dicomParser.ByteStream(parser, data, 0),
    data.length,
  );
  return { dataSet, warnings };
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

/** The value's bytes; undefined if the element is absent, empty for a zero-length value or a sequence. */
export function bytesOf(dataSet: DicomDataSet, tag: string): Buffer | undefined {
  const element = dataSet.elements[tag];
  if (!element) return undefined;
  const { dataOffset, length } = element;
  return element.items
    ? dataSet.byteArray.subarray(0, 0)
    : dataSet.byteArray.subarray(dataOffset, dataOffset + length);
}

/** The value as Latin-1 without trailing padding: for codes, numbers, dates and UIDs. Null if absent or empty. */
export function asciiOf(dataSet: DicomDataSet, tag: string): string | null {
  const element = dataSet.elements[tag];
  if (!element || element.items || element.length === 0) return null;
  let end = element.dataOffset + element.length;
  const bytes = dataSet.byteArray;
  while (end > element.dataOffset && (bytes[end - 1] === 0x20 || bytes[end - 1] === 0)) end -= 1;
  return end > element.dataOffset ? bytes.latin1Slice(element.dataOffset, end) : null;
}
