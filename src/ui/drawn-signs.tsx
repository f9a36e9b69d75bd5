/** Signs that the shipped type lacks, drawn at its weight and read out as words. */
const drawn = {
  'at most': 'M8.5 1.5L2 4.7l6.5 3.2M2 10.5h6.5',
  'at least': 'M1.5 1.5L8 4.7 1.5 7.9M1.5 10.5H8',
  about: 'M1 4.2c2-2.4 4 2 7.5-.6M1 8.2c2-2.4 4 2 7.5-.6',
  to: 'M0 6h9M6 3l3 3-3 3',
  'entered by hand': 'M1.5 10l.6-2.6L7.6 1.9l2 2-5.5 5.5L1.5 10z',
} as const;

export const DrawnSign = ({ name }: { name: keyof typeof drawn }) => (
  <svg
    viewBox="0 0 10 12"
    role="img"
    aria-label={name}
    className="mr-[0.2em] inline-block h-[0.72em] w-[0.6em] overflow-visible align-[-0.02em]"
  >
    <path d={drawn[name]} fill="none" stroke="currentColor" strokeWidth="1.15" />
  </svg>
);
