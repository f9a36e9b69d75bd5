import type { ReactNode } from 'react';

/** The trade's signs, set as they are printed; screen readers hear the quantity's name. */
const signs = {
  referenceAirKerma: { name: 'reference air kerma', sign: sub('K', 'a,r') },
  kermaAreaProduct: { name: 'air kerma–area product', sign: sub('P', 'KA') },
  fluoroscopyTime: { name: 'fluoroscopy time', sign: 'FT' },
  scatterAirKerma: { name: 'scatter air kerma', sign: sub('K', 's') },
  peakSkinDose: { name: 'peak skin dose', sign: 'PSD' },
  effectiveDose: { name: 'effective dose', sign: 'E' },
  hp10: { name: 'personal dose equivalent at 10 mm', sign: sub('H', 'p', '(10)') },
  hp3: { name: 'personal dose equivalent at 3 mm', sign: sub('H', 'p', '(3)') },
} satisfies Record<string, { name: string; sign: ReactNode }>;

export type QuantitySignName = keyof typeof signs;

function sub(letter: string, index: string, rest?: string): ReactNode {
  return (
    <>
      {letter}
      <sub>{index}</sub>
      {rest}
    </>
  );
}

export const QuantitySign = ({ of }: { of: QuantitySignName }) => (
  <abbr title={signs[of].name} className="whitespace-nowrap no-underline">
    {signs[of].sign}
  </abbr>
);
