import type { EventFigures } from '../procedures/irradiation-event.store';
import type { Procedure } from '../procedures/procedure.entity';

/**
 * What to multiply P KA of the events with where a physicist typed the total: then they add up to it, and no factor of
 * the machine applies. Null where no total was typed, or the events tell none. Events 100 times too large under a total
 * of 43 Gy·cm² give 0.01.
 */
export function findSettledScale(
  procedure: Pick<Procedure, 'settledFigures'>,
  events: readonly Pick<EventFigures, 'kermaAreaProductGyCm2'>[],
): number | null {
  const total = procedure.settledFigures?.kermaAreaProductGyCm2 ?? null;
  const summed = events.reduce((sum, event) => sum + (event.kermaAreaProductGyCm2 ?? 0), 0);
  return total === null || summed <= 0 ? null : total / summed;
}
