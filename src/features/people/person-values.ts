import {
  jobNames,
  jobs,
  personSchema,
  type Job,
  type Person,
  type PersonInput,
} from '../../../shared/contract/person';
import { roleNames, type Role } from '../../../shared/permissions';
import { formatMetres } from '../../../shared/units';

export const jobChoices = jobs.map((value: Job) => ({ value, label: jobNames[value] }));

/** What each role opens, for the person who gives it away. */
export const roleHints: Record<Role, string> = {
  technologist: 'Receives reports, completes records; sees patients’ identities.',
  physicist: 'Sees all procedures and everyone’s exposure; keeps machines, factors, types and garments.',
  interventionalist: 'Sees own procedures and own exposure only.',
  committee: 'Sees figures without names of patients or staff.',
  administrator: 'Keeps people, rooms, machines, types and garments; sees no procedures and no patients.',
};

export const listRoles = (roles: readonly Role[]): string => roles.map((role) => roleNames[role]).join(', ');

/** Where a person stands with signing in. */
export function describeSignIn({ email, hasPassword }: Pick<Person, 'email' | 'hasPassword'>): string {
  if (email === null) return 'none';
  return hasPassword ? 'can sign in' : 'invited, no password yet';
}

export const newPerson: PersonInput = {
  name: '',
  job: 'nurse',
  statureM: null,
  isMonitored: true,
  isActive: true,
  email: '',
  roles: [],
};

export const toPersonInput = ({ id: _id, hasPassword: _hasPassword, ...person }: Person): PersonInput =>
  person;

export function readCurrentPerson(current: unknown): PersonInput | null {
  const parsed = personSchema.safeParse(current);
  return parsed.success ? toPersonInput(parsed.data) : null;
}

const yesOrNo = (value: boolean) => (value ? 'yes' : 'no');

export const describePerson = (person: PersonInput) => [
  { name: 'Name', value: person.name },
  { name: 'Job', value: jobNames[person.job] },
  { name: 'Stature, m', value: formatMetres(person.statureM) },
  { name: 'Wears a dosimeter', value: yesOrNo(person.isMonitored) },
  { name: 'Works here', value: yesOrNo(person.isActive) },
  { name: 'E-mail', value: person.email || 'none' },
  { name: 'Roles', value: listRoles([...person.roles].sort()) || 'none' },
];
