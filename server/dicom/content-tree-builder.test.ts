// Own acceptance checks of what a content item is made of (PS3.3 C.17.3), told attribute by attribute.
import { expect, it } from 'vitest';
import type { ContentItem, ContentTree } from './content-tree';
import { ContentTreeBuilder } from './content-tree-builder';
import type { SliceableBuffer } from './latin1-text';
import { tags } from './tags';

type Part = [tag: number, value: string | Part[][]];

/** Tells a builder of the parts of a data set; gives the tree, the events and the notices. */
function build(parts: Part[]): { tree: ContentTree; events: ContentItem[]; notices: string[] } {
  const bytes = Buffer.alloc(4096) as SliceableBuffer;
  const events: ContentItem[] = [];
  const notices: string[] = [];
  const listener = {
    headerEnds: () => undefined,
    takeEvent: (event: ContentItem) => events.push(event),
    notice: (code: string) => notices.push(code),
  };
  const builder = new ContentTreeBuilder(bytes, listener, false);
  let end = 0;
  const tell = ([tag, value]: Part): void => {
    if (typeof value === 'string') {
      const start = end;
      end += bytes.write(value, start, 'latin1');
      builder.value(tag, start, end);
      return;
    }
    builder.openSequence(tag, 0);
    for (const item of value) {
      builder.openItem();
      item.forEach(tell);
      builder.closeItem();
    }
    builder.closeSequence();
  };
  parts.forEach(tell);
  return { tree: builder.finish(), events, notices };
}

const code = (value: string, scheme = 'DCM'): Part[] => [
  [tags.codeValue, value],
  [tags.codingScheme, scheme],
  [tags.codeMeaning, `meaning of ${value}`],
];
const item = (type: string, concept: string, ...more: Part[]): Part[] => [
  [tags.valueType, type],
  [tags.conceptName, [code(concept)]],
  ...more,
];
const children = (...items: Part[][]): Part => [tags.contentSequence, items];

const EVENT = '113706';
const UID = '113769';

it('makes an item of each value type with its own value alone', () => {
  const { tree } = build([
    children(
      item('NUM', '113733', [
        tags.measuredValues,
        [
          [
            [tags.numericValue, ' 70 \\72'],
            [tags.unitCodes, [code('kV', 'UCUM')]],
          ],
        ],
      ]),
      item('CODE', '113764', [tags.conceptCode, [code('113622')]]),
      item('TEXT', '121106', [tags.textValue, 'as told  '], [tags.uid, '1.2']),
      item('UIDREF', UID, [tags.textValue, 'no'], [tags.uid, '1.2\0']),
      item('IMAGE', '113795', [tags.referencedInstances, [[[tags.referencedFrames, '1\\3']]]]),
    ),
  ]);
  const [number, coded, text, uid, image] = tree.root.children;
  expect(number?.measurement).toMatchObject({ text: ['70', '72'], unit: { value: 'kV' }, qualifier: null });
  expect(coded?.code).toEqual({ value: '113622', scheme: 'DCM', meaning: 'meaning of 113622' });
  expect([text?.text, uid?.text]).toEqual(['as told', '1.2']);
  expect(image?.image?.frameNumbers).toEqual([1, 3]);
  expect(number?.name).toBe('kvp');
});

it('takes the first item of a code sequence and passes over what stands inside a code', () => {
  const nested: Part = [0x00080121, [code('9')]];
  const { tree } = build([
    children(item('CODE', '113764', [tags.conceptCode, [[...code('1'), nested], code('2')]])),
  ]);
  expect(tree.root.children[0]?.code?.value).toBe('1');
});

it('hands over events as they end, also from containers put in between, and keeps none', () => {
  const event = (uid: string) => item('CONTAINER', EVENT, children(item('UIDREF', UID, [tags.uid, uid])));
  const { tree, events } = build([
    children(
      event('1'),
      item('CONTAINER', '999', children(event('2'))),
      item('TEXT', '121106', [tags.textValue, 'x']),
    ),
  ]);
  expect(events.map((one) => one.children[0]?.text)).toEqual(['1', '2']);
  expect(tree.root.children.map((one) => one.concept?.value)).toEqual(['999', '121106']);
  expect(tree.names).toEqual(new Set(['event', 'irradiationEventUid', 'comment']));
  expect(tree.itemCount).toBe(6);
});

it('leaves an event inside an event, or below what is no container, where it stands', () => {
  const inner = item('CONTAINER', EVENT);
  const { events } = build([
    children(item('CONTAINER', EVENT, children(inner)), item('TEXT', '121106', children(inner))),
  ]);
  expect(events).toHaveLength(1);
  expect(events[0]?.children[0]?.name).toBe('event');
});

it("decodes text in an item's own character set, and what it holds too, but not what follows", () => {
  const text = (value: string) => item('TEXT', '121106', [tags.textValue, value]);
  const { tree, notices } = build([
    [tags.characterSet, 'ISO_IR 100'],
    children(
      item('CONTAINER', '999', [tags.characterSet, 'ISO_IR 144'], children(text('\xbb\xee'))),
      text('\xbb\xee'),
    ),
  ]);
  expect(tree.root.children[0]?.children[0]?.text).toBe('Лю');
  expect(tree.root.children[1]?.text).toBe('»î');
  expect(notices).toEqual([]);
});

it('hashes values, concepts and shape, not meanings', () => {
  const hashOf = (...items: Part[][]) => build([children(...items)]).tree.contentHash;
  const uid = (value: string) => item('UIDREF', UID, [tags.uid, value]);
  const reworded: Part[] = [
    [tags.valueType, 'UIDREF'],
    [
      tags.conceptName,
      [
        [
          [tags.codeValue, UID],
          [tags.codingScheme, 'DCM'],
          [tags.codeMeaning, 'Other'],
        ],
      ],
    ],
    [tags.uid, '1.2'],
  ];
  const hash = hashOf(uid('1.2'), uid('1.3'));
  expect(hashOf(reworded, uid('1.3'))).toBe(hash);
  expect(hashOf(uid('1.3'), uid('1.2'))).not.toBe(hash);
  expect(hashOf([...uid('1.2'), children(uid('1.3'))])).not.toBe(hash);
});
