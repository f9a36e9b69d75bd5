import request from 'supertest';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { can, roles, type Action, type Role } from '../../shared/permissions';
import { makeHospital, makePerson, testPassword } from '../factories';
import { readSample } from '../samples';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';

type Operation = { method: 'get' | 'post' | 'put' | 'patch' | 'delete'; path: string; permission: string };

let app: TestApp;
let operations: Operation[];
const agents = new Map<Role | 'monitored', Agent>();
const holders = [...roles, 'monitored'] as const;
const someId = '01890a5d-ac96-774b-bcce-b302099a8057';

beforeAll(async () => {
  app = await startTestApp();
  const hospitalId = await makeHospital(app.dataSource);
  for (const holder of holders) {
    const email = `${holder}@example.org`;
    await makePerson(app.dataSource, hospitalId, { email, roles: holder === 'monitored' ? [] : [holder] });
    agents.set(holder, await signIn(app.app, email, testPassword));
  }
  const { body } = await request(app.app).get('/api/openapi.json').expect(200);
  operations = Object.entries(
    body.paths as Record<string, Record<string, { 'x-permission': string }>>,
  ).flatMap(([path, methods]) =>
    Object.entries(methods).map(([method, operation]) => ({
      method: method as Operation['method'],
      path: path.replace(/\{\w+\}/g, someId),
      permission: operation['x-permission'],
    })),
  );
});
afterAll(() => app.close());

const call = (client: Agent | ReturnType<typeof request>, { method, path }: Operation) =>
  method === 'get' || method === 'delete' ? client[method](path) : client[method](path).send({});

test('every route declares its permission', () => {
  expect(operations.length).toBeGreaterThan(25);
  expect(operations.filter(({ permission }) => !permission)).toEqual([]);
});

test('signed out, only public routes answer', async () => {
  for (const operation of operations.filter(({ permission }) => permission !== 'public')) {
    const { status } = await call(request(app.app), operation);
    expect([operation.method, operation.path, status]).toEqual([operation.method, operation.path, 401]);
  }
});

test.each(holders)('%s opens what the permission table says, and nothing else', async (holder) => {
  const actor = { id: someId, roles: holder === 'monitored' ? [] : [holder] };
  for (const operation of operations.filter(({ permission }) => permission !== 'public')) {
    const { status } = await call(agents.get(holder) as Agent, operation);
    const isAllowed = operation.permission === 'signed-in' || can(actor, operation.permission as Action);
    const label = `${operation.method} ${operation.path} as ${holder}`;
    expect(`${label}: ${status === 403 ? 'refused' : 'open'}`).toBe(
      `${label}: ${isAllowed ? 'open' : 'refused'}`,
    );
    expect(status, label).toBeLessThan(500);
  }
});

/** What the sample file says of its patient; found nowhere in the answers of those who must not see it. */
const identities = (body: unknown, secrets: string[]) => {
  const text = JSON.stringify(body);
  return secrets.filter((secret) => text.includes(secret));
};

test('no answer to committee, administrator or monitored staff names a patient or a file', async () => {
  const technologist = agents.get('technologist') as Agent;
  const { body } = await technologist
    .post('/api/dose-reports')
    .attach('files', readSample('01-single-plane.dcm'), 'Patient Named.dcm')
    .attach('files', Buffer.from('x'), 'Refused Patient Named.dcm');
  const procedureId = body.results[0].procedureId as string;
  const { body: patient } = await technologist.get(`/api/procedures/${procedureId}/patient`).expect(200);
  const secrets = ['Patient Named', patient.name, patient.id, patient.accessionNumber].filter(Boolean);
  expect(secrets.length).toBeGreaterThan(3);
  const seen = (await technologist.get('/api/procedures?period=all').expect(200)).body;
  expect(identities(seen, secrets).length).toBeGreaterThan(0);
  for (const holder of ['committee', 'administrator', 'monitored', 'interventionalist'] as const)
    for (const { path, method } of operations.filter((operation) => operation.method === 'get')) {
      const answer = await call(agents.get(holder) as Agent, {
        method,
        path: path.replace(someId, procedureId),
        permission: '',
      });
      expect([holder, path, identities(answer.body, secrets)]).toEqual([holder, path, []]);
    }
});
