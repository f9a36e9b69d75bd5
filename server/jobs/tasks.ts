import type { TaskList } from 'graphile-worker';
import type { Db } from '../db/db';
import type { Clock } from '../kernel/clock';
import { recomputeFindings } from '../data-checks/recompute-findings';
import { purgeRefused } from '../dose-reports/purge-refused';
import { settleReceived } from '../dose-reports/settle-received';
import type { Environment } from '../env';
import { recomputeSince } from '../procedures/recompute-since';
import type { Jobs } from './job.store';

type Handlers = { [Name in keyof Jobs]: (payload: Jobs[Name]) => Promise<unknown> };

/** Whatever is younger is probably being read by the request that brought it. */
const patienceMs = 120_000;

export type JobSettings = Pick<Environment, 'refusedKeepDays' | 'archiveUnpackedBytes'>;

/** What each kind of job does; every one may run twice and ends in the same state. */
export function listTasks(db: Db, settings: JobSettings, now: Clock): TaskList {
  const handlers: Handlers = {
    'recompute-machine': ({ hospitalId, equipmentId, day, reason }) =>
      recomputeSince(db, hospitalId, equipmentId, day, reason, now()),
    'recompute-findings': ({ hospitalId, ruleCode }) => recomputeFindings(db, hospitalId, ruleCode, now()),
    'purge-refused': () => purgeRefused(db, now(), settings.refusedKeepDays),
    'settle-received': () => {
      const until = new Date(now().getTime() - patienceMs);
      return settleReceived(db, now(), settings.archiveUnpackedBytes, until);
    },
  };
  return Object.fromEntries(
    Object.entries(handlers).map(([name, handle]) => [
      name,
      async (payload: unknown) => {
        await handle(payload as never);
      },
    ]),
  );
}
