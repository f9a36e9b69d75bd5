// Own acceptance checks: what a megabyte can hold at worst takes less than the second that intake allows.
import { describe, expect, it } from 'vitest';
import { codeItem, contentItem, dcm } from '../../server/dicom-writer/content-items';
import { sequenceElement, textElement, type DataSet } from '../../server/dicom-writer/data-element';
import { doseReportDataSet } from '../../server/dicom-writer/write-dose-report';
import { writeFile } from '../../server/dicom-writer/write-file';
import { limits } from '../../server/dicom/limits';
import { readDoseReport, type DoseReportReading } from '../../server/dicom/read-dose-report';
import { content, withItems } from './reader-cases';

const MEGABYTE = 1_000_000;

/** The reading and the processor's milliseconds for it: other programs on the machine do not count. */
function time(bytes: Uint8Array): { reading: DoseReportReading; spentMs: number } {
  const before = process.cpuUsage();
  const reading = readDoseReport(bytes);
  const { user, system } = process.cpuUsage(before);
  return { reading, spentMs: (user + system) / 1000 };
}

const inEvent = (...items: DataSet[]) =>
  withItems((others) => [
    ...others,
    contentItem.container(dcm('113706', 'Irradiation Event X-Ray Data'), items),
  ]);

/** A comment of raw bytes in a character set of its own. */
const comment = (characterSet: string, text: string): DataSet => [
  textElement(0x00080005, 'CS', characterSet),
  textElement(0x0040a040, 'CS', 'TEXT'),
  sequenceElement(0x0040a043, [codeItem(dcm('121106', 'Comment'))]),
  { tag: 0x0040a160, vr: 'UT', value: new Uint8Array(Buffer.from(text, 'latin1')) },
];
const fill = (part: string) => part.repeat(Math.floor((MEGABYTE - 20_000) / part.length));
const JAPANESE = '\\ISO 2022 IR 87';

describe('a megabyte of', () => {
  it.each<[string, () => Uint8Array]>([
    ['blanks inside a text', () => inEvent(comment('ISO_IR 100', `a${fill(' ')}b`))],
    ['characters of two sets in turn', () => inEvent(comment(JAPANESE, fill('\x1b$B3D\x1b$)C\xfb\xf3')))],
    ['escape sequences without text', () => inEvent(comment(JAPANESE, fill('\x1b(B\x1b$B')))],
    ['escapes that lead nowhere', () => inEvent(comment(JAPANESE, fill('\x1b')))],
    ['bytes that are not the declared UTF-8', () => inEvent(comment('ISO_IR 192', fill('\xe9')))],
    ['items without content', () => withItems((items) => [...items, ...Array<DataSet>(120_000).fill([])])],
    [
      'empty containers in one another',
      () => {
        const chain = (levels: number): DataSet =>
          levels === 0 ? [] : [sequenceElement(0x0040a730, [chain(levels - 1)])];
        return withItems((items) => [...items, ...Array.from({ length: 780 }, () => chain(60))]);
      },
    ],
  ])('%s is read in time', (_name, make) => {
    const { reading, spentMs } = time(make());
    expect(reading.outcome).toBe('read');
    expect(spentMs).toBeLessThan(1000);
  });

  it('units unknown here is read in time, with the first hundred named', () => {
    const items = Array.from({ length: 4500 }, (_, index) =>
      contentItem.number(dcm('113738', 'Dose (RP)'), { text: '1', unit: `u${index}` }),
    );
    const events = items.map((item) =>
      contentItem.container(dcm('113706', 'Irradiation Event X-Ray Data'), [item]),
    );
    const { reading, spentMs } = time(withItems((others) => [...others, ...events]));
    expect(spentMs).toBeLessThan(1000);
    if (reading.outcome !== 'read') throw new Error(reading.reason.detail);
    const unknown = reading.warnings.filter((warning) => warning.code === 'unit-unknown');
    expect(unknown).toHaveLength(101);
    expect(unknown[100]?.detail).toMatch(/^further ones of this kind, events 102, /);
  });
});

describe('too many', () => {
  it('items in the header are not made into objects', () => {
    const evidence = sequenceElement(
      0x0040a375,
      Array<DataSet>(limits.headerElements).fill([textElement(0x00081155, 'UI', '')]),
    );
    const elements = doseReportDataSet(content());
    const { reading } = time(writeFile([...elements, evidence].sort((one, other) => one.tag - other.tag)));
    expect(reading).toMatchObject({ outcome: 'held', reason: { code: 'limit-items' } });
  });

  it('events are held, the most allowed are read', () => {
    const event = [sequenceElement(0x0040a043, [codeItem(dcm('113706', 'x'))])];
    const withEvents = (count: number) => withItems(() => Array<DataSet>(count).fill(event));
    expect(readDoseReport(withEvents(limits.events)).outcome).toBe('read');
    expect(readDoseReport(withEvents(limits.events + 1))).toMatchObject({
      outcome: 'held',
      reason: { code: 'limit-items', detail: `more than ${limits.events} irradiation events` },
      sopInstanceUid: '2.25.1001',
    });
  });
});
