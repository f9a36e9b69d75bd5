import { lazy, Suspense, useEffect } from 'react';
import { Button } from '../../ui/button';
import { MarginNote } from '../../ui/margin-note';
import { FolderButton } from './folder-button';
import { uploads, useUploadNotes, useUploads } from './uploads';

/** Only whoever has handed files over needs it. */
const loadReceivedFiles = () => import('./received-files');
const ReceivedFiles = lazy(async () => ({ default: (await loadReceivedFiles()).ReceivedFiles }));

/** Where dose reports are handed over, and what became of each. */
export function UploadPanel({ onChoose }: { onChoose: () => void }) {
  const items = useUploads();
  const { skippedCount } = useUploadNotes();
  // Fetched beforehand: the connection may be gone when files are dropped.
  useEffect(() => void loadReceivedFiles().catch(() => undefined), []);
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
            <Suspense fallback={<p className="text-sm">Under way …</p>}>
              <ReceivedFiles items={items} />
            </Suspense>
          </MarginNote>
        </div>
      )}
    </>
  );
}
