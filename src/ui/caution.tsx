import { Fragment } from 'react';
import { splitCaution, type CautionKey, type CautionValues } from '../../shared/cautions';
import { joinClassNames } from '../lib/class-names';
import { QuantitySign } from './quantity-sign';

type CautionProps = { of: CautionKey; values?: CautionValues; className?: string };

/** A caution beside the figures it concerns. */
export const Caution = ({ of, values = {}, className }: CautionProps) => (
  <p
    role="note"
    data-caution={of}
    className={joinClassNames('max-w-[44rem] border-l border-edge pl-2.5 text-sm text-ink-2', className)}
  >
    {splitCaution(of).map((part, place) => (
      <Fragment key={place}>{place % 2 === 0 ? part : fill(part, values)}</Fragment>
    ))}
  </p>
);

function fill(name: string, values: CautionValues) {
  if (name === 'Kar') return <QuantitySign of="referenceAirKerma" />;
  if (name === 'Pka') return <QuantitySign of="kermaAreaProduct" />;
  return values[name as keyof CautionValues];
}
