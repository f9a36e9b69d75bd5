import {
  fewestUnnamedPeople,
  type ExposureMonth,
  type ExposureMonths,
  type ExposureMonthsFilter,
} from '../../shared/contract/staff-exposure';
import type { Db } from '../db/db';
import { findHospital } from '../hospital/hospital.store';
import type { Actor } from '../kernel/actor';
import { findLocalDay } from '../kernel/local-day';
import { Problem } from '../kernel/problem';
import { findFirstMonthDay, listMonths } from './exposure-period';
import { findPersonName, listExposedPeople, sumMonths, type SummedMonth } from './exposure.store';
import { settleReach } from './settle-reach';

const nothing = {
  collarHp10USv: null,
  eyeHp3USv: null,
  underGarmentHp10USv: null,
  effectiveDoseUSv: null,
};

function toMonth(month: string, summed: SummedMonth | undefined, isWithheld: boolean): ExposureMonth {
  if (!summed) return { month, procedures: 0, withoutEstimate: 0, ...nothing };
  const { people: _, ...shown } = summed;
  return isWithheld ? { ...shown, ...nothing } : shown;
}

/** One person's estimates, or everybody's, by whole months without gaps; months without procedures stay empty, not 0. */
export async function listExposureMonths(
  db: Db,
  actor: Actor,
  filter: ExposureMonthsFilter,
  now: Date,
): Promise<ExposureMonths> {
  const { personId, isMasked } = settleReach(actor, filter.person);
  const person = personId === null ? null : await findPersonName(db, actor.hospitalId, personId);
  if (personId !== null && !person) throw new Problem('not-found');
  const { timeZone } = await findHospital(db, actor.hospitalId);
  const fromDay = findFirstMonthDay(filter.period, now, timeZone);
  const summed = await sumMonths(db, actor.hospitalId, { personId, fromDay });
  const byMonth = new Map(summed.map((month) => [month.month, month]));
  const isWithheld = ({ people }: SummedMonth) => isMasked && people < fewestUnnamedPeople;
  const first = fromDay?.slice(0, 7) ?? summed[0]?.month;
  const last = findLocalDay(now, timeZone).slice(0, 7);
  return {
    person,
    isWithheld: summed.some(isWithheld),
    items: (first ? listMonths(first, last) : []).map((month) => {
      const found = byMonth.get(month);
      return toMonth(month, found, found !== undefined && isWithheld(found));
    }),
  };
}

/** Whose months the reader may open; nobody's where people are not named. */
export async function listOpenPeople(db: Db, actor: Actor) {
  const { personId, isMasked } = settleReach(actor, undefined);
  return isMasked ? [] : listExposedPeople(db, actor.hospitalId, personId);
}
