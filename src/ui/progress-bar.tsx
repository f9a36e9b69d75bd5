/** How far something has come, 0..1; null where it is not known. */
export const ProgressBar = ({ share, label }: { share: number | null; label: string }) => (
  <div
    role="progressbar"
    aria-label={label}
    aria-valuemin={0}
    aria-valuemax={100}
    aria-valuenow={share === null ? undefined : Math.round(share * 100)}
    className="h-1 w-full bg-rule"
  >
    <div
      className="h-full bg-lee transition-[width] duration-200"
      style={{ width: share === null ? '33%' : `${Math.min(100, Math.max(0, share * 100))}%` }}
    />
  </div>
);
