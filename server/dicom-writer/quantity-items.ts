import { contentItem, dcm } from './content-items';
import type { DataSet } from './data-element';
import type { Quantity } from './written-parts';
import type { QuantityPlace } from './event-quantities.table-data';
import { formatQuantity } from './format-values';

/** One NUM item for each value present; a list gives one item a value, as TID 10003B repeats them. */
export function quantityItems<Holder, Field extends keyof Holder>(
  holder: Holder,
  places: QuantityPlace<Field>[],
): DataSet[] {
  return places.flatMap(({ field, code, meaning, unit, perWrittenUnit }) => {
    const value = holder[field] as Quantity | Quantity[] | null | undefined;
    if (value === null || value === undefined) return [];
    return [value].flat().map((quantity) => {
      return contentItem.number(dcm(code, meaning), formatQuantity(quantity, unit, perWrittenUnit));
    });
  });
}
