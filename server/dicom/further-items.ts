import type { FurtherItem, Qualifiers } from '../../shared/contract/report-parts';
import type { ConceptName } from './concepts.table-data';
import type { ContentItem } from './content-tree';

/** More than any template has; a file that is full of foreign items shall not fill the report. */
const MOST_KEPT = 100;

const isPrivate = (scheme: string) => /^99|^L$/i.test(scheme);

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
 * What stands in a container under concepts unknown here, and why numbers are empty. Private concepts (PS3.16 8.2:
 * designators that start with "99", and the older "L") count for nothing.
 */
export function readFurther(
  parent: ContentItem,
  fields: Map<ConceptName, string>,
): { furtherItems: FurtherItem[]; qualifiers: Qualifiers } {
  const furtherItems: FurtherItem[] = [];
  const qualifiers: Qualifiers = {};
  for (const item of leavesOf(parent)) {
    const field = item.name === null ? undefined : fields.get(item.name);
    const qualifier = item.measurement?.qualifier;
    if (field !== undefined && qualifier) qualifiers[field] = qualifier;
    if (item.name !== null || item.concept === null || isPrivate(item.concept.scheme)) continue;
    if (furtherItems.length === MOST_KEPT) continue;
    furtherItems.push({
      concept: item.concept,
      code: item.code,
      text: item.measurement?.text ?? (item.text === null ? [] : [item.text]),
      unit: item.measurement?.unit?.value ?? null,
    });
  }
  return { furtherItems, qualifiers };
}
