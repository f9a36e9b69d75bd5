import { useState } from 'react';
import { Button } from '../../ui/button';
import { Checkbox } from '../../ui/checkbox';
import { ProgressBar } from '../../ui/progress-bar';
import { describeSkipped, describeUploads, shareOf } from './describe-uploads';
import { writeOutcomeList } from './outcome-list';
import { UploadList } from './upload-list';
import { isTrouble } from './upload-line';
import { isUnderWay, type Upload } from './upload.types';
import { uploads, useUploadNotes } from './uploads';

/** What became of each file, what is still under way, and what can be done with the list. */
export function ReceivedFiles({ items }: { items: readonly Upload[] }) {
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
