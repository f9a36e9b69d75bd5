import { writeCaution } from '../../shared/cautions';

/** Says on every page, and on paper, that nothing here happened. */
export const DemoBanner = ({ hospitalName }: { hospitalName: string }) => (
  <aside
    aria-label="Demo"
    data-caution="demo-data"
    className="border-b border-rule bg-surface px-4 py-0.5 text-center text-xs text-ink-2"
  >
    <strong className="font-semibold text-ink">{writeCaution('demo-data')}</strong> {hospitalName}, its
    people, machines and figures are invented.
  </aside>
);
