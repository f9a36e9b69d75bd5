import type { ExposureMonth } from '../../../shared/contract/staff-exposure';
import { convertUSvToMsv } from '../../../shared/units';
import { formatMonth } from '../../lib/clock';
import { QuantitySign } from '../../ui/quantity-sign';
import { formatMsvRange, formatSmallMsv, sumFigures, type Range } from './month-figures';

const Figure = ({ range }: { range: Range }) => (
  <>
    <strong className="font-semibold whitespace-nowrap">
      {formatSmallMsv(convertUSvToMsv(range.nominal))} mSv
    </strong>{' '}
    <span className="text-base text-ink-2">
      (<span className="sr-only">interval </span>
      {formatMsvRange(range)})
    </span>
  </>
);

/** What the months come to, in one plain sentence. */
export function OwnSummary({ months }: { months: readonly ExposureMonth[] }) {
  const [first, last] = [months[0], months.at(-1)];
  const collar = sumFigures(months, 'collarHp10USv');
  const under = sumFigures(months, 'underGarmentHp10USv');
  if (!first || !last || !collar) return null;
  const when =
    first === last
      ? `in ${formatMonth(first.month)}`
      : `from ${formatMonth(first.month)} to ${formatMonth(last.month)}`;
  return (
    <p className="max-w-[62rem] text-xl font-light text-pretty">
      Your estimate {when}: <Figure range={collar} /> <QuantitySign of="hp10" /> at the collar, over the
      garment
      {under ? (
        <>
          , and <Figure range={under} /> under it.
        </>
      ) : (
        '; under the garment nothing can be said, because it is not recorded what was worn.'
      )}
    </p>
  );
}
