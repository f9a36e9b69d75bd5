import type { ReadAgainResult } from '../../shared/contract/read-again';
import { can } from '../../shared/permissions';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { answerOf } from './answer-first-sending';
import { applyReading } from './apply-reading';
import { findDoseReport } from './dose-report.store';
import { readSecondTime } from './read-again-preview';
import { reasonInWords } from './reason-in-words';
import { settleArrival } from './settle-arrival';

/**
 * Reads a kept file again and takes what the reader makes of it now. A stored report whose values change has its events
 * and totals replaced in one go; one that cannot be read now stays as it is.
 */
export async function readAgain(db: Db, actor: Actor, id: string, now: Date): Promise<ReadAgainResult> {
  const known = await findDoseReport(db, actor.hospitalId, id);
  if (!known) throw new Problem('not-found');
  if (known.outcome === 'stored' && !can(actor, 'dose-report.decide'))
    throw new Problem('not-permitted', 'A stored report is read again by the physicist.');
  if (known.outcome === 'duplicate') return { ...answerOf(known), verdict: 'same', changedCount: 0 };
  const { report, bytes, read } = await readSecondTime(db, actor.hospitalId, id);
  if (!bytes || !read)
    throw new Problem('not-found', 'The bytes of this file are not kept, so it cannot be read again.');
  if (report.outcome !== 'stored') {
    const result = await settleArrival(db, report, bytes, now);
    const isRead = result.outcome === 'stored' || result.outcome === 'duplicate';
    return { ...result, verdict: isRead ? 'becomes-readable' : 'still-unread', changedCount: 0 };
  }
  const answer = answerOf(report);
  if (read.outcome === 'read') {
    const changedCount = await applyReading(db, actor, report, read, now);
    return { ...answer, verdict: changedCount === 0 ? 'same' : 'changes', changedCount };
  }
  const { code, detail } = read.reason;
  const reason = { code, detail: reasonInWords(code, detail, bytes) };
  return { ...answer, reason, verdict: 'fails', changedCount: 0 };
}
