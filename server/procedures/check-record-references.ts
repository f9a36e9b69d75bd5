import type { z } from 'zod';
import type { recordInputSchema } from '../../shared/contract/record';
import type { Db } from '../db/db';
import { listGarments } from '../garments/garment.store';
import { Problem } from '../kernel/problem';
import { listChoices } from '../people/person.store';
import { listProcedureTypes } from '../procedure-types/procedure-type.store';

/** People, garments and type of a record must be of this hospital; a withdrawn garment cannot be chosen. All is told at once. */
export async function checkRecordReferences(
  db: Db,
  hospitalId: string,
  input: z.output<typeof recordInputSchema>,
): Promise<void> {
  const people = new Set((await listChoices(db, hospitalId)).map(({ id }) => id));
  const garments = new Map(
    (await listGarments(db, hospitalId, null)).map((garment) => [garment.id, garment]),
  );
  const types = new Set((await listProcedureTypes(db, hospitalId)).map(({ id }) => id));
  const issues: { pointer: string; detail: string }[] = [];
  const expect = (isRight: boolean, pointer: string, detail: string) => {
    if (!isRight) issues.push({ pointer, detail });
  };
  const isPerson = (id: string | null) => id === null || people.has(id);
  expect(
    input.procedureTypeId === null || types.has(input.procedureTypeId),
    '/procedureTypeId',
    'Choose a type of the list.',
  );
  for (const field of ['primaryOperatorId', 'secondOperatorId', 'traineeId'] as const)
    expect(isPerson(input[field]), `/${field}`, 'Choose a person of the register.');
  input.presences.forEach((presence, index) => {
    const garment = presence.garmentId === null ? null : garments.get(presence.garmentId);
    expect(isPerson(presence.personId), `/presences/${index}/personId`, 'Choose a person of the register.');
    expect(garment !== undefined, `/presences/${index}/garmentId`, 'Choose a garment of the register.');
    expect(
      garment?.state === undefined || garment.state === 'in-service',
      `/presences/${index}/garmentId`,
      `${garment?.code} is ${garment?.state}: choose what was worn instead, or "not known".`,
    );
  });
  const seen = input.presences.flatMap((presence) => presence.personId ?? []);
  expect(new Set(seen).size === seen.length, '/presences', 'Somebody is listed twice.');
  if (issues.length > 0)
    throw new Problem('invalid-input', 'Correct what is marked and save again; nothing was changed.', {
      issues,
    });
}
