import type { Strip } from '../../../shared/contract/procedure-row';
import {
  convertGyPerSToMgyPerMin,
  formatAirKermaRateMgyPerMin,
  formatInteger,
  formatSignificant,
} from '../../../shared/units';

/** "42 min", and seconds where there is less than a minute and a half. */
export const describeSpan = (spanS: number): string =>
  spanS < 90 ? `${formatInteger(spanS)} s` : `${formatInteger(spanS / 60)} min`;

/** What the full height stands for: "to 42 mGy/min"; an area product's rate where no air kerma is given. */
export function describePeak({ basis, peakRate }: Pick<Strip, 'basis' | 'peakRate'>): string {
  // Both rates are kept per second.
  return basis === 'reference-air-kerma'
    ? `to ${formatAirKermaRateMgyPerMin(convertGyPerSToMgyPerMin(peakRate))} mGy/min`
    : `to ${formatSignificant(peakRate * 60, 3)} Gy·cm²/min (area product)`;
}
