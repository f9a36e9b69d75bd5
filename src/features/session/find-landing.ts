import { can, type Action, type Actor } from '../../../shared/permissions';

type Landing = 'procedures' | 'staffExposure' | 'administration' | 'myExposure';

const landings: readonly { action: Action; landing: Landing }[] = [
  { action: 'procedure.list', landing: 'procedures' },
  { action: 'person.edit', landing: 'administration' },
];

/** Where a person's work is: procedures, the committee's figures, administration, else the own exposure. */
export function findLanding(user: Actor): Landing {
  const found = landings.find(({ action }) => can(user, action));
  if (found) return found.landing;
  return user.roles.includes('committee') ? 'staffExposure' : 'myExposure';
}
