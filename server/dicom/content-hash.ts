import { createHash } from 'node:crypto';
import type { Code } from '../../shared/contract/report-parts';
import type { ContentItem } from './content-tree';

/** Control characters keep fields and levels apart; none of them survives in decoded values. */
const FIELD = '\u001f';
const OPEN = '\u001d';
const CLOSE = '\u001e';

const codeText = (code: Code | null) => (code ? `${code.scheme}|${code.value}` : '');

function append(parts: string[], item: ContentItem): void {
  const { measurement } = item;
  parts.push(
    OPEN,
    item.relationship,
    FIELD,
    item.valueType,
    FIELD,
    codeText(item.concept),
    FIELD,
    codeText(item.code),
    FIELD,
    item.text ?? '',
    FIELD,
    measurement ? `${measurement.text.join('\\')}|${codeText(measurement.unit)}` : '',
  );
  for (const child of item.children) append(parts, child);
  parts.push(CLOSE);
}

/**
 * SHA-256 (hexadecimal) of the content tree: relationships, concepts, values. Header, transfer syntax, character set,
 * lengths and the meanings of codes do not count: archives rewrite those.
 */
export function hashContent(root: ContentItem): string {
  const parts: string[] = [];
  append(parts, root);
  return createHash('sha256').update(parts.join('')).digest('hex');
}
