/** The first bytes of kinds of file that people hand over by mistake, and what such a file is. */
const signatures: { at: number; bytes: string; name: string }[] = [
  { at: 0, bytes: '\x89PNG', name: 'a picture (PNG)' },
  { at: 0, bytes: '\xff\xd8\xff', name: 'a picture (JPEG)' },
  { at: 0, bytes: 'GIF8', name: 'a picture (GIF)' },
  { at: 0, bytes: 'BM', name: 'a picture (BMP)' },
  { at: 0, bytes: 'II*\0', name: 'a picture (TIFF)' },
  { at: 0, bytes: 'MM\0*', name: 'a picture (TIFF)' },
  { at: 8, bytes: 'WEBP', name: 'a picture (WebP)' },
  { at: 4, bytes: 'ftypheic', name: 'a picture (HEIC)' },
  { at: 4, bytes: 'ftyp', name: 'a film (MP4)' },
  { at: 0, bytes: '%PDF', name: 'a PDF document' },
  { at: 0, bytes: '\xd0\xcf\x11\xe0', name: 'an older Excel or Word document' },
  { at: 0, bytes: '{\\rtf', name: 'a text document (RTF)' },
  { at: 0, bytes: '\x1f\x8b', name: 'a packed file (gzip)' },
  { at: 0, bytes: '7z\xbc\xaf', name: 'a packed archive (7z)' },
  { at: 0, bytes: 'Rar!', name: 'a packed archive (RAR)' },
  { at: 257, bytes: 'ustar', name: 'a packed archive (tar)' },
  { at: 0, bytes: 'BZh', name: 'a packed file (bzip2)' },
  { at: 0, bytes: '\xfd7zXZ', name: 'a packed file (xz)' },
];

const steps = {
  picture:
    'Send the radiation dose structured report of the same study; a picture of the dose screen belongs to an entry by hand.',
  packed: 'Unpack it, or pack it as a zip archive, and send what is in it.',
  other: 'Export the dose report as a DICOM structured report.',
};

const stepFor = (name: string) =>
  name.includes('picture') ? steps.picture : name.includes('packed') ? steps.packed : steps.other;

/** Tab, line feeds and escape (of other character sets) occur in text; other control characters do not. */
const inText = new Set([9, 10, 11, 12, 13, 27]);
const isText = (head: string) =>
  head.length > 0 && [...head].every((letter) => letter >= ' ' || inText.has(letter.charCodeAt(0)));

function nameText(head: string): string {
  const start = head
    .replace(/^(\xef\xbb\xbf|\xff\xfe|\xfe\xff)/, '')
    .trimStart()
    .slice(0, 200)
    .toLowerCase();
  if (/^<!doctype html|^<html/.test(start)) return 'a web page (HTML)';
  if (start.startsWith('<?xml') || start.startsWith('<')) return 'an XML document';
  if (/^[[{]/.test(start)) return 'a JSON document';
  return 'a text';
}

/** What a file that is not DICOM is, from its content; null when nobody can tell. */
export function nameContent(bytes: Buffer): string | null {
  const head = bytes.toString('latin1', 0, 512);
  const known = signatures.find(({ at, bytes: mark }) => head.startsWith(mark, at));
  if (known) return known.name;
  if (/^(\xff\xfe|\xfe\xff)/.test(head)) return nameText(head.replaceAll('\0', ''));
  return isText(head) ? nameText(head) : null;
}

/** Office documents are zip archives: told by the names of their parts. */
export function nameZipDocument(paths: readonly string[]): string | null {
  if (!paths.includes('[Content_Types].xml') && !paths.includes('mimetype')) return null;
  const kinds = [
    { start: 'xl/', name: 'an Excel workbook' },
    { start: 'word/', name: 'a Word document' },
    { start: 'ppt/', name: 'a PowerPoint presentation' },
  ];
  return (
    kinds.find(({ start }) => paths.some((path) => path.startsWith(start)))?.name ?? 'an office document'
  );
}

/** The sentence for a file that is not DICOM: what it is, what was kept, what to do. */
export const sentenceForContent = (name: string): string =>
  `This is ${name}, not a DICOM file. It was kept unread. ${stepFor(name)}`;

/** Whether the reader, asked why, named the SOP class of a disc's table of contents (Media Storage Directory, PS3.10). */
export const isDicomDirectory = (detail: string): boolean => /\b1\.2\.840\.10008\.1\.3\.10$/.test(detail);

export const dicomDirectorySentence =
  'This is the table of contents of a DICOM disc (DICOMDIR). It was kept unread. Send the files beside it, or the whole folder.';
