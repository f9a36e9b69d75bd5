import type { ImageReference } from '../../shared/contract/report-parts';
import { decodeText, type TextReader } from './character-set';
import type { KnownCode } from './code-table';
import type { ContentItem } from './content-tree';
import { sliceLatin1, type SliceableBuffer } from './latin1-text';
import type { PreciseNumber } from './precise-number';
import { tags } from './tags';

/** Text of one value type stands in its own attribute. */
const textTags = new Map<string, number>([
  ['TEXT', tags.textValue],
  ['UIDREF', tags.uid],
  ['DATETIME', tags.dateTime],
  ['DATE', tags.date],
  ['TIME', tags.time],
  ['PNAME', tags.personName],
]);
const isTextTag = (tag: number) => tag === tags.textValue || (tag >= tags.dateTime && tag <= tags.uid);

/** Value types as one string each: comparing and keeping them is then cheap. */
const valueTypes = new Map(
  [...textTags.keys(), 'CONTAINER', 'NUM', 'CODE', 'IMAGE'].map((type) => [type, type]),
);

/** Items without children share this list. */
const none: ContentItem[] = [];

/** The values of a decimal string: backslashes part a list. */
function splitNumbers(text: string | null): string[] {
  if (text === null) return [];
  return text.includes('\\') ? text.split('\\').map((part) => part.trim()) : [text.trim()];
}

/** A content item (PS3.3 C.17.3) while its attributes come in, in any order. */
export class OpenContentItem {
  concept: KnownCode | null = null;
  code: KnownCode | null = null;
  unit: KnownCode | null = null;
  qualifier: KnownCode | null = null;
  number: string | null = null;
  precise: PreciseNumber | null = null;
  image: ImageReference | null = null;
  private valueType = '';
  private texts: { tag: number; start: number; end: number }[] | null = null;
  private completed: ContentItem | null = null;

  constructor(
    readonly outer: OpenContentItem | null,
    /** True if containers alone, none of them an event, lead from the root to here. */
    readonly isPlaceOfEvents: boolean,
    /** An item has the character set of the one around it unless it declares its own (PS3.3 C.12.1.1.2). */
    public textReader: TextReader,
  ) {}

  takeAttribute(bytes: SliceableBuffer, tag: number, start: number, end: number): void {
    if (tag === tags.valueType) {
      const text = sliceLatin1(bytes, start, end) ?? '';
      this.valueType = valueTypes.get(text) ?? text;
    } else if (isTextTag(tag)) {
      (this.texts ??= []).push({ tag, start, end });
    }
  }

  /** What an IMAGE refers to: an item of its Referenced SOP Sequence. */
  takeReference(bytes: SliceableBuffer, tag: number, start: number, end: number): void {
    const image = (this.image ??= { sopClassUid: null, sopInstanceUid: null, frameNumbers: [] });
    const text = sliceLatin1(bytes, start, end);
    if (tag === tags.referencedSopClass) image.sopClassUid = text;
    else if (tag === tags.referencedSopInstance) image.sopInstanceUid = text;
    else if (tag === tags.referencedFrames)
      image.frameNumbers = splitNumbers(text)
        .map(Number)
        .filter((frame) => Number.isInteger(frame) && frame > 0);
  }

  /** The item; null until `complete` is called. */
  get item(): ContentItem | null {
    return this.completed;
  }

  /** The item with its value and, as yet, no children; to be called once all attributes but those are known. */
  complete(bytes: SliceableBuffer): ContentItem {
    const { valueType } = this;
    this.completed = {
      valueType,
      concept: this.concept?.code ?? null,
      name: this.concept?.name ?? null,
      code: valueType === 'CODE' ? (this.code?.code ?? null) : null,
      text: this.decodeText(bytes),
      measurement:
        valueType === 'NUM'
          ? {
              text: splitNumbers(this.number),
              unit: this.unit?.code ?? null,
              qualifier: this.qualifier?.code ?? null,
              precise: this.precise?.value ?? null,
            }
          : null,
      image: valueType === 'IMAGE' ? this.image : null,
      children: none,
    };
    return this.completed;
  }

  /** The value as one text: what tells two items apart whatever their transfer syntax. */
  valueText(): string {
    const { completed } = this;
    if (completed?.measurement) return `${completed.measurement.text.join('\\')}|${this.unit?.key ?? ''}`;
    return completed?.text ?? (completed?.code ? (this.code?.key ?? '') : '');
  }

  private decodeText(bytes: SliceableBuffer): string | null {
    const tag = textTags.get(this.valueType);
    if (tag === undefined || this.texts === null) return null;
    const span = this.texts.findLast((one) => one.tag === tag);
    return span ? decodeText(bytes, span.start, span.end, this.textReader) : null;
  }
}
