// Own acceptance checks: what the writer was given against what the reader finds.
import { describe, expect, it } from 'vitest';
import { codeItem, contentItem, dcm } from '../../server/dicom-writer/content-items';
import { sequenceElement } from '../../server/dicom-writer/data-element';
import type { FileOptions } from '../../server/dicom-writer/write-file';
import { event, read, readContent, withItems } from './reader-cases';

describe('the content hash', () => {
  const reference = readContent().contentHash;

  it.each<FileOptions>([
    { transferSyntax: 'implicit-little-endian' },
    { transferSyntax: 'explicit-big-endian' },
    { transferSyntax: 'deflated' },
    { hasUndefinedLengths: true },
    { hasMetaHeader: false },
    { characterSet: 'ISO_IR 100' },
  ])('stays the same when a sender rewrites the file with %j', (options) => {
    expect(readContent({}, options).contentHash).toBe(reference);
  });

  it('stays the same when a sender rewrites the header', () => {
    const header = {
      patient: { name: 'Fernhill^Ada^M', id: 'MCR1' },
      accessionNumber: 'A9',
      studyDescription: 'New',
    };
    expect(readContent(header).contentHash).toBe(reference);
  });

  it('changes with one digit of one value', () => {
    expect(readContent({ events: [event({ kermaAreaProductGyCm2: 1.6 })] }).contentHash).not.toBe(reference);
  });
});

describe('what the file leaves out', () => {
  it('is null with a warning, never zero', () => {
    const { report, warnings } = readContent({
      events: [event({ kermaAreaProductGyCm2: null, plane: null, kvpValues: [] })],
    });
    expect(report.events[0]).toMatchObject({
      kermaAreaProductGyCm2: null,
      plane: null,
      kvpValues: [],
      kvpMean: null,
    });
    const details = warnings
      .filter((one) => one.code === 'value-missing')
      .map((one) => one.detail.split(',')[0]);
    expect(details).toEqual(expect.arrayContaining(['kermaAreaProductGyCm2', 'plane', 'kvpMean']));
  });

  it('and zero stays zero', () => {
    expect(
      readContent({ events: [event({ referenceAirKermaGy: 0 })] }).report.events[0]?.referenceAirKermaGy,
    ).toBe(0);
  });

  it('names the events of one warning together', () => {
    const events = Array.from({ length: 12 }, (_, index) =>
      event({ irradiationEventUid: `2.25.6${index}`, referenceAirKermaGy: null }),
    );
    const { warnings } = readContent({ events });
    expect(warnings.filter((one) => one.detail.startsWith('referenceAirKermaGy'))).toEqual([
      {
        code: 'value-missing',
        detail: expect.stringContaining('events 1, 2, 3, 4, 5, 6, 7, 8, 9, 10 and 2 more'),
      },
    ]);
  });
});

describe('units and numbers', () => {
  it('keep the text and give null for a unit that is not UCUM, with the unit named', () => {
    const { report, warnings } = readContent({
      events: [event({ kermaAreaProductGyCm2: { text: '15', unit: 'dGy*cm2' } })],
    });
    expect(report.events[0]?.kermaAreaProductGyCm2).toBeNull();
    expect(report.events[0]?.reported['kermaAreaProductGyCm2']).toEqual({ text: ['15'], unit: 'dGy*cm2' });
    expect(warnings).toContainEqual({ code: 'unit-unknown', detail: expect.stringContaining('dGy*cm2') });
  });

  it('take a backslash list in one entry as values of their own', () => {
    const { report, codes } = readContent({
      events: [event({ kvpValues: [{ text: '70\\72\\74', unit: 'kV' }] })],
    });
    expect(report.events[0]).toMatchObject({ kvpValues: [70, 72, 74], kvpMean: 72 });
    expect(codes).toContain('value-list');
  });
});

describe('the kind of exposure', () => {
  it('is fluoroscopy by SNOMED-CT, SNOMED-RT, and the converter that writes one zero less', () => {
    for (const [scheme, value] of [
      ['SCT', '44491008'],
      ['SRT', 'P5-06000'],
      ['SRT', 'P5-0600'],
    ] as const) {
      const type = { scheme, value, meaning: 'Fluoroscopy' };
      expect(readContent({ events: [event({ type })] }).report.events[0]?.type).toBe('fluoroscopy');
    }
  });

  it('is null with a warning for a private code, even with the value of a known one', () => {
    const type = { scheme: '99QUILLON', value: '113611', meaning: 'Burst' };
    const { report, codes } = readContent({ events: [event({ type })] });
    expect(report.events[0]).toMatchObject({ type: null, typeCode: type });
    expect(codes).toContain('event-type-unknown');
  });
});

describe('the shape of the tree', () => {
  it('does not matter: totals after events, events one container deeper', () => {
    const moved = withItems((items) => {
      const [totals = [], events = []] = [items.slice(-3, -2), items.slice(-2, -1)];
      return [...items.slice(0, -3), contentItem.container(dcm('113701', 'Group'), events), ...totals];
    });
    const { report } = read(moved);
    expect(report.events).toHaveLength(1);
    expect(report.planes[0]?.kermaAreaProductGyCm2).toBe(1.5);
  });

  it('may hold private items, which count for nothing', () => {
    const foreign = contentItem.number(
      { value: '113722', scheme: '99QUILLON', meaning: 'Own total' },
      { text: '99', unit: 'Gy.m2' },
    );
    const { report } = read(
      withItems((items) => [foreign, contentItem.container(dcm('999999', 'x'), [foreign]), ...items]),
    );
    expect(report.planes).toHaveLength(1);
    expect(report.planes[0]?.kermaAreaProductGyCm2).toBe(1.5);
  });

  it('takes code values of more than 16 characters and items without a value', () => {
    const empty = [
      sequenceElement(0x0040a043, [codeItem({ value: 'A'.repeat(40), scheme: '99X', meaning: 'long' })]),
    ];
    expect(read(withItems((items) => [...items, empty])).report.events).toHaveLength(1);
  });
});
