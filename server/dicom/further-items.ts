import type { FurtherItem, PreciseValues, Qualifiers } from '../../shared/contract/report-parts';
import { isPrivateScheme } from './concepts';
import type { ConceptName } from './concepts.table-data';
import type { ContentItem } from './content-tree';

/** More than any template has; a file that is full of foreign items shall not fill the report. */
const MOST_KEPT = 100;

/** Concept → field of the contract, from one or several tables of quantity fields. */
export function fieldsByConcept(
  ...tables: Record<string, readonly [ConceptName, string]>[]
): Map<ConceptName, string> {
  return new Map(
    tables.flatMap((table) => Object.entries(table).map(([field, [concept]]) => [concept, field] as const)),
  );
}

/** Leaves below an item, through containers put in between. */
function leavesOf(parent: ContentItem, leaves: ContentItem[] = []): ContentItem[] {
  for (const item of parent.children) {
    if (item.valueType !== 'CONTAINER') leaves.push(item);
    else if (item.name === null) leavesOf(item, leaves);
  }
  return leaves;
}

/**
 * What stands in a container under concepts unknown here, why numbers are empty, and their binary forms. Private concepts
 * count for nothing.
 */
export function readFurther(
  parent: ContentItem,
  fields: Map<ConceptName, string>,
): { furtherItems: FurtherItem[]; qualifiers: Qualifiers; preciseValues: PreciseValues } {
  const furtherItems: FurtherItem[] = [];
  const qualifiers: Qualifiers = {};
  const preciseValues: PreciseValues = {};
  for (const item of leavesOf(parent)) {
    const field = item.name === null ? undefined : fields.get(item.name);
    if (field !== undefined && item.measurement) {
      const { qualifier, precise } = item.measurement;
      if (qualifier) qualifiers[field] = qualifier;
      if (precise !== null) (preciseValues[field] ??= []).push(precise);
    }
    if (item.name !== null || item.concept === null || isPrivateScheme(item.concept.scheme)) continue;
    if (furtherItems.length === MOST_KEPT) continue;
    furtherItems.push({
      concept: item.concept,
      code: item.code,
      text: item.measurement?.text ?? (item.text === null ? [] : [item.text]),
      unit: item.measurement?.unit?.value ?? null,
    });
  }
  return { furtherItems, qualifiers, preciseValues };
}
