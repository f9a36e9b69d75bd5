import type { SettledFigures } from '../../shared/contract/data-check';
import type { AttentionLevel } from '../../shared/contract/procedure-row';
import { isDoubtful, isOpen, type StoredCheck } from '../data-checks/check-data';
import type { SummaryInput } from './summary-input';
import type { Together } from './total-together';

type Reason = { level: AttentionLevel; code: string; detail: string };
export type Attention = { attentionLevel: AttentionLevel | null; attentionReasons: Reason[] };

const order: AttentionLevel[] = ['note', 'notify', 'act'];
/** A value exactly at the level counts, whatever the last binary digit says. */
const rounded = (value: number) => Math.round(value * 1e6) / 1e6;
const larger = ({ displayed, corrected }: { displayed: number | null; corrected: number | null }) =>
  displayed === null ? corrected : Math.max(displayed, corrected ?? displayed);

const words = {
  'reference-air-kerma': (value: number) => `K a,r ${Math.round(value * 1000)} mGy`,
  'kerma-area-product': (value: number) => `P KA ${Number(value.toPrecision(3))} Gy·cm²`,
  'fluoroscopy-time': (value: number) => `Fluoroscopy time ${(value / 60).toFixed(1)} min`,
};

/** A value against levels, and whether a physicist typed it in place of a wrong one. */
type Judged = { value: number | null; isSettled: boolean };

const judgedOf = (settled: number | null | undefined, reported: number | null): Judged =>
  settled === null || settled === undefined
    ? { value: reported, isSettled: false }
    : { value: settled, isSettled: true };

/**
 * Which of the department's levels a procedure reached. The larger of displayed and corrected counts, but where a
 * physicist typed the total in place of a wrong one that alone counts; fluoroscopy time only where both kerma figures
 * are missing. A failed data check never silences a level: it says that the value is in doubt.
 */
export function judgeAttention(
  input: SummaryInput,
  together: Together,
  checks: readonly StoredCheck[],
  settled: SettledFigures | null,
): Attention {
  if (input.procedure.procedureClass !== 'clinical' || input.procedure.deviceClass !== 'fluoroscopy')
    return { attentionLevel: null, attentionReasons: [] };
  const kerma = judgedOf(settled?.referenceAirKermaGy, larger(together.referenceAirKerma));
  const product = judgedOf(settled?.kermaAreaProductGyCm2, larger(together.kermaAreaProduct));
  const time = judgedOf(settled?.fluoroscopyTimeS, together.fluoroscopyTimeS);
  const judged = {
    'reference-air-kerma': kerma,
    'kerma-area-product': product,
    'fluoroscopy-time':
      kerma.value === null && product.value === null ? time : { value: null, isSettled: false },
  };
  const doubt = checks.some(isDoubtful) ? '; value in doubt' : '';
  const reached = input.levels.flatMap((level): Reason[] => {
    const { value, isSettled } = judged[level.quantity];
    if (value === null || rounded(value) < rounded(level.value)) return [];
    const name = level.strength === 'act' ? 'substantial level' : 'notification level';
    const write = words[level.quantity];
    const origin = isSettled ? ' as corrected by the physicist' : '';
    return [
      {
        level: level.strength,
        code: level.quantity,
        detail: `${write(value)}${origin}, at or above the ${name} of ${write(level.value).replace(/^\D+/, '')}${doubt}`,
      },
    ];
  });
  const strongest = reached.filter(
    (reason) =>
      reason.level === 'act' || !reached.some((other) => other.code === reason.code && other.level === 'act'),
  );
  const notes = checks
    .filter(isOpen)
    .map((check): Reason => ({ level: 'note', code: check.code, detail: check.detail }));
  const reasons = [...strongest, ...notes].toSorted(
    (a, b) => order.indexOf(b.level) - order.indexOf(a.level),
  );
  return { attentionLevel: reasons[0]?.level ?? null, attentionReasons: reasons };
}
