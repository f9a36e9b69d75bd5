// Own acceptance checks: what stands beside the values of the template, or looks like them. Source of the forms:
// PS3.3 C.18.1 (numeric measurement), PS3.16 8.2 (private coding schemes).
import { describe, expect, it } from 'vitest';
import { codeItem, contentItem, dcm } from '../../server/dicom-writer/content-items';
import {
  sequenceElement,
  textElement,
  type DataElement,
  type DataSet,
} from '../../server/dicom-writer/data-element';
import type { WriterTransferSyntax } from '../../server/dicom-writer/write-file';
import { conceptOf } from '../../scripts/samples/edit-content';
import { read, withEventItems, withItems } from './reader-cases';

const kerma = dcm('113738', 'Dose (RP)');
const own = (value: string, meaning = 'own') => ({ value, scheme: '99QUILLON', meaning });
const gy = (text: string) => ({ text, unit: 'Gy' });
const eventOf = (bytes: Uint8Array) => {
  const [event] = read(bytes).report.events;
  if (!event) throw new Error('no event');
  return event;
};
const without = (items: DataSet[], code: string) => items.filter((item) => conceptOf(item) !== code);

/** A reference air kerma whose Measured Value Sequence item has more attributes. */
const kermaWith = (...added: DataElement[]): DataSet => [
  textElement(0x0040a010, 'CS', 'CONTAINS'),
  textElement(0x0040a040, 'CS', 'NUM'),
  sequenceElement(0x0040a043, [codeItem(kerma)]),
  sequenceElement(0x0040a300, [
    [
      textElement(0x0040a30a, 'DS', '0.333'),
      ...added,
      sequenceElement(0x004008ea, [codeItem({ value: 'Gy', scheme: 'UCUM', meaning: 'gray' })]),
    ],
  ]),
];

describe.each<WriterTransferSyntax>([
  'explicit-little-endian',
  'implicit-little-endian',
  'explicit-big-endian',
  'deflated',
])('numbers beside the decimal string in %s', (transferSyntax) => {
  const readKerma = (...added: DataElement[]) => {
    const { referenceAirKermaGy, preciseValues } = eventOf(
      withEventItems((items) => [...without(items, '113738'), kermaWith(...added)], { transferSyntax }),
    );
    return { referenceAirKermaGy, precise: preciseValues['referenceAirKermaGy'] };
  };

  it('are kept, and the decimal string stays the value', () => {
    expect(readKerma({ tag: 0x0040a161, vr: 'FD', value: [1 / 3] })).toEqual({
      referenceAirKermaGy: 0.333,
      precise: [1 / 3],
    });
  });

  it('may be a fraction', () => {
    expect(
      readKerma(
        { tag: 0x0040a162, vr: 'SL', value: [-2] },
        { tag: 0x0040a163, vr: 'UL', value: [3_000_000_000] },
      ).precise,
    ).toEqual([-2 / 3_000_000_000]);
  });

  it('count for nothing where they are half, infinite or cut', () => {
    expect(readKerma({ tag: 0x0040a162, vr: 'SL', value: [1] }).precise).toBeUndefined();
    expect(readKerma({ tag: 0x0040a161, vr: 'FD', value: [Infinity] }).precise).toBeUndefined();
    expect(readKerma({ tag: 0x0040a161, vr: 'FD', value: new Uint8Array(4) }).precise).toBeUndefined();
  });
});

describe('private containers', () => {
  const predicted = contentItem.container(own('P1', 'Prediction'), [contentItem.number(kerma, gy('99'))]);

  it('never take the place of a value of the event itself, wherever they stand', () => {
    for (const bytes of [
      withEventItems((items) => [predicted, ...items]),
      withEventItems((items) => [...items, predicted]),
    ]) {
      const { report, codes } = read(bytes);
      expect(report.events[0]?.referenceAirKermaGy).toBe(0.012);
      expect(codes).not.toContain('value-repeated');
    }
  });

  it('may group the values of an event', () => {
    const grouped = withEventItems((items) => [contentItem.container(own('G1', 'Exposure'), items)]);
    expect(eventOf(grouped)).toMatchObject({ referenceAirKermaGy: 0.012, kermaAreaProductGyCm2: 1.5 });
  });
});

describe('items beside those of the template', () => {
  it('are kept with concept, value and unit where the terminology is public, LOINC too', () => {
    const loinc = { value: '18782-3', scheme: 'LN', meaning: 'Radiology study observation' };
    const rate = dcm('122094', 'Rate of administration');
    const bytes = withEventItems((items) => [
      contentItem.number(rate, { text: '4', unit: 'ml/s' }),
      contentItem.text('CONTAINS', loinc, 'Filled slowly'),
      contentItem.text('CONTAINS', own('7'), 'private'),
      ...items,
    ]);
    expect(eventOf(bytes).furtherItems).toEqual([
      { concept: rate, code: null, text: ['4'], unit: 'ml/s' },
      { concept: loinc, code: null, text: ['Filled slowly'], unit: null },
    ]);
  });

  it('are limited in number', () => {
    const item = contentItem.text('CONTAINS', dcm('121071', 'Finding'), 'x');
    const bytes = withItems((items) => [...items, ...Array.from({ length: 300 }, () => item)]);
    expect(read(bytes).report.furtherItems).toHaveLength(100);
  });

  it('tell why a number is empty', () => {
    const failed = dcm('114006', 'Measurement failure');
    const bytes = withEventItems((items) => [
      ...without(items, '113738'),
      contentItem.number(kerma, { qualifier: failed }),
    ]);
    expect(eventOf(bytes)).toMatchObject({
      referenceAirKermaGy: null,
      qualifiers: { referenceAirKermaGy: failed },
    });
  });
});
