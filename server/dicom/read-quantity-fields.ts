import type { ConceptName } from './concepts.table-data';
import type { ItemIndex } from './item-index';
import { readQuantities, readQuantity, type Reported } from './read-quantity';
import type { QuantityKind } from '../../shared/unit-factors';
import type { WarningCollector } from './warning-collector';

type Fields<Name extends string> = Record<Name, readonly [ConceptName, QuantityKind]>;

function mapFields<Name extends string, Value>(
  fields: Fields<Name>,
  read: (name: Name, concept: ConceptName, kind: QuantityKind) => Value,
): Record<Name, Value> {
  const values = {} as Record<Name, Value>;
  for (const name in fields) values[name] = read(name, fields[name][0], fields[name][1]);
  return values;
}

/** Each field's value in its canonical unit, or null; the strings as written go into `reported`. */
export function readQuantityFields<Name extends string>(
  index: ItemIndex,
  fields: Fields<Name>,
  reported: Reported,
  warnings: WarningCollector,
): Record<Name, number | null> {
  return mapFields(fields, (name, concept, kind) =>
    readQuantity(index.all(concept), name, kind, reported, warnings),
  );
}

/** Each repeating field's values in canonical units, or an empty list. */
export function readQuantityLists<Name extends string>(
  index: ItemIndex,
  fields: Fields<Name>,
  reported: Reported,
  warnings: WarningCollector,
): Record<Name, number[]> {
  return mapFields(fields, (name, concept, kind) =>
    readQuantities(index.all(concept), name, kind, reported, warnings),
  );
}
