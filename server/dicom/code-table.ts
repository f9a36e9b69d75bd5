import type { Code } from '../../shared/contract/report-parts';
import { decodeText, type TextReader } from './character-set';
import { conceptNameOf } from './concepts';
import type { ConceptName } from './concepts.table-data';
import { endOfContent, type SliceableBuffer } from './latin1-text';
import { tags } from './tags';

/** A code of the file with what the reader knows of it. */
export interface KnownCode {
  code: Code;
  /** The concept among those the reader knows. */
  name: ConceptName | null;
  /** Scheme and value in one. */
  key: string;
}

/**
 * The codes of one file. A report repeats few codes many times: each is decoded once, with the meaning of its first
 * appearance. Values of a code sequence item (PS3.3 table 8.8-1) are taken one by one, then `finish` gives the code.
 */
export class CodeTable {
  private readonly known = new Map<string, KnownCode>();
  private valueTag = 0;
  private valueStart = 0;
  private valueEnd = 0;
  private schemeStart = 0;
  private schemeEnd = 0;
  private meaningStart = 0;
  private meaningEnd = 0;

  constructor(private readonly bytes: SliceableBuffer) {}

  start(): void {
    this.valueStart = this.valueEnd = 0;
    this.schemeStart = this.schemeEnd = 0;
    this.meaningStart = this.meaningEnd = 0;
  }

  take(tag: number, start: number, end: number): void {
    if (tag === tags.codingScheme) {
      this.schemeStart = start;
      this.schemeEnd = endOfContent(this.bytes, start, end);
    } else if (tag === tags.codeMeaning) {
      this.meaningStart = start;
      this.meaningEnd = end;
    } else if (tag === tags.codeValue || tag === tags.longCodeValue || tag === tags.urnCodeValue) {
      // One of the three is given; of several, the one that sorts first.
      if (this.valueStart !== this.valueEnd && tag > this.valueTag) return;
      this.valueTag = tag;
      this.valueStart = start;
      this.valueEnd = endOfContent(this.bytes, start, end);
    }
  }

  /** The code just taken; null for an item without a value. */
  finish(text: TextReader): KnownCode | null {
    if (this.valueStart === this.valueEnd) return null;
    const scheme = this.bytes.latin1Slice(this.schemeStart, this.schemeEnd);
    const value = this.bytes.latin1Slice(this.valueStart, this.valueEnd);
    const spelling = `${scheme}|${value}`;
    let known = this.known.get(spelling);
    if (!known) {
      const meaning = decodeText(this.bytes, this.meaningStart, this.meaningEnd, text) ?? '';
      const code = { value: value.trim(), scheme: scheme.trim(), meaning };
      known = { code, name: conceptNameOf(code.scheme, code.value), key: `${code.scheme}|${code.value}` };
      this.known.set(spelling, known);
    }
    return known;
  }
}
