import type { ScatterArea } from '../../charts/scatter.types';
import type { ExposurePoint } from '../../../shared/contract/staff-exposure';

/** The chosen rectangle as a part of the address: "5.2-20_80.1-95": minutes, then kVp. */
export const writeArea = ({ xFrom, xTo, yFrom, yTo }: ScatterArea): string => {
  const short = (value: number) => Number(value.toPrecision(3));
  return `${short(xFrom)}-${short(xTo)}_${short(yFrom)}-${short(yTo)}`;
};

/** Null where the address names none, or nonsense. */
export function readArea(text: string | null): ScatterArea | null {
  const numbers = text?.split(/[-_]/).map(Number) ?? [];
  const [xFrom = NaN, xTo = NaN, yFrom = NaN, yTo = NaN] = numbers;
  const isArea = numbers.length === 4 && xFrom > 0 && xTo > xFrom && yFrom > 0 && yTo > yFrom;
  return isArea ? { xFrom, xTo, yFrom, yTo } : null;
}

/** Place of a procedure in the chart; null where a coordinate is missing or has no place on a log scale. */
export function placePoint(point: ExposurePoint): { x: number; y: number } | null {
  const { fluoroscopyTimeS, kvpMean } = point;
  if (fluoroscopyTimeS === null || fluoroscopyTimeS <= 0 || kvpMean === null) return null;
  return { x: fluoroscopyTimeS / 60, y: kvpMean };
}
