import type { ReportEvent } from '../../shared/contract/report-event';
import type { ContentItem } from './content-tree';
import { limits } from './limits';
import { parseIrradiationEvent } from './parse-irradiation-event';
import { ReadFailure } from './read-failure';
import type { WarningCollector } from './warning-collector';

/** Reads the irradiation events of a report one after the other, in the order of the file. */
export class EventReader {
  readonly events: ReportEvent[] = [];
  /** The header's offset, for times without one. */
  utcOffset: string | null = null;
  private readonly seen = new Set<string>();

  constructor(private readonly warnings: WarningCollector) {}

  add(item: ContentItem): void {
    const { warnings } = this;
    if (this.events.length === limits.events)
      throw new ReadFailure('limit-items', `more than ${limits.events} irradiation events`);
    warnings.atEvent(this.events.length + 1);
    const event = parseIrradiationEvent(item, this.utcOffset, warnings);
    if (event.irradiationEventUid !== null) {
      const key = `${event.irradiationEventUid}|${event.plane}`;
      if (this.seen.has(key)) warnings.add('event-duplicate', 'irradiationEventUid');
      this.seen.add(key);
    }
    this.events.push(event);
    warnings.atEvent(null);
  }
}
