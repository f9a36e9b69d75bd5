import type { SummaryReport } from './summary-input';

/**
 * What a report is worth beside the others of its procedure.
 * `counts`: its totals are the machine's. `adds`: its exposures are a part of the sum. `superseded`: another report
 * tells everything it tells. `repeats`: another report holds exactly the same exposures.
 */
export type Standing = { kind: 'counts' | 'adds' } | { kind: 'superseded' | 'repeats'; byId: string };

const hasEvents = (report: SummaryReport) => report.eventKeys.length > 0;

const totals = ['kermaAreaProductGyCm2', 'referenceAirKermaGy', 'fluoroscopyTimeS'] as const;

/** Exposures, or at least one readable total. */
const tellsSomething = (report: SummaryReport) =>
  hasEvents(report) || report.reportedPlanes.some((plane) => totals.some((total) => plane[total] !== null));

/** Reports whose content a report takes over, by its own statement, step by step. */
function predecessorsOf(report: SummaryReport, reports: SummaryReport[]): Set<string> {
  const found = new Set<string>();
  const waiting = [report];
  for (let next = waiting.pop(); next; next = waiting.pop())
    for (const { sopInstanceUid } of next.context?.predecessors ?? []) {
      const named = reports.find(({ context }) => context && context.sopInstanceUid === sopInstanceUid);
      if (named && named.id !== report.id && !found.has(named.id)) {
        found.add(named.id);
        waiting.push(named);
      }
    }
  return found;
}

const isPartial = (report: SummaryReport) => report.context?.completionFlag === 'PARTIAL';

/**
 * The one to believe of several that tell the same: a stated predecessor decides before any clock, a complete report
 * stands before a partial one, then the newer content, then the later receipt.
 */
export function pickNewest(reports: SummaryReport[]): SummaryReport | null {
  const replaced = new Set(reports.flatMap((report) => [...predecessorsOf(report, reports)]));
  const last = reports.filter((report) => !replaced.has(report.id));
  // Reports that name each other replace nothing.
  const candidates = last.length > 0 ? last : reports;
  return (
    candidates.toSorted(
      (a, b) =>
        Number(isPartial(a)) - Number(isPartial(b)) ||
        (b.contentAt ?? '').localeCompare(a.contentAt ?? '') ||
        b.receivedAt.getTime() - a.receivedAt.getTime() ||
        b.id.localeCompare(a.id),
    )[0] ?? null
  );
}

/** Whether two totals speak of the same irradiation: same study and, where both say so, the same step, series or event. */
export function isSamePart(a: SummaryReport, b: SummaryReport): boolean {
  const [studyA, studyB] = [a.context?.studyInstanceUid, b.context?.studyInstanceUid];
  if (studyA && studyB && studyA !== studyB) return false;
  const [scopeA, scopeB] = [a.context?.scopeOfAccumulation, b.context?.scopeOfAccumulation];
  if (!scopeA?.uid || !scopeB?.uid || scopeA.code?.value !== scopeB.code?.value) return true;
  return scopeA.uid === scopeB.uid;
}

/** The same exposures sent under another machine's name stay with the machine that sent them first. */
function pickOfEqual(reports: SummaryReport[]): SummaryReport | null {
  const first = reports.toSorted((a, b) => a.receivedAt.getTime() - b.receivedAt.getTime())[0];
  return pickNewest(reports.filter(({ equipmentId }) => equipmentId === first?.equipmentId));
}

/** Reports with exposures: the ones that no other report contains stand, the others tell by whom they are contained. */
function standWithEvents(reports: SummaryReport[], standings: Map<string, Standing>): SummaryReport[] {
  const keys = new Map(reports.map((report) => [report.id, new Set(report.eventKeys)]));
  const keysOf = (report: SummaryReport) => keys.get(report.id) as Set<string>;
  const contains = (whole: SummaryReport, part: SummaryReport) =>
    keysOf(whole).size >= keysOf(part).size && part.eventKeys.every((key) => keysOf(whole).has(key));
  const standing = reports.filter((report) => {
    const holders = reports.filter((other) => contains(other, report));
    if (holders.some((other) => keysOf(other).size > keysOf(report).size)) return false;
    return pickOfEqual(holders)?.id === report.id;
  });
  for (const report of reports.filter((one) => !standing.includes(one))) {
    const holder = pickNewest(standing.filter((other) => contains(other, report)));
    if (!holder) continue;
    const isEqual = keysOf(holder).size === keysOf(report).size;
    standings.set(report.id, { kind: isEqual ? 'repeats' : 'superseded', byId: holder.id });
  }
  return standing;
}

/** Reports with totals only: each speaks for its part, unless the exposures themselves or a newer total do. */
function standWithoutEvents(
  reports: SummaryReport[],
  withEvents: SummaryReport[],
  standings: Map<string, Standing>,
): SummaryReport[] {
  const standing: SummaryReport[] = [];
  let waiting = reports;
  for (let next = pickNewest(waiting); next; next = pickNewest(waiting)) {
    const report = next;
    waiting = waiting.filter(({ id }) => id !== report.id);
    const holder =
      pickNewest(withEvents.filter((other) => isSamePart(other, report))) ??
      standing.find((other) => isSamePart(other, report));
    if (!holder) standing.push(report);
    else {
      const holding = standings.get(holder.id);
      const byId = holding && 'byId' in holding ? holding.byId : holder.id;
      standings.set(report.id, { kind: 'superseded', byId });
    }
  }
  return standing;
}

export type MachineReports = {
  equipmentId: string | null;
  /** The one report that holds every exposure known of the machine: its totals are taken as reported. */
  holder: SummaryReport | null;
  /** Totals without exposures that no other report tells. */
  totalsOnly: SummaryReport[];
  /** Keys of the exposures that are this machine's. */
  eventKeys: Set<string>;
};

export type StoodReports = { standings: Map<string, Standing>; machines: MachineReports[] };

/**
 * Which of a procedure's reports count. The keys of the exposures decide, not the order of arrival: a report is
 * superseded by one that holds all of its exposures; what no single report holds is summed over unique exposures.
 * Totals typed by hand give way to any report of the same machine that tells something.
 */
export function standReports(reports: SummaryReport[]): StoodReports {
  const standings = new Map<string, Standing>();
  const withEvents = reports.filter(hasEvents);
  const standing = standWithEvents(withEvents, standings);
  const inOrder = standing.toSorted((a, b) => a.receivedAt.getTime() - b.receivedAt.getTime());
  const taken = new Set<string>();
  const machines = [...new Set(reports.map(({ equipmentId }) => equipmentId))].map((equipmentId) => {
    const own = <T extends SummaryReport>(list: T[]) => list.filter((one) => one.equipmentId === equipmentId);
    const eventKeys = new Set(own(inOrder).flatMap((report) => report.eventKeys));
    const isUnshared = [...eventKeys].every((key) => !taken.has(key));
    for (const key of eventKeys) if (taken.has(key)) eventKeys.delete(key);
    for (const key of eventKeys) taken.add(key);
    const totalsOnly = own(reports).filter((report) => !hasEvents(report));
    const sent = standWithoutEvents(
      totalsOnly.filter(({ channel }) => channel !== 'manual'),
      own(withEvents),
      standings,
    );
    const told = [...own(standing), ...sent];
    const typed = totalsOnly.filter(({ channel }) => channel === 'manual');
    const superior = pickNewest((told.length > 0 ? told : own(withEvents)).filter(tellsSomething));
    for (const report of superior ? typed : [])
      standings.set(report.id, { kind: 'superseded', byId: (superior as SummaryReport).id });
    const written = superior ? [] : standWithoutEvents(typed, [], standings);
    const counting = [...told, ...written];
    for (const report of counting)
      standings.set(report.id, { kind: counting.length === 1 && isUnshared ? 'counts' : 'adds' });
    return {
      equipmentId,
      holder: own(standing).length === 1 && isUnshared ? (own(standing)[0] ?? null) : null,
      totalsOnly: [...sent, ...written],
      eventKeys,
    };
  });
  return {
    standings,
    machines: machines.filter(
      ({ equipmentId, totalsOnly }) =>
        totalsOnly.length > 0 || standing.some((report) => report.equipmentId === equipmentId),
    ),
  };
}
