import { Logger, parseCrontab, run, runMigrations, runOnce, type TaskList } from 'graphile-worker';
import type { Pool } from 'pg';
import type { Logger as AppLogger } from 'pino';

/** The queue's own log lines: payloads never pass through them. */
const loggerFor = (logger: AppLogger) =>
  new Logger(() => (level, message) => {
    if (level === 'error') logger.error({ part: 'jobs' }, message);
    if (level === 'warning') logger.warn({ part: 'jobs' }, message);
  });

/** Minute, hour, day, month, weekday (UTC), and the job. */
const timetable = `
*/5 * * * * settle-received
17 3 * * * purge-refused
`;

const silent = new Logger(() => () => {});

/** Makes or updates the queue's tables, which stand in a schema of their own. */
export const installJobs = (pgPool: Pool): Promise<void> => runMigrations({ pgPool, logger: silent });

/** Runs jobs until stopped. Several server processes share one queue; each job and each date is done once. */
export async function startJobs(
  pgPool: Pool,
  taskList: TaskList,
  logger: AppLogger,
): Promise<{ stop(): Promise<void> }> {
  const runner = await run({
    pgPool,
    taskList,
    concurrency: 1,
    noHandleSignals: true,
    logger: loggerFor(logger),
    parsedCronItems: parseCrontab(timetable),
  });
  return { stop: () => runner.stop() };
}

/** Does everything that waits, then returns: for tests. */
export const runWaitingJobs = (pgPool: Pool, taskList: TaskList): Promise<void> =>
  runOnce({ pgPool, taskList, logger: silent, noHandleSignals: true });
