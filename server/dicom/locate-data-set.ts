import { inflateRawSync } from 'node:zlib';
import type { WarningCode } from '../../shared/contract/outcome';
import { classifySopClass } from './classify-sop-class';
import { encodingOfTransferSyntax, guessEncoding, type ElementEncoding } from './encoding';
import { limits } from './limits';
import { ReadFailure } from './read-failure';

export interface LocatedDataSet {
  /** The data set without preamble and group 2, inflated. */
  data: Buffer;
  encoding: ElementEncoding;
  warnings: { code: WarningCode; detail: string }[];
}

interface MetaHeader {
  end: number;
  transferSyntaxUid: string | null;
  sopClassUid: string | null;
}

const longForm = new Set(['OB', 'OW', 'UN', 'UT', 'SQ']);

/** Group 2 is always explicit little endian (PS3.10 7.1); its stated length is not relied on. */
function readMetaHeader(bytes: Buffer, start: number): MetaHeader {
  const meta: MetaHeader = { end: start, transferSyntaxUid: null, sopClassUid: null };
  while (meta.end + 8 <= bytes.length && bytes.readUInt16LE(meta.end) === 0x0002) {
    const element = bytes.readUInt16LE(meta.end + 2);
    const isLong = longForm.has(bytes.toString('latin1', meta.end + 4, meta.end + 6));
    const valueStart = meta.end + (isLong ? 12 : 8);
    if (valueStart > bytes.length)
      throw new ReadFailure('truncated', 'ends inside the file meta information');
    const length = isLong ? bytes.readUInt32LE(meta.end + 8) : bytes.readUInt16LE(meta.end + 6);
    const valueEnd = valueStart + length;
    if (valueEnd > bytes.length) throw new ReadFailure('truncated', 'ends inside the file meta information');
    const text = bytes
      .toString('latin1', valueStart, Math.min(valueEnd, valueStart + 64))
      .replace(/[\0 ]+$/, '');
    if (element === 0x0010) meta.transferSyntaxUid = text || null;
    if (element === 0x0002) meta.sopClassUid = text;
    meta.end = valueEnd;
  }
  return meta;
}

function findMetaHeader(bytes: Buffer): number | null {
  if (bytes.length >= 132 && bytes.toString('latin1', 128, 132) === 'DICM') return 132;
  if (bytes.toString('latin1', 0, 4) === 'DICM') return 4;
  const startsWithGroup2 = bytes.length >= 8 && bytes.readUInt16LE(0) === 0x0002;
  return startsWithGroup2 && guessEncoding(bytes)?.isExplicit === true ? 0 : null;
}

function inflate(bytes: Buffer): Buffer {
  const sensibleBytes = Math.max(limits.inflatedBytesAtLeast, limits.inflationRatio * bytes.length);
  const maxOutputLength = Math.min(limits.inflatedBytes, sensibleBytes);
  try {
    return inflateRawSync(bytes, { maxOutputLength });
  } catch (error) {
    const code = error instanceof Error && 'code' in error ? String(error.code) : '';
    if (code === 'ERR_BUFFER_TOO_LARGE') {
      throw new ReadFailure('limit-inflated-size', `more than ${maxOutputLength} bytes when inflated`);
    }
    if (code === 'Z_BUF_ERROR') throw new ReadFailure('truncated', 'the deflated data set breaks off');
    throw new ReadFailure('malformed', 'the deflated data set cannot be inflated');
  }
}

function locateBareDataSet(bytes: Buffer): LocatedDataSet {
  const encoding = guessEncoding(bytes);
  if (!encoding)
    throw new ReadFailure('not-dicom', 'neither a DICOM prefix nor a first element of a data set');
  return {
    data: bytes,
    encoding,
    warnings: [{ code: 'no-meta-header', detail: 'no file meta information' }],
  };
}

/**
 * Finds the data set of a DICOM file (PS3.10 section 7): behind preamble and meta header, behind a meta header
 * alone, or bare. A declared encoding that the first element contradicts gives way to the element, with a warning.
 */
export function locateDataSet(bytes: Buffer): LocatedDataSet {
  if (bytes.length === 0) throw new ReadFailure('empty', 'no bytes');
  const metaStart = findMetaHeader(bytes);
  if (metaStart === null) return locateBareDataSet(bytes);
  const meta = readMetaHeader(bytes, metaStart);
  if (meta.sopClassUid) classifySopClass(meta.sopClassUid);
  // Less than an element's tag and length: cut inside the meta information or right behind it.
  if (bytes.length - meta.end < 8) throw new ReadFailure('truncated', 'ends after the file meta information');
  const rest = bytes.subarray(meta.end);
  const warnings: LocatedDataSet['warnings'] = [];
  if (meta.transferSyntaxUid === null) {
    warnings.push({ code: 'no-meta-header', detail: 'no transfer syntax in the file meta information' });
  }
  const declared = meta.transferSyntaxUid === null ? null : encodingOfTransferSyntax(meta.transferSyntaxUid);
  if (meta.transferSyntaxUid !== null && !declared) {
    throw new ReadFailure(
      'transfer-syntax-unknown',
      `transfer syntax ${JSON.stringify(meta.transferSyntaxUid)}`,
    );
  }
  if (declared?.isDeflated) {
    const data = inflate(rest);
    if (data.length === 0) throw new ReadFailure('truncated', 'the deflated data set is empty');
    return { data, encoding: declared, warnings };
  }
  const shown = guessEncoding(rest);
  const encoding = shown ?? declared;
  if (!encoding) throw new ReadFailure('malformed', 'no data set after the file meta information');
  const isAsDeclared =
    !declared ||
    (declared.isExplicit === encoding.isExplicit && declared.isBigEndian === encoding.isBigEndian);
  if (!isAsDeclared) {
    warnings.push({ code: 'syntax-mismatch', detail: `declared ${String(meta.transferSyntaxUid)}` });
  }
  return { data: rest, encoding, warnings };
}
