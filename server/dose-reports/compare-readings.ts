import type { ValueChange } from '../../shared/contract/read-again';
import type { Remark } from '../../shared/contract/common';
import type { Report } from '../../shared/contract/report';
import type { NewEvent } from '../procedures/irradiation-event.store';
import type { ReportContext } from './dose-report.entity';

/** What one reading of a file gave, as it is stored. */
export type Reading = {
  context: ReportContext | null;
  planes: Report['planes'];
  warnings: Remark[];
  events: NewEvent[];
};

type Leaves = Map<string, string>;

const isPlain = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !(value instanceof Date);

/** Every value below an object by its path. Nothing said (null, empty) is no value; a list of plain values is one. */
function collectLeaves(value: unknown, path: string, leaves: Leaves): Leaves {
  if (value === null || value === undefined || value === '') return leaves;
  if (value instanceof Date) leaves.set(path, value.toISOString());
  else if (Array.isArray(value) && !value.some(isPlain)) {
    if (value.length > 0) leaves.set(path, value.join(', '));
  } else if (isPlain(value))
    for (const [name, part] of Object.entries(value))
      collectLeaves(
        part,
        path === '' ? name : `${path}.${Array.isArray(value) ? Number(name) + 1 : name}`,
        leaves,
      );
  else leaves.set(path, String(value));
  return leaves;
}

function* compareLeaves(where: string, before: unknown, after: unknown): Generator<ValueChange> {
  const old = collectLeaves(before, '', new Map());
  const fresh = collectLeaves(after, '', new Map());
  for (const field of new Set([...old.keys(), ...fresh.keys()])) {
    const [was, is] = [old.get(field) ?? null, fresh.get(field) ?? null];
    if (was !== is) yield { where, field, before: was, after: is };
  }
}

/** The row without what says where it is stored. */
function valuesOf(event: NewEvent | undefined): unknown {
  if (!event) return null;
  const { id: _, doseReportId: __, eventKey: ___, ...values } = event;
  return values;
}

const nameOfPlane = ({ plane }: Report['planes'][number]) =>
  plane === null || plane === 'all' || plane === 'single' ? 'totals' : `totals of plane ${plane}`;

/** Every value that two readings of the same bytes have differently, in the order of the report. */
export function compareReadings(before: Reading, after: Reading): ValueChange[] {
  const changes = [...compareLeaves('report', before.context, after.context)];
  for (let index = 0; index < Math.max(before.planes.length, after.planes.length); index++) {
    const [was, is] = [before.planes[index], after.planes[index]];
    const plane = is ?? was;
    if (plane) changes.push(...compareLeaves(nameOfPlane(plane), was, is));
  }
  const old = new Map(before.events.map((event) => [event.eventKey, event]));
  const fresh = new Map(after.events.map((event) => [event.eventKey, event]));
  [...new Set([...old.keys(), ...fresh.keys()])].forEach((key, index) => {
    changes.push(...compareLeaves(`event ${index + 1}`, valuesOf(old.get(key)), valuesOf(fresh.get(key))));
  });
  return [...changes, ...compareLeaves('warnings', before.warnings, after.warnings)];
}
