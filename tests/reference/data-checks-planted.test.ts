import { readFileSync } from 'node:fs';
import { beforeAll, expect, test } from 'vitest';
import type { DemoProcedure } from '../../server/demo/demo-types';
import { generateProcedures } from '../../server/demo/generate-procedures';
import { checkRules } from '../../server/data-checks/check-rules';
import { findingsOf, startChecking } from './check-generated';
import { findableFaults, hiddenFaults, type Fault } from './plant-faults';

// Own acceptance checks: no finding on 500 clean procedures, at least 95 % of at least 60 planted faults found.
const firstClean = 1000;
const cleanCount = 500;
const copies = 5;

type Subject = { procedure: DemoProcedure; findings: string[] };
type Outcome = { fault: Fault; found: number; rules: string[] };

const clean: Subject[] = [];
let findable: Outcome[];
let hidden: Outcome[];

beforeAll(() => {
  const checking = startChecking();
  const outcomes = new Map<Fault, Outcome>();
  const latest = new Map<string, DemoProcedure>();
  const waiting = [...findableFaults, ...hiddenFaults].flatMap((fault) => Array<Fault>(copies).fill(fault));
  let index = 0;
  for (const procedure of generateProcedures(new Date('2026-12-01T00:00:00Z'))) {
    const before = latest.get(procedure.equipment.key);
    if (index >= firstClean && procedure.defect === null && before && clean.length < cleanCount) {
      // Spoilt copies are checked where the clean one stands, with what was known then.
      const place = clean.length % 2 === 0 ? waiting.findIndex(({ fits }) => fits?.(procedure) ?? true) : -1;
      const [fault] = place < 0 ? [] : waiting.splice(place, 1);
      if (fault) {
        const findings = findingsOf(checking.checkAside(fault.plant(procedure, before)));
        const outcome = outcomes.get(fault) ?? { fault, found: 0, rules: [] };
        outcome.found += findings.length > 0 ? 1 : 0;
        outcome.rules = [...new Set([...outcome.rules, ...findings])].toSorted();
        outcomes.set(fault, outcome);
      }
      clean.push({ procedure, findings: findingsOf(checking.check(procedure)) });
    } else checking.check(procedure);
    if (procedure.planes.length > 0) latest.set(procedure.equipment.key, procedure);
    index += 1;
    if (clean.length === cleanCount) break;
  }
  expect(waiting).toEqual([]);
  const listed = (faults: Fault[]) => faults.flatMap((fault) => outcomes.get(fault) ?? []);
  [findable, hidden] = [listed(findableFaults), listed(hiddenFaults)];
}, 120_000);

/** Lines of the document without the padding of its tables. */
const readTableLines = () =>
  readFileSync('docs/data-checks.md', 'utf8')
    .split('\n')
    .map((line) => line.replace(/ +/g, ' '));

test('500 clean procedures have no finding at all', () => {
  expect(clean).toHaveLength(500);
  expect(
    clean.flatMap(({ procedure, findings }) => findings.map((code) => [procedure.number, code])),
  ).toEqual([]);
});

test('of the planted faults that can be found at least 95 % are', () => {
  const planted = findable.length * copies;
  expect(planted).toBeGreaterThanOrEqual(60);
  const found = findable.reduce((sum, outcome) => sum + outcome.found, 0);
  expect(found / planted).toBeGreaterThanOrEqual(0.95);
});

test('the document lists every rule as it is delivered', () => {
  const lines = readTableLines();
  for (const { code, name, severity, owner, low, high, unit } of checkRules) {
    const passes =
      low !== null && high !== null ? `${low} to ${high}` : high !== null ? `up to ${high}` : `from ${low}`;
    const bounds = low === null && high === null ? '–' : `${passes} ${unit}`;
    expect(lines).toContain(`| ${name} | ${code} | ${bounds} | ${severity} | ${owner} |`);
  }
});

test('the document says which planted fault was found by which rule, and which none finds', () => {
  const lines = readTableLines();
  for (const { fault, found, rules } of [...findable, ...hidden])
    expect(lines).toContain(`| ${fault.name} | ${found} of ${copies} | ${rules.join(', ') || '–'} |`);
});

test('what no rule can find is not claimed to be found', () => {
  expect(hidden.filter(({ found }) => found > 0).map(({ fault }) => fault.name)).toEqual([]);
});
