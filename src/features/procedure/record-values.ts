import {
  dutyNames,
  positionPresetNames,
  recordSchema,
  type Place,
  type ProcedureRecord,
  type RecordInput,
  type SuggestedTeam,
} from '../../../shared/contract/record';
import type { Garment } from '../../../shared/contract/garment';
import { formatMetres } from '../../../shared/units';
import { nameGarment } from './garment-choices';
import { mirrorPresences, seatOperator, type PresenceInput } from './presence-values';
import type { RecordChoices } from './record-choices';

/** The stored record as form values. */
export const toRecordInput = ({
  state: _state,
  missing: _missing,
  fromFile: _fromFile,
  people: _people,
  ...fields
}: ProcedureRecord): RecordInput => ({ ...fields, reason: '' });

/** Where nobody is listed yet, the operators that are known already get their rows. */
export const openRecord = (record: ProcedureRecord, garments: readonly Garment[]): RecordInput => {
  const values = toRecordInput(record);
  return values.presences.length > 0 ? values : { ...values, presences: listOperators(values, garments) };
};

function listOperators(values: RecordInput, garments: readonly Garment[]): PresenceInput[] {
  const fields = [
    ['primary-operator', values.primaryOperatorId],
    ['second-operator', values.secondOperatorId],
    ['trainee', values.traineeId],
  ] as const;
  return fields.reduce<PresenceInput[]>(
    (rows, [duty, personId]) => seatOperator(rows, duty, personId, garments, values.accessSide),
    values.presences,
  );
}

export function readCurrentRecord(current: unknown): RecordInput | null {
  const parsed = recordSchema.safeParse(current);
  return parsed.success ? toRecordInput(parsed.data) : null;
}

/** The last team's people, places and garments; what the record says already stays. */
export function takeTeam(values: RecordInput, team: SuggestedTeam, choices: RecordChoices): RecordInput {
  const inService = new Set(
    choices.garments.filter(({ state }) => state === 'in-service').map(({ id }) => id),
  );
  const working = new Set(choices.people.filter(({ isActive }) => isActive).map(({ id }) => id));
  const rows = mirrorPresences(team.presences, values.accessSide)
    .filter((row) => row.personId === null || working.has(row.personId))
    .map((row): PresenceInput =>
      row.garmentId === null || inService.has(row.garmentId)
        ? { ...row, presentFromS: null, presentToS: null }
        : { ...row, garmentAnswer: 'unanswered', garmentId: null, presentFromS: null, presentToS: null },
    );
  const holder = (duty: PresenceInput['duty']) => rows.find((row) => row.duty === duty)?.personId ?? null;
  const filled = {
    ...values,
    procedureTypeId: values.procedureTypeId ?? team.procedureTypeId,
    primaryOperatorId: values.primaryOperatorId ?? holder('primary-operator'),
    secondOperatorId: values.secondOperatorId ?? holder('second-operator'),
    traineeId: values.traineeId ?? holder('trainee'),
    presences: rows,
  };
  return { ...filled, presences: listOperators(filled, choices.garments) };
}

const yesNo = (answer: boolean | null | undefined): string =>
  answer === null || answer === undefined ? 'not recorded' : answer ? 'yes' : 'no';

const writePlace = (place: Place | null): string => {
  if (place === null) return 'no place';
  return place.preset === null
    ? `(${formatMetres(place.xM)}, ${formatMetres(place.yM)}) m`
    : positionPresetNames[place.preset].toLowerCase();
};

/** The record in words, field by field: for the comparison of two versions. */
export const describeRecord =
  ({ people, types, garments }: RecordChoices) =>
  (values: RecordInput) => {
    const person = (id: string | null) => people.find((one) => one.id === id)?.name ?? 'none';
    const garment = (presence: PresenceInput): string => {
      if (presence.garmentAnswer !== 'worn') return `garment ${presence.garmentAnswer}`;
      const worn = garments.find((one) => one.id === presence.garmentId);
      return worn ? nameGarment(worn) : 'garment of the register';
    };
    const writePresence = (presence: PresenceInput): string =>
      [
        presence.visitorName ?? person(presence.personId),
        dutyNames[presence.duty].toLowerCase(),
        writePlace(presence.fluoroscopyPlace),
        presence.acquisitionPlace ? `acquisitions ${writePlace(presence.acquisitionPlace)}` : null,
        garment(presence),
        presence.hasThyroidCollar === true ? 'thyroid collar' : null,
        presence.hasGlasses ? 'glasses' : null,
        presence.hasCeilingScreen ? 'ceiling screen' : null,
        presence.hasTableSkirt ? 'table skirt' : null,
        presence.hasMobileScreen ? 'mobile screen' : null,
        presence.isTurnedAway ? 'turned away' : null,
        presence.isPresentDuringRotation ? 'stays during rotational runs' : null,
      ]
        .filter(Boolean)
        .join(', ');
    return [
      {
        name: 'Procedure type',
        value: types.find((one) => one.id === values.procedureTypeId)?.name ?? 'none',
      },
      { name: 'Operator', value: person(values.primaryOperatorId) },
      { name: 'Second operator', value: person(values.secondOperatorId) },
      { name: 'Trainee', value: person(values.traineeId) },
      { name: 'Access side', value: values.accessSide ?? 'not recorded' },
      { name: 'Feet first', value: yesNo(values.isFeetFirst) },
      { name: 'Prone', value: yesNo(values.isProne) },
      { name: 'Emergency', value: yesNo(values.isEmergency) },
      {
        name: 'Patient height',
        value: values.patientHeightM === null ? 'none' : `${values.patientHeightM} m`,
      },
      {
        name: 'Patient weight',
        value: values.patientWeightKg === null ? 'none' : `${values.patientWeightKg} kg`,
      },
      { name: 'Staff in the room', value: values.presences.map(writePresence).join('; ') || 'nobody' },
    ];
  };
