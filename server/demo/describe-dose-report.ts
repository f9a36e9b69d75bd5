import type {
  DoseReportContent,
  WrittenEvent,
  WrittenPlaneTotals,
} from '../dicom-writer/dose-report-content';
import type { DemoEquipment, DemoIrradiationEvent, DemoProcedure } from './demo-types';
import { demoHospital } from './hospital';
import { localTimeAfter } from './local-time';
import { createRandom } from './random';
import { endOf, type ReportPart, sopInstanceUidOf } from './split-into-reports';

const referencePointOffsetMm = 150;

function describeEvent(event: DemoIrradiationEvent, procedure: DemoProcedure): WrittenEvent {
  const { offsetS, tubeCurrentMa, pulseWidthMs, irradiationEventUid, ...measured } = event;
  return {
    ...measured,
    irradiationEventUid,
    startedAt: localTimeAfter(procedure, offsetS),
    referencePointDefinition: 'isocenter-15-cm-toward-source',
    sourceToReferencePointMm: event.sourceToIsocenterMm - referencePointOffsetMm,
    fluoroMode: event.type === 'fluoroscopy' ? 'pulsed' : null,
    tubeCurrentValuesMa: [tubeCurrentMa],
    pulseWidthValuesMs: [pulseWidthMs],
    patientTableRelationship: 'headfirst',
    patientOrientationModifier: 'supine',
  };
}

const describePlane = (
  plane: DemoProcedure['planes'][number],
  machine: DemoEquipment,
): WrittenPlaneTotals => ({
  ...plane,
  referencePointDefinition: 'isocenter-15-cm-toward-source',
  sourceToReferencePointMm: machine.sourceToIsocenterMm - referencePointOffsetMm,
});

/** A machine's own UID as observer: the same in all of its reports. */
function deviceUid({ key }: DemoEquipment): string {
  const random = createRandom('device', key);
  return `2.25.${1 + Math.floor(random.uniform() * 2 ** 32)}${Math.floor(random.uniform() * 2 ** 32)}`;
}

/** One report of a generated procedure, ready to be written as a DICOM file. */
export function describeDoseReport(procedure: DemoProcedure, part: ReportPart): DoseReportContent {
  const { equipment, patient, studyInstanceUid } = procedure;
  return {
    sopInstanceUid: sopInstanceUidOf(procedure, part),
    studyInstanceUid,
    seriesInstanceUid: `${studyInstanceUid}.0.0`,
    seriesNumber: 990,
    instanceNumber: part.number,
    studyAt: localTimeAfter(procedure, -600),
    contentAt: localTimeAfter(procedure, endOf(part) + 60),
    accessionNumber: procedure.accessionNumber,
    studyId: String(procedure.number),
    studyDescription: procedure.studyDescription,
    patient,
    equipment: {
      manufacturer: equipment.manufacturer,
      modelName: equipment.modelName,
      serialNumber: equipment.serialNumber,
      stationName: equipment.stationName,
      institutionName: demoHospital.name,
      softwareVersion: '1.0',
      deviceUid: deviceUid(equipment),
    },
    acquisitionDeviceType: 'fluoroscopy-guided',
    planes: part.planes.map((plane) => describePlane(plane, equipment)),
    events: part.events.map((event) => describeEvent(event, procedure)),
  };
}
