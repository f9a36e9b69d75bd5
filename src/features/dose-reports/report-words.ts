import type { DoseReport } from '../../../shared/contract/dose-report';
import { formatInteger } from '../../../shared/units';
import type { Choice } from '../../ui/select-field';

export const outcomeWords: Record<DoseReport['outcome'], string> = {
  stored: 'stored',
  duplicate: 'already here',
  held: 'held',
  refused: 'refused',
  received: 'received, not read yet',
};

export const outcomeChoices: Choice[] = [
  { value: 'any', label: 'with any outcome' },
  { value: 'stored', label: 'that were stored' },
  { value: 'duplicate', label: 'that were here already' },
  { value: 'held', label: 'that are held' },
  { value: 'refused', label: 'that were refused' },
  { value: 'received', label: 'that wait to be read' },
];

/** "344 stored, 2 held, 1 refused." Narrowed: of those that the search or the archive leaves. */
export function describeCounts(counts: Record<string, number>, isNarrowed = false): string {
  const parts = Object.entries(outcomeWords).flatMap(([outcome, name]) => {
    const count = counts[outcome] ?? 0;
    return count === 0 ? [] : [`${formatInteger(count)} ${name}`];
  });
  if (parts.length === 0) return isNarrowed ? 'No such file has come.' : 'No file has come yet.';
  return `${parts.join(', ')}.`;
}

/** How long bytes are kept, for whoever wonders where they are. */
export const describeKeeping = (refusedKeepDays: number): string =>
  refusedKeepDays === 0
    ? 'Every file is kept as it came, whatever its outcome.'
    : `Stored and held files are kept as they came; the bytes of refused ones for ${formatInteger(refusedKeepDays)} days, their rows for good.`;
