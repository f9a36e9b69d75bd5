import { scopeOf, type Actor } from '../../shared/permissions';
import { paths } from '../paths';

type Place = { path: string; name: string; isOffered: (user: Actor) => boolean };

const reachesOthers = (user: Actor, action: Parameters<typeof scopeOf>[1]): boolean =>
  !['own', null].includes(scopeOf(user, action));

/** The places of the navigation, in order, each with who is offered it. */
const places: readonly Place[] = [
  {
    path: paths.procedures,
    name: 'Procedures',
    isOffered: (user) => scopeOf(user, 'procedure.list') !== null,
  },
  {
    path: paths.doseReports,
    name: 'Dose reports',
    isOffered: (user) => scopeOf(user, 'dose-report.list') !== null,
  },
  {
    path: paths.staffExposure,
    name: 'Staff exposure',
    isOffered: (user) => reachesOthers(user, 'staff-exposure.read'),
  },
  {
    path: paths.myExposure,
    name: 'My exposure',
    isOffered: (user) => scopeOf(user, 'staff-exposure.read') !== null,
  },
  { path: paths.garments, name: 'Garments', isOffered: (user) => scopeOf(user, 'garment.list') !== null },
  { path: paths.methods, name: 'Methods', isOffered: (user) => scopeOf(user, 'methods.read') !== null },
  {
    path: paths.administration,
    name: 'Administration',
    isOffered: (user) => user.roles.some((role) => role === 'administrator' || role === 'physicist'),
  },
];

export const findPlaces = (user: Actor): Place[] => places.filter((place) => place.isOffered(user));
