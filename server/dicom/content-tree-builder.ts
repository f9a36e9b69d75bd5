import { createTextReader, type CharacterSetNotice, type TextReader } from './character-set';
import { CodeTable } from './code-table';
import type { ConceptName } from './concepts.table-data';
import { ContentHasher } from './content-hash';
import type { ContentItem, ContentTree } from './content-tree';
import type { DataSetVisitor } from './data-set-visitor';
import { sliceLatin1, type SliceableBuffer } from './latin1-text';
import { OpenContentItem } from './open-content-item';
import { PreciseNumber } from './precise-number';
import { tags } from './tags';

/** What is told while a file is read. */
export interface ContentListener {
  /** The content sequence of the data set starts at this byte: the header stands before it. */
  headerEnds(contentStart: number): void;
  /** An irradiation event is complete; it is not kept in the tree. */
  takeEvent(event: ContentItem): void;
  notice: CharacterSetNotice;
}

/** Sequences inside a content item that the reader looks into. */
const readInItem = new Set<number>([
  tags.contentSequence,
  tags.conceptName,
  tags.conceptCode,
  tags.measuredValues,
  tags.numericQualifier,
  tags.referencedInstances,
]);

/** What a sequence or item that the reader passes over counts as. */
const PASSED_OVER = 0;

function isRead(outer: number, tag: number): boolean {
  if (outer === tags.contentSequence) return readInItem.has(tag);
  return outer === tags.measuredValues && tag === tags.unitCodes;
}

/** True for an item that says nothing: kept by the hundred thousand, such items would only fill memory. */
function isBlank(item: ContentItem): boolean {
  const { concept, code, text, children } = item;
  return concept === null && code === null && text === null && children.length === 0;
}

/** Builds the content tree (PS3.3 C.17.3) while a data set is scanned. */
export class ContentTreeBuilder implements DataSetVisitor {
  /** For each open sequence and item the tag of the sequence; the data set counts as an item of the content. */
  private readonly roles: number[] = [tags.contentSequence];
  private depth = 0;
  private current: OpenContentItem;
  private itemCount = 0;
  private readonly names = new Set<ConceptName>();
  private readonly codes: CodeTable;
  private readonly textReaders = new Map<string | null, TextReader>();
  private readonly hasher = new ContentHasher();

  constructor(
    private readonly bytes: SliceableBuffer,
    private readonly listener: ContentListener,
    private readonly isBigEndian: boolean,
  ) {
    this.codes = new CodeTable(bytes);
    this.current = new OpenContentItem(null, true, this.textReaderFor(null));
  }

  openSequence(tag: number, elementStart: number): void {
    const role = isRead(this.roles[this.depth] as number, tag) ? tag : PASSED_OVER;
    if (role === tags.contentSequence) {
      if (this.depth === 0) this.listener.headerEnds(elementStart);
      this.complete(this.current).children = [];
    }
    this.depth += 1;
    this.roles[this.depth] = role;
  }

  openItem(): void {
    const role = this.roles[this.depth] as number;
    if (role === tags.contentSequence) {
      this.openContentItem();
    } else if (role !== PASSED_OVER) {
      // Of every other sequence the first item alone counts.
      this.roles[this.depth] = PASSED_OVER;
      this.codes.start();
    }
    this.depth += 1;
    this.roles[this.depth] = role;
  }

  value(tag: number, start: number, end: number): void {
    const { bytes, current } = this;
    const role = this.roles[this.depth];
    if (role === PASSED_OVER) return;
    if (role === tags.contentSequence) {
      if (tag === tags.characterSet) current.textReader = this.textReaderFor(sliceLatin1(bytes, start, end));
      else current.takeAttribute(bytes, tag, start, end);
    } else if (role === tags.measuredValues) {
      if (tag === tags.numericValue) current.number = sliceLatin1(bytes, start, end);
      else (current.precise ??= new PreciseNumber(this.isBigEndian)).take(bytes, tag, start, end);
    } else if (role === tags.referencedInstances) {
      current.takeReference(bytes, tag, start, end);
    } else {
      this.codes.take(tag, start, end);
    }
  }

  closeItem(): void {
    const { current } = this;
    const role = this.roles[this.depth];
    this.depth -= 1;
    if (role === tags.contentSequence) this.closeContentItem();
    else if (role === tags.conceptName) current.concept = this.codes.finish(current.textReader);
    else if (role === tags.conceptCode) current.code = this.codes.finish(current.textReader);
    else if (role === tags.unitCodes) current.unit = this.codes.finish(current.textReader);
    else if (role === tags.numericQualifier) current.qualifier = this.codes.finish(current.textReader);
  }

  closeSequence(): void {
    this.depth -= 1;
  }

  /** The tree, once the data set is scanned to its end. */
  finish(): ContentTree {
    const root = this.current.item ?? this.complete(this.current);
    this.hasher.closeItem();
    return { root, names: this.names, itemCount: this.itemCount, contentHash: this.hasher.digest() };
  }

  private openContentItem(): void {
    this.itemCount += 1;
    const { current: outer } = this;
    const isPlaceOfEvents =
      outer.outer === null ||
      (outer.isPlaceOfEvents && outer.item?.valueType === 'CONTAINER' && outer.item.name !== 'event');
    this.current = new OpenContentItem(outer, isPlaceOfEvents, outer.textReader);
  }

  private closeContentItem(): void {
    const { current } = this;
    const item = current.item ?? this.complete(current);
    this.hasher.closeItem();
    if (current.outer === null) return;
    this.current = current.outer;
    if (current.isPlaceOfEvents && item.name === 'event') this.listener.takeEvent(item);
    else if (!isBlank(item)) this.current.item?.children.push(item);
  }

  /** What an item is stands before its children: none of its attributes sorts after the content sequence. */
  private complete(open: OpenContentItem): ContentItem {
    const item = open.complete(this.bytes);
    if (open.outer !== null && item.name !== null) this.names.add(item.name);
    this.hasher.openItem(item.valueType, open.concept?.key ?? '', open.valueText());
    return item;
  }

  private textReaderFor(declared: string | null): TextReader {
    let reader = this.textReaders.get(declared);
    if (!reader) {
      reader = createTextReader(declared, this.listener.notice);
      this.textReaders.set(declared, reader);
    }
    return reader;
  }
}
