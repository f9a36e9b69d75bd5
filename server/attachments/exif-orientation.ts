const orientationTag = 0x0112;

/** The orientation (1 to 8) of an Exif block, from its TIFF header on; null where there is none. Source: Exif 2.3, 4.5. */
export function readExifOrientation(tiff: Buffer): number | null {
  if (tiff.length < 14) return null;
  const isLittle = tiff.toString('latin1', 0, 2) === 'II';
  const read16 = (at: number) =>
    at + 2 > tiff.length ? 0 : isLittle ? tiff.readUInt16LE(at) : tiff.readUInt16BE(at);
  const directory = isLittle ? tiff.readUInt32LE(4) : tiff.readUInt32BE(4);
  const count = read16(directory);
  for (
    let entry = directory + 2;
    entry < directory + 2 + 12 * count && entry + 12 <= tiff.length;
    entry += 12
  )
    if (read16(entry) === orientationTag) {
      const value = read16(entry + 8);
      return value >= 1 && value <= 8 ? value : null;
    }
  return null;
}

/** A JPEG segment that says how the picture is held and nothing else: a directory of one entry. */
export function writeExifOrientation(orientation: number): Buffer {
  const segment = Buffer.alloc(36);
  segment.writeUInt16BE(0xffe1, 0);
  segment.writeUInt16BE(34, 2);
  segment.write('Exif\0\0MM\0*', 4, 'latin1');
  segment.writeUInt32BE(8, 14);
  segment.writeUInt16BE(1, 18);
  segment.writeUInt16BE(orientationTag, 20);
  // Type 3 is a 16-bit number, of which there is one.
  segment.writeUInt16BE(3, 22);
  segment.writeUInt32BE(1, 24);
  segment.writeUInt16BE(orientation, 28);
  return segment;
}
