import type { Report } from '../../shared/contract/report';
import { createTextReader } from './character-set';
import { formatUtcOffset, joinDateAndTime, parseDate } from './date-time';
import { parseDecimal } from '../../shared/decimal';
import { readHeaderCodes, readRequests } from './read-requests';
import { asciiOf, firstItemOf, itemsOf, readText, type DicomDataSet } from './read-dicom';
import type { Reported } from './read-quantity';
import type { WarningCollector } from './warning-collector';

export type Header = Pick<
  Report,
  | 'sopInstanceUid'
  | 'sopClassUid'
  | 'studyInstanceUid'
  | 'seriesInstanceUid'
  | 'accessionNumber'
  | 'studyDescription'
  | 'studyId'
  | 'studyAt'
  | 'contentAt'
  | 'instanceNumber'
  | 'completionFlag'
  | 'verificationFlag'
  | 'templateId'
  | 'requests'
  | 'procedureCodes'
  | 'predecessors'
  | 'patient'
  | 'equipment'
> & { utcOffset: string | null };

/** PS3.5 section 9.1: at most 64 characters, digits and dots. */
const uid = /^[0-9.]{1,64}$/;

function readPatientSize(
  dataSet: DicomDataSet,
  tag: string,
  field: string,
  unit: string,
  reported: Reported,
  warnings: WarningCollector,
): number | null {
  const text = asciiOf(dataSet, tag);
  if (text === null) return null;
  reported[field] = { text: [text.trim()], unit };
  const value = parseDecimal(text);
  if (value === null) warnings.add('number-unreadable', `${field} ${JSON.stringify(text.slice(0, 40))}`);
  // Zero is how a console leaves the field empty; nobody weighs nothing.
  return value === 0 ? null : value;
}

/** Identity, equipment and dates, which stand around the content tree (PS3.3 A.35.8), not in it. */
export function parseHeader(dataSet: DicomDataSet, warnings: WarningCollector): Header {
  const reader = createTextReader(asciiOf(dataSet, 'x00080005'), warnings.add);
  const text = (tag: string) => readText(dataSet, tag, reader)?.trim() || null;
  const ascii = (tag: string) => asciiOf(dataSet, tag)?.trim() || null;
  const identifier = (tag: string, field: string) => {
    const value = ascii(tag);
    if (value !== null && !uid.test(value)) warnings.add('uid-invalid', field);
    return value;
  };
  const utcOffset = formatUtcOffset(ascii('x00080201'));
  const dateTime = (dateTag: string, timeTag: string, field: string) => {
    const date = ascii(dateTag);
    const joined = joinDateAndTime(date, ascii(timeTag), utcOffset);
    if (date !== null && !joined) warnings.add('date-time-unreadable', field);
    return joined?.text ?? null;
  };
  const birthDate = ascii('x00100030');
  if (birthDate !== null && parseDate(birthDate) === null)
    warnings.add('date-time-unreadable', 'patient.birthDate');
  const reported: Reported = {};
  return {
    sopInstanceUid: identifier('x00080018', 'sopInstanceUid'),
    sopClassUid: identifier('x00080016', 'sopClassUid'),
    studyInstanceUid: identifier('x0020000d', 'studyInstanceUid'),
    seriesInstanceUid: identifier('x0020000e', 'seriesInstanceUid'),
    accessionNumber: text('x00080050'),
    studyDescription: text('x00081030'),
    studyId: text('x00200010'),
    studyAt: dateTime('x00080020', 'x00080030', 'studyAt'),
    contentAt: dateTime('x00080023', 'x00080033', 'contentAt'),
    instanceNumber: ascii('x00200013'),
    completionFlag: ascii('x0040a491'),
    verificationFlag: ascii('x0040a493'),
    templateId: readTemplateId(dataSet),
    requests: readRequests(dataSet, reader),
    procedureCodes: [
      ...readHeaderCodes(dataSet, 'x00081032', reader),
      ...readHeaderCodes(dataSet, 'x0040a372', reader),
    ],
    predecessors: readPredecessors(dataSet),
    patient: {
      name: text('x00100010'),
      id: text('x00100020'),
      birthDate: parseDate(birthDate),
      sex: ascii('x00100040'),
      heightM: readPatientSize(dataSet, 'x00101020', 'heightM', 'm', reported, warnings),
      weightKg: readPatientSize(dataSet, 'x00101030', 'weightKg', 'kg', reported, warnings),
      age: ascii('x00101010'),
      position: ascii('x00185100'),
      reported,
    },
    equipment: {
      manufacturer: text('x00080070'),
      modelName: text('x00081090'),
      serialNumber: text('x00181000'),
      stationName: text('x00081010'),
      institutionName: text('x00080080'),
      softwareVersions: text('x00181020'),
      deviceUid: ascii('x00181002'),
      departmentName: text('x00081040'),
    },
    utcOffset,
  };
}

/** Predecessor Documents Sequence: study > series > instance. */
function readPredecessors(dataSet: DicomDataSet): Header['predecessors'] {
  const studies = itemsOf(dataSet, 'x0040a360');
  const series = studies.flatMap((study) => itemsOf(study, 'x00081115'));
  return series.flatMap((one) =>
    itemsOf(one, 'x00081199').map((instance) => ({
      sopClassUid: asciiOf(instance, 'x00081150'),
      sopInstanceUid: asciiOf(instance, 'x00081155'),
    })),
  );
}

/** Template Identifier (0040,DB00) of the root, where it is given. */
export function readTemplateId(dataSet: DicomDataSet): string | null {
  const template = firstItemOf(dataSet, 'x0040a504');
  return template ? asciiOf(template, 'x0040db00') : null;
}
