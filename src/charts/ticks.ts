const clockSteps = [1, 2, 5, 10, 15, 30, 60, 120, 300, 600, 900, 1_800, 3_600, 7_200, 14_400];

/**
 * Round clock times inside a window. All numbers are seconds; `originS` is the second of the day at
 * which the window's zero lies. Returns places in the window's own seconds.
 */
export function findClockTicks(fromS: number, toS: number, originS: number, most: number): number[] {
  const span = Math.max(toS - fromS, 1e-9);
  const step = clockSteps.find((candidate) => span / candidate <= most) ?? 28_800;
  const first = Math.ceil((originS + fromS) / step) * step - originS;
  const ticks: number[] = [];
  for (let at = first; at <= toS; at += step) ticks.push(at);
  return ticks;
}

/** "14:12", with seconds where the ticks are closer than a minute; past midnight it starts again at 00. */
export function formatClock(secondOfDay: number, hasSeconds: boolean): string {
  const whole = ((Math.round(secondOfDay) % 86_400) + 86_400) % 86_400;
  const parts = [Math.floor(whole / 3_600), Math.floor(whole / 60) % 60, ...(hasSeconds ? [whole % 60] : [])];
  return parts.map((part) => String(part).padStart(2, '0')).join(':');
}

/** The round step (1, 2 or 5 times a power of ten) that cuts a length into at most so many parts. */
export function findRoundStep(length: number, most: number): number {
  const raw = length / Math.max(1, most);
  const decade = 10 ** Math.floor(Math.log10(raw));
  const factor = [1, 2, 5, 10].find((candidate) => candidate * decade >= raw * (1 - 1e-9)) ?? 10;
  return factor * decade;
}

/** Round values from 0 (or the first one inside) up to an end. */
export function findRoundTicks(from: number, to: number, most: number): number[] {
  if (!(to > from)) return [];
  const step = findRoundStep(to - from, most);
  const first = Math.ceil(from / step - 1e-9);
  const last = Math.floor(to / step + 1e-9);
  return Array.from({ length: last - first + 1 }, (_, place) =>
    Number(((first + place) * step).toPrecision(12)),
  );
}

/** Ticks that stay apart on a square-root scale: 0, then 1-2-5 values at least a share of the height apart. */
export function findRootTicks(peak: number, least: number): number[] {
  if (!(peak > 0)) return [0];
  const candidates: number[] = [];
  for (let decade = 10 ** Math.ceil(Math.log10(peak)); decade > peak / 1_000; decade /= 10)
    candidates.push(decade, decade / 2, decade / 5);
  const kept = [0];
  let lastPlace = 1 + least;
  for (const value of candidates.filter((candidate) => candidate <= peak * 1.0001)) {
    const place = Math.sqrt(value / peak);
    if (lastPlace - place >= least && place >= least) {
      kept.push(Number(value.toPrecision(6)));
      lastPlace = place;
    }
  }
  return kept.sort((one, other) => one - other);
}
