import { groupThousands } from '../../../shared/units';

/** Shares of the procedures below each limit, before rounding: a few stand out, most are told apart. */
const shares = [0.2, 0.5, 0.8, 0.96];

/** The 1-2-5 value nearest on a logarithmic scale: 4 → 5, 0.13 → 0.1. */
export function roundTo125(value: number): number {
  const decade = 10 ** Math.floor(Math.log10(value));
  const steps = [1, 2, 5, 10].map((factor) => factor * decade);
  const distance = (step: number) => Math.abs(Math.log(step / value));
  const nearest = steps.reduce((best, step) => (distance(step) < distance(best) ? step : best));
  return Number(nearest.toPrecision(6));
}

const nextUp = (value: number): number => roundTo125(value * 2.2);

/** Four ascending round limits between five tones, near fixed shares of the values; [1, 2, 5, 10] without any. */
export function findToneLimits(values: readonly number[]): number[] {
  const sorted = values.filter((value) => value > 0).sort((one, other) => one - other);
  const limits: number[] = [];
  for (const share of shares) {
    const found = sorted[Math.floor(share * (sorted.length - 1))];
    const round = found === undefined ? 1 : roundTo125(found);
    const last = limits.at(-1);
    limits.push(last !== undefined && round <= last ? nextUp(last) : round);
  }
  return limits;
}

/** A round limit as it is printed: 0.2, 5, 1 000. */
export const nameLimit = (limit: number): string => groupThousands(String(limit));

/** Five names for the legend: "below 5", "5–20", …, "200 and above". */
export function nameTones(limits: readonly number[]): string[] {
  return [...limits, Infinity].map((limit, tone) => {
    const from = limits[tone - 1];
    if (from === undefined) return `below ${nameLimit(limit)}`;
    return limit === Infinity ? `${nameLimit(from)} and above` : `${nameLimit(from)}–${nameLimit(limit)}`;
  });
}
