import { queryOptions } from '@tanstack/react-query';
import { listOf } from '../../../shared/contract/common';
import { personChoiceSchema, personSchema } from '../../../shared/contract/person';
import { request } from '../../lib/api';

export const peopleKey = ['people'] as const;

export const personQueries = {
  /** With sign-ins and roles: for administrators. */
  list: () =>
    queryOptions({
      queryKey: [...peopleKey, 'all'],
      queryFn: async ({ signal }) =>
        (await request('/api/people', { schema: listOf(personSchema), signal })).items,
    }),
  /** Names and jobs: what a form needs to offer people. */
  choices: () =>
    queryOptions({
      queryKey: [...peopleKey, 'choices'],
      queryFn: async ({ signal }) =>
        (await request('/api/people/choices', { schema: listOf(personChoiceSchema), signal })).items,
    }),
};
