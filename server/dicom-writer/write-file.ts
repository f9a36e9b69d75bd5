import { deflateRawSync } from 'node:zlib';
import { textElement, type DataSet } from './data-element';
import { encodeDataSet, type Encoding } from './encode-data-set';
import type { WriterCharacterSet } from './encode-text';

export type WriterTransferSyntax =
  'implicit-little-endian' | 'explicit-little-endian' | 'explicit-big-endian' | 'deflated';

/** How a file is wrapped; every field may be left out. */
export interface FileOptions {
  /** Default explicit little endian. */
  transferSyntax?: WriterTransferSyntax;
  /** Default ISO_IR 192 (UTF-8). */
  characterSet?: WriterCharacterSet;
  /** False leaves out the 128 bytes and "DICM". */
  hasPreamble?: boolean;
  /** False leaves out group 2 as well: a bare data set. */
  hasMetaHeader?: boolean;
  /** True writes sequences and items with delimiters in place of lengths. */
  hasUndefinedLengths?: boolean;
  /** Written to (0008,0005) in place of the set's own term; null leaves the element out. */
  declaredCharacterSet?: string | string[] | null;
  /** Data Set Trailing Padding (FFFC,FFFC), as media of fixed block size have it. */
  trailingPaddingBytes?: number;
  /** Written to (0002,0010) in place of the syntax's own UID. */
  declaredTransferSyntaxUid?: string;
}

/** PS3.6 annex A. */
const transferSyntaxUids: Record<WriterTransferSyntax, string> = {
  'implicit-little-endian': '1.2.840.10008.1.2',
  'explicit-little-endian': '1.2.840.10008.1.2.1',
  'explicit-big-endian': '1.2.840.10008.1.2.2',
  deflated: '1.2.840.10008.1.2.1.99',
};
const IMPLEMENTATION_CLASS_UID = '2.25.163289046702981236540919246801735';

function encodeMetaHeader(sopClassUid: string, sopInstanceUid: string, transferSyntaxUid: string): Buffer {
  const encoding: Encoding = {
    isExplicit: true,
    isBigEndian: false,
    hasUndefinedLengths: false,
    characterSet: null,
  };
  const body = encodeDataSet(
    [
      { tag: 0x00020001, vr: 'OB', value: Uint8Array.from([0, 1]) },
      textElement(0x00020002, 'UI', sopClassUid),
      textElement(0x00020003, 'UI', sopInstanceUid),
      textElement(0x00020010, 'UI', transferSyntaxUid),
      textElement(0x00020012, 'UI', IMPLEMENTATION_CLASS_UID),
      textElement(0x00020013, 'SH', 'LEEWARD_WRITER'),
    ],
    encoding,
  );
  const length = encodeDataSet([{ tag: 0x00020000, vr: 'UL', value: [body.length] }], encoding);
  return Buffer.concat([length, body]);
}

/** PS3.5 A.5: a deflated stream of odd length gets one zero byte. */
function padToEven(bytes: Buffer): Buffer {
  return bytes.length % 2 === 0 ? bytes : Buffer.concat([bytes, Buffer.alloc(1)]);
}

function textOf(dataSet: DataSet, tag: number): string {
  const value = dataSet.find((element) => element.tag === tag)?.value;
  return typeof value === 'string' ? value : '';
}

function characterSetElement(
  characterSet: WriterCharacterSet,
  declared: FileOptions['declaredCharacterSet'],
): DataSet {
  if (declared === null) return [];
  if (declared !== undefined) return [textElement(0x00080005, 'CS', declared)];
  if (characterSet === null) return [];
  // A code extension stands second; the first value stays empty, which means ASCII (PS3.3 C.12.1.1.2).
  return [
    textElement(0x00080005, 'CS', characterSet.startsWith('ISO 2022') ? ['', characterSet] : characterSet),
  ];
}

function paddingElement(byteCount: number | undefined): DataSet {
  return byteCount === undefined ? [] : [{ tag: 0xfffcfffc, vr: 'OB', value: new Uint8Array(byteCount) }];
}

/** Writes a data set as a DICOM file (PS3.10 section 7); the Specific Character Set is added here. */
export function writeFile(dataSet: DataSet, options: FileOptions = {}): Uint8Array {
  const syntax = options.transferSyntax ?? 'explicit-little-endian';
  const characterSet = options.characterSet === undefined ? 'ISO_IR 192' : options.characterSet;
  const encoding: Encoding = {
    isExplicit: syntax !== 'implicit-little-endian',
    isBigEndian: syntax === 'explicit-big-endian',
    hasUndefinedLengths: options.hasUndefinedLengths ?? false,
    characterSet,
    isRoot: true,
  };
  const complete = [
    ...dataSet,
    ...characterSetElement(characterSet, options.declaredCharacterSet),
    ...paddingElement(options.trailingPaddingBytes),
  ];
  const plain = encodeDataSet(complete, encoding);
  const body = syntax === 'deflated' ? padToEven(deflateRawSync(plain)) : plain;
  if (options.hasMetaHeader === false) return new Uint8Array(body);
  const uid = options.declaredTransferSyntaxUid ?? transferSyntaxUids[syntax];
  const meta = encodeMetaHeader(textOf(dataSet, 0x00080016), textOf(dataSet, 0x00080018), uid);
  const preamble =
    options.hasPreamble === false ? Buffer.alloc(0) : Buffer.concat([Buffer.alloc(128), Buffer.from('DICM')]);
  return new Uint8Array(Buffer.concat([preamble, meta, body]));
}
