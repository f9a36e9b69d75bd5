import type { CheckRule as RuleContract } from '../../shared/contract/data-check';
import type { Db } from '../db/db';
import { findHospital } from '../hospital/hospital.store';
import { listPendingKeys } from '../jobs/job.store';
import { findLocalDay } from '../kernel/local-day';
import type { CheckRule } from './check-rule';
import { checkRules } from './check-rules';
import { listSettings } from './check-setting.store';
import { countOpenFindings } from './open-findings.store';
import { keyOfRecomputing } from './recompute-findings';

const standingOf = ({ severity, owner, low, high }: CheckRule) => ({ severity, owner, low, high });

/** Every rule with what holds today, what held before and what is open because of it. */
export async function listCheckRules(db: Db, hospitalId: string, now: Date): Promise<RuleContract[]> {
  const hospital = await findHospital(db, hospitalId);
  const today = findLocalDay(now, hospital.timeZone);
  const settings = await listSettings(db, hospitalId);
  const openCounts = await countOpenFindings(db, hospitalId);
  const pending = await listPendingKeys(
    db,
    checkRules.map(({ code }) => keyOfRecomputing(hospitalId, code)),
  );
  return checkRules.map((rule): RuleContract => {
    const { code, name, looksAt, remedy, source, unit } = rule;
    const own = settings
      .filter(({ ruleCode }) => ruleCode === code)
      .map(({ ruleCode: _, setAt, ...setting }) => ({ ...setting, setAt: setAt.toISOString() }));
    const { severity, owner, low, high } = own.find(({ validFrom }) => validFrom <= today) ?? rule;
    return {
      code,
      name,
      looksAt,
      remedy,
      source,
      unit,
      product: standingOf(rule),
      inForce: { severity, owner, low, high },
      settings: own,
      openCount: openCounts.get(code) ?? 0,
      isBeingRecomputed: pending.has(keyOfRecomputing(hospitalId, code)),
    };
  });
}
