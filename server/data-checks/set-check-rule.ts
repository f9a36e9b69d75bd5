import type { z } from 'zod';
import type { CheckRule as RuleContract, checkSettingInputSchema } from '../../shared/contract/data-check';
import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import { findHospital } from '../hospital/hospital.store';
import type { Actor } from '../kernel/actor';
import { fieldProblem } from '../kernel/field-problem';
import { findLocalDay } from '../kernel/local-day';
import { newId } from '../kernel/new-id';
import { Problem } from '../kernel/problem';
import type { Bounds } from './check-rule';
import { findRule } from './check-rules';
import { addSetting, listSettings, lockSettings } from './check-setting.store';
import { listCheckRules } from './list-check-rules';

/** A bound stands where the rule has one, and nowhere else. */
function issuesOfBounds(rule: Bounds, given: Bounds): { pointer: string; detail: string }[] {
  const issues = (['low', 'high'] as const).flatMap((side) => {
    if (rule[side] === null && given[side] !== null)
      return [{ pointer: `/${side}`, detail: 'This rule has no such bound.' }];
    return rule[side] !== null && given[side] === null
      ? [{ pointer: `/${side}`, detail: 'Type a number; to switch the rule off, choose so.' }]
      : [];
  });
  const isTurned = given.low !== null && given.high !== null && given.low >= given.high;
  return isTurned
    ? [...issues, { pointer: '/high', detail: 'The upper bound lies above the lower one.' }]
    : issues;
}

/** Sets a rule from a day on. Settings are appended; procedures follow when they are next computed. */
export const setCheckRule = (
  db: Db,
  actor: Actor,
  ruleCode: string,
  { basedOn, ...input }: z.output<typeof checkSettingInputSchema>,
  now: Date,
): Promise<RuleContract> =>
  db.transaction(async (tx) => {
    const { hospitalId } = actor;
    const rule = findRule(ruleCode);
    if (!rule) throw new Problem('not-found');
    await lockSettings(tx, hospitalId);
    const hospital = await findHospital(tx, hospitalId);
    const issues = issuesOfBounds(rule, input);
    if (input.validFrom < findLocalDay(now, hospital.timeZone))
      issues.push({
        pointer: '/validFrom',
        detail: 'Today or later: what was computed before stays as it was.',
      });
    if (issues.length > 0) throw fieldProblem(...issues);
    const newest = (await listSettings(tx, hospitalId)).find((setting) => setting.ruleCode === ruleCode);
    if ((newest?.id ?? null) !== basedOn)
      throw new Problem('conflict', 'Somebody set this rule after you opened it. Compare, then save again.', {
        current: newest,
      });
    const id = newId();
    await addSetting(tx, { ...input, id, hospitalId, ruleCode, setById: actor.id });
    await noteAudit(tx, {
      hospitalId,
      actorId: actor.id,
      action: 'set',
      subject: 'data check',
      subjectId: id,
      before: newest ?? {
        ruleCode,
        severity: rule.severity,
        owner: rule.owner,
        low: rule.low,
        high: rule.high,
      },
      after: { ruleCode, ...input },
      reason: input.reason,
    });
    const saved = (await listCheckRules(tx, hospitalId, now)).find(({ code }) => code === ruleCode);
    if (!saved) throw new Problem('not-found');
    return saved;
  });
