import type { DataSource } from 'typeorm';
import { hashPassword, isPasswordRight } from '../people/password';
import { readRegisters } from '../staff-exposure/registers.store';
import { findSignIn, setPassword } from '../people/account.store';
import type { Db } from '../db/db';
import { rememberProcedures } from './check-memory';
import {
  analyseTables,
  findFinishedDemo,
  labelMachines,
  listAllLevels,
  listFactors,
  markFinished,
  settleArrivalTimes,
  waitForOtherSeeders,
} from './demo-hospital.store';
import type { DemoProcedure } from './demo-types';
import { generateProcedures, startOfNewest } from './generate-procedures';
import type { DemoContext } from './procedure-row';
import { seedGenerated } from './seed-generated';
import { seedHospital } from './seed-hospital';
import { seedNewest } from './seed-newest';
import { demoAccounts, demoEmail } from './seed-people';
import { settleAnchor } from './settle-anchor';

export interface SeedOptions {
  dataSource: DataSource;
  /** ISO date in whose month the demo ends; null: the current month. */
  anchor: string | null;
  /** Password of the five demo accounts. */
  password: string;
  report: (line: string) => void;
}

/** A later start may bring another password for the demo accounts: it counts. */
async function keepPassword(db: Db, password: string): Promise<void> {
  const [first] = demoAccounts;
  const known = first ? await findSignIn(db, demoEmail(first.mailbox)) : null;
  if (known && (await isPasswordRight(known.passwordHash, password))) return;
  const passwordHash = await hashPassword(password);
  for (const { mailbox } of demoAccounts) {
    const account = await findSignIn(db, demoEmail(mailbox));
    if (account) await setPassword(db, account.id, passwordHash);
  }
}

/** Passes on what is older than the given moment; puts the rest into a list for the intake. */
function* setNewestApart(
  procedures: Iterable<DemoProcedure>,
  from: Date,
  newest: DemoProcedure[],
): Generator<DemoProcedure> {
  for (const procedure of procedures) {
    if (procedure.startedAt < from) yield procedure;
    else newest.push(procedure);
  }
}

async function writeDemo(
  db: Db,
  anchor: Date,
  passwordHash: string,
  report: SeedOptions['report'],
): Promise<void> {
  const ids = await seedHospital(db, anchor, passwordHash);
  const context: DemoContext = {
    ids,
    factors: await listFactors(db, ids.hospitalId),
    levels: await listAllLevels(db, ids.hospitalId),
    equipmentLabels: await labelMachines(db, ids.hospitalId),
    registers: await readRegisters(db, ids.hospitalId),
    checkMemory: rememberProcedures(),
  };
  const newest: DemoProcedure[] = [];
  await seedGenerated(
    db,
    setNewestApart(generateProcedures(anchor), startOfNewest(anchor), newest),
    context,
    report,
  );
  await analyseTables(db);
  await seedNewest(db, newest, ids, report);
  await settleArrivalTimes(db, ids.hospitalId);
  await markFinished(db, ids.hospitalId, new Date());
}

/**
 * Writes the invented hospital with its 24 months, once. All of it is one transaction: a start that
 * is killed half way leaves nothing, and the next one begins again.
 */
export async function seedDemo({ dataSource, anchor, password, report }: SeedOptions): Promise<void> {
  if (await findFinishedDemo(dataSource.manager)) {
    await keepPassword(dataSource.manager, password);
    return;
  }
  const startedMs = Date.now();
  const end = settleAnchor(anchor, new Date());
  report(`Writing the fictional demo hospital, 24 months to ${end.toISOString().slice(0, 10)}`);
  const passwordHash = await hashPassword(password);
  await dataSource.transaction(async (db) => {
    await waitForOtherSeeders(db);
    if (!(await findFinishedDemo(db))) await writeDemo(db, end, passwordHash, report);
  });
  report(`Demo hospital written in ${Math.round((Date.now() - startedMs) / 1000)} s`);
}
