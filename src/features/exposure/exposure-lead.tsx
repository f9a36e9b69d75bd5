import type { ExposurePoints } from '../../../shared/contract/staff-exposure';
import { formatInteger } from '../../../shared/units';

const say = (count: number, one: string, many: string): string =>
  count === 1 ? `1 ${one}` : `${formatInteger(count)} ${many}`;

/** What is counted and what is missing, in one line. */
export function ExposureLead({ found, personName }: { found: ExposurePoints; personName?: string }) {
  const parts = [
    `${say(found.items.length, 'procedure', 'procedures')} with an estimate${personName ? ` of ${personName}` : ''}`,
    found.incompleteRecords > 0 &&
      say(found.incompleteRecords, 'more waits for its record', 'more wait for their record'),
    found.withoutEstimate > 0 && say(found.withoutEstimate, 'is not estimable', 'are not estimable'),
  ].filter(Boolean);
  return <p>{parts.join('; ')}. Estimates, not a dosimeter of record.</p>;
}
