import type { DemoProcedure } from './demo-types';

type Started = Pick<DemoProcedure, 'startedAtLocal' | 'deviceClockAheadS'>;

/**
 * The machine's wall clock some seconds after the procedure's first irradiation, ISO 8601 without
 * offset. A clock that is ahead or behind shows it in every time that the machine writes.
 */
export function localTimeAfter(procedure: Started, offsetS: number): string {
  const startMs = Date.parse(`${procedure.startedAtLocal}Z`);
  const shownMs = Math.round(startMs + 1000 * (offsetS + procedure.deviceClockAheadS));
  return new Date(shownMs).toISOString().slice(0, -1);
}
