import { createHash } from 'node:crypto';
import type { Code } from '../../shared/contract/report-parts';
import type { ContentItem } from './content-tree';

/** Control characters keep fields and levels apart; none of them survives in decoded values. */
const FIELD = '\u001f';
const OPEN = '\u001d';
const CLOSE = '\u001e';

const codeText = (code: Code | null) => (code ? `${code.scheme}|${code.value}` : '');

function textOf(item: ContentItem): string {
  const { measurement } = item;
  const value = measurement
    ? `${measurement.text.join('\\')}|${codeText(measurement.unit)}`
    : (item.text ?? codeText(item.code));
  let text = OPEN + item.valueType + FIELD + codeText(item.concept) + FIELD + value;
  for (const child of item.children) text += textOf(child);
  return text + CLOSE;
}

/**
 * SHA-256 (hexadecimal) of the content tree: value types, concepts, values. Header, transfer syntax, character set,
 * lengths and the meanings of codes do not count: archives rewrite those.
 */
export function hashContent(root: ContentItem): string {
  return createHash('sha256').update(textOf(root)).digest('hex');
}
