import type { ReactNode } from 'react';
import { useDropzone } from 'react-dropzone';

type FileDropProps = {
  onFiles: (files: File[]) => void;
  /** Shown over the page while files hover: "Let go to hand over the dose reports". */
  invitation: string;
  isDisabled?: boolean;
  /** Gets the way to open the file picker, for a button inside the page. */
  children: (openPicker: () => void) => ReactNode;
};

/** Takes files anywhere on the page that it wraps, and by a picker for those who do not drag. */
export function FileDrop({ onFiles, invitation, isDisabled, children }: FileDropProps) {
  const { getRootProps, getInputProps, isDragActive, open } = useDropzone({
    onDropAccepted: onFiles,
    noClick: true,
    noKeyboard: true,
    multiple: true,
    disabled: isDisabled,
  });
  return (
    <div
      {...getRootProps({ role: undefined, tabIndex: undefined })}
      className="relative min-h-[calc(100dvh-6rem)]"
    >
      <input {...getInputProps({ 'aria-label': 'Choose files' })} />
      {children(open)}
      {isDragActive && (
        <div className="pointer-events-none fixed inset-3 z-40 grid place-items-center border-2 border-dashed border-lee bg-paper/90">
          <p className="text-2xl font-light">{invitation}</p>
        </div>
      )}
    </div>
  );
}
