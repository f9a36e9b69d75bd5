/** A drawn cross of 32 px. */
export const CloseButton = ({ onClick, label }: { onClick: () => void; label: string }) => (
  <button
    type="button"
    onClick={onClick}
    aria-label={label}
    className="-mr-2 grid size-8 flex-none place-items-center text-ink-2 hover:text-ink"
  >
    <svg viewBox="0 0 12 12" width="12" height="12" aria-hidden="true">
      <path d="M1 1l10 10M11 1L1 11" stroke="currentColor" strokeWidth="1.5" />
    </svg>
  </button>
);
