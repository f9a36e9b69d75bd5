/** A line at the upper edge while something is on its way; it appears only when that takes a while. */
export const Waiting = () => (
  <div role="status" className="fixed inset-x-0 top-0 z-50">
    <span className="sr-only">Loading</span>
    <div className="waiting-line h-1 bg-lee" />
  </div>
);
