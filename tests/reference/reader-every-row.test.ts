// Source: the writer's input (scripts/samples), which holds every row of PS3.16 TID 10001 and what it includes.
import { describe, expect, it } from 'vitest';
import { dcm } from '../../server/dicom-writer/content-items';
import { fullCase } from '../../scripts/samples/full-case';
import { reportEventSchema } from '../../shared/contract/report-event';
import { readSample } from './reader-comparison';

const content = fullCase(95);
const { report, warnings } = readSample('95-every-row.dcm');
const [plane] = report.planes;
const [event] = report.events;

describe('a report with every row of the template', () => {
  it('gives header, order and what the machine could state', () => {
    expect(report).toMatchObject({
      patient: { age: '064Y' },
      equipment: { departmentName: 'Interventional Radiology', softwareVersions: '4.2.0' },
      templateId: '10001',
      verificationFlag: 'UNVERIFIED',
      procedureCodes: content.procedureCodes,
      requests: content.requests,
      language: content.language,
      country: content.country,
      detectorDataAvailable: 'yes',
      sourceDataAvailable: 'yes',
      mechanicalDataAvailable: 'yes',
      comment: content.comment,
      furtherItems: [],
    });
    expect(warnings).toEqual([]);
  });

  it('gives both observers with all that is said of them', () => {
    const { equipment, personObservers = [] } = content;
    expect(report.observers).toMatchObject([
      {
        type: 'device',
        uid: equipment.deviceUid,
        location: equipment.location,
        deviceRoles: equipment.roles,
      },
      { type: 'person', ...personObservers[0] },
    ]);
  });

  it('gives the calibration and applies it to nothing', () => {
    expect(plane?.calibrations).toMatchObject([
      {
        measurementDevice: { value: '15869005', scheme: 'SCT' },
        calibratedAt: '2025-11-20T13:30:00',
        factor: 1.04,
        uncertaintyPercent: 4,
        responsibleParty: 'Physics, Marrow Creek',
        protocol: 'Report 190 protocol, in beam',
      },
    ]);
    expect(plane?.kermaAreaProductGyCm2).toBe(7.863);
    expect(event?.kermaAreaProductGyCm2).toBe(0.8);
  });

  it('gives persons and devices of totals and events', () => {
    expect(report.persons).toEqual(content.persons);
    expect(event?.persons).toEqual(content.persons);
    expect(plane?.devices).toMatchObject([
      { role: dcm('113859', 'Irradiating Device'), serialNumber: 'QR-20417' },
    ]);
  });

  it('leaves no field of an event empty but those that cannot stand with the others', () => {
    const empty = Object.entries(event ?? {})
      .filter(([, value]) => value === null || (Array.isArray(value) && value.length === 0))
      .map(([field]) => field);
    expect(empty.sort()).toEqual(
      [
        // Mammography's, a column's in place of angles, a rotation's end.
        'entranceExposureGy',
        'compressionThicknessMm',
        'columnAngulationDeg',
        'primaryEndAngleDeg',
        'secondaryEndAngleDeg',
        'isocenterPrimaryEndAngleDeg',
        'isocenterSecondaryEndAngleDeg',
        'isocenterDetectorRotationEndDeg',
        'utcOffset',
        'furtherItems',
      ].sort(),
    );
    expect(Object.keys(event ?? {}).sort()).toEqual(Object.keys(reportEventSchema.shape).sort());
  });
});
