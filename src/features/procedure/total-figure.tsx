import { MISSING } from '../../../shared/units';
import { Quantity } from '../../ui/quantity';
import type { Figures, TotalQuantity } from './combine-planes';
import { formatTotal } from './quantity-words';

type TotalFigureProps = {
  figures: Figures;
  quantity: TotalQuantity;
  isUpperBound?: boolean;
  /** Typed by a physicist in place of a wrong total. */
  settled?: number | null;
};

/**
 * The corrected figure with its dagger, and beside it what the machine displayed; a total that a physicist typed goes
 * before both.
 */
export function TotalFigure({
  figures: { displayed, corrected },
  quantity,
  isUpperBound,
  settled = null,
}: TotalFigureProps) {
  const shown = formatTotal(displayed, quantity);
  if (settled !== null)
    return (
      <>
        <Quantity {...formatTotal(settled, quantity)} />
        <span className="block text-sm font-normal text-ink-2">
          typed by the physicist; displayed <Quantity {...shown} isUpperBound={isUpperBound} />
        </span>
      </>
    );
  if (corrected === null || shown.value === MISSING)
    return <Quantity {...shown} isUpperBound={isUpperBound} />;
  return (
    <>
      <Quantity {...formatTotal(corrected, quantity)} isCorrected isUpperBound={isUpperBound} />
      <span className="block text-sm font-normal text-ink-2">
        displayed <Quantity {...shown} isUpperBound={isUpperBound} />
      </span>
    </>
  );
}
