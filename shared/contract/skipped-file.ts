/** Files that systems and discs add on their own: their exact names in lower case, and what each is. */
const systemFiles: Record<string, string> = {
  '.ds_store': 'view settings of a folder (macOS)',
  '.localized': 'a folder name for display (macOS)',
  'thumbs.db': 'preview pictures of a folder (Windows)',
  'ehthumbs.db': 'preview pictures of a folder (Windows)',
  'desktop.ini': 'view settings of a folder (Windows)',
  dicomdir: 'the table of contents of a DICOM disc; the reports are the files beside it',
  lockfile: 'a lock of the disc software',
  'autorun.inf': 'the start instruction of a disc (Windows)',
};

/** Why a file is nobody's dose report, by its path; null when it may be one. */
export function whySkipped(path: string): string | null {
  const parts = path.toLowerCase().split('/');
  if (parts.includes('__macosx')) return 'a side file of the packing program (macOS)';
  const name = parts.at(-1) ?? '';
  if (name.startsWith('._')) return 'a side file of the file system (macOS)';
  return systemFiles[name] ?? null;
}
