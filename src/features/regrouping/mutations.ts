import { useMutation } from '@tanstack/react-query';
import {
  regroupedSchema,
  type MergeInput,
  type MoveInput,
  type Regrouped,
  type SplitInput,
  type TakeBackInput,
} from '../../../shared/contract/regrouping';
import { request } from '../../lib/api';

const meta = { invalidates: [['procedures'], ['staff-exposure'], ['dose-reports']] };

/** A merge, split or move with the procedure that the reports leave. */
export type RegroupDeed = { sourceId: string } & (
  | { kind: 'merge'; body: MergeInput }
  | { kind: 'split'; body: SplitInput }
  | { kind: 'move'; body: MoveInput }
);

export const useRegroup = () =>
  useMutation<Regrouped, Error, RegroupDeed>({
    mutationFn: ({ sourceId, kind, body }) =>
      request(`/api/procedures/${sourceId}/${kind}`, { method: 'POST', body, schema: regroupedSchema }),
    meta,
  });

/** `onDone` is called even when what was taken back has left the page meanwhile. */
export const useTakeBack = (regroupingId: string, onDone: (taken: Regrouped) => void) =>
  useMutation<Regrouped, Error, TakeBackInput>({
    mutationFn: (body) =>
      request(`/api/regroupings/${regroupingId}/undo`, { method: 'POST', body, schema: regroupedSchema }),
    onSuccess: onDone,
    meta,
  });
