import type { Outcome } from '../../../shared/contract/received-files';
import { formatInteger } from '../../../shared/units';
import type { Upload } from './upload.types';

export const outcomeNames: Record<Outcome, string> = {
  stored: 'stored',
  duplicate: 'already here',
  held: 'held',
  refused: 'refused',
};

/** Files that an upload brings: itself, or the entries of its archive as soon as they are counted. */
const sizeOf = ({ archive, results }: Upload) =>
  archive === null ? 1 : Math.max(archive.entryCount ?? 1, results.length);

/** How far the whole is, 0..1; null when nothing was handed over. */
export function shareOf(uploads: readonly Upload[]): number | null {
  const whole = uploads.reduce((sum, upload) => sum + sizeOf(upload), 0);
  const done = uploads.reduce(
    (sum, upload) => sum + (upload.state === 'failed' ? sizeOf(upload) : upload.results.length),
    0,
  );
  return whole === 0 ? null : done / whole;
}

/** "12 of 200 read: 9 stored, 2 already here, 1 refused." */
export function describeUploads(uploads: readonly Upload[]): string {
  const results = uploads.flatMap((upload) => upload.results);
  const whole = uploads.reduce((sum, upload) => sum + sizeOf(upload), 0);
  const parts = Object.entries(outcomeNames).flatMap(([outcome, name]) => {
    const count = results.filter((result) => result.outcome === outcome).length;
    return count === 0 ? [] : [`${formatInteger(count)} ${name}`];
  });
  const failed = uploads.filter(({ state }) => state === 'failed').length;
  if (failed > 0) parts.push(`${formatInteger(failed)} not sent`);
  const read = formatInteger(results.length);
  const head = results.length === whole ? `${read} read` : `${read} of ${formatInteger(whole)} read`;
  return parts.length === 0 ? `${head}.` : `${head}: ${parts.join(', ')}.`;
}

/** "3 system files of folders were left out." */
export const describeSkipped = (count: number): string | null =>
  count === 0
    ? null
    : count === 1
      ? '1 system file of a folder was left out.'
      : `${formatInteger(count)} system files of folders were left out.`;
