import type { IrradiationEvent } from '../../../shared/contract/irradiation-event';
import {
  formatAirKermaRateMgyPerMin,
  formatDecimals,
  formatKermaAreaProduct,
  formatKvp,
  formatPrimaryAngle,
  formatReferenceAirKermaMgy,
  formatSecondaryAngle,
  formatSignificant,
  MISSING,
} from '../../../shared/units';
import { formatTimeWithSeconds } from '../../lib/clock';
import { findRate, type RateBasis } from './event-blocks';
import { midSentencePlane } from './procedure-words';

export const nameEventType = (type: string | null): string =>
  type === null ? 'type not told' : type.replaceAll('-', ' ');

export const formatRate = (rate: number | null, basis: RateBasis): string =>
  basis === 'reference-air-kerma' ? formatAirKermaRateMgyPerMin(rate) : formatSignificant(rate, 2);

export const rateUnits: Record<RateBasis, string> = {
  'reference-air-kerma': 'mGy/min',
  'kerma-area-product': 'Gy·cm²/min',
};

/** "LAO 30° / CRA 15°"; a rotation tells both ends. */
export function describeAngles(event: IrradiationEvent): string {
  if (event.primaryAngleDeg === null && event.secondaryAngleDeg === null) return MISSING;
  const start = `${formatPrimaryAngle(event.primaryAngleDeg)} / ${formatSecondaryAngle(event.secondaryAngleDeg)}`;
  const turns =
    event.primaryEndAngleDeg !== null &&
    Math.round(event.primaryEndAngleDeg) !== Math.round(event.primaryAngleDeg ?? 0);
  return turns ? `${start} to ${formatPrimaryAngle(event.primaryEndAngleDeg)}` : start;
}

export function describeFilters(event: IrradiationEvent): string {
  const parts = event.filters.flatMap(({ material, minThicknessMm, maxThicknessMm }) => {
    const thickness = maxThicknessMm ?? minThicknessMm;
    if (material === null && thickness === null) return [];
    const size = thickness === null ? '' : `${formatDecimals(thickness, 2)} mm `;
    return [`${size}${material ?? 'material not told'}`];
  });
  return parts.length === 0 ? MISSING : parts.join(' + ');
}

/** One event in one sentence, for the read-out above the strip; what the file does not say is left out. */
export function describeEvent(event: IrradiationEvent, place: number, basis: RateBasis): string {
  const rate = findRate(event, basis);
  return [
    `Event ${place + 1}`,
    event.startedAt === null ? null : formatTimeWithSeconds(event.startedAt),
    event.plane === null || event.plane === 'single' ? null : midSentencePlane(event.plane),
    nameEventType(event.type),
    event.kvpMean === null ? 'kVp not told' : `${formatKvp(event.kvpMean)} kVp`,
    rate === null ? 'rate not known' : `${formatRate(rate, basis)} ${rateUnits[basis]}`,
    event.referenceAirKermaGy === null
      ? null
      : `${formatReferenceAirKermaMgy(event.referenceAirKermaGy)} mGy`,
    event.kermaAreaProductGyCm2 === null
      ? null
      : `${formatKermaAreaProduct(event.kermaAreaProductGyCm2)} Gy·cm²`,
    describeAngles(event) === MISSING ? null : describeAngles(event),
  ]
    .filter((part) => part !== null)
    .join(', ');
}

/** How the heights of the strip came about, told once beneath it. */
export function describeRateBasis(events: readonly IrradiationEvent[], basis: RateBasis): string {
  if (basis === 'kerma-area-product')
    return 'Height: air kerma–area product rate, for no event tells its air kerma. Square-root scale.';
  const byExposure = events.filter((event) => event.airKermaRateBasis === 'exposure-time').length;
  const without = events.filter((event) => event.airKermaRateGyPerS === null).length;
  return [
    'Height: air kerma at the reference point over irradiation duration, as displayed, square-root scale.',
    byExposure > 0
      ? `${byExposure} of ${events.length} events give no duration: there the exposure time divides.`
      : null,
    without > 0 ? `${without} events have no rate and lie flat on the line.` : null,
  ]
    .filter((part) => part !== null)
    .join(' ');
}
