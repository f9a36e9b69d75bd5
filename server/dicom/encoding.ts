/** How the elements of a data set are laid out (PS3.5 section 7). */
export interface ElementEncoding {
  isExplicit: boolean;
  isBigEndian: boolean;
}

export const implicitLittleEndian: ElementEncoding = { isExplicit: false, isBigEndian: false };
export const explicitLittleEndian: ElementEncoding = { isExplicit: true, isBigEndian: false };
export const explicitBigEndian: ElementEncoding = { isExplicit: true, isBigEndian: true };

const DEFLATED = '1.2.840.10008.1.2.1.99';

/** Encoding for a transfer syntax UID (PS3.5 annex A), null for one whose data set can't be read here. */
export function encodingOfTransferSyntax(uid: string): (ElementEncoding & { isDeflated: boolean }) | null {
  if (uid === '1.2.840.10008.1.2') return { ...implicitLittleEndian, isDeflated: false };
  if (uid === '1.2.840.10008.1.2.1') return { ...explicitLittleEndian, isDeflated: false };
  if (uid === '1.2.840.10008.1.2.2') return { ...explicitBigEndian, isDeflated: false };
  if (uid === DEFLATED) return { ...explicitLittleEndian, isDeflated: true };
  // Compressed images (JPEG and others) keep the rest of the data set in explicit little endian.
  if (/^1\.2\.840\.10008\.1\.2\.(4|5|6|7)(\.\d+)*$/.test(uid))
    return { ...explicitLittleEndian, isDeflated: false };
  return null;
}

const isUpperCase = (byte: number | undefined) => byte !== undefined && byte >= 0x41 && byte <= 0x5a;

/** The encoding that the first element shows; null when it is no element of a DICOM data set. */
export function guessEncoding(bytes: Buffer, offset = 0): ElementEncoding | null {
  if (bytes.length < offset + 8) return null;
  const hasValueRepresentation = isUpperCase(bytes[offset + 4]) && isUpperCase(bytes[offset + 5]);
  const littleGroup = bytes.readUInt16LE(offset);
  const bigGroup = bytes.readUInt16BE(offset);
  const isFirstGroup = (group: number) => group === 0x0002 || group === 0x0004 || group === 0x0008;
  if (hasValueRepresentation && isFirstGroup(littleGroup)) return explicitLittleEndian;
  if (hasValueRepresentation && isFirstGroup(bigGroup)) return explicitBigEndian;
  const length = bytes.readUInt32LE(offset + 4);
  const isPlausible = littleGroup === 0x0008 && length % 2 === 0 && length <= 0xffff;
  return isPlausible && bytes.readUInt16LE(offset + 2) <= 0x0070 ? implicitLittleEndian : null;
}
