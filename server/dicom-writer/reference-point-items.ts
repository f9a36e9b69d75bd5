import { referencePoints } from './codes.table-data';
import { contentItem, dcm } from './content-items';
import type { DataSet } from './data-element';

/** Reference Point Definition (113780): a code of CID 10025 where the name is one of ours, else free text. */
export function referencePointItems(definition: string | null | undefined): DataSet[] {
  if (!definition) return [];
  const concept = dcm('113780', 'Reference Point Definition');
  const code = referencePoints[definition];
  return [
    code ? contentItem.code('CONTAINS', concept, code) : contentItem.text('CONTAINS', concept, definition),
  ];
}
