import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { AxeBuilder } from '@axe-core/playwright';
import { pino } from 'pino';
import { chromium, type Browser, type BrowserContextOptions, type Page } from 'playwright-core';
import type { DataSource } from 'typeorm';
import { buildClient } from '../../scripts/build-client';
import { chromiumFlags, chromiumPath } from '../../scripts/chromium';
import { createApp } from '../../server/app';
import { createDataSource } from '../../server/db/data-source';
import { readEnvironment } from '../../server/env';
import { systemClock } from '../../server/kernel/clock';
import { testPassword } from '../factories';
import { createTestDatabase } from '../test-db';

/** The built page on a real server and database, in a real browser. */
export type Journey = {
  url: string;
  dataSource: DataSource;
  /** A fresh browser profile, signed in through the page when an e-mail is given. */
  open(email?: string, options?: BrowserContextOptions): Promise<Page>;
  /** Errors of the console and requests to other hosts, over all pages opened. */
  complaints: string[];
  /** Closes every profile opened so far: what no test looks at any more need not be drawn. */
  closePages(): Promise<void>;
  close(): Promise<void>;
};

/** Answers that the journeys themselves provoke. */
const isExpected = (text: string) =>
  /status of (401|403|404|409|422)|Your role does not open this|There is nothing here/.test(text);

function watch(page: Page, url: string, complaints: string[]): void {
  page.on('console', (message) => {
    if (message.type() === 'error' && !isExpected(message.text())) complaints.push(message.text());
  });
  page.on('pageerror', (error) => complaints.push(String(error)));
  page.on('request', (request) => {
    if (!request.url().startsWith(url) && !/^(data|blob):/.test(request.url()))
      complaints.push(`to ${request.url()}`);
  });
}

export async function startJourney(): Promise<Journey> {
  const clientFolder = await buildClient(() => undefined);
  const database = await createTestDatabase();
  const dataSource = await createDataSource(database.url).initialize();
  const app = createApp({
    dataSource,
    env: readEnvironment({ LOG_LEVEL: 'silent' }),
    logger: pino({ level: 'silent' }),
    now: systemClock,
    sessionSecret: 'only for tests',
    isHttps: false,
    version: 'test',
    clientFolder,
  });
  const server: Server = createServer(app);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  const browser: Browser = await chromium.launch({ executablePath: chromiumPath, args: chromiumFlags });
  const complaints: string[] = [];
  return {
    url,
    dataSource,
    complaints,
    async open(email, options = {}) {
      const context = await browser.newContext({
        baseURL: url,
        viewport: { width: 1440, height: 900 },
        ...options,
      });
      const page = await context.newPage();
      watch(page, url, complaints);
      if (email) await signInOnPage(page, email);
      return page;
    },
    async closePages() {
      for (const context of browser.contexts()) await context.close();
    },
    async close() {
      await browser.close();
      await new Promise((resolve) => server.close(resolve));
      await dataSource.destroy();
      await database.drop();
    },
  };
}

async function signInOnPage(page: Page, email: string): Promise<void> {
  await page.goto('/');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(testPassword);
  await page.keyboard.press('Enter');
  // Only the frame behind the sign-in has a navigation.
  await page.getByRole('navigation').first().waitFor();
}

/** What axe calls serious or critical on a page as it stands. */
export async function findBarriers(page: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  return violations
    .filter(({ impact }) => impact === 'serious' || impact === 'critical')
    .map(({ id, nodes }) => `${id}: ${nodes[0]?.html ?? ''}`);
}

/** How far the page is wider than its window, in pixels. */
export const findOverflow = (page: Page): Promise<number> =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
