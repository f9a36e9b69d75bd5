import {
  fewestUnnamedPeople,
  type ExposureFilter,
  type ExposurePoint,
  type ExposurePoints,
} from '../../shared/contract/staff-exposure';
import { estimateMethod, estimateMethodVersion } from '../../shared/dosimetry/estimate-staff-exposure';
import { can } from '../../shared/permissions';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { findPeriodStart } from './exposure-period';
import { countIncomplete, findPoints, type FoundPoint } from './exposure-points.store';
import { settleReach } from './settle-reach';

const nameAll = (values: string[], none: string): string => [...new Set(values)].sort().join(', ') || none;

/** The procedures as points. Unnamed: no link, case or moment, and nothing at all where few people stand behind them. */
export async function listExposurePoints(
  db: Db,
  actor: Actor,
  filter: ExposureFilter,
  now: Date,
): Promise<ExposurePoints> {
  const { personId, isMasked } = settleReach(actor, filter.person);
  const since = findPeriodStart(filter.period, now);
  const scope = { hospitalId: actor.hospitalId, personId, since };
  const found = await findPoints(db, filter, { ...scope, readerId: actor.id });
  const people = new Set(found.flatMap((point) => point.personId ?? []));
  const isWithheld = isMasked && found.length > 0 && people.size < fewestUnnamedPeople;
  const mayOpen = ({ isReaders }: FoundPoint) =>
    !isMasked && can(actor, 'procedure.read', { isOwn: isReaders });

  const items = found.flatMap((point): ExposurePoint[] => {
    const { nominal, low, high } = point;
    if (isWithheld || nominal === null || low === null || high === null) return [];
    return [
      {
        procedureId: mayOpen(point) ? point.procedureId : null,
        caseNumber: isMasked ? null : point.caseNumber,
        startedAt: isMasked ? null : point.startedAt,
        procedureType: point.procedureType,
        room: point.room,
        fluoroscopyTimeS: point.fluoroscopyTimeS,
        kvpMean: point.kvpMean,
        kermaAreaProductGyCm2: point.kermaAreaProductGyCm2,
        estimate: { nominal, low, high },
      },
    ];
  });
  return {
    items,
    withoutEstimate: found.filter((point) => point.nominal === null).length,
    incompleteRecords: await countIncomplete(db, filter, scope),
    isWithheld,
    method: nameAll(
      found.map((point) => point.method),
      estimateMethod,
    ),
    methodVersion: nameAll(
      found.map((point) => point.methodVersion),
      estimateMethodVersion,
    ),
  };
}
