import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { DataSource } from 'typeorm';
import { createDataSource } from '../../server/db/data-source';
import { seedDemo } from '../../server/demo/seed-demo';
import { isPasswordRight } from '../../server/people/password';
import { findSignIn } from '../../server/people/account.store';
import { createTestDatabase, type TestDatabase } from '../test-db';

let database: TestDatabase;
let dataSource: DataSource;
const lines: string[] = [];

const seed = (password: string, report: (line: string) => void = () => {}) =>
  seedDemo({ dataSource, anchor: '2026-12-01', password, report });
const count = async (from: string): Promise<number> =>
  Number((await dataSource.query(`select count(*) as n from ${from}`))[0].n);

beforeAll(async () => {
  database = await createTestDatabase();
  dataSource = createDataSource(database.url);
  await dataSource.initialize();
}, 120_000);

afterAll(async () => {
  await dataSource.destroy();
  await database.drop();
});

describe('seeding the demo hospital', () => {
  it('leaves nothing behind when it is stopped half way', async () => {
    const stopAt = (line: string) => {
      if (line.includes('1000 procedures')) throw new Error('stopped');
    };
    await expect(seed('first password', stopAt)).rejects.toThrow('stopped');
    expect(await count('hospital')).toBe(0);
    expect(await count('procedure')).toBe(0);
    expect(await count('audit_entry')).toBe(0);
  }, 180_000);

  it('writes all of it after that, with progress', async () => {
    await seed('first password', (line) => lines.push(line));
    expect(await count('procedure')).toBe(7356);
    expect(await count('hospital where is_demo and demo_finished_at is not null')).toBe(1);
    expect(lines.length).toBeGreaterThan(7);
  }, 300_000);

  it('does nothing the second time, except that a new password counts', async () => {
    const before = await count('irradiation_event');
    await seed('second password');
    expect(await count('irradiation_event')).toBe(before);
    for (const mailbox of ['technologist', 'physicist', 'interventionalist', 'committee', 'administrator']) {
      const account = await findSignIn(dataSource.manager, `${mailbox}@marrowcreek.example`);
      expect(account?.roles).toEqual([mailbox]);
      expect(await isPasswordRight(account?.passwordHash ?? null, 'second password')).toBe(true);
    }
    const interventionalist = await findSignIn(dataSource.manager, 'interventionalist@marrowcreek.example');
    expect(interventionalist?.name).toBe('IC-2');
  }, 60_000);
});

describe('the demo in the database', () => {
  it('has 4 rooms, 5 machines, 18 types, 64 garments and 34 monitored members of staff', async () => {
    expect(await count('room')).toBe(4);
    expect(await count('equipment')).toBe(5);
    expect(await count('procedure_type')).toBe(18);
    expect(await count('garment')).toBe(64);
    expect(await count('person where is_monitored')).toBe(34);
  });

  it('counts the events of each procedure as many as there are', async () => {
    const wrong = await count(
      `procedure p where p.event_count <> (select count(*) from irradiation_event e where e.procedure_id = p.id)`,
    );
    expect(wrong).toBe(0);
    expect(await count('irradiation_event')).toBeGreaterThan(200_000);
  });

  it('keeps the displayed totals equal to the sum of events within 0.5 %, but for planted faults', async () => {
    const off = await count(
      `procedure p join (select procedure_id, sum(kerma_area_product_gy_cm2) as summed
                           from irradiation_event group by procedure_id) e on e.procedure_id = p.id
        where abs(e.summed / p.displayed_kerma_area_product_gy_cm2 - 1) > 0.005`,
    );
    expect(off).toBe(0);
  });

  it('has the published median of coronary angiography in the table as well', async () => {
    const [{ median }] = await dataSource.query(
      `select percentile_cont(0.5) within group (order by p.displayed_kerma_area_product_gy_cm2) as median
         from procedure p join procedure_type t on t.id = p.procedure_type_id
        where t."key" = 'CA-DX' and not p.is_quarantined`,
    );
    expect(median).toBeGreaterThan(24 * 0.95);
    expect(median).toBeLessThan(24 * 1.05);
  });

  it('asks for at most 1.5 substantial and 4 other reviews a week', async () => {
    expect((await count(`procedure where attention_level = 'act'`)) / 104).toBeLessThan(1.5);
    expect((await count(`procedure where attention_level = 'notify'`)) / 104).toBeLessThan(4);
  });

  it('shows what is planted: unit slips out of the statistics, weights missing, planes in pairs', async () => {
    expect(await count('procedure where is_quarantined')).toBeGreaterThan(5);
    expect(await count('procedure where patient_weight_kg is null')).toBeGreaterThanOrEqual(147);
    expect(await count(`procedure where jsonb_array_length(planes) = 2`)).toBeGreaterThan(800);
  });

  it('keeps original files of the last 30 days and says of older procedures that they are generated', async () => {
    const since = `timestamptz '2026-11-01T00:00:00-06:00'`;
    expect(await count(`procedure where started_at < ${since} and not is_generated`)).toBe(0);
    expect(await count(`procedure where started_at >= ${since} and is_generated`)).toBe(0);
    const withoutFile = await count(
      `procedure p where not p.is_generated and not exists
         (select 1 from dose_report r where r.procedure_id = p.id and r.original_file_id is not null)`,
    );
    expect(withoutFile).toBe(0);
  });

  it('leaves eight of the newest cases to be completed', async () => {
    expect(await count(`procedure where not is_generated and record_state = 'incomplete'`)).toBe(8);
  });

  it('estimates the exposure of everybody in a completed record, and of nobody else', async () => {
    const valid = `presence s join procedure p on p.id = s.procedure_id and p.record_revision = s.revision`;
    const estimated = `staff_estimate e join procedure p on p.id = e.procedure_id and p.estimate_revision = e.revision`;
    expect(await count(estimated)).toBe(await count(valid));
    expect(await count(`${estimated} where p.record_state = 'incomplete'`)).toBe(0);
    expect(await count(`${estimated} where e.duty = 'primary-operator'`)).toBe(
      await count(`procedure where record_state = 'complete'`),
    );
  });

  it('gives operators figures of the order seen at the table: some µSv for a line, more for a coronary case', async () => {
    const medianOf = async (key: string): Promise<number> =>
      (
        await dataSource.query(
          `select percentile_cont(0.5) within group (order by e.collar_hp10_usv) as median
             from staff_estimate e join procedure p on p.id = e.procedure_id
             join procedure_type t on t.id = p.procedure_type_id
            where t."key" = $1 and e.duty = 'primary-operator'`,
          [key],
        )
      )[0].median;
    const [line, coronary] = [await medianOf('IR-CVC'), await medianOf('CA-DX')];
    expect(line).toBeGreaterThan(0.2);
    expect(line).toBeLessThan(10);
    expect(coronary).toBeGreaterThan(10);
    expect(coronary).toBeLessThan(200);
  });
});
