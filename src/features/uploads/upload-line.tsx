import { memo } from 'react';
import { paths } from '../../paths';
import { ProgressBar } from '../../ui/progress-bar';
import { TextLink } from '../../ui/text-link';
import { outcomeNames } from './describe-uploads';
import type { Upload } from './upload-store';

/** Not sent, held or refused: somebody has to look. */
export const isTrouble = (item: Upload) =>
  item.state === 'failed' || item.result?.outcome === 'held' || item.result?.outcome === 'refused';

function Consequence({ item: { state, share, result, failure, file } }: { item: Upload }) {
  if (state === 'failed')
    return <p className="text-sm text-ink-2">{failure} Send it again: nothing is stored twice.</p>;
  if (state === 'waiting') return <p className="text-sm text-ink-2">waiting</p>;
  if (state === 'sending') return <ProgressBar share={share} label={`${file.name} under way`} />;
  return (
    <>
      {result?.reason && <p className="text-sm text-ink-2">{result.reason.detail}</p>}
      {result?.procedureId && (
        <TextLink to={paths.procedure(result.procedureId)} className="self-start text-sm">
          Open the procedure
        </TextLink>
      )}
    </>
  );
}

/** One file: its name, its outcome, and what follows from it. Hundreds stand below each other: only what changes is drawn. */
export const UploadLine = memo(({ item }: { item: Upload }) => (
  <li className="flex flex-col gap-1 border-b border-rule pb-2">
    <div className="flex items-baseline justify-between gap-3">
      <span className="min-w-0 truncate" title={item.file.name}>
        {item.file.name}
      </span>
      <span className={`flex-none text-sm font-semibold ${isTrouble(item) ? 'text-beacon' : 'text-lee'}`}>
        {item.state === 'failed' && 'not sent'}
        {item.state === 'sending' && (
          <span className="font-normal text-ink-2">{item.share < 1 ? 'sending' : 'reading'}</span>
        )}
        {item.result && outcomeNames[item.result.outcome]}
      </span>
    </div>
    <Consequence item={item} />
  </li>
));
UploadLine.displayName = 'UploadLine';
