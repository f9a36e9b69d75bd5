import { MISSING } from '../../../shared/units';
import { Quantity } from '../../ui/quantity';
import type { Figures, TotalQuantity } from './combine-planes';
import { formatTotal } from './quantity-words';

type TotalFigureProps = { figures: Figures; quantity: TotalQuantity; isUpperBound?: boolean };

/** The corrected figure with its dagger, and beside it what the machine displayed. */
export function TotalFigure({ figures: { displayed, corrected }, quantity, isUpperBound }: TotalFigureProps) {
  const shown = formatTotal(displayed, quantity);
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
