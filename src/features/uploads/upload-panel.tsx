import { useState } from 'react';
import { Button } from '../../ui/button';
import { Checkbox } from '../../ui/checkbox';
import { MarginNote } from '../../ui/margin-note';
import { ProgressBar } from '../../ui/progress-bar';
import { describeUploads } from './describe-uploads';
import { FolderButton } from './folder-button';
import { isTrouble, UploadLine } from './upload-line';
import type { Upload } from './upload-store';
import { uploads, useUploads } from './uploads';

/** Where dose reports are handed over, and what became of each. */
export function UploadPanel({ onChoose }: { onChoose: () => void }) {
  const items = useUploads();
  return (
    <>
      <MarginNote title="Hand over dose reports">
        <p className="text-sm text-ink-2">Drop files or folders anywhere on this page, one or hundreds.</p>
        <Button variant="primary" onClick={onChoose}>
          Choose files
        </Button>
        <FolderButton onFiles={uploads.add} />
        <p className="text-sm text-ink-2">Every file is kept, also one that cannot be read.</p>
      </MarginNote>
      {items.length > 0 && (
        <div id="just-received">
          <MarginNote title="Just received">
            <Received items={items} />
          </MarginNote>
        </div>
      )}
    </>
  );
}

function Received({ items }: { items: readonly Upload[] }) {
  const [isTroubleOnly, setTroubleOnly] = useState(false);
  const troubles = items.filter(isTrouble);
  const done = items.filter(({ state }) => state === 'answered' || state === 'failed').length;
  const shown = isTroubleOnly && troubles.length > 0 ? troubles : items;
  return (
    <>
      <p role="status" className="text-sm">
        {describeUploads(items)}
      </p>
      {done < items.length && <ProgressBar share={done / items.length} label="All files" />}
      {troubles.length > 0 && troubles.length < items.length && (
        <Checkbox
          label="Only what was not stored"
          checked={isTroubleOnly}
          onChange={(event) => setTroubleOnly(event.target.checked)}
        />
      )}
      <ul
        className="flex max-h-[28rem] flex-col gap-2 overflow-y-auto"
        tabIndex={0}
        aria-label="Files and their outcomes"
      >
        {shown.map((item) => (
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
    </>
  );
}
