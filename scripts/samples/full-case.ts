import { dcm } from '../../server/dicom-writer/content-items';
import type { DoseReportContent } from '../../server/dicom-writer/dose-report-content';
import { acquisitionEvent, caseContent, fluoroscopyEvent, sampleUid } from './case-content';

const sct = (value: string, meaning: string) => ({ value, scheme: 'SCT', meaning });
const XA_IMAGE = '1.2.840.10008.5.1.4.1.1.12.1';

const performer = {
  name: 'Larkmoor^Ines^^Dr',
  role: dcm('113851', 'Irradiation Administering'),
  id: 'IC-2',
  idIssuer: 'MCRH staff office',
  organization: 'Marrow Creek Regional Hospital',
  organizationRole: dcm('121081', 'Physician'),
};

/** Every row of TID 10001 and what it includes, as far as one room can state all of it. */
export function fullCase(sample: number): DoseReportContent {
  const base = caseContent(sample);
  const fluoroscopy = fluoroscopyEvent(sample, 0, {
    label: '7',
    labelType: dcm('113608', 'Acquisition Number'),
    comment: 'Table moved during exposure.',
    anatomy: sct('10200004', 'Liver'),
    laterality: sct('24028007', 'Right'),
    targetRegion: sct('113345001', 'Abdomen'),
    imageView: sct('399348003', 'antero-posterior'),
    imageViewModifiers: [sct('399160000', 'Axial'), sct('399161001', 'Tangential')],
    projectionName: sct('399358004', 'Caldwell'),
    patientEquivalentThicknessMm: 224,
    halfValueLayerMm: 5.1,
    contrastAgents: [sct('385420005', 'Contrast media'), 'Iodine 300 mg/ml'],
    persons: [performer],
    exposureIndex: 412,
    targetExposureIndex: 400,
    deviationIndex: 0.13,
    acquiredImages: [
      { sopClassUid: XA_IMAGE, sopInstanceUid: sampleUid(sample, 8, 1), frameNumbers: [1, 12] },
      { sopClassUid: XA_IMAGE, sopInstanceUid: sampleUid(sample, 8, 2) },
    ],
    pulseCountDerivation: sct('258083009', 'Visual estimation'),
    averageTubeCurrentMa: 57.9,
    exposureValuesMas: [32.6],
    anodeMaterial: sct('105874009', 'Tungsten or Tungsten compound'),
    fieldHeightMm: 203,
    fieldWidthMm: 203.2,
    grids: [dcm('111642', 'Focused grid'), dcm('111644', 'Parallel grid')],
    mechanicalConfiguration: dcm('113955', 'C-Arm Mount'),
    tableLongitudinalEndMm: 251,
    tableLateralEndMm: -8,
    tableHeightEndMm: 31,
    tableXToIsocenterMm: 12,
    tableYToIsocenterMm: -150.5,
    tableZToIsocenterMm: 480,
    tableXToIsocenterEndMm: 14,
    tableYToIsocenterEndMm: -150.5,
    tableZToIsocenterEndMm: 517,
    isocenterPrimaryAngleDeg: -12.5,
    isocenterSecondaryAngleDeg: 4.5,
    isocenterDetectorRotationDeg: 0.5,
  });
  return {
    ...base,
    language: { value: 'en', scheme: 'RFC5646', meaning: 'English' },
    country: { value: 'US', scheme: 'ISO3166_1', meaning: 'United States' },
    equipment: {
      ...base.equipment,
      departmentName: 'Interventional Radiology',
      location: 'Suite 1',
      roles: [dcm('113859', 'Irradiating Device'), dcm('121097', 'Recording')],
    },
    patient: { ...base.patient, age: '064Y' },
    personObservers: [
      {
        name: 'Harrowgate^Tomas',
        loginName: 'tharrowgate',
        organization: 'Marrow Creek Regional Hospital',
        organizationRole: dcm('121083', 'Technologist'),
        role: dcm('121097', 'Recording'),
        roleIdentifier: 'RT-31',
      },
    ],
    procedureCodes: [{ value: 'IR-HEPART', scheme: '99MCRH', meaning: 'Hepatic arteriography' }],
    requests: [
      {
        accessionNumber: base.accessionNumber ?? '',
        requestedProcedureId: 'RP-5512',
        requestedProcedureDescription: 'Hepatic arteriography',
      },
    ],
    planes: base.planes.map((plane) => ({
      ...plane,
      calibrations: [
        {
          calibratedAt: '2025-11-20T13:30:00',
          factor: 1.04,
          uncertaintyPercent: 4,
          responsibleParty: 'Physics, Marrow Creek',
          protocol: 'Report 190 protocol, in beam',
        },
      ],
    })),
    events: [fluoroscopy, acquisitionEvent(sample, 1, { persons: [performer] })],
    persons: [performer],
    doseImages: [{ sopClassUid: '1.2.840.10008.5.1.4.1.1.7', sopInstanceUid: sampleUid(sample, 8, 3) }],
    comment: 'Consent for 3 Gy discussed.',
  };
}
