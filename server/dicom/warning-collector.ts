import { warningSentences, type WarningCode } from '../../shared/contract/outcome';
import type { ReportWarning } from '../../shared/contract/report';

interface Collected {
  code: WarningCode;
  detail: string;
  /** Numbers of the events concerned, counted from 1, each once; empty for the report itself. */
  eventNumbers: number[];
}

/** Different details of one kind of warning that are kept; a damaged file could bring a hundred thousand. */
const MOST_DETAILS = 100;
const FURTHER = 'further ones of this kind';

const SHOWN_EVENTS = 10;

function listEvents(numbers: number[]): string {
  const shown = numbers.slice(0, SHOWN_EVENTS).join(', ');
  const more = numbers.length > SHOWN_EVENTS ? ` and ${numbers.length - SHOWN_EVENTS} more` : '';
  return `${numbers.length === 1 ? 'event' : 'events'} ${shown}${more}`;
}

/** Gathers warnings; the same one at many events becomes one with their numbers. */
export class WarningCollector {
  private readonly collected: Collected[] = [];
  private readonly byCode = new Map<WarningCode, Map<string, Collected>>();
  private eventNumber: number | null = null;

  /** What is added until the next call concerns this event (from 1), or the report as a whole (null). */
  atEvent(eventNumber: number | null): void {
    this.eventNumber = eventNumber;
  }

  readonly add = (code: WarningCode, detail: string): void => {
    const { eventNumbers } = this.find(code, detail);
    if (this.eventNumber !== null && eventNumbers.at(-1) !== this.eventNumber)
      eventNumbers.push(this.eventNumber);
  };

  private find(code: WarningCode, detail: string): Collected {
    let ofCode = this.byCode.get(code);
    if (!ofCode) this.byCode.set(code, (ofCode = new Map()));
    const known = ofCode.get(detail);
    if (known) return known;
    if (ofCode.size >= MOST_DETAILS && detail !== FURTHER) return this.find(code, FURTHER);
    const entry = { code, detail, eventNumbers: [] };
    ofCode.set(detail, entry);
    this.collected.push(entry);
    return entry;
  }

  list(): ReportWarning[] {
    return this.collected.map(({ code, detail, eventNumbers }) => ({
      code,
      detail:
        eventNumbers.length === 0
          ? `${detail}. ${warningSentences[code]}`
          : `${detail}, ${listEvents(eventNumbers)}. ${warningSentences[code]}`,
    }));
  }
}
