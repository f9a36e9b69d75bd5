// Own acceptance checks; the layouts of bytes are those of PS3.5 sections 7.1 and 7.5.
import { describe, expect, it } from 'vitest';
import type { DataSetVisitor } from './data-set-visitor';
import {
  explicitBigEndian,
  explicitLittleEndian,
  implicitLittleEndian,
  type ElementEncoding,
} from './encoding';
import { limits } from './limits';
import { ReadFailure } from './read-failure';
import { scanDataSet } from './scan-data-set';

type Element = [tag: number, vr: string, value: string | Element[][]];
type Layout = ElementEncoding & { hasUndefinedLengths?: boolean };

const UNDEFINED = 0xffffffff;
const ITEM = 0xfffee000;

function uint(value: number, byteCount: 2 | 4, isBigEndian: boolean): Buffer {
  const bytes = Buffer.alloc(byteCount);
  if (isBigEndian) bytes.writeUIntBE(value, 0, byteCount);
  else bytes.writeUIntLE(value, 0, byteCount);
  return bytes;
}

const tagBytes = (tag: number, isBigEndian: boolean) =>
  Buffer.concat([uint(tag >>> 16, 2, isBigEndian), uint(tag & 0xffff, 2, isBigEndian)]);

/** Tag, representation where the layout has one, length, value. */
function header(tag: number, vr: string, length: number, { isExplicit, isBigEndian }: Layout): Buffer {
  const isLong = ['SQ', 'UN', 'UT'].includes(vr);
  const middle = isExplicit ? Buffer.from(isLong ? `${vr}\0\0` : vr, 'latin1') : Buffer.alloc(0);
  const lengthBytes = uint(length, isExplicit && !isLong ? 2 : 4, isBigEndian);
  return Buffer.concat([tagBytes(tag, isBigEndian), middle, lengthBytes]);
}

function encode(elements: Element[], layout: Layout): Buffer {
  const { isBigEndian, hasUndefinedLengths = false } = layout;
  const mark = (tag: number, length: number) =>
    Buffer.concat([tagBytes(tag, isBigEndian), uint(length, 4, isBigEndian)]);
  const ended = (body: Buffer, end: number) =>
    hasUndefinedLengths ? Buffer.concat([body, mark(end, 0)]) : body;
  const lengthOf = (body: Buffer) => (hasUndefinedLengths ? UNDEFINED : body.length);
  return Buffer.concat(
    elements.flatMap(([tag, vr, value]) => {
      if (typeof value === 'string') {
        return [header(tag, vr, value.length, layout), Buffer.from(value, 'latin1')];
      }
      const items = value.map((item) => {
        const body = encode(item, layout);
        return Buffer.concat([mark(ITEM, lengthOf(body)), ended(body, 0xfffee00d)]);
      });
      const body = Buffer.concat(items);
      return [header(tag, vr, lengthOf(body), layout), ended(body, 0xfffee0dd)];
    }),
  );
}

/** What the scan tells, one word after the other. */
function scan(bytes: Buffer, encoding: ElementEncoding): string[] {
  const told: string[] = [];
  const visitor: DataSetVisitor = {
    openSequence: (tag) => told.push(`${tag.toString(16)}[`),
    openItem: () => told.push('{'),
    value: (tag, start, end) => told.push(`${tag.toString(16)}=${bytes.toString('latin1', start, end)}`),
    closeItem: () => told.push('}'),
    closeSequence: () => told.push(']'),
  };
  scanDataSet(bytes, encoding, visitor);
  return told;
}

function failureOf(bytes: Buffer, encoding: ElementEncoding = explicitLittleEndian): string {
  try {
    scan(bytes, encoding);
  } catch (error) {
    if (error instanceof ReadFailure) return error.code;
    throw error;
  }
  return 'none';
}

const number: Element[] = [
  [0x0040a040, 'CS', 'NUM '],
  [0x0040a300, 'SQ', [[[0x0040a30a, 'DS', '1.50']]]],
];
const tree: Element[] = [
  [0x00080018, 'UI', '1.2.3\0'],
  [0x0040a730, 'SQ', [number, [], [[0x0040a160, 'UT', '']]]],
];
const asTold = '80018=1.2.3\0|40a730[|{|40a040=NUM |40a300[|{|40a30a=1.50|}|]|}|{|}|{|40a160=|}|]';

const layouts: [string, Layout][] = [
  ['explicit little endian', explicitLittleEndian],
  ['explicit big endian', explicitBigEndian],
  ['implicit little endian', implicitLittleEndian],
];
const all = layouts.flatMap(([name, layout]): [string, Layout][] => [
  [name, layout],
  [`${name}, undefined lengths`, { ...layout, hasUndefinedLengths: true }],
]);

describe.each(all)('in %s', (_name, layout) => {
  const whole = encode(tree, layout);

  it('tells of every value, item and sequence in the order of the file', () => {
    expect(scan(whole, layout).join('|')).toBe(asTold);
  });

  it('does not pass a file that breaks off anywhere', () => {
    const firstElement = encode(tree.slice(0, 1), layout).length;
    for (let length = 1; length < whole.length; length += 1) {
      if (length === firstElement) continue;
      expect(failureOf(whole.subarray(0, length), layout), `cut at ${length}`).toBe('truncated');
    }
  });
});

describe('a sequence of unknown type and undefined length', () => {
  it('has implicit items, whatever surrounds it', () => {
    const inner = encode([[0x0040a160, 'UT', 'ab']], implicitLittleEndian);
    const marked = Buffer.concat([
      header(0x0040a730, 'UN', UNDEFINED, explicitLittleEndian),
      tagBytes(ITEM, false),
      uint(inner.length, 4, false),
      inner,
      tagBytes(0xfffee0dd, false),
      uint(0, 4, false),
    ]);
    expect(scan(marked, explicitLittleEndian)).toEqual(['40a730[', '{', '40a160=ab', '}', ']']);
  });
});

describe('a broken structure', () => {
  const encoded = (elements: Element[]) => encode(elements, explicitLittleEndian);
  const item = (length: number, body: Buffer) =>
    Buffer.concat([tagBytes(ITEM, false), uint(length, 4, false), body]);
  const sequence = (length: number, body: Buffer) =>
    Buffer.concat([header(0x0040a730, 'SQ', length, explicitLittleEndian), body]);
  const value = encoded([[0x0040a040, 'CS', 'NUM ']]);

  it.each<[string, Buffer]>([
    ['an inner length passes the outer one', sequence(18, item(12, value))],
    ['a sequence holds something else than items', sequence(12, value)],
    [
      'a delimiter has a length',
      sequence(UNDEFINED, Buffer.from('fe ff dd e0 01 00 00 00'.replaceAll(' ', ''), 'hex')),
    ],
    ['an item stands outside a sequence', Buffer.concat([value, item(0, Buffer.alloc(0))])],
    ['an element has no type', Buffer.from('080018001a2b0000', 'hex')],
    ['a plain value has no length', header(0x0040a730, 'UT', UNDEFINED, explicitLittleEndian)],
    ['elements run backwards after the content', Buffer.concat([sequence(0, Buffer.alloc(0)), value])],
    ['the content stands twice', Buffer.concat([sequence(0, Buffer.alloc(0)), sequence(0, Buffer.alloc(0))])],
  ])('is found: %s', (_name, bytes) => {
    expect(failureOf(bytes)).toBe('malformed');
  });

  it('is not seen in a content sequence without items', () => {
    expect(failureOf(Buffer.concat([value, sequence(0, Buffer.alloc(0))]))).toBe('none');
  });
});

describe('limits', () => {
  const nested = (levels: number): Element[] =>
    levels === 0 ? [] : [[0x0040a730, 'SQ', [nested(levels - 1)]]];

  it('stop nesting, and not before', () => {
    const encoding = { ...explicitLittleEndian, hasUndefinedLengths: true };
    expect(failureOf(encode(nested(limits.depth - 1), encoding))).toBe('none');
    expect(failureOf(encode(nested(limits.depth), encoding))).toBe('limit-depth');
  });

  it('stop a header of too many elements, not a content of as many', () => {
    const items = Array.from({ length: limits.headerElements }, (): Element[] => [[0x00081150, 'UI', '']]);
    expect(failureOf(encode([[0x0040a375, 'SQ', items]], explicitLittleEndian))).toBe('limit-items');
    expect(failureOf(encode([[0x0040a730, 'SQ', items]], explicitLittleEndian))).toBe('none');
  });

  it('stop a text that is too long, outside the outermost level', () => {
    const text = (length: number): Element[] => [
      [0x0040a730, 'SQ', [[[0x0040a160, 'UT', 'x'.repeat(length)]]]],
    ];
    expect(failureOf(encode(text(limits.textBytes), explicitLittleEndian))).toBe('none');
    expect(failureOf(encode(text(limits.textBytes + 2), explicitLittleEndian))).toBe('limit-text-length');
  });

  it('stop at an image and at objects of other classes', () => {
    expect(failureOf(encode([[0x7fe00010, 'UN', 'ab']], explicitLittleEndian))).toBe('image');
    const mammography = '1.2.840.10008.5.1.4.1.1.1.2\0';
    expect(failureOf(encode([[0x00080016, 'UI', mammography]], explicitLittleEndian))).toBe('image');
  });
});
