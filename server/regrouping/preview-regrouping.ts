import type { GroupedState, PreviewInput, RegroupPreview } from '../../shared/contract/regrouping';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { regroup } from './regroup';

/** Thrown to take back everything that the try did. */
class Tried extends Error {
  constructor(readonly preview: RegroupPreview) {
    super('a try ends by being taken back');
  }
}

const known = (...states: (GroupedState | null)[]) => states.flatMap((state) => state ?? []);

/** Does it and takes it back at once: events and totals of both procedures before and after, or why it cannot be done. */
export async function previewRegrouping(
  db: Db,
  actor: Actor,
  id: string,
  { kind, targetId, doseReportIds }: PreviewInput,
  now: Date,
): Promise<RegroupPreview> {
  if (kind !== 'split' && targetId === null)
    throw new Problem('invalid-input', 'Choose the other procedure first.', {
      issues: [{ pointer: '/targetId', detail: 'Choose a procedure.' }],
    });
  const target = kind === 'split' || targetId === null ? null : { id: targetId, version: null };
  const plan = { kind, source: { id, version: null }, target, doseReportIds, caseNumber: 'new' };
  try {
    return await db.transaction(async (tx): Promise<never> => {
      const {
        evidence: { before, after },
      } = await regroup(tx, actor, plan, now);
      throw new Tried({
        refusal: null,
        before: known(before.source, before.target),
        after: known(after.source, after.target),
      });
    });
  } catch (error) {
    if (error instanceof Tried) return error.preview;
    if (error instanceof Problem && error.code === 'cannot-regroup')
      return { refusal: error.detail, before: [], after: [] };
    throw error;
  }
}
