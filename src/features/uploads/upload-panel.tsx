import { useState } from 'react';
import { Button } from '../../ui/button';
import { Checkbox } from '../../ui/checkbox';
import { MarginNote } from '../../ui/margin-note';
import { ProgressBar } from '../../ui/progress-bar';
import { describeSkipped, describeUploads, shareOf } from './describe-uploads';
import { FolderButton } from './folder-button';
import { writeOutcomeList } from './outcome-list';
import { UploadList } from './upload-list';
import { isTrouble } from './upload-line';
import { isUnderWay, type Upload } from './upload.types';
import { uploads, useUploadNotes, useUploads } from './uploads';

/** Where dose reports are handed over, and what became of each. */
export function UploadPanel({ onChoose }: { onChoose: () => void }) {
  const items = useUploads();
  const { skippedCount } = useUploadNotes();
  return (
    <>
      <MarginNote title="Hand over dose reports">
        <p className="text-sm text-ink-2">
          Drop files, folders or zip archives anywhere on this page, one or hundreds.
        </p>
        <Button variant="primary" onClick={onChoose}>
          Choose files
        </Button>
        <FolderButton onFiles={uploads.add} />
        <p className="text-sm text-ink-2">Every file is kept, also one that cannot be read.</p>
      </MarginNote>
      {items.length + skippedCount > 0 && (
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
  const { isPaused, skippedCount } = useUploadNotes();
  const isAnyTrouble = items.some(isTrouble);
  const isDone = !items.some(isUnderWay);
  const skipped = describeSkipped(skippedCount);
  return (
    <>
      <p role="status" className="text-sm">
        {items.length > 0 && describeUploads(items)} {skipped}
      </p>
      {isPaused && (
        <p role="alert" className="text-sm font-semibold text-beacon">
          The server does not answer. What waits goes on by itself as soon as it does; leave this page open.
        </p>
      )}
      {!isDone && <ProgressBar share={shareOf(items)} label="All files" />}
      {isAnyTrouble && (
        <Checkbox
          label="Only what needs attention"
          checked={isTroubleOnly}
          onChange={(event) => setTroubleOnly(event.target.checked)}
        />
      )}
      {items.length > 0 && <UploadList items={items} isTroubleOnly={isTroubleOnly && isAnyTrouble} />}
      <div className="flex flex-wrap items-center gap-2">
        {items.some(({ state }) => state === 'failed') && (
          <Button isSmall onClick={uploads.sendFailedAgain}>
            Send again what was not sent
          </Button>
        )}
        {items.some(({ results }) => results.length > 0) && (
          <Button isSmall onClick={() => saveOutcomeList(items)}>
            Save this list
          </Button>
        )}
        {items.every((item) => !isUnderWay(item)) && (
          <Button isSmall onClick={uploads.clear}>
            Clear this list
          </Button>
        )}
      </div>
    </>
  );
}

/** Hands the list to the browser as a file; it never leaves this machine. */
function saveOutcomeList(items: readonly Upload[]): void {
  const text = `\uFEFF${writeOutcomeList(items, window.location.origin)}`;
  const address = URL.createObjectURL(new Blob([text], { type: 'text/csv;charset=utf-8' }));
  const link = document.createElement('a');
  link.href = address;
  link.download = 'received-files.csv';
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}
