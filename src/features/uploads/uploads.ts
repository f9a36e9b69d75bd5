import { useSyncExternalStore } from 'react';
import { queryClient } from '../../lib/query-client';
import { sendFile } from './send-file';
import { createUploadStore } from './upload-store';

/** Lives as long as the page: looking elsewhere does not stop an upload. */
export const uploads = createUploadStore(sendFile, () => {
  void queryClient.invalidateQueries({ queryKey: ['procedures'] });
  void queryClient.invalidateQueries({ queryKey: ['dose-reports'] });
});

export const useUploads = () => useSyncExternalStore(uploads.subscribe, uploads.read);
export const useUploadNotes = () => useSyncExternalStore(uploads.subscribe, uploads.readNotes);

// Files still on their way exist only here: closing the tab would lose them without a word.
window.addEventListener('beforeunload', (event) => {
  if (uploads.isBusy()) event.preventDefault();
});
