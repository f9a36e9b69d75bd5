import { ReadFailure } from './read-failure';

const STORAGE = '1.2.840.10008.5.1.4.1.1.';

/** Storage classes that are neither images nor structured reports, by the number after the storage root. */
const otherObjects = /^(9|11|66|67|68|79|80)(\.|$)|^481\.(?!1$)/;

/**
 * Stops early at what cannot be a dose report, by SOP class (PS3.4 annex B, PS3.6 annex A). Structured reports of
 * any class go on, and so do classes that are not of the standard.
 */
export function classifySopClass(sopClassUid: string): void {
  if (!/^[0-9.]+$/.test(sopClassUid)) return;
  if (sopClassUid.startsWith('1.2.840.10008.') && !sopClassUid.startsWith(STORAGE)) {
    throw new ReadFailure('not-structured-report', `SOP class ${sopClassUid}`);
  }
  if (!sopClassUid.startsWith(STORAGE)) return;
  const kind = sopClassUid.slice(STORAGE.length);
  if (kind === '88.68' || kind === '88.73') {
    throw new ReadFailure('radiopharmaceutical-report', `SOP class ${sopClassUid}`);
  }
  if (kind === '88.76') throw new ReadFailure('enhanced-report', `SOP class ${sopClassUid}`);
  if (kind.startsWith('88.')) return;
  if (kind.startsWith('104.')) throw new ReadFailure('encapsulated-document', `SOP class ${sopClassUid}`);
  if (otherObjects.test(kind)) throw new ReadFailure('not-structured-report', `SOP class ${sopClassUid}`);
  throw new ReadFailure('image', `SOP class ${sopClassUid}`);
}
