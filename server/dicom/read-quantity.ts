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
    warnings.add(
      'unit-unknown',
      `${field} in ${JSON.stringify(unit.value.slice(0, 40))} (${unit.scheme.slice(0, 40)})`,
    );
  return factor;
}

/** Adds the item's readable values to `values`; of a list, the first unreadable one is named. */
function readItem(
  item: ContentItem,
  field: string,
  kind: QuantityKind,
  warnings: WarningCollector,
  values: number[],
): void {
  const measurement = item.measurement;
  if (!measurement || measurement.text.length === 0) {
    const { qualifier } = measurement ?? {};
    warnings.add('value-empty', qualifier ? `${field} (${qualifier.meaning})` : field);
    return;
  }
  if (measurement.text.length > 1) warnings.add('value-list', field);
  const factor = factorOf(item, field, kind, warnings);
  if (factor === null) return;
  let unreadable: string | null = null;
  for (const text of measurement.text) {
    const value = scaleDecimal(text, factor);
    if (value === null) unreadable ??= text;
    else values.push(value);
  }
  if (unreadable !== null)
    warnings.add('number-unreadable', `${field} ${JSON.stringify(unreadable.slice(0, 40))}`);
}

/** The strings as written; units of a list that differ from item to item stand joined. */
function reportedOf(items: ContentItem[]): ReportedQuantity {
  if (items.length === 1) {
    const measurement = items[0]?.measurement;
    return { text: measurement?.text ?? [], unit: measurement?.unit?.value ?? null };
  }
  const units = new Set(items.map((item) => item.measurement?.unit?.value ?? null));
  const given = [...units].filter((unit) => unit !== null);
  return {
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
  const values: number[] = [];
  if (!items) return values;
  reported[field] = reportedOf(items);
  for (const item of items) readItem(item, field, kind, warnings, values);
  return values;
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
  reported[field] = reportedOf(items);
  if (items.length > 1) warnings.add('value-repeated', field);
  const values: number[] = [];
  readItem(first, field, kind, warnings, values);
  return values[0] ?? null;
}

/** The plain mean of the values given; null for none. */
export function meanOf(values: number[]): number | null {
  return values.length === 0 ? null : values.reduce((sum, value) => sum + value, 0) / values.length;
}
