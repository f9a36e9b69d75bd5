/** A zip archive by its first bytes: a local header, an empty archive, or a part of several (APPNOTE.TXT 4.3). */
const zipMagic = [0x04034b50, 0x06054b50, 0x08074b50];

/** So many bytes are needed to tell. */
export const zipHeadBytes = 132;

/** Whether bytes begin as a zip archive. A DICOM file may have anything in its first 128 bytes, also that. */
export function isZip(head: Buffer): boolean {
  const isDicom = head.length >= zipHeadBytes && head.toString('latin1', 128, zipHeadBytes) === 'DICM';
  return !isDicom && head.length >= 4 && zipMagic.includes(head.readUInt32LE(0));
}
