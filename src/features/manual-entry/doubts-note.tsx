import { useFormContext, useWatch } from 'react-hook-form';
import { findDoubts } from './find-doubts';
import { listFigures, type EntryValues } from './entry-values';

const oldAfterDays = 30;
const dayMs = 86_400_000;

const describeAge = (localStartedAt: string): string | null => {
  const days = Math.floor((Date.now() - new Date(localStartedAt).getTime()) / dayMs);
  return days > oldAfterDays ? `The start lies ${days} days back. Is the date right?` : null;
};

/** What looks odd about the entry; it is stored all the same when it is right. */
export function DoubtsNote() {
  const { control } = useFormContext<EntryValues>();
  const [figures, hasTwoPlanes, startedAt] = useWatch({
    control,
    name: ['figures', 'hasTwoPlanes', 'localStartedAt'],
  });
  const doubts = [...findDoubts(listFigures({ figures, hasTwoPlanes })), describeAge(startedAt)].filter(
    (doubt) => doubt !== null,
  );
  return (
    <div role="status">
      {doubts.length > 0 && (
        <div className="flex flex-col gap-1 border-l-3 border-beacon bg-surface px-4 py-2">
          <p className="font-semibold text-beacon">Look again</p>
          {doubts.map((doubt) => (
            <p key={doubt}>{doubt}</p>
          ))}
          <p className="text-sm text-ink-2">If the machine shows just this, store it.</p>
        </div>
      )}
    </div>
  );
}
