import { codeItem } from './content-items';
import { sequenceElement, textElement, type DataElement, type DataSet } from './data-element';
import type { DoseReportContent } from './dose-report-content';
import { formatDecimal, splitDateTime } from './format-values';

/** X-Ray Radiation Dose SR Storage (PS3.4 annex B). */
export const RADIATION_DOSE_SR_CLASS_UID = '1.2.840.10008.5.1.4.1.1.88.67';

function present(tag: number, vr: DataElement['vr'], value: string | null | undefined): DataSet {
  return value ? [textElement(tag, vr, value)] : [];
}

function patientElements({ patient }: DoseReportContent): DataSet {
  return [
    textElement(0x00100010, 'PN', patient.name),
    textElement(0x00100020, 'LO', patient.id),
    textElement(0x00100030, 'DA', (patient.birthDate ?? '').replaceAll('-', '')),
    textElement(0x00100040, 'CS', patient.sex ?? ''),
    ...present(0x00101010, 'AS', patient.age),
    ...(patient.heightM ? [textElement(0x00101020, 'DS', formatDecimal(patient.heightM))] : []),
    ...(patient.weightKg ? [textElement(0x00101030, 'DS', formatDecimal(patient.weightKg))] : []),
  ];
}

function equipmentElements({ equipment, isEquipmentOnlyInTree }: DoseReportContent): DataSet {
  const shown = isEquipmentOnlyInTree ? null : equipment;
  return [
    // Manufacturer may be empty but not absent (PS3.3 C.7.5.2 asks for more; the fields below are then wanted too).
    textElement(0x00080070, 'LO', shown?.manufacturer ?? ''),
    ...present(0x00080080, 'LO', equipment.institutionName),
    ...present(0x00081010, 'SH', equipment.stationName),
    ...present(0x00081090, 'LO', shown?.modelName),
    ...present(0x00181000, 'LO', shown?.serialNumber),
    ...present(0x00181020, 'LO', equipment.softwareVersion),
    ...present(0x00081040, 'LO', equipment.departmentName),
  ];
}

/** Referenced Request Sequence and Procedure Code Sequence: the order and what was done, in the department's words. */
function orderElements({ requests = [], procedureCodes = [], studyInstanceUid }: DoseReportContent): DataSet {
  const items = requests.map(({ accessionNumber, requestedProcedureId, requestedProcedureDescription }) => [
    textElement(0x00080050, 'SH', accessionNumber),
    sequenceElement(0x00081110, []),
    textElement(0x0020000d, 'UI', studyInstanceUid),
    textElement(0x00321060, 'LO', requestedProcedureDescription),
    sequenceElement(0x00321064, []),
    textElement(0x00401001, 'SH', requestedProcedureId),
    textElement(0x00402016, 'LO', ''),
    textElement(0x00402017, 'LO', ''),
  ]);
  return [
    ...(procedureCodes.length > 0 ? [sequenceElement(0x00081032, procedureCodes.map(codeItem))] : []),
    ...(items.length > 0 ? [sequenceElement(0x0040a370, items)] : []),
  ];
}

/** Images that items refer to must be listed as evidence too (PS3.3 C.17.2). */
function evidenceElements({
  doseImages = [],
  events,
  studyInstanceUid,
  seriesInstanceUid,
}: DoseReportContent): DataSet {
  const images = [...doseImages, ...events.flatMap(({ acquiredImages = [] }) => acquiredImages)];
  if (images.length === 0) return [];
  const instances = images.map(({ sopClassUid, sopInstanceUid }) => [
    textElement(0x00081150, 'UI', sopClassUid),
    textElement(0x00081155, 'UI', sopInstanceUid),
  ]);
  const series = [
    textElement(0x0020000e, 'UI', `${seriesInstanceUid}.1`),
    sequenceElement(0x00081199, instances),
  ];
  const study = [textElement(0x0020000d, 'UI', studyInstanceUid), sequenceElement(0x00081115, [series])];
  return [sequenceElement(0x0040a375, [study])];
}

function predecessorElements(content: DoseReportContent): DataSet {
  const instances = (content.predecessors ?? []).map(({ sopClassUid, sopInstanceUid }) => [
    textElement(0x00081150, 'UI', sopClassUid),
    textElement(0x00081155, 'UI', sopInstanceUid),
  ]);
  if (instances.length === 0) return [];
  const series = [
    textElement(0x0020000e, 'UI', content.seriesInstanceUid),
    sequenceElement(0x00081199, instances),
  ];
  const study = [
    textElement(0x0020000d, 'UI', content.studyInstanceUid),
    sequenceElement(0x00081115, [series]),
  ];
  return [sequenceElement(0x0040a360, [study])];
}

/** The modules around the content tree (PS3.3 A.35.8): patient, study, series, equipment, SR document general. */
export function headerElements(content: DoseReportContent): DataSet {
  const study = splitDateTime(content.studyAt);
  const made = splitDateTime(content.contentAt);
  return [
    textElement(0x00080016, 'UI', content.sopClassUid ?? RADIATION_DOSE_SR_CLASS_UID),
    textElement(0x00080018, 'UI', content.sopInstanceUid),
    textElement(0x00080020, 'DA', study.date),
    textElement(0x00080030, 'TM', study.time),
    textElement(0x00080023, 'DA', made.date),
    textElement(0x00080033, 'TM', made.time),
    ...present(0x00080201, 'SH', content.timezoneOffset),
    textElement(0x00080050, 'SH', content.accessionNumber ?? ''),
    textElement(0x00080060, 'CS', 'SR'),
    textElement(0x00080090, 'PN', ''),
    ...present(0x00081030, 'LO', content.studyDescription),
    sequenceElement(0x00081111, []),
    ...patientElements(content),
    ...equipmentElements(content),
    textElement(0x0020000d, 'UI', content.studyInstanceUid),
    textElement(0x0020000e, 'UI', content.seriesInstanceUid),
    textElement(0x00200010, 'SH', content.studyId ?? ''),
    textElement(0x00200011, 'IS', String(content.seriesNumber ?? 990)),
    textElement(0x00200013, 'IS', String(content.instanceNumber ?? 1)),
    ...orderElements(content),
    ...predecessorElements(content),
    ...evidenceElements(content),
    sequenceElement(0x0040a372, []),
    textElement(0x0040a491, 'CS', content.completionFlag ?? 'COMPLETE'),
    textElement(0x0040a493, 'CS', 'UNVERIFIED'),
  ];
}
