import { afterAll, beforeAll, expect, test } from 'vitest';
import type { TypedQuantity } from '../../shared/contract/manual-entry';
import { makeHospital, makePerson, makeRoom, testPassword } from '../factories';
import { makeJpeg, makePng, makeWebp } from '../../server/attachments/example-pictures';
import { signIn, startTestApp, type Agent, type TestApp } from '../test-app';
import { kap, pointers, typedEntry } from '../typed-entry';

let app: TestApp;
let technologist: Agent;
let hospitalId: string;
let roomId: string;

beforeAll(async () => {
  app = await startTestApp(() => new Date('2026-11-30T20:00:00Z'));
  hospitalId = await makeHospital(app.dataSource);
  roomId = await makeRoom(app.dataSource, hospitalId);
  await makePerson(app.dataSource, hospitalId, { email: 't@example.org', roles: ['technologist'] });
  technologist = await signIn(app.app, 't@example.org', testPassword);
});
afterAll(() => app.close());

const send = (body: object, agent = technologist) => agent.post('/api/manual-entries').send(body);
const enter = async (quantities: TypedQuantity[], overrides: object) =>
  (await send(typedEntry(quantities, { roomId, ...overrides })).expect(201)).body as {
    id: string;
    procedureId: string;
  };
const keep = (bytes: Buffer, name: string, agent = technologist) =>
  agent.post('/api/attachments').attach('photo', bytes, { filename: name, contentType: 'image/heic' });

test.each([
  ['image/jpeg', makeJpeg()],
  ['image/png', makePng()],
  ['image/webp', makeWebp()],
])(
  'a picture is %s by its content, whatever its name says, and is served as just that',
  async (type, bytes) => {
    const { body: kept } = await keep(bytes, 'screen.exe').expect(201);
    expect(kept).toMatchObject({ fileName: 'screen.exe', mediaType: type });
    const { id } = await enter([kap('5')], { photoId: kept.id });
    const answer = await technologist.get(`/api/manual-entries/${id}/photo`).buffer(true).expect(200);
    expect(answer.headers).toMatchObject({
      'content-type': type,
      'x-content-type-options': 'nosniff',
      'content-disposition': `inline; filename="dose-screen.${type.slice(6)}"`,
      'content-security-policy': "default-src 'none'; sandbox",
      'cache-control': 'no-store',
    });
    expect((answer.body as Buffer).length).toBe(kept.byteCount);
    expect((answer.body as Buffer).includes(Buffer.from('47.1 north'))).toBe(false);
  },
);

test.each([
  ['a page', Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"><script>alert(1)</script></svg>')],
  ['a picture cut short', makeJpeg().subarray(0, 100)],
  ['HEIC', Buffer.from('\0\0\0\x18ftypheic\0\0\0\0', 'latin1')],
])('%s is refused as a picture', async (_name, bytes) => {
  const { body } = await keep(bytes, 'screen.jpg').expect(422);
  expect(pointers(body)).toEqual(['/photo']);
});

test('a picture above 12 MB is refused, and so is an entry with a picture of another', async () => {
  await keep(Buffer.concat([makeJpeg(), Buffer.alloc(12 * 1_048_576)]), 'large.jpg').expect(413);
  const { body: kept } = await keep(makePng(), 'a.png').expect(201);
  await enter([kap('5')], { photoId: kept.id });
  const other = await send(typedEntry([kap('5')], { roomId, photoId: kept.id })).expect(422);
  expect(pointers(other.body)).toEqual(['/photoId']);
});

test('each look at a picture is written down; only those who may see the patient get it', async () => {
  const { body: kept } = await keep(makePng(), 'a.png').expect(201);
  const { id, procedureId } = await enter([kap('5')], {
    photoId: kept.id,
    comment: 'Ms Example was restless',
  });
  const operatorId = await makePerson(app.dataSource, hospitalId, {
    email: 'o@example.org',
    roles: ['interventionalist'],
    job: 'interventional-radiologist',
  });
  const operator = await signIn(app.app, 'o@example.org', testPassword);
  const looks = async () =>
    Number(
      (
        await app.dataSource.query(
          `select count(*) from audit_entry where "action" = 'picture of the dose screen shown' and subject_id = $1`,
          [procedureId],
        )
      )[0].count,
    );
  await operator.get(`/api/manual-entries/${id}/photo`).expect(404);
  await operator.get(`/api/procedures/${procedureId}/manual-entries`).expect(404);
  await send(typedEntry([kap('5')]), operator).expect(403);
  expect(await looks()).toBe(0);
  await app.dataSource.query('update procedure set primary_operator_id = $1 where id = $2', [
    operatorId,
    procedureId,
  ]);
  await operator.get(`/api/manual-entries/${id}/photo`).expect(200);
  expect(await looks()).toBe(1);
  const { body } = await operator.get(`/api/procedures/${procedureId}/manual-entries`).expect(200);
  // The operator sees the own patient, but not who worked on the record.
  expect(body.items).toMatchObject([
    { comment: 'Ms Example was restless', enteredBy: null, photoId: kept.id },
  ]);
});

test('a picture that no entry uses is gone after a week', async () => {
  const { body: kept } = await keep(makePng(), 'forgotten.png').expect(201);
  await app.dataSource.query(`update attachment set created_at = now() - interval '8 days' where id = $1`, [
    kept.id,
  ]);
  await keep(makePng(), 'next.png').expect(201);
  const rows = await app.dataSource.query('select 1 from attachment where id = $1', [kept.id]);
  expect(rows).toEqual([]);
});
