import { can, type Action, type Actor } from '../../shared/permissions';
import { paths } from '../paths';

type AdminPlace = { path: string; name: string; action: Action };

const adminPlaces: readonly AdminPlace[] = [
  { path: paths.people, name: 'People', action: 'person.edit' },
  { path: paths.rooms, name: 'Rooms', action: 'room.edit' },
  { path: paths.equipment, name: 'Equipment', action: 'equipment.edit' },
  { path: paths.procedureTypes, name: 'Procedure types', action: 'procedure-type.edit' },
  { path: paths.dataChecks, name: 'Data checks', action: 'data-check.list' },
];

/** The registers that a person may edit, in order. */
export const findAdminPlaces = (user: Actor): AdminPlace[] =>
  adminPlaces.filter(({ action }) => can(user, action));
