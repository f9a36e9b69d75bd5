import { memo } from 'react';
import type { ReceivedFile } from '../../../shared/contract/received-files';
import { formatInteger } from '../../../shared/units';
import { paths } from '../../paths';
import { ProgressBar } from '../../ui/progress-bar';
import { TextLink } from '../../ui/text-link';
import { outcomeNames } from './describe-uploads';
import type { Upload } from './upload.types';

/** Held or refused: somebody has to look. */
export const isTroubled = ({ outcome }: ReceivedFile): boolean => outcome === 'held' || outcome === 'refused';

/** Not sent, held or refused. */
export const isTrouble = (item: Upload): boolean => item.state === 'failed' || item.results.some(isTroubled);

/** Thousands may stand below each other: what is out of sight is not laid out. */
const lineLook =
  'flex flex-col gap-1 border-b border-rule pb-2 [content-visibility:auto] [contain-intrinsic-size:auto_3rem]';

/** Where room is short, the folder gives way before the name does. */
function Name({ name, folder }: { name: string; folder: string }) {
  return (
    <span className="flex min-w-0" title={`${folder}${name}`}>
      {folder && <span className="min-w-0 truncate text-ink-2">{folder}</span>}
      <span className="max-w-full flex-none truncate">{name}</span>
    </span>
  );
}

/** The name in its own right, the folder before it. */
function splitPath(path: string): { name: string; folder: string } {
  const at = path.lastIndexOf('/') + 1;
  return { name: path.slice(at), folder: path.slice(0, at) };
}

type ResultLineProps = { path: string; result: ReceivedFile };

/** A file or entry that has its outcome, and what follows from it. */
export const ResultLine = memo(({ path, result }: ResultLineProps) => (
  <li className={lineLook}>
    <div className="flex items-baseline justify-between gap-3">
      <Name {...splitPath(path)} />
      <span className={`flex-none text-sm font-semibold ${isTroubled(result) ? 'text-beacon' : 'text-lee'}`}>
        {outcomeNames[result.outcome]}
      </span>
    </div>
    {result.reason && <p className="text-sm text-ink-2">{result.reason.detail}</p>}
    {result.procedureId && (
      <TextLink to={paths.procedure(result.procedureId)} className="self-start text-sm">
        Open the procedure
      </TextLink>
    )}
  </li>
));
ResultLine.displayName = 'ResultLine';

/** A file that waits, leaves, or was not sent. */
export const PendingLine = memo(({ item: { path, state, share, failure } }: { item: Upload }) => (
  <li className={lineLook}>
    <div className="flex items-baseline justify-between gap-3">
      <Name {...splitPath(path)} />
      {state === 'failed' && <span className="flex-none text-sm font-semibold text-beacon">not sent</span>}
      {state === 'sending' && (
        <span className="flex-none text-sm text-ink-2">{share < 1 ? 'sending' : 'reading'}</span>
      )}
    </div>
    {state === 'failed' && (
      <p className="text-sm text-ink-2">{failure} Send it again: nothing is stored twice.</p>
    )}
    {state === 'waiting' && <p className="text-sm text-ink-2">waiting</p>}
    {state === 'sending' && <ProgressBar share={share} label={`${path} under way`} />}
  </li>
));
PendingLine.displayName = 'PendingLine';

function describeEntries({ archive, results }: Upload): string {
  if (!archive || archive.entryCount === null) return 'unpacking';
  const whole = formatInteger(archive.entryCount);
  if (archive.state === 'received') return `${formatInteger(results.length)} of ${whole} read`;
  return archive.entryCount === 1 ? '1 file in it' : `${whole} files in it`;
}

/** An archive above its entries: how far it is, and what in it was left out. */
export const ArchiveLine = memo(({ item }: { item: Upload }) => {
  const { archive, path, results } = item;
  const skipped = archive?.skipped ?? [];
  return (
    <li className={lineLook}>
      <div className="flex items-baseline justify-between gap-3">
        <Name {...splitPath(path)} />
        <span className="flex-none text-sm text-ink-2">{describeEntries(item)}</span>
      </div>
      {archive?.state === 'received' && (
        <ProgressBar
          share={archive.entryCount ? results.length / archive.entryCount : null}
          label={`${path} under way`}
        />
      )}
      {skipped.length > 0 && (
        <details className="text-sm text-ink-2">
          <summary className="cursor-pointer">
            {skipped.length === 1 ? '1 entry' : `${formatInteger(skipped.length)} entries`} left out: folders,
            empty and system files
          </summary>
          <ul className="ml-4 list-disc">
            {skipped.map(({ path: entry, reason }, index) => (
              <li key={index} className="wrap-anywhere">
                {entry}: {reason}
              </li>
            ))}
          </ul>
        </details>
      )}
    </li>
  );
});
ArchiveLine.displayName = 'ArchiveLine';
