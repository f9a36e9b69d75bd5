import type { z } from 'zod';
import type { personInputSchema } from '../../shared/contract/person';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { fieldProblem } from '../kernel/field-problem';
import { lockAdministrators } from './administrator.store';

/** Nobody gives up the own administrator role, and one administrator always remains. */
export async function guardAdministrators(
  tx: Db,
  actor: Actor,
  personId: string,
  input: Pick<z.output<typeof personInputSchema>, 'isActive' | 'email' | 'roles'>,
): Promise<void> {
  const administrators = await lockAdministrators(tx, actor.hospitalId);
  const staysAdministrator = input.isActive && input.email !== null && input.roles.includes('administrator');
  if (staysAdministrator || !administrators.includes(personId)) return;
  const pointer = !input.isActive ? '/isActive' : input.email === null ? '/email' : '/roles';
  if (administrators.length === 1)
    throw fieldProblem({
      pointer,
      detail: 'This is the last administrator. Make another one first.',
    });
  if (personId === actor.id)
    throw fieldProblem({
      pointer,
      detail: 'Nobody takes the administrator role from themselves. Ask another administrator.',
    });
}
