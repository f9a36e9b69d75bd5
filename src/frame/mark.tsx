/** The mark: what comes from the left parts at a shield and leaves one place behind it in shelter. */
export const Mark = ({ className }: { className?: string }) => (
  <svg viewBox="0 0 26 24" className={className} aria-hidden="true" fill="none">
    <g stroke="currentColor" strokeWidth="1.7" strokeLinecap="round" className="text-ramp-3">
      <path d="M1.5 7.6C8 7.6 8 2.6 13.6 2.6c4.6 0 6.4 2 10.4 2.6" />
      <path d="M1.5 12h5" />
      <path d="M1.5 16.4c6.5 0 6.5 5 12.1 5 4.6 0 6.4-2 10.4-2.6" />
    </g>
    <path
      d="M13.6 6.6c-4 2.6-4 8.2 0 10.8"
      stroke="currentColor"
      strokeWidth="2.8"
      strokeLinecap="round"
      className="text-ink"
    />
    <circle cx="17.6" cy="12" r="2.5" fill="currentColor" className="text-lee" />
  </svg>
);
