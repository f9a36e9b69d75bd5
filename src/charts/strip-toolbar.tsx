type StripToolbarProps = {
  readout: string | null;
  rateTitle: string;
  isWhole: boolean;
  onZoom: (factor: number) => void;
  onShowAll: () => void;
};

const look =
  'grid min-h-7 min-w-7 place-items-center border border-edge bg-surface px-2 text-sm hover:border-ink disabled:opacity-50';

/** The line above the strip: what is pointed at, and zoom for those who neither drag nor type. */
export const StripToolbar = ({ readout, rateTitle, isWhole, onZoom, onShowAll }: StripToolbarProps) => (
  <div className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1">
    <p className="min-h-[1.15rem] min-w-0 grow basis-64 text-sm text-ink-2">
      {readout ? <span className="font-medium text-ink">{readout}</span> : rateTitle}
    </p>
    <div role="group" aria-label="Zoom" className="flex gap-1.5">
      <button type="button" className={look} aria-label="Zoom in" onClick={() => onZoom(0.5)}>
        +
      </button>
      <button
        type="button"
        className={look}
        aria-label="Zoom out"
        disabled={isWhole}
        onClick={() => onZoom(2)}
      >
        −
      </button>
      <button type="button" className={look} disabled={isWhole} onClick={onShowAll}>
        Whole
      </button>
    </div>
  </div>
);
