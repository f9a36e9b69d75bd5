import { codeItem, contentItem } from '../../server/dicom-writer/content-items';
import { sequenceElement, textElement, type DataSet } from '../../server/dicom-writer/data-element';
import type { OutsideReport } from './reader-comparison';
import type { OutsideValue, OutsideValues } from './outside-values';

export type CodeTriple = [value: string, scheme: string, meaning: string];
export type NodeValue = string | CodeTriple | { q: CodeTriple } | [string, string, number[]];

/** A content item as data, for a writer of any kind. */
export interface ContentNode {
  r?: 'CONTAINS' | 'HAS CONCEPT MOD' | 'HAS OBS CONTEXT' | 'HAS PROPERTIES';
  t: 'CONTAINER' | 'CODE' | 'NUM' | 'TEXT' | 'UIDREF' | 'DATETIME' | 'PNAME' | 'IMAGE';
  c: CodeTriple;
  v?: NodeValue;
  k?: ContentNode[];
}

const closed = new Set(['113702', '113706', '113771', '122505']);
const isPrivate = ({ c: [, scheme] }: ContentNode) => scheme.startsWith('99');

function containersOf(node: ContentNode, code: string): ContentNode[] {
  return (node.k ?? []).flatMap((child) => {
    if (child.t !== 'CONTAINER') return [];
    return child.c[0] === code && !isPrivate(child) ? [child] : containersOf(child, code);
  });
}

/** Every number below a node, filters' included; private ones count for nothing. */
function numbersOf(node: ContentNode): OutsideReport['events'][number] {
  return (node.k ?? []).flatMap((child): OutsideReport['events'][number] => {
    if (child.t === 'CONTAINER') return numbersOf(child);
    if (child.t !== 'NUM' || isPrivate(child) || !Array.isArray(child.v)) return [];
    const [text, unit, scheme] = child.v as CodeTriple;
    return [[child.c[0], text, unit, scheme]];
  });
}

/** What a tree says, by a walk of its own: the numbers of events and totals. */
export function numbersOfTree(root: ContentNode): OutsideReport {
  return {
    events: containersOf(root, '113706').map(numbersOf),
    totals: containersOf(root, '113702').map(numbersOf),
  };
}

/** What stands in a container beside numbers, by concept; what hangs below an item under "concept>concept". */
export function valuesOfNode(node: ContentNode, found: OutsideValues = {}, prefix = ''): OutsideValues {
  for (const child of node.k ?? []) {
    if (child.t === 'CONTAINER') {
      if (!closed.has(child.c[0])) valuesOfNode(child, found, prefix);
      continue;
    }
    if (isPrivate(child)) continue;
    if (child.t !== 'NUM') (found[prefix + child.c[0]] ??= []).push(child.v as OutsideValue);
    if (prefix === '') valuesOfNode(child, found, `${child.c[0]}>`);
  }
  return found;
}

/** Why numbers of a container are empty, by concept, and the leaves whose concept is of none of the templates. */
export function oddItemsOf(
  node: ContentNode,
  known: Record<string, string>,
  found: { qualifiers: Record<string, CodeTriple>; further: ContentNode[] } = { qualifiers: {}, further: [] },
) {
  for (const child of node.k ?? []) {
    const field = known[child.c[0]];
    if (child.t === 'CONTAINER' && !closed.has(child.c[0])) oddItemsOf(child, known, found);
    if (child.t !== 'NUM' || isPrivate(child)) continue;
    if (field === undefined) found.further.push(child);
    else if (!Array.isArray(child.v)) found.qualifiers[field] = (child.v as { q: CodeTriple }).q;
  }
  return found;
}

export const eventNodesOf = (root: ContentNode) => containersOf(root, '113706');

const written = ([value, scheme, meaning]: CodeTriple) => ({ value, scheme, meaning });

/** The node as this project's own writer encodes it. */
export function itemOf({ r = 'CONTAINS', t, c, v, k = [] }: ContentNode): DataSet {
  const concept = written(c);
  const children = k.map(itemOf);
  switch (t) {
    case 'CONTAINER':
      return contentItem.container(concept, children);
    case 'CODE':
      return contentItem.code(r, concept, written(v as CodeTriple), children);
    case 'NUM': {
      if (!Array.isArray(v))
        return contentItem.number(concept, { qualifier: written((v as { q: CodeTriple }).q) });
      const [text, unit, scheme] = v as CodeTriple;
      return contentItem.number(concept, { text, unit, scheme }, children);
    }
    case 'TEXT':
      return contentItem.text(r, concept, v as string, children);
    case 'UIDREF':
      return contentItem.uid(r, concept, v as string);
    case 'DATETIME':
      return contentItem.dateTime(r, concept, v as string);
    case 'PNAME':
      return contentItem.personName(r, concept, v as string, children);
    case 'IMAGE': {
      const [sopClassUid, sopInstanceUid, frames] = v as [string, string, number[]];
      const frameNumbers = frames.length > 0 ? { frameNumbers: frames } : {};
      return contentItem.image(r, concept, { sopClassUid, sopInstanceUid, ...frameNumbers });
    }
  }
}

/** The root's own elements. */
export function rootElements({ c, k = [] }: ContentNode): DataSet {
  return [
    textElement(0x0040a040, 'CS', 'CONTAINER'),
    textElement(0x0040a050, 'CS', 'SEPARATE'),
    sequenceElement(0x0040a043, [codeItem(written(c))]),
    sequenceElement(0x0040a730, k.map(itemOf)),
  ];
}
