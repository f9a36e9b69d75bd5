import type { GroupedState } from '../../shared/contract/regrouping';
import type { Db } from '../db/db';
import type { Hospital } from '../hospital/hospital.entity';
import type { Procedure } from '../procedures/procedure.entity';
import { describeState } from './describe-state';
import { moveEvents, pointEventsHome, type EventRow } from './grouped-events.store';
import { moveReportRows } from './grouped-reports.store';
import { placementOf, settleRow, type Placement } from './settle-rows';

/** What a regrouping leaves behind: enough to check the way back, and to go it to the letter. */
export type Evidence = {
  before: { source: GroupedState; target: GroupedState | null };
  after: { source: GroupedState; target: GroupedState };
  placements: { source: Placement; target: Placement | null };
  /** Rows of the source that the target knew already. */
  dropped: EventRow[];
};

type ReportMove = {
  source: Procedure;
  target: Procedure;
  doseReportIds: string[];
  /** The target was made for these reports. */
  isNewTarget: boolean;
  /** On the way back: rows to put back, and where the two procedures stood. */
  back: Pick<Evidence, 'dropped' | 'placements'> | null;
};

/** Takes reports with their events from one procedure to another and recomputes both; nothing is added to a total. */
export async function moveReports(
  tx: Db,
  hospital: Hospital,
  { source, target, doseReportIds, isNewTarget, back }: ReportMove,
  now: Date,
): Promise<Evidence> {
  const states = async () => ({
    source: await describeState(tx, hospital.id, source.id),
    target: await describeState(tx, hospital.id, target.id),
  });
  const before = await states();
  const between = { sourceId: source.id, targetId: target.id };
  const dropped = await moveEvents(tx, { ...between, doseReportIds, keptRows: back?.dropped ?? [] });
  await moveReportRows(tx, hospital.id, doseReportIds, between);
  await pointEventsHome(tx, [source.id, target.id]);
  // What was the source is the target on the way back.
  const [homeward, away] = [back?.placements.source ?? null, back?.placements.target ?? null];
  await settleRow(tx, hospital, { id: source.id, heirId: target.id, placement: away }, now);
  await settleRow(tx, hospital, { id: target.id, heirId: source.id, placement: homeward }, now);
  return {
    before: { source: before.source, target: isNewTarget ? null : before.target },
    after: await states(),
    placements: { source: placementOf(source), target: isNewTarget ? null : placementOf(target) },
    dropped,
  };
}
