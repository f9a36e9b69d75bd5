import type {
  CheckDecision,
  CheckOwner,
  CheckRule,
  CheckSettlement,
  CheckSeverity,
  DataCheck,
  SettledFigures,
} from '../../../shared/contract/data-check';
import {
  formatFluoroscopyTime,
  formatKermaAreaProduct,
  formatReferenceAirKerma,
} from '../../../shared/units';

export const severityNames: Record<CheckSeverity, string> = { hard: 'hard', note: 'note', off: 'off' };

export const severityChoices: { value: CheckSeverity; label: string; hint: string }[] = [
  {
    value: 'hard',
    label: 'Hard',
    hint: 'A finding keeps the procedure out of every statistic until a physicist decides. Levels count all the same.',
  },
  { value: 'note', label: 'Note', hint: 'A finding is said beside the figures; the procedure counts.' },
  { value: 'off', label: 'Off', hint: 'The rule is not applied, and each procedure’s page says so.' },
];

export const ownerNames: Record<CheckOwner, string> = {
  physicist: 'physicist',
  technologist: 'technologist',
};
export const ownerChoices: { value: CheckOwner; label: string }[] = [
  { value: 'physicist', label: 'Physicist' },
  { value: 'technologist', label: 'Technologist' },
];

export const decisionNames: Record<CheckDecision, string> = {
  right: 'The value is right',
  corrected: 'Totals corrected',
  'left-out': 'Left out of statistics',
};

export const decisionChoices: { value: CheckDecision; label: string; hint: string }[] = [
  {
    value: 'right',
    label: 'The value is right',
    hint: 'It was compared with the machine or explained; the procedure counts as reported.',
  },
  {
    value: 'corrected',
    label: 'Other totals count',
    hint: 'Typed below; what was reported stays beside them.',
  },
  {
    value: 'left-out',
    label: 'Leave the procedure out',
    hint: 'It stays outside every statistic for good. Levels count all the same.',
  },
];

export const isFinding = ({ result }: Pick<DataCheck, 'result'>): boolean =>
  result === 'noted' || result === 'failed';
export const isOpenFinding = (check: DataCheck): boolean => isFinding(check) && check.settlement === null;

/** "4 to 600 cm²", "up to 5 %", "from 2005"; a rule without bounds has a dash. */
export function describeBounds(
  { low, high }: Pick<CheckRule['inForce'], 'low' | 'high'>,
  unit: string | null,
): string {
  // A true minus sign, as in every figure.
  const [from, to] = [low, high].map((end) => (end === null ? null : String(end).replace('-', '\u2212')));
  const range = from && to ? `${from} to ${to}` : to ? `up to ${to}` : from ? `from ${from}` : null;
  // A year is its own unit.
  return range === null ? '–' : [range, unit === 'year' ? null : unit].filter(Boolean).join(' ');
}

/** "K a,r 350 mGy, P KA 43.0 Gy·cm²": the totals that a physicist typed. */
export function describeFigures(figures: SettledFigures): string {
  const kerma = formatReferenceAirKerma(figures.referenceAirKermaGy);
  return [
    figures.referenceAirKermaGy === null ? null : `K a,r ${kerma.value} ${kerma.unit}`,
    figures.kermaAreaProductGyCm2 === null
      ? null
      : `P KA ${formatKermaAreaProduct(figures.kermaAreaProductGyCm2)} Gy·cm²`,
    figures.fluoroscopyTimeS === null
      ? null
      : `fluoroscopy time ${formatFluoroscopyTime(figures.fluoroscopyTimeS)} min`,
  ]
    .filter(Boolean)
    .join(', ');
}

/** "Totals corrected: P KA 43.0 Gy·cm²". */
export const describeDecision = ({
  decision,
  corrected,
}: Pick<CheckSettlement, 'decision' | 'corrected'>): string =>
  corrected ? `${decisionNames[decision]}: ${describeFigures(corrected)}` : decisionNames[decision];

/** "29 rules: 22 passed, 4 not checked, 2 open, 1 settled." */
export function countChecks(checks: readonly DataCheck[]): string {
  const count = (is: (check: DataCheck) => boolean) => checks.filter(is).length;
  const parts = [
    { n: count(({ result }) => result === 'passed'), word: 'passed' },
    { n: count(({ result }) => result === 'not-checked'), word: 'not checked' },
    { n: count(isOpenFinding), word: 'open' },
    { n: count((check) => isFinding(check) && check.settlement !== null), word: 'settled' },
  ].filter(({ n }) => n > 0);
  return `${checks.length} ${checks.length === 1 ? 'rule' : 'rules'}: ${parts.map(({ n, word }) => `${n} ${word}`).join(', ')}.`;
}
