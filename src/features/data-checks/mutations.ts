import { useMutation } from '@tanstack/react-query';
import {
  checkRecomputedSchema,
  checkRuleSchema,
  type CheckRule,
  type CheckSettingInput,
  type SettlementInput,
} from '../../../shared/contract/data-check';
import { procedureSchema, type Procedure } from '../../../shared/contract/procedure';
import { request } from '../../lib/api';
import { dataChecksKey } from './queries';

/** What a decision about a finding makes stale: the procedure, lists, statistics, the counts of open findings. */
const decided = [['procedures'], ['staff-exposure'], dataChecksKey] as const;

export const useSettleFindings = (procedureId: string) =>
  useMutation<Procedure, Error, SettlementInput>({
    mutationFn: (body) =>
      request(`/api/procedures/${procedureId}/check-settlements`, {
        method: 'POST',
        body,
        schema: procedureSchema,
      }),
    meta: { invalidates: decided },
  });

export const useTakeDecisionBack = (procedureId: string, settlementId: string) =>
  useMutation<Procedure, Error, { reason: string }>({
    mutationFn: (body) =>
      request(`/api/procedures/${procedureId}/check-settlements/${settlementId}/end`, {
        method: 'POST',
        body,
        schema: procedureSchema,
      }),
    meta: { invalidates: decided },
  });

export const useSetCheckRule = (code: string) =>
  useMutation<CheckRule, Error, CheckSettingInput>({
    mutationFn: (body) =>
      request(`/api/data-checks/${code}`, { method: 'PUT', body, schema: checkRuleSchema }),
    meta: { invalidates: [dataChecksKey] },
  });

export const useRecomputeFindings = (code: string) =>
  useMutation<{ procedures: number }, Error, void>({
    mutationFn: () =>
      request(`/api/data-checks/${code}/recompute`, { method: 'POST', schema: checkRecomputedSchema }),
    meta: { invalidates: [dataChecksKey, ['procedures']] },
  });
