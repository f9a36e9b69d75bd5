import { afterAll, beforeAll, expect, test } from 'vitest';
import { Procedure } from '../../server/procedures/procedure.entity';
import { makeProcedure } from '../estimate-factory';
import { makeHospital, makePerson, testPassword } from '../factories';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';

let app: TestApp;
let technologist: Agent;

beforeAll(async () => {
  app = await startTestApp();
  const hospitalId = await makeHospital(app.dataSource);
  await makePerson(app.dataSource, hospitalId, { email: 't@example.org', roles: ['technologist'] });
  for (const kvpMean of [70, null, 90, 80, null, 75, 85]) {
    const id = await makeProcedure(app.dataSource, hospitalId, {});
    await app.dataSource.manager.update(Procedure, { id }, { kvpMean });
  }
  technologist = await signIn(app.app, 't@example.org', testPassword);
});
afterAll(() => app.close());

/** The whole list, two rows a page. */
async function walk(query: string): Promise<(number | null)[]> {
  const seen: (number | null)[] = [];
  let cursor: string | null = '';
  while (cursor !== null) {
    const page: { body: { items: { kvpMean: number | null }[]; nextCursor: string | null } } =
      await technologist
        .get(`/api/procedures?period=all&limit=2&${query}${cursor && `&cursor=${cursor}`}`)
        .expect(200);
    seen.push(...page.body.items.map((item) => item.kvpMean));
    cursor = page.body.nextCursor;
  }
  return seen;
}

test('page by page every row comes once, and what lacks the figure comes last at either end', async () => {
  expect(await walk('sort=kvp&order=descending')).toEqual([90, 85, 80, 75, 70, null, null]);
  expect(await walk('sort=kvp&order=ascending')).toEqual([70, 75, 80, 85, 90, null, null]);
});

test('a made-up place in the list is told so', async () => {
  const { body } = await technologist.get('/api/procedures?cursor=nonsense').expect(422);
  expect(body.issues[0].pointer).toBe('/cursor');
});
