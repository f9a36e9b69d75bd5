import type { Code, ReferencePoint } from '../../shared/contract/report-parts';
import type { ConceptName } from './concepts.table-data';
import type { ContentItem } from './content-tree';

/** Containers that keep their values to themselves: what stands inside belongs to one of several. */
const closed = new Set<ConceptName | null>(['filters', 'calibration', 'accumulated', 'event']);

/** The content items of a container by concept, also from containers put in between. */
export class ItemIndex {
  private readonly byName = new Map<ConceptName, ContentItem[]>();

  constructor(parent: ContentItem) {
    this.gather(parent);
  }

  private gather(parent: ContentItem): void {
    for (const item of parent.children) {
      if (item.name !== null) {
        const known = this.byName.get(item.name);
        if (known) known.push(item);
        else this.byName.set(item.name, [item]);
      }
      if (item.valueType === 'CONTAINER' && !closed.has(item.name)) this.gather(item);
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
