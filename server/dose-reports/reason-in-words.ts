import { sentenceOfReason, type ReasonCode } from '../../shared/contract/outcome';
import { dicomDirectorySentence, isDicomDirectory, nameContent, sentenceForContent } from './name-content';

/**
 * Why a file gave no report: the sentence for a person, which names what the file is where that can be told, then what
 * the reader stumbled over, for whoever is asked for help.
 */
export function reasonInWords(code: ReasonCode, detail: string, bytes: Buffer): string {
  const name = code === 'not-dicom' ? nameContent(bytes) : null;
  if (name) return sentenceForContent(name);
  if (code === 'not-structured-report' && isDicomDirectory(detail)) return dicomDirectorySentence;
  return `${sentenceOfReason(code)} (${detail})`;
}
