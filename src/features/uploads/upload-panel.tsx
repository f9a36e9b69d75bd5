import { Button } from '../../ui/button';
import { MarginNote } from '../../ui/margin-note';
import { ProgressBar } from '../../ui/progress-bar';
import { describeUploads } from './describe-uploads';
import { UploadLine } from './upload-line';
import { uploads, useUploads } from './uploads';

/** Where dose reports are handed over, and what became of each. */
export function UploadPanel({ onChoose }: { onChoose: () => void }) {
  const items = useUploads();
  const done = items.filter(({ state }) => state === 'answered' || state === 'failed').length;
  return (
    <>
      <MarginNote title="Hand over dose reports">
        <p className="text-sm text-ink-2">Drop files anywhere on this page, one or hundreds.</p>
        <Button variant="primary" onClick={onChoose}>
          Choose files
        </Button>
        <p className="text-sm text-ink-2">Every file is kept, also one that cannot be read.</p>
      </MarginNote>
      {items.length > 0 && (
        <MarginNote title="Just received">
          <p role="status" className="text-sm">
            {describeUploads(items)}
          </p>
          {done < items.length && <ProgressBar share={done / items.length} label="All files" />}
          <ul
            className="flex max-h-[28rem] flex-col gap-2 overflow-y-auto"
            tabIndex={0}
            aria-label="Files and their outcomes"
          >
            {items.map((item) => (
              <UploadLine key={item.key} item={item} />
            ))}
          </ul>
          <div className="flex flex-wrap gap-2">
            {items.some(({ state }) => state === 'failed') && (
              <Button isSmall onClick={uploads.sendFailedAgain}>
                Send again what was not sent
              </Button>
            )}
            {done > 0 && (
              <Button isSmall onClick={uploads.clear}>
                Clear this list
              </Button>
            )}
          </div>
        </MarginNote>
      )}
    </>
  );
}
