import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { lockProcedure } from '../procedures/procedure.store';
import type { Procedure } from '../procedures/procedure.entity';
import { lockGrouping } from './regrouping-lock.store';

/** The version that the person saw; null where nothing is to be changed. */
export type Seen = { id: string; version: number | null };

async function openSeen(tx: Db, actor: Actor, { id, version }: Seen): Promise<Procedure> {
  const procedure = await lockProcedure(tx, actor.hospitalId, id);
  if (!procedure) throw new Problem('not-found');
  if (version !== null && procedure.version !== version)
    throw new Problem(
      'conflict',
      `Somebody changed ${procedure.caseNumber} after you opened it. Nothing was moved: look at it again.`,
      { current: { caseNumber: procedure.caseNumber, version: procedure.version } },
    );
  return procedure;
}

/** Locks the procedures between which reports go, always in the same order, and checks that nobody was faster. */
export async function openPair<T extends Seen | null>(
  tx: Db,
  actor: Actor,
  source: Seen,
  target: T,
): Promise<{ source: Procedure; target: Procedure | (T extends null ? null : never) }> {
  await lockGrouping(tx, actor.hospitalId, 'regrouping');
  const opened = new Map<string, Procedure>();
  const inOrder = [source, ...(target ? [target] : [])].toSorted((a, b) => a.id.localeCompare(b.id));
  for (const seen of inOrder) if (!opened.has(seen.id)) opened.set(seen.id, await openSeen(tx, actor, seen));
  return {
    source: opened.get(source.id) as Procedure,
    target: (target ? opened.get(target.id) : null) as Procedure,
  };
}
