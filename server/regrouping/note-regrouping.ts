import type { RegroupingKind } from '../../shared/contract/regrouping';
import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import type { Evidence } from './move-reports';

type Numbered = { id: string; caseNumber: string };
type Noted = {
  kind: RegroupingKind;
  source: Numbered;
  target: Numbered;
  reportCount: number;
  isTakenBack: boolean;
  evidence: Evidence;
  reason: string;
};

const countReports = (count: number) => (count === 1 ? '1 report' : `${count} reports`);

/** What the history of either procedure says; both are told the other's number. */
export function describeRegrouping({
  kind,
  source,
  target,
  reportCount,
  isTakenBack,
}: Omit<Noted, 'evidence' | 'reason'>): {
  source: string;
  target: string;
} {
  const reports = countReports(reportCount);
  const words = {
    merge: { source: `Merged into ${target.caseNumber}`, target: `Took in ${source.caseNumber}` },
    split: {
      source: `Split: ${reports} went to the new ${target.caseNumber}`,
      target: `Split off ${source.caseNumber} with ${reports}`,
    },
    move: {
      source: `${reports} moved to ${target.caseNumber}`,
      target: `${reports} came from ${source.caseNumber}`,
    },
  }[kind];
  if (!isTakenBack) return words;
  return { source: `Taken back: “${words.source}”`, target: `Taken back: “${words.target}”` };
}

/** One line in the history of each procedure, with both states before and after. */
export async function noteRegrouping(tx: Db, actor: Actor, noted: Noted): Promise<void> {
  const { source, target, evidence, reason } = noted;
  const words = describeRegrouping(noted);
  for (const side of ['source', 'target'] as const)
    await noteAudit(tx, {
      hospitalId: actor.hospitalId,
      actorId: actor.id,
      action: words[side],
      subject: 'procedure',
      subjectId: { source, target }[side].id,
      before: evidence.before,
      after: evidence.after,
      reason,
    });
}
