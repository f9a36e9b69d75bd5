import { warningSentences, type WarningCode } from '../../shared/contract/outcome';
import type { ReportWarning } from '../../shared/contract/report';

interface Collected {
  code: WarningCode;
  detail: string;
  /** Numbers of the events concerned, counted from 1; empty for the report itself. */
  eventNumbers: Set<number>;
}

const SHOWN_EVENTS = 10;

function listEvents(numbers: number[]): string {
  const shown = numbers.slice(0, SHOWN_EVENTS).join(', ');
  const more = numbers.length > SHOWN_EVENTS ? ` and ${numbers.length - SHOWN_EVENTS} more` : '';
  return `${numbers.length === 1 ? 'event' : 'events'} ${shown}${more}`;
}

/** Gathers warnings; the same one at many events becomes one with their numbers. */
export class WarningCollector {
  private readonly collected = new Map<string, Collected>();
  private eventNumber: number | null = null;

  /** What is added until the next call concerns this event (from 1), or the report as a whole (null). */
  atEvent(eventNumber: number | null): void {
    this.eventNumber = eventNumber;
  }

  readonly add = (code: WarningCode, detail: string): void => {
    const key = `${code}|${detail}`;
    let entry = this.collected.get(key);
    if (!entry) this.collected.set(key, (entry = { code, detail, eventNumbers: new Set() }));
    if (this.eventNumber !== null) entry.eventNumbers.add(this.eventNumber);
  };

  list(): ReportWarning[] {
    return [...this.collected.values()].map(({ code, detail, eventNumbers }) => ({
      code,
      detail:
        eventNumbers.size === 0
          ? `${detail}. ${warningSentences[code]}`
          : `${detail}, ${listEvents([...eventNumbers])}. ${warningSentences[code]}`,
    }));
  }
}
