import type { ReportedQuantity } from '../../shared/contract/report-parts';
import type { ContentItem } from './content-tree';
import { scaleDecimal } from '../../shared/decimal';
import { unitFactor, type QuantityKind } from '../../shared/unit-factors';
import type { WarningCollector } from './warning-collector';

export type Reported = Record<string, ReportedQuantity>;

/** Factor for the unit of one item; null and a warning where it is absent, not UCUM or of another kind. */
function factorOf(
  item: ContentItem,
  field: string,
  kind: QuantityKind,
  warnings: WarningCollector,
): number | null {
  const unit = item.measurement?.unit ?? null;
  if (unit === null) {
    warnings.add('unit-missing', field);
    return null;
  }
  const factor = unit.scheme.toUpperCase() === 'UCUM' ? unitFactor(kind, unit.value) : null;
  if (factor === null)
    warnings.add('unit-unknown', `${field} in ${JSON.stringify(unit.value)} (${unit.scheme})`);
  return factor;
}

function readItem(
  item: ContentItem,
  field: string,
  kind: QuantityKind,
  warnings: WarningCollector,
): number[] {
  const measurement = item.measurement;
  if (!measurement || measurement.text.length === 0) {
    warnings.add(
      'value-empty',
      measurement?.qualifier ? `${field} (${measurement.qualifier.meaning})` : field,
    );
    return [];
  }
  if (measurement.text.length > 1) warnings.add('value-list', field);
  const factor = factorOf(item, field, kind, warnings);
  if (factor === null) return [];
  return measurement.text.flatMap((text) => {
    const value = scaleDecimal(text, factor);
    if (value === null) warnings.add('number-unreadable', `${field} ${JSON.stringify(text.slice(0, 40))}`);
    return value === null ? [] : [value];
  });
}

/** Keeps the strings as written; units of a list that differ from item to item stand joined. */
function keepReported(items: ContentItem[], field: string, reported: Reported): void {
  const units = new Set(items.map((item) => item.measurement?.unit?.value ?? null));
  const given = [...units].filter((unit) => unit !== null);
  reported[field] = {
    text: items.flatMap((item) => item.measurement?.text ?? []),
    unit: given.length === 0 ? null : given.join(', '),
  };
}

/** All readable values of a repeating quantity, in canonical units and the order of the file. */
export function readQuantities(
  items: ContentItem[] | undefined,
  field: string,
  kind: QuantityKind,
  reported: Reported,
  warnings: WarningCollector,
): number[] {
  if (!items) return [];
  keepReported(items, field, reported);
  return items.flatMap((item) => readItem(item, field, kind, warnings));
}

/** A quantity that stands once, in its canonical unit; null if absent, empty, unreadable or of an unknown unit. */
export function readQuantity(
  items: ContentItem[] | undefined,
  field: string,
  kind: QuantityKind,
  reported: Reported,
  warnings: WarningCollector,
): number | null {
  const first = items?.[0];
  if (!items || !first) return null;
  keepReported(items, field, reported);
  if (items.length > 1) warnings.add('value-repeated', field);
  return readItem(first, field, kind, warnings)[0] ?? null;
}

/** The plain mean of the values given; null for none. */
export function meanOf(values: number[]): number | null {
  return values.length === 0 ? null : values.reduce((sum, value) => sum + value, 0) / values.length;
}
