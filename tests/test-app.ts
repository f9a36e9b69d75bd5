import type { Express } from 'express';
import { pino } from 'pino';
import request from 'supertest';
import type { DataSource } from 'typeorm';
import { createApp } from '../server/app';
import { createDataSource } from '../server/db/data-source';
import { poolOf } from '../server/db/pool';
import { readEnvironment } from '../server/env';
import { runWaitingJobs } from '../server/jobs/job-queue';
import { listTasks } from '../server/jobs/tasks';
import type { Clock } from '../server/kernel/clock';
import { createTestDatabase } from './test-db';

export type TestApp = {
  app: Express;
  dataSource: DataSource;
  url: string;
  /** Does what waits in the job queue, as the server would in its own time. */
  runJobs(): Promise<void>;
  close(): Promise<void>;
};

/** The real application on a database of its own. */
export async function startTestApp(now: Clock = () => new Date()): Promise<TestApp> {
  const database = await createTestDatabase();
  const dataSource = await createDataSource(database.url).initialize();
  const env = readEnvironment({ LOG_LEVEL: 'silent' });
  const app = createApp({
    dataSource,
    env,
    logger: pino({ level: 'silent' }),
    now,
    sessionSecret: 'only for tests',
    isHttps: false,
    version: 'test',
    clientFolder: null,
  });
  return {
    app,
    dataSource,
    url: database.url,
    runJobs: () => runWaitingJobs(poolOf(dataSource), listTasks(dataSource.manager, env, now)),
    close: async () => {
      await dataSource.destroy();
      await database.drop();
    },
  };
}

export type Agent = ReturnType<typeof request.agent>;

/** A client with its own cookies, signed in. */
export async function signIn(app: Express, email: string, password: string): Promise<Agent> {
  const agent = request.agent(app);
  await agent.post('/api/session').send({ email, password }).expect(200);
  return agent;
}
