import type { EntityManager } from 'typeorm';
import { IrradiationEvent } from './irradiation-event.entity';

export type NewEvent = Omit<IrradiationEvent, 'procedureId'>;

/** Column of the table and its type, in the order of the insert. */
const columns = {
  id: 'uuid',
  startedAt: 'timestamptz',
  doseReportId: 'uuid',
  eventKey: 'text',
  irradiationEventUid: 'text',
  plane: 'text',
  type: 'text',
  localStartedAt: 'text',
  protocol: 'text',
  kvpValues: 'double precision[]',
  kvpMean: 'double precision',
  tubeCurrentMa: 'double precision',
  pulseWidthMs: 'double precision',
  pulseCount: 'double precision',
  pulseRatePerS: 'double precision',
  exposureTimeS: 'double precision',
  irradiationDurationS: 'double precision',
  kermaAreaProductGyCm2: 'double precision',
  referenceAirKermaGy: 'double precision',
  primaryAngleDeg: 'double precision',
  secondaryAngleDeg: 'double precision',
  primaryEndAngleDeg: 'double precision',
  secondaryEndAngleDeg: 'double precision',
  sourceToDetectorMm: 'double precision',
  sourceToIsocenterMm: 'double precision',
  sourceToReferencePointMm: 'double precision',
  tableLongitudinalMm: 'double precision',
  tableLateralMm: 'double precision',
  tableHeightMm: 'double precision',
  fieldAreaCm2: 'double precision',
  filters: 'jsonb',
  reported: 'jsonb',
  details: 'jsonb',
} as const satisfies Record<keyof NewEvent, string>;

const names = Object.keys(columns) as (keyof typeof columns)[];

const columnOf = (db: EntityManager, name: (typeof names)[number]) =>
  `"${db.connection.getMetadata(IrradiationEvent).findColumnWithPropertyName(name)?.databaseName}"`;

/** Rows in one statement: some milliseconds of writing JSON, between which other requests are answered. */
const rowsPerStatement = 100;

/** A cell as PostgreSQL reads it from text: lists and documents stand in one text each. */
const cellOf = (value: unknown, type: string): unknown => {
  if (value === null || value === undefined) return null;
  if (type === 'jsonb') return JSON.stringify(value);
  if (value instanceof Date) return value.toISOString();
  if (type.endsWith('[]')) return `{${(value as number[]).join(',')}}`;
  return value;
};

/**
 * Adds the events that the procedure does not hold yet; one seen before (same UID and plane) changes nothing. Column by
 * column: the server takes ten times as long over rows of JSON.
 */
export async function addEvents(db: EntityManager, procedureId: string, events: NewEvent[]): Promise<void> {
  if (events.length === 0) return;
  const targets = names.map((name) => columnOf(db, name)).join(', ');
  const isWrapped = (type: string) => type === 'jsonb' || type.endsWith('[]');
  const lists = names.map(
    (name, index) => `$${index + 2}::${isWrapped(columns[name]) ? 'text' : columns[name]}[]`,
  );
  const statement = `insert into irradiation_event (procedure_id, ${targets})
     select $1, ${names.map((name) => `given."${name}"::${columns[name]}`).join(', ')}
       from unnest(${lists.join(', ')}) as given(${names.map((name) => `"${name}"`).join(', ')})
      where not exists (select 1 from irradiation_event known
                         where known.procedure_id = $1 and known.event_key = given."eventKey")
     on conflict (procedure_id, event_key, started_at) do nothing`;
  for (let start = 0; start < events.length; start += rowsPerStatement) {
    const rows = events.slice(start, start + rowsPerStatement);
    await db.query(statement, [
      procedureId,
      ...names.map((name) => rows.map((event) => cellOf(event[name], columns[name]))),
    ]);
  }
}

const inTime = { startedAt: 'ASC', plane: 'ASC', id: 'ASC' } as const;

/** The events with the file's own strings: for whoever shows them. */
export const listEvents = (db: EntityManager, procedureId: string): Promise<IrradiationEvent[]> =>
  db.find(IrradiationEvent, { where: { procedureId }, order: inTime });

export type EventFigures = Omit<IrradiationEvent, 'reported' | 'details'>;

const figures = names.filter((name) => name !== 'reported' && name !== 'details');

/**
 * The events without the file's own strings, which are most of a row: for whoever computes. Plain rows: the library's
 * entities take as long again, in one go for thousands of events.
 */
export const listEventFigures = (db: EntityManager, procedureId: string): Promise<EventFigures[]> =>
  db.query(
    `select procedure_id as "procedureId",
            ${figures.map((name) => `${columnOf(db, name)} as "${name}"`).join(', ')}
       from irradiation_event
      where procedure_id = $1
      order by started_at, plane, id`,
    [procedureId],
  );
