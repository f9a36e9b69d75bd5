import type { Outcome } from '../../../shared/contract/received-files';
import type { Upload } from './upload-store';

export const outcomeNames: Record<Outcome, string> = {
  stored: 'stored',
  duplicate: 'already here',
  held: 'held',
  refused: 'refused',
};

/** "12 of 200 read: 9 stored, 2 already here, 1 refused." */
export function describeUploads(uploads: readonly Upload[]): string {
  const done = uploads.filter(({ state }) => state === 'answered' || state === 'failed');
  const parts = Object.entries(outcomeNames).flatMap(([outcome, name]) => {
    const count = done.filter(({ result }) => result?.outcome === outcome).length;
    return count === 0 ? [] : [`${count} ${name}`];
  });
  const failed = done.filter(({ state }) => state === 'failed').length;
  if (failed > 0) parts.push(`${failed} not sent`);
  const readCount = done.length - failed;
  const head = readCount === uploads.length ? `${readCount} read` : `${readCount} of ${uploads.length} read`;
  return parts.length === 0 ? `${head}.` : `${head}: ${parts.join(', ')}.`;
}
