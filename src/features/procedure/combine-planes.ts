import type { PlaneTotals, Procedure } from '../../../shared/contract/procedure';

export type Figures = {
  displayed: number | null;
  /** Null where no factor of the physicist applies. */
  corrected: number | null;
};

export const totalQuantities = ['fluoroscopy-time', 'reference-air-kerma', 'kerma-area-product'] as const;
export type TotalQuantity = (typeof totalQuantities)[number];

const fieldOf = {
  'fluoroscopy-time': 'fluoroscopyTimeS',
  'reference-air-kerma': 'referenceAirKermaGy',
  'kerma-area-product': 'kermaAreaProductGyCm2',
} as const;

/** One quantity of one plane: as the machine displayed it, and with the physicist's factor. */
export function readPlane(plane: PlaneTotals, quantity: TotalQuantity): Figures {
  if (quantity === 'fluoroscopy-time')
    return { displayed: plane.displayed.fluoroscopyTimeS, corrected: null };
  const field = quantity === 'reference-air-kerma' ? 'referenceAirKermaGy' : 'kermaAreaProductGyCm2';
  return { displayed: plane.displayed[field], corrected: plane.corrected[field] };
}

/** The total that a physicist typed in place of a wrong one; null where none was. */
export const readSettled = (
  { settledFigures }: Pick<Procedure, 'settledFigures'>,
  quantity: TotalQuantity,
): number | null => settledFigures?.[fieldOf[quantity]] ?? null;

/**
 * Whether an open finding is about this quantity: rules about fluoroscopy time doubt the time, all others what was
 * measured.
 */
export const isDoubted = ({ dataChecks }: Pick<Procedure, 'dataChecks'>, quantity: TotalQuantity): boolean =>
  dataChecks.some(
    ({ code, result, settlement }) =>
      result === 'failed' &&
      settlement === null &&
      code.startsWith('fluoroscopy-time') === (quantity === 'fluoroscopy-time'),
  );

const add = (one: number, other: number): number => one + other;
// Not Math.max itself: a fold hands over place and list as well.
const takeLarger = (one: number, other: number): number => Math.max(one, other);

function fold(values: (number | null)[], combine: (one: number, other: number) => number): number | null {
  const known = values.filter((value) => value !== null);
  return known.length === 0 ? null : known.reduce(combine);
}

/**
 * One quantity of all planes. Time and air kerma–area product add up; the reference air kerma of two planes
 * adds up to an upper bound, and is the larger one where the physicist said that the fields lie apart.
 * A plane without a factor enters the corrected total as displayed.
 */
export function combinePlanes(
  { planes, fieldsOverlap }: Pick<Procedure, 'planes' | 'fieldsOverlap'>,
  quantity: TotalQuantity,
): Figures {
  const figures = planes.map((plane) => readPlane(plane, quantity));
  const isLarger = quantity === 'reference-air-kerma' && fieldsOverlap === false;
  const combine = isLarger ? takeLarger : add;
  const hasFactor = figures.some(({ corrected }) => corrected !== null);
  return {
    displayed: fold(
      figures.map(({ displayed }) => displayed),
      combine,
    ),
    corrected: hasFactor
      ? fold(
          figures.map(({ displayed, corrected }) => corrected ?? displayed),
          combine,
        )
      : null,
  };
}

/** How far the reported total and the sum of the events lie apart, as a share of the reported; null if unknown. */
export function findDifference(plane: PlaneTotals, quantity: TotalQuantity): number | null {
  const field = fieldOf[quantity];
  const reported = plane.reported?.[field] ?? null;
  const summed = plane.summed[field];
  return reported === null || summed === null || reported === 0 ? null : summed / reported - 1;
}
