import type { Report } from '../../shared/contract/report';
import type { Db } from '../db/db';
import { listChoices } from '../people/person.store';
import type { Procedure } from '../procedures/procedure.entity';
import { listProcedureTypes } from '../procedure-types/procedure-type.store';

type Prefilled = Pick<
  Procedure,
  | 'procedureTypeId'
  | 'primaryOperatorId'
  | 'patientHeightM'
  | 'patientWeightKg'
  | 'isFeetFirst'
  | 'isProne'
  | 'fromFile'
  | 'missing'
>;

const physicianJobs = /physician|radiologist|cardiologist|electrophysiologist|interventionalist/;
const feetFirst = new Set(['F-10480', '102541007']);
const headFirst = new Set(['F-10470', '102540008']);
const prone = new Set(['F-10310', '1240000']);
const supine = new Set(['F-10340', '40199007']);

/** A yes or no that some event answers by code and none contradicts. */
function answer(codes: (string | undefined)[], yes: Set<string>, no: Set<string>): boolean | null {
  const [hasYes, hasNo] = [
    codes.some((code) => code && yes.has(code)),
    codes.some((code) => code && no.has(code)),
  ];
  return hasYes === hasNo ? null : hasYes;
}

/** As much of a report as the record can be prefilled from. */
export type PrefillSource = Pick<Report, 'studyDescription' | 'persons'> & {
  patient: Pick<Report['patient'], 'heightM' | 'weightKg'>;
  events: {
    protocol: string | null;
    patientTableRelationship: { value: string } | null;
    patientOrientationModifier: { value: string } | null;
  }[];
};

/** What a report already says of the record: nothing of it is asked again, all of it may be overruled. */
export async function prefillRecord(db: Db, hospitalId: string, report: PrefillSource): Promise<Prefilled> {
  const described = [report.studyDescription, ...report.events.map((event) => event.protocol)]
    .filter((text) => text !== null)
    .join('\n')
    .toLowerCase();
  const types = await listProcedureTypes(db, hospitalId);
  const matching = types.filter(
    (type) => type.isActive && type.recognisedBy.some((words) => described.includes(words.toLowerCase())),
  );
  const people = await listChoices(db, hospitalId);
  const names = new Set(report.persons.flatMap((person) => person.name?.toLowerCase() ?? []));
  const operators = people.filter(
    (person) => names.has(person.name.toLowerCase()) && physicianJobs.test(person.job),
  );
  const found = {
    procedureTypeId: matching.length === 1 ? (matching[0]?.id ?? null) : null,
    primaryOperatorId: operators.length === 1 ? (operators[0]?.id ?? null) : null,
    patientHeightM: report.patient.heightM,
    patientWeightKg: report.patient.weightKg,
    isFeetFirst: answer(
      report.events.map((event) => event.patientTableRelationship?.value),
      feetFirst,
      headFirst,
    ),
    isProne: answer(
      report.events.map((event) => event.patientOrientationModifier?.value),
      prone,
      supine,
    ),
  };
  const fromFile = Object.entries(found).flatMap(([field, value]) => (value === null ? [] : [field]));
  const missing: Prefilled['missing'] = [
    ...(found.procedureTypeId ? [] : (['procedure-type'] as const)),
    ...(found.primaryOperatorId ? [] : (['operator'] as const)),
    'person',
  ];
  return { ...found, fromFile, missing };
}
