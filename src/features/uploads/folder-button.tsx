import { useRef } from 'react';
import { Button } from '../../ui/button';

/** Every file of a folder and of the folders in it. */
export function FolderButton({ onFiles }: { onFiles: (files: File[]) => void }) {
  const input = useRef<HTMLInputElement>(null);
  return (
    <>
      <input
        ref={input}
        type="file"
        multiple
        webkitdirectory=""
        hidden
        aria-label="Choose a folder"
        onChange={({ target }) => {
          onFiles([...(target.files ?? [])]);
          // The same folder can be chosen again.
          target.value = '';
        }}
      />
      <Button onClick={() => input.current?.click()}>Choose a folder</Button>
    </>
  );
}
