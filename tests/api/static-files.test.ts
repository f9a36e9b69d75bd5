import { mkdtempSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import express from 'express';
import { pino } from 'pino';
import request from 'supertest';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { handleProblem } from '../../server/http/problem-handler';
import { logRequests } from '../../server/http/request-log';
import { serveClient } from '../../server/http/serve-client';

let folder: string;
const app = express();

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'leeward-client-'));
  mkdirSync(join(folder, 'assets'));
  writeFileSync(join(folder, 'index.html'), '<!doctype html><title>Leeward</title>');
  writeFileSync(join(folder, 'assets', 'page-abc.js'), 'export {}');
  app.use(logRequests(pino({ level: 'silent' })), serveClient(folder), handleProblem);
});
afterAll(() => rmSync(folder, { recursive: true }));

test('every place of the page gets the page; its hashed parts are kept for ever', async () => {
  const page = await request(app).get('/procedures/some-id').expect(200);
  expect([page.text, page.headers['cache-control']]).toEqual([
    expect.stringContaining('Leeward'),
    'no-cache',
  ]);
  const part = await request(app).get('/assets/page-abc.js').expect(200);
  expect(part.headers['cache-control']).toContain('immutable');
});

test('a part of an older build is missing, not an error of the server', async () => {
  const { status, body } = await request(app).get('/assets/page-old.js');
  expect([status, body.code]).toEqual([404, 'not-found']);
});
