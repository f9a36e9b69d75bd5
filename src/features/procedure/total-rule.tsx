import type { Comparison } from '../../../shared/contract/procedure';
import { LevelRule } from '../../charts/level-rule';
import { findLogRange } from '../../lib/log-scale';
import type { TotalQuantity } from './combine-planes';
import { keepComparable, leastComparableCases, nameQuarter } from './level-position';
import { formatTotal, quantityNames, toScale, writeTotal } from './quantity-words';

type TotalRuleProps = {
  quantity: TotalQuantity;
  value: number | null;
  comparison: Comparison | undefined;
  /** A level of this quantity was reached. */
  isMarked: boolean;
  hasType: boolean;
};

/** Where one total lies among the procedures of its type: ruler, and the same in words. */
export function TotalRule({ quantity, value, comparison, isMarked, hasType }: TotalRuleProps) {
  const comparable = keepComparable(comparison);
  const level = comparison?.notifyLevel ?? null;
  const scaled = (at: number | null) => (at === null ? null : toScale(at, quantity));
  const quartiles = comparable
    ? [comparable.lowerQuartile, comparable.median, comparable.upperQuartile].map(scaled)
    : [null, null, null];
  const range = findLogRange([scaled(value), scaled(level), ...quartiles].filter((at) => at !== null));
  const words = describe();
  if (!range || (!comparable && level === null)) return <span className="text-sm text-ink-2">{words}</span>;
  return (
    <div className="flex flex-col gap-0.5">
      <LevelRule
        value={scaled(value)}
        lowerQuartile={quartiles[0] ?? null}
        median={quartiles[1] ?? null}
        upperQuartile={quartiles[2] ?? null}
        references={level === null ? [] : [{ value: toScale(level, quantity), name: 'notification level' }]}
        scaleFrom={range.from}
        scaleTo={range.to}
        isMarked={isMarked}
        label={`${quantityNames[quantity]} ${writeTotal(value, quantity)}. ${words}`}
      />
      <span className="text-sm text-ink-2">{words}</span>
    </div>
  );

  function describe(): string {
    const levelWords = level === null ? '' : ` Notification level ${writeTotal(level, quantity)}.`;
    if (!hasType) return 'Without a procedure type there is nothing to compare with.';
    if (!comparable) {
      const n = comparison?.n ?? 0;
      return `Too few of this type for quartiles: n = ${n}, needed ${leastComparableCases}.${levelWords}`;
    }
    const lower = formatTotal(comparable.lowerQuartile, quantity);
    const upper = formatTotal(comparable.upperQuartile, quantity);
    const from = lower.unit === upper.unit ? lower.value : `${lower.value} ${lower.unit}`;
    const quarter = nameQuarter(value, comparison);
    const place = quarter === null ? '' : `${quarter.charAt(0).toUpperCase()}${quarter.slice(1)}; `;
    return `${place}middle half ${from} to ${upper.value} ${upper.unit}, n = ${comparable.n}.${levelWords}`;
  }
}
