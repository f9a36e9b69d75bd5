import { useEffect, useState } from 'react';
import { joinClassNames } from '../lib/class-names';
import { CloseButton } from './close-button';
import { TextLink } from './text-link';
import { closeToast, useToasts, type Toast } from './toast-store';

const shownMs = 8_000;

/** The live region for toasts; stands once in the frame. */
export const Toasts = () => (
  <div
    role="status"
    aria-live="polite"
    aria-label="Notices"
    className="pointer-events-none fixed inset-x-4 bottom-4 z-50 flex flex-col items-end gap-2"
  >
    {useToasts().map((toast) => (
      <ToastNote key={toast.id} toast={toast} />
    ))}
  </div>
);

function ToastNote({ toast }: { toast: Toast }) {
  const [isHeld, setIsHeld] = useState(false);
  useEffect(() => {
    if (toast.isProblem || isHeld) return;
    const timer = setTimeout(() => closeToast(toast.id), shownMs);
    return () => clearTimeout(timer);
  }, [toast, isHeld]);

  return (
    <div
      onMouseEnter={() => setIsHeld(true)}
      onMouseLeave={() => setIsHeld(false)}
      onFocus={() => setIsHeld(true)}
      onBlur={() => setIsHeld(false)}
      className={joinClassNames(
        'pointer-events-auto flex max-w-md items-start gap-3 border border-edge border-l-4 bg-surface py-2 pl-4 pr-4 shadow-lg',
        toast.isProblem ? 'border-l-beacon' : 'border-l-lee',
      )}
    >
      <p className="py-1">
        {toast.text} {toast.link && <TextLink to={toast.link.to}>{toast.link.text}</TextLink>}
      </p>
      <CloseButton label="Close notice" onClick={() => closeToast(toast.id)} />
    </div>
  );
}
