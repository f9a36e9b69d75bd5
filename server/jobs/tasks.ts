import type { TaskList } from 'graphile-worker';
import type { Db } from '../db/db';
import type { Clock } from '../kernel/clock';
import { recomputeSince } from '../procedures/recompute-since';
import type { Jobs } from './job.store';

type Handlers = { [Name in keyof Jobs]?: (payload: Jobs[Name]) => Promise<unknown> };

/** What each kind of job does; every one may run twice and ends in the same state. */
export function listTasks(db: Db, now: Clock): TaskList {
  const handlers: Handlers = {
    'recompute-machine': ({ hospitalId, equipmentId, day, reason }) =>
      recomputeSince(db, hospitalId, equipmentId, day, reason, now()),
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
