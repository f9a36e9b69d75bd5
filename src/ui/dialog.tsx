import { useEffect, useId, useRef, type ReactNode } from 'react';
import { joinClassNames } from '../lib/class-names';
import { CloseButton } from './close-button';

type DialogProps = {
  isOpen: boolean;
  onClose: () => void;
  title: ReactNode;
  children: ReactNode;
  /** Buttons at the foot. */
  deeds?: ReactNode;
  isWide?: boolean;
};

/** A native modal dialog: the browser keeps the focus inside, closes on Escape and gives the focus back. */
export function Dialog({ isOpen, onClose, title, children, deeds, isWide }: DialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const element = dialog.current;
    if (isOpen && !element?.open) element?.showModal();
    if (!isOpen && element?.open) element.close();
  }, [isOpen]);

  return (
    <dialog
      ref={dialog}
      aria-labelledby={titleId}
      onClose={onClose}
      onClick={(event) => event.target === dialog.current && onClose()}
      className={joinClassNames(
        'm-auto max-h-[calc(100dvh-2rem)] w-[calc(100vw-2rem)] overflow-y-auto border border-edge bg-surface p-0 text-ink shadow-xl backdrop:bg-[rgb(19_21_16/0.55)]',
        isWide ? 'max-w-4xl' : 'max-w-xl',
      )}
    >
      {isOpen && (
        <div className="flex flex-col">
          <header className="sticky top-0 flex items-start justify-between gap-4 border-b border-rule bg-surface px-5 py-3">
            <h2 id={titleId} className="text-lg font-semibold">
              {title}
            </h2>
            <CloseButton onClick={onClose} label="Close" />
          </header>
          <div className="px-5 py-4">{children}</div>
          {deeds && (
            <footer className="flex flex-wrap justify-end gap-3 border-t border-rule px-5 py-3">
              {deeds}
            </footer>
          )}
        </div>
      )}
    </dialog>
  );
}
