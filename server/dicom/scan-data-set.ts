import { classifySopClass } from './classify-sop-class';
import type { ElementEncoding } from './encoding';
import { limits } from './limits';
import { ReadFailure } from './read-failure';
import type { DataSetVisitor } from './data-set-visitor';
import { tags } from './tags';

const UNDEFINED_LENGTH = 0xffffffff;
const SQ = 0x5351;
const UN = 0x554e;

/** Value representations with a four-byte length, two letters in one number; the set that dicom-parser knows. */
const longForm = new Set(
  ['OB', 'OD', 'OL', 'OW', 'SQ', 'OF', 'UC', 'UR', 'UT', 'UN'].map(
    (vr) => (vr.charCodeAt(0) << 8) | vr.charCodeAt(1),
  ),
);

interface Frame {
  isSequence: boolean;
  isExplicit: boolean;
  hasUndefinedLength: boolean;
  /** Nothing inside may pass this byte: its own end, or the outer one while its length is undefined. */
  bound: number;
  lastTag: number;
}

const newFrame = (): Frame => ({
  isSequence: false,
  isExplicit: false,
  hasUndefinedLength: false,
  bound: 0,
  lastTag: 0,
});

function isTypeLetters(vr: number): boolean {
  const first = vr >>> 8;
  const second = vr & 0xff;
  return first >= 0x41 && first <= 0x5a && second >= 0x41 && second <= 0x5a;
}

/** One walk over a data set; see `scanDataSet`. */
class DataSetScan {
  private readonly view: DataView;
  private readonly littleEndian: boolean;
  /** One for each level, used again and again. */
  private readonly frames: Frame[] = [];
  private frame: Frame;
  private depth = 0;
  private position = 0;
  private itemCount = 0;
  private headerElementCount = 0;
  private isInHeader = true;

  constructor(
    private readonly bytes: Buffer,
    encoding: ElementEncoding,
    private readonly visitor: DataSetVisitor,
  ) {
    this.view = new DataView(bytes.buffer, bytes.byteOffset, bytes.length);
    this.littleEndian = !encoding.isBigEndian;
    this.frame = { ...newFrame(), isExplicit: encoding.isExplicit, bound: bytes.length };
    this.frames.push(this.frame);
  }

  run(): void {
    while (true) {
      if (!this.frame.hasUndefinedLength && this.position === this.frame.bound) {
        if (this.depth === 0) return;
        this.close();
      } else if (this.frame.isSequence) {
        this.readItemTag();
      } else {
        this.readElement();
      }
    }
  }

  private malformed(detail: string): ReadFailure {
    return new ReadFailure('malformed', `${detail} at byte ${this.position}`);
  }

  /** The next bytes must lie in the file and in what is open. */
  private require(byteCount: number): void {
    const end = this.position + byteCount;
    if (end > this.bytes.length)
      throw new ReadFailure('truncated', `ends early, after byte ${this.position}`);
    if (end > this.frame.bound) throw this.malformed('an inner length passes the outer one');
  }

  private readTag(): number {
    const group = this.view.getUint16(this.position, this.littleEndian);
    return ((group << 16) | this.view.getUint16(this.position + 2, this.littleEndian)) >>> 0;
  }

  private open(isSequence: boolean, isExplicit: boolean, length: number): void {
    const hasUndefinedLength = length === UNDEFINED_LENGTH;
    if (!hasUndefinedLength) this.require(length);
    const bound = hasUndefinedLength ? this.frame.bound : this.position + length;
    this.depth += 1;
    if (this.depth >= limits.depth * 2)
      throw new ReadFailure('limit-depth', `more than ${limits.depth} levels of sequences`);
    const frame = (this.frames[this.depth] ??= newFrame());
    frame.isSequence = isSequence;
    frame.isExplicit = isExplicit;
    frame.hasUndefinedLength = hasUndefinedLength;
    frame.bound = bound;
    frame.lastTag = 0;
    this.frame = frame;
  }

  private close(): void {
    if (this.frame.isSequence) this.visitor.closeSequence();
    else this.visitor.closeItem();
    this.depth -= 1;
    this.frame = this.frames[this.depth] as Frame;
  }

  private passDelimiter(): void {
    if (this.view.getUint32(this.position + 4, true) !== 0) throw this.malformed('a delimiter has a length');
    this.position += 8;
    this.close();
  }

  private readItemTag(): void {
    this.require(8);
    const tag = this.readTag();
    const length = this.view.getUint32(this.position + 4, this.littleEndian);
    if (tag === tags.item) {
      this.itemCount += 1;
      if (this.itemCount > limits.items)
        throw new ReadFailure('limit-items', `more than ${limits.items} items`);
      this.position += 8;
      this.open(false, this.frame.isExplicit, length);
      this.visitor.openItem();
    } else if (tag === tags.sequenceEnd && this.frame.hasUndefinedLength) {
      this.passDelimiter();
    } else {
      throw this.malformed('a sequence holds something else than items');
    }
  }

  private readElement(): void {
    this.require(8);
    const start = this.position;
    const tag = this.readTag();
    if (tag === tags.itemEnd && this.frame.hasUndefinedLength) {
      this.passDelimiter();
      return;
    }
    this.checkOrder(tag);
    let type = 0;
    let length: number;
    if (this.frame.isExplicit) {
      type = this.view.getUint16(start + 4, false);
      if (!isTypeLetters(type)) throw this.malformed('an element has no type');
      const isLong = longForm.has(type);
      this.require(isLong ? 12 : 8);
      length = isLong
        ? this.view.getUint32(start + 8, this.littleEndian)
        : this.view.getUint16(start + 6, this.littleEndian);
      this.position += isLong ? 12 : 8;
    } else {
      length = this.view.getUint32(start + 4, this.littleEndian);
      this.position += 8;
    }
    if (tag === tags.pixelData) throw new ReadFailure('image', 'has pixel data');
    if (this.isInHeader) this.countHeaderElement(tag);
    if (this.isSequence(type, length)) {
      this.open(true, this.frame.isExplicit && type !== UN, length);
      this.visitor.openSequence(tag, start);
    } else {
      this.passValue(tag, length);
    }
  }

  /** What stands before the content is made into objects by the DICOM library, so that it must be few. */
  private countHeaderElement(tag: number): void {
    if (this.depth === 0 && tag === tags.contentSequence) this.isInHeader = false;
    this.headerElementCount += 1;
    if (this.headerElementCount > limits.headerElements)
      throw new ReadFailure('limit-items', `more than ${limits.headerElements} elements before the content`);
  }

  /**
   * A content sequence whose length is too short spills the elements of its items, which sort before it; so does
   * an item tag outside a sequence. A reader that takes either in silence loses what follows.
   */
  private checkOrder(tag: number): void {
    if (tag >>> 16 === 0xfffe) throw this.malformed('an item stands outside a sequence');
    const { lastTag } = this.frame;
    if (lastTag >= tags.contentSequence && tag <= lastTag) throw this.malformed('elements run backwards');
    this.frame.lastTag = tag;
  }

  private isSequence(type: number, length: number): boolean {
    if (this.frame.isExplicit) return type === SQ || (type === UN && length === UNDEFINED_LENGTH);
    // Implicit: without a dictionary, a sequence is what starts with an item (as dicom-parser decides it).
    if (length === UNDEFINED_LENGTH) return true;
    if (length === 0 || this.position + 4 > this.bytes.length) return false;
    const next = this.readTag();
    return next === tags.item || next === tags.sequenceEnd;
  }

  private passValue(tag: number, length: number): void {
    if (length === UNDEFINED_LENGTH) throw this.malformed('a plain value has no length');
    this.require(length);
    if (length > limits.textBytes && this.depth > 0) {
      throw new ReadFailure('limit-text-length', `a value of ${length} bytes`);
    }
    if (tag === tags.sopClassUid && this.depth === 0) {
      const value = this.bytes.toString('latin1', this.position, this.position + Math.min(length, 128));
      classifySopClass(value.replace(/[\0 ]+$/, ''));
    }
    this.visitor.value(tag, this.position, this.position + length);
    this.position += length;
  }
}

/**
 * Walks a data set once, without recursion and without objects for elements, and tells the visitor what it meets.
 * Throws a ReadFailure where the file ends early, its lengths contradict each other, or a limit is passed.
 */
export function scanDataSet(bytes: Buffer, encoding: ElementEncoding, visitor: DataSetVisitor): void {
  new DataSetScan(bytes, encoding, visitor).run();
}
