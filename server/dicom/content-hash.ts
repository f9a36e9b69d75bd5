import { createHash } from 'node:crypto';

/** Control characters keep fields and levels apart; none of them survives in decoded values. */
const FIELD = '\u001f';
const OPEN = '\u001d';
const CLOSE = '\u001e';

/** Text is handed on in pieces of about this many characters, so that a long report never stands in memory whole. */
const PIECE = 65_536;

/**
 * SHA-256 (hexadecimal) of the content tree, told item by item in the order of the file: value types, concepts,
 * values. Header, transfer syntax, character set, lengths and the meanings of codes do not count: archives rewrite
 * those.
 */
export class ContentHasher {
  private readonly hash = createHash('sha256');
  private pending = '';

  /** `concept` is scheme and value of the concept, `value` the item's text, code, or numbers with unit. */
  openItem(valueType: string, concept: string, value: string): void {
    this.pending += OPEN + valueType + FIELD + concept + FIELD + value;
    if (this.pending.length > PIECE) this.flush();
  }

  closeItem(): void {
    this.pending += CLOSE;
  }

  digest(): string {
    this.flush();
    return this.hash.digest('hex');
  }

  private flush(): void {
    this.hash.update(this.pending);
    this.pending = '';
  }
}
