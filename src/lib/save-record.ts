import { useMutation, type QueryKey } from '@tanstack/react-query';
import type { z } from 'zod';
import { request } from './api';

type SavingRecord<Schema extends z.ZodType> = {
  path: string;
  /** Null: a new one. */
  id: string | null;
  schema: Schema;
  invalidates: readonly QueryKey[];
};

/** Adds or edits one record of a register. */
export const useSaveRecord = <Schema extends z.ZodType>({
  path,
  id,
  schema,
  invalidates,
}: SavingRecord<Schema>) =>
  useMutation<z.output<Schema>, Error, object>({
    mutationFn: (body) =>
      id === null
        ? request(path, { method: 'POST', body, schema })
        : request(`${path}/${id}`, { method: 'PUT', body, schema }),
    meta: { invalidates },
  });
