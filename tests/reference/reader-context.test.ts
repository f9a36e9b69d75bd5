// Own acceptance checks: what the writer was given against what the reader finds.
import { describe, expect, it } from 'vitest';
import { writeDoseReport } from '../../server/dicom-writer/write-dose-report';
import { content, event, read, readContent } from './reader-cases';

describe('equipment, start, class', () => {
  it('comes from the irradiating device where the header has none', () => {
    const equipment = {
      manufacturer: 'Quillon Roentgen',
      modelName: 'Aster F2',
      serialNumber: '7',
      deviceUid: '2.25.9',
    };
    const { report } = readContent({ equipment, isEquipmentOnlyInTree: true });
    expect(report.equipment).toMatchObject({
      manufacturer: 'Quillon Roentgen',
      modelName: 'Aster F2',
      serialNumber: '7',
    });
  });

  it('starts with the earliest event, whatever their order, else with the study', () => {
    const events = ['2026-03-04T09:30:00', '2026-03-04T09:00:00.5'].map((startedAt, index) =>
      event({ startedAt, irradiationEventUid: `2.25.7${index}` }),
    );
    expect(readContent({ events }).report.startedAt).toBe('2026-03-04T09:00:00.5');
    expect(readContent({ events: [] }).report.startedAt).toBe('2026-03-04T08:00:00');
  });

  it('takes the offset of the file where its times have none', () => {
    expect(readContent({ timezoneOffset: '+0100' }).report.events[0]?.startedAt).toBe(
      '2026-03-04T09:00:00+01:00',
    );
  });

  it('is radiography for an integrated system without fluoroscopy, and fluoroscopy with', () => {
    const still = event({ type: 'stationary-acquisition' });
    const planes = [{ plane: 'single' as const, kermaAreaProductGyCm2: 1 }];
    const acquisitionDeviceType = 'integrated' as const;
    expect(readContent({ acquisitionDeviceType, planes, events: [still] }).report.deviceClass).toBe(
      'radiography',
    );
    expect(readContent({ acquisitionDeviceType, planes }).report.deviceClass).toBe('fluoroscopy');
  });

  it('warns of two events with one identifier in one plane, not of one in two planes', () => {
    expect(readContent({ events: [event(), event()] }).codes).toContain('event-duplicate');
    expect(readContent({ events: [event({ plane: 'A' }), event({ plane: 'B' })] }).codes).not.toContain(
      'event-duplicate',
    );
  });

  it('names predecessors, persons, scope and intent', () => {
    const predecessors = [{ sopClassUid: '1.2.840.10008.5.1.4.1.1.88.67', sopInstanceUid: '2.25.1000' }];
    const role = { value: '113851', scheme: 'DCM', meaning: 'Irradiation Administering' };
    const { report } = readContent({
      predecessors,
      persons: [{ name: 'Larkmoor^Ines', role, id: 'IC-2' }],
      intent: { value: '113680', scheme: 'DCM', meaning: 'Quality Control Intent' },
      scope: { kind: 'procedure-step-to-this-point', uid: '2.25.77' },
    });
    expect(report).toMatchObject({
      predecessors,
      persons: [{ name: 'Larkmoor^Ines', role, id: 'IC-2' }],
      isQualityControl: true,
      scopeOfAccumulation: { code: { value: '113970' }, uid: '2.25.77' },
    });
  });
});

describe('encodings that are not as declared', () => {
  it('are read as they are, with a warning', () => {
    const { codes, report } = readContent(
      {},
      { transferSyntax: 'implicit-little-endian', declaredTransferSyntaxUid: '1.2.840.10008.1.2.1' },
    );
    expect(report.events).toHaveLength(1);
    expect(codes).toContain('syntax-mismatch');
  });

  it('work from a view into a larger buffer and from a plain Uint8Array', () => {
    const bytes = writeDoseReport(content(), { transferSyntax: 'deflated' });
    const larger = new Uint8Array(bytes.length + 20);
    larger.set(bytes, 7);
    expect(read(larger.subarray(7, 7 + bytes.length)).report.events).toHaveLength(1);
  });
});
