import { useQuery } from '@tanstack/react-query';
import { useFormContext, useWatch } from 'react-hook-form';
import type { Neighbour } from '../../../shared/contract/manual-entry';
import { formatTime } from '../../lib/clock';
import { paths } from '../../paths';
import { TextLink } from '../../ui/text-link';
import { unlistedMachine, type EntryValues } from './entry-values';
import { manualEntryQueries } from './queries';

const describe = ({ startedAt, name, caseNumber, isManual }: Neighbour) =>
  `${formatTime(startedAt)}, ${name ?? 'type not recorded'}, ${caseNumber}${isManual ? ', entered by hand' : ', from a report'}`;

/** Procedures of the same machine and hour: perhaps the report came after all, or somebody typed it already. */
export function NeighboursNote() {
  const { control } = useFormContext<EntryValues>();
  const [equipmentId, startedAt] = useWatch({ control, name: ['equipmentId', 'localStartedAt'] });
  const isPlaced = equipmentId !== '' && equipmentId !== unlistedMachine && startedAt !== '';
  const { data } = useQuery({ ...manualEntryQueries.neighbours(equipmentId, startedAt), enabled: isPlaced });
  const neighbours = isPlaced ? (data ?? []) : [];
  return (
    <div role="status">
      {neighbours.length > 0 && (
        <div className="flex flex-col gap-1 border-l-3 border-lee bg-surface px-4 py-2">
          <p className="font-semibold">Stored already, on this machine and within an hour</p>
          <ul>
            {neighbours.map((neighbour) => (
              <li key={neighbour.id}>
                <TextLink to={paths.procedure(neighbour.id)}>{describe(neighbour)}</TextLink>
              </li>
            ))}
          </ul>
          <p className="text-sm text-ink-2">If one of them is this case, there is nothing to type.</p>
        </div>
      )}
    </div>
  );
}
