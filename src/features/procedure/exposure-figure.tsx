import type { Estimated } from '../../../shared/contract/common';
import { formatScatter, formatScatterInterval, MISSING } from '../../../shared/units';
import { IntervalMark } from '../../ui/interval-mark';
import { Quantity } from '../../ui/quantity';
import { writeFigure, type ExposureQuantity } from './exposure-words';

type ExposureFigureProps = {
  figure: Estimated | null;
  quantity: ExposureQuantity;
  scale: { from: number; to: number } | null;
};

/** Nominal, interval, and both as dot and bar on the scale that the whole table shares. */
export function ExposureFigure({ figure, quantity, scale }: ExposureFigureProps) {
  if (figure === null) return <Quantity value={MISSING} missingText="not estimated" />;
  const isNothing = figure.high === 0;
  return (
    <span className="inline-flex flex-col items-end max-md:flex-row max-md:items-center max-md:gap-2">
      <Quantity value={formatScatter(figure.nominal)} unit={quantity.unit} />
      {!isNothing && (
        <span className="text-sm text-ink-2">{formatScatterInterval(figure.low, figure.high)}</span>
      )}
      {scale && !isNothing && (
        <IntervalMark
          {...figure}
          scaleFrom={scale.from}
          scaleTo={scale.to}
          width={104}
          label={`${quantity.name}: ${writeFigure(figure, quantity.unit)}`}
        />
      )}
    </span>
  );
}
