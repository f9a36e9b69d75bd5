/** The mark: rings around a source, broken by a screen that leaves one place in its lee. */
export const Mark = ({ className }: { className?: string }) => (
  <svg viewBox="0 0 24 24" className={className} aria-hidden="true" fill="none" strokeLinecap="round">
    <path
      d="M13.69 18.79A7 7 0 1 1 18.85 10.54M15.73 22.24A10.9 10.9 0 1 1 22.84 10.86"
      strokeWidth="1.5"
      className="stroke-ramp-3"
    />
    <circle cx="12" cy="12" r="2.6" strokeWidth="1.5" className="stroke-ramp-4" />
    <path d="M14.74 19.13L19.61 11.33" strokeWidth="2.5" className="stroke-ink" />
    <circle cx="21.0" cy="17.6" r="2" className="fill-lee" />
  </svg>
);
