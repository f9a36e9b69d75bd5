import {
  calibratedPlanes,
  calibratedQuantities,
  expectedFactorRange,
  isExpectedFactor,
} from '../../../shared/contract/calibration-factor';
import { formatDecimals } from '../../../shared/units';

export const planeNames: Record<(typeof calibratedPlanes)[number], string> = {
  single: 'Single plane',
  A: 'Plane A',
  B: 'Plane B',
};
export const planeChoices = calibratedPlanes.map((value) => ({ value, label: planeNames[value] }));

export const quantityNames: Record<(typeof calibratedQuantities)[number], string> = {
  'reference-air-kerma': 'Reference air kerma',
  'kerma-area-product': 'Kerma-area product',
};
export const quantityChoices = calibratedQuantities.map((value) => ({ value, label: quantityNames[value] }));

/** Said beside a factor that a display within 35 % of the true value cannot have. It may be saved. */
export function warnOfFactor(factor: number | null): string | null {
  if (factor === null || !Number.isFinite(factor) || factor <= 0 || isExpectedFactor(factor)) return null;
  const [low, high] = [expectedFactorRange.low, expectedFactorRange.high].map((end) =>
    formatDecimals(end, 2),
  );
  return (
    `A display within ±35 % of the true value has a factor from ${low} to ${high} (1/1.35 to 1/0.65); ` +
    `${formatDecimals(factor, 2)} lies outside. Check that true was divided by displayed, and both units. ` +
    'It can be saved all the same.'
  );
}
