import fc from 'fast-check';
import type { ContentNode } from './content-node';
import { alphabets, conceptOf, dcm, numberOf, numbersFor, uid, valuesIn, type Values } from './random-values';
import { eventFields, totalFields } from './reader-comparison';

export interface RandomReport {
  syntax: 'implicit-little-endian' | 'explicit-little-endian' | 'explicit-big-endian' | 'deflated';
  characterSet: string;
  undefinedLengths: boolean;
  patientName: string;
  studyDescription: string;
  tree: ContentNode;
}

type Kind = 'CODE' | 'TEXT' | 'CODE OR TEXT' | 'IMAGE';
/** Concept, kind of value, whether it repeats, and what may hang below it. */
type Spec = [concepts: string[], kind: Kind, isRepeated: boolean, below?: [string[], 'CODE' | 'TEXT'][]];

const eventSpecs: Spec[] = [
  [['113764'], 'CODE', false],
  [['113721'], 'CODE', false],
  [['125203'], 'TEXT', false],
  [['121106'], 'TEXT', false],
  [['113605'], 'TEXT', false, [[['113606'], 'CODE']]],
  [['91723000', 'T-D0005'], 'CODE', false, [[['272741003'], 'CODE']]],
  [['111031'], 'CODE', false, [[['111032'], 'CODE']]],
  [['113946'], 'CODE', false],
  [['113745'], 'CODE', false],
  [['113743'], 'CODE', false, [[['113744'], 'CODE']]],
  [['123014'], 'CODE', false],
  [['113780'], 'CODE OR TEXT', false],
  [['113732'], 'CODE', false],
  [['123011'], 'CODE OR TEXT', true],
  [['113795'], 'IMAGE', true],
  [['111632'], 'CODE', false],
  [['111635'], 'CODE', true],
  [['113956'], 'CODE', false],
];

const rootSpecs: Spec[] = [
  [['121049'], 'CODE', false, [[['121046'], 'CODE']]],
  [['122142'], 'CODE', false],
  [['113854'], 'CODE', true],
  [['121106'], 'TEXT', false],
  [['121342'], 'IMAGE', true],
];

function valueNode([concepts, kind, , below = []]: Spec, values: Values): fc.Arbitrary<ContentNode> {
  const types = kind === 'CODE OR TEXT' ? (['CODE', 'TEXT'] as const) : ([kind] as const);
  const children = fc.tuple(
    ...below.map(([names, type]) =>
      fc.option(valueNode([names, type, false], values)).map((one) => (one === null ? [] : [one])),
    ),
  );
  return fc
    .tuple(fc.constantFrom(...concepts), fc.constantFrom(...types), children)
    .chain(([concept, type, nested]) => {
      const value =
        type === 'CODE'
          ? values.code
          : type === 'TEXT'
            ? values.text
            : fc.tuple(uid, uid, fc.array(fc.integer({ min: 1, max: 300 }), { maxLength: 3 }));
      return value.map(
        (v) => ({ r: 'CONTAINS', t: type, c: conceptOf(concept), v, k: nested.flat() }) as ContentNode,
      );
    });
}

/** Some of the values that a container may hold. */
function valuesFor(specs: Spec[], values: Values): fc.Arbitrary<ContentNode[]> {
  return fc
    .tuple(
      ...specs.map((spec) =>
        fc
          .integer({ min: 0, max: spec[2] ? 3 : 1 })
          .chain((count) => fc.array(valueNode(spec, values), { minLength: count, maxLength: count })),
      ),
    )
    .map((lists) => lists.flat());
}

const foreign = fc.constantFrom<ContentNode>(
  { r: 'CONTAINS', t: 'NUM', c: ['122130', '99QUILLON', 'own'], v: ['99', 'Gy.m2', 'UCUM'] },
  { r: 'CONTAINS', t: 'TEXT', c: ['125203', '99QUILLON', 'own'], v: 'own text' },
  { r: 'CONTAINS', t: 'NUM', c: ['122094', 'DCM', 'Rate of administration'], v: ['4', 'ml/s', 'UCUM'] },
);

/** Any order, with some of the items one or two containers deeper and foreign ones between. */
function arrange(items: fc.Arbitrary<ContentNode[]>): fc.Arbitrary<ContentNode[]> {
  return fc.tuple(items, fc.array(foreign, { maxLength: 2 })).chain(([own, others]) => {
    const all = [...own, ...others];
    return fc
      .tuple(fc.shuffledSubarray(all, { minLength: all.length }), fc.nat(20), fc.nat(20))
      .map(([mixed, from, count]) => {
        if (count < 12) return mixed;
        const group: ContentNode = { r: 'CONTAINS', t: 'CONTAINER', c: ['121111', 'DCM', 'Summary'] };
        const inner = mixed.slice(from, from + count);
        if (inner.length === 0) return mixed;
        return [...mixed.slice(0, from), { ...group, k: inner }, ...mixed.slice(from + count)];
      });
  });
}

const start = fc
  .date({ min: new Date('2000-01-01T00:00:00Z'), max: new Date('2039-12-31T00:00:00Z'), noInvalidDate: true })
  .map((date) => date.toISOString().replace(/[-:TZ]/g, ''));

const filter = fc
  .tuple(numberOf('113758', 'filterMm'), numberOf('113773', 'filterMm'))
  .map((bounds): ContentNode => ({ r: 'CONTAINS', t: 'CONTAINER', c: dcm('113771'), k: bounds }));

function eventNode(values: Values): fc.Arbitrary<ContentNode> {
  const fixed = fc
    .tuple(uid, start, fc.array(filter, { maxLength: 2 }))
    .map(([id, at, filters]): ContentNode[] => [
      { r: 'CONTAINS', t: 'UIDREF', c: dcm('113769'), v: id },
      { r: 'CONTAINS', t: 'DATETIME', c: dcm('111526'), v: at },
      ...filters,
    ]);
  const items = fc
    .tuple(fixed, numbersFor(eventFields), valuesFor(eventSpecs, values))
    .map((parts) => parts.flat());
  return arrange(items).map((k) => ({ r: 'CONTAINS', t: 'CONTAINER', c: dcm('113706'), k }));
}

const totalsNode = arrange(numbersFor(totalFields)).map((k): ContentNode => ({
  r: 'CONTAINS',
  t: 'CONTAINER',
  c: dcm('113702'),
  k,
}));

/** A person with role and identifiers below. */
const personNode = (values: Values) =>
  fc.tuple(values.name, values.code, values.text).map(([name, role, id]): ContentNode => ({
    r: 'CONTAINS',
    t: 'PNAME',
    c: dcm('113870'),
    v: name,
    k: [
      { r: 'HAS PROPERTIES', t: 'CODE', c: dcm('113875'), v: role },
      { r: 'HAS PROPERTIES', t: 'TEXT', c: dcm('113871'), v: id },
    ],
  }));

function rootNode(values: Values): fc.Arbitrary<ContentNode> {
  const parts = fc
    .tuple(
      fc.array(totalsNode, { minLength: 1, maxLength: 2 }),
      fc.array(eventNode(values), { minLength: 1, maxLength: 3 }),
      fc.array(personNode(values), { maxLength: 2 }),
      valuesFor(rootSpecs, values),
    )
    .map((lists) => lists.flat());
  return fc.tuple(uid, values.text, arrange(parts)).map(([deviceUid, station, items]): ContentNode => ({
    t: 'CONTAINER',
    c: dcm('113701'),
    k: [
      { r: 'HAS CONCEPT MOD', t: 'CODE', c: dcm('121058'), v: dcm('113704') },
      { r: 'HAS OBS CONTEXT', t: 'CODE', c: dcm('121005'), v: dcm('121007') },
      { r: 'HAS OBS CONTEXT', t: 'UIDREF', c: dcm('121012'), v: deviceUid },
      { r: 'HAS OBS CONTEXT', t: 'TEXT', c: dcm('121013'), v: station },
      ...items,
    ],
  }));
}

/** A report of TID 10001 in a random shape, encoding and character set. */
export const randomReport: fc.Arbitrary<RandomReport> = fc
  .constantFrom(...Object.keys(alphabets))
  .chain((characterSet) => {
    const values = valuesIn(characterSet);
    return fc.record({
      syntax: fc.constantFrom(
        'implicit-little-endian',
        'explicit-little-endian',
        'explicit-big-endian',
        'deflated',
      ),
      characterSet: fc.constant(characterSet),
      undefinedLengths: fc.boolean(),
      patientName: values.name,
      studyDescription: values.text,
      tree: rootNode(values),
    });
  });
