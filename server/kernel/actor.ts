import type { Role } from '../../shared/permissions';

/** The signed-in person, as every guard and use case sees them. */
export type Actor = {
  id: string;
  hospitalId: string;
  name: string;
  email: string;
  job: string;
  roles: Role[];
};
