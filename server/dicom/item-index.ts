import type { Code, ReferencePoint } from '../../shared/contract/report-parts';
import { isPrivateScheme } from './concepts';
import type { ConceptName } from './concepts.table-data';
import type { ContentItem } from './content-tree';

/** Containers that keep their values to themselves: what stands inside belongs to one of several. */
const closed = new Set<ConceptName | null>(['filters', 'calibration', 'accumulated', 'event']);

/**
 * The content items of a container by concept, also from containers put in between. A private container may group
 * a maker's own values or hold further ones (predictions, settings) under the same concepts: it counts for nothing
 * where the concept stands outside of it.
 */
export class ItemIndex {
  private readonly byName = new Map<ConceptName, ContentItem[]>();

  constructor(parent: ContentItem) {
    const privateContainers: ContentItem[] = [];
    this.gather(parent, this.byName, privateContainers);
    for (const container of privateContainers) {
      const found = new Map<ConceptName, ContentItem[]>();
      this.gather(container, found);
      for (const [name, items] of found) if (!this.byName.has(name)) this.byName.set(name, items);
    }
  }

  private gather(
    parent: ContentItem,
    found: Map<ConceptName, ContentItem[]>,
    privateContainers?: ContentItem[],
  ): void {
    for (const item of parent.children) {
      if (item.name !== null) {
        const known = found.get(item.name);
        if (known) known.push(item);
        else found.set(item.name, [item]);
      }
      if (item.valueType !== 'CONTAINER' || closed.has(item.name)) continue;
      if (privateContainers && isPrivateScheme(item.concept?.scheme ?? '')) privateContainers.push(item);
      else this.gather(item, found, privateContainers);
    }
  }

  all(name: ConceptName): ContentItem[] | undefined {
    return this.byName.get(name);
  }

  text(name: ConceptName): string | null {
    return this.byName.get(name)?.find((item) => item.text !== null)?.text ?? null;
  }

  code(name: ConceptName): Code | null {
    return this.byName.get(name)?.find((item) => item.code !== null)?.code ?? null;
  }

  /** Modifiers and properties hang below the item that they qualify. */
  below(name: ConceptName): ItemIndex | null {
    const item = this.byName.get(name)?.[0];
    return item ? new ItemIndex(item) : null;
  }

  referencePoint(): ReferencePoint | null {
    const code = this.code('referencePointDefinition');
    const text = this.text('referencePointDefinition');
    return code === null && text === null ? null : { code, text };
  }
}

/** Every container of one concept, at whatever depth, in the order of the file. */
export function findContainers(root: ContentItem, name: ConceptName): ContentItem[] {
  return root.children.flatMap((item) =>
    item.name === name ? [item] : item.valueType === 'CONTAINER' ? findContainers(item, name) : [],
  );
}
