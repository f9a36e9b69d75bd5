import {
  exposedPeopleSchema,
  exposureFilterSchema,
  exposureMonthsFilterSchema,
  exposureMonthsSchema,
  exposurePointsSchema,
} from '../../shared/contract/staff-exposure';
import { route, type Route } from '../http/route';
import { listExposureMonths, listOpenPeople } from './list-exposure-months';
import { listExposurePoints } from './list-exposure-points';

export const exposureRoutes: Route[] = [
  route({
    method: 'get',
    path: '/staff-exposure/procedures',
    permission: 'staff-exposure.read',
    summary:
      'Procedures as points of fluoroscopy time, kVp and the estimate for a duty: all, unnamed, or own',
    query: exposureFilterSchema,
    response: exposurePointsSchema,
    handle: ({ deps, actor, query }) => listExposurePoints(deps.db, actor, query, deps.now()),
  }),
  route({
    method: 'get',
    path: '/staff-exposure/months',
    permission: 'staff-exposure.read',
    summary: 'A person’s estimates by whole months; without a person: own, or everybody together',
    query: exposureMonthsFilterSchema,
    response: exposureMonthsSchema,
    handle: ({ deps, actor, query }) => listExposureMonths(deps.db, actor, query, deps.now()),
  }),
  route({
    method: 'get',
    path: '/staff-exposure/people',
    permission: 'staff-exposure.read',
    summary: 'Whose months the person may open',
    response: exposedPeopleSchema,
    handle: async ({ deps, actor }) => ({ items: await listOpenPeople(deps.db, actor) }),
  }),
];
