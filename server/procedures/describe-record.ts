import type { MissingPart } from '../../shared/contract/procedure-row';
import type { Presence as PresenceContract, ProcedureRecord } from '../../shared/contract/record';
import type { Db } from '../db/db';
import { listChoices } from '../people/person.store';
import { listPresences } from './presence.store';
import type { Presence } from './presence.entity';
import type { Procedure } from './procedure.entity';

type Answers = Pick<Procedure, 'procedureTypeId' | 'primaryOperatorId'>;

/** What a record still lacks before staff exposure can be estimated. */
export function findMissing(
  answers: Answers,
  presences: Pick<PresenceContract, 'fluoroscopyPlace' | 'garmentAnswer'>[],
): MissingPart[] {
  const lacks: [MissingPart, boolean][] = [
    ['procedure-type', answers.procedureTypeId === null],
    ['operator', answers.primaryOperatorId === null],
    ['person', presences.length === 0],
    ['place', presences.some((presence) => presence.fluoroscopyPlace === null)],
    ['garment', presences.some((presence) => presence.garmentAnswer === 'unanswered')],
  ];
  return lacks.flatMap(([part, isLacking]) => (isLacking ? [part] : []));
}

export function toPresenceContract(row: Presence): PresenceContract {
  const { id: _, procedureId: __, revision: ___, position: ____, ...presence } = row;
  return presence;
}

/** The record as the form shows it, with the names of the people in it. */
export async function describeRecord(db: Db, procedure: Procedure): Promise<ProcedureRecord> {
  const presences = await listPresences(db, procedure.id, procedure.recordRevision);
  const named = new Set([
    procedure.primaryOperatorId,
    procedure.secondOperatorId,
    procedure.traineeId,
    ...presences.map((presence) => presence.personId),
  ]);
  const people = await listChoices(db, procedure.hospitalId);
  return {
    procedureTypeId: procedure.procedureTypeId,
    primaryOperatorId: procedure.primaryOperatorId,
    secondOperatorId: procedure.secondOperatorId,
    traineeId: procedure.traineeId,
    accessSide: procedure.accessSide,
    isFeetFirst: procedure.isFeetFirst,
    isProne: procedure.isProne,
    isEmergency: procedure.isEmergency,
    patientHeightM: procedure.patientHeightM,
    patientWeightKg: procedure.patientWeightKg,
    presences: presences.map(toPresenceContract),
    version: procedure.version,
    state: procedure.recordState,
    missing: procedure.missing,
    fromFile: procedure.fromFile,
    people: people.filter(({ id }) => named.has(id)).map(({ id, name }) => ({ id, name })),
  };
}
