import {
  meanFieldAreaCm2,
  plausibleFieldAreaCm2,
  plausibleKermaRateMgyPerMin,
} from '../../../shared/dosimetry/field-plausibility';
import type { TypedQuantity, TypedQuantityName } from '../../../shared/contract/manual-entry';
import { readTypedQuantity } from '../../../shared/read-typed-quantity';
import {
  convertGyToMgy,
  convertSecondsToMinutes,
  formatInteger,
  formatSignificant,
} from '../../../shared/units';

const planeWords: Record<TypedQuantity['plane'], string> = {
  single: '',
  all: '',
  A: ' of plane A',
  B: ' of plane B',
};

/** What looks as if a unit or a point were wrong. It is said, and never holds an entry back. */
export function findDoubts(figures: readonly TypedQuantity[]): string[] {
  return (['single', 'A', 'B'] as const).flatMap((plane) => {
    const value = (quantity: TypedQuantityName): number | null => {
      const figure = figures.find((one) => one.plane === plane && one.quantity === quantity);
      return (figure && readTypedQuantity(figure).value) ?? null;
    };
    const [kermaGy, timeS] = [value('reference-air-kerma'), value('fluoroscopy-time')];
    const areaCm2 = meanFieldAreaCm2(value('kerma-area-product'), kermaGy);
    const { low, high } = plausibleFieldAreaCm2;
    const doubts: string[] = [];
    if (areaCm2 !== null && (areaCm2 < low || areaCm2 > high))
      doubts.push(
        `The mean field${planeWords[plane]} would be ${formatSignificant(areaCm2, 2)} cm²; real ones are ${low} to ${high} cm². Is one of the two units another one?`,
      );
    const minutes = timeS === null ? null : convertSecondsToMinutes(timeS);
    const rate = kermaGy === null || !minutes ? null : convertGyToMgy(kermaGy) / minutes;
    if (rate !== null && rate > plausibleKermaRateMgyPerMin)
      doubts.push(
        `Air kerma over fluoroscopy time${planeWords[plane]} would be ${formatInteger(rate)} mGy/min, more than machines usually give. Is one of the two units another one?`,
      );
    return doubts;
  });
}
