import type { TypedQuantityName } from './contract/manual-entry';
import type { QuantityKind } from './unit-factors';

/** Minutes and seconds with a colon between them, as many machines show the time: "12:30". No code of UCUM. */
export const minutesAndSeconds = 'min:s';

type TypedUnit = { unit: string; sign: string };

/** What may be chosen beside a number: the UCUM code and its sign on the screen. */
export const typedUnits: Record<TypedQuantityName, readonly TypedUnit[]> = {
  'reference-air-kerma': [
    { unit: 'mGy', sign: 'mGy' },
    { unit: 'Gy', sign: 'Gy' },
    { unit: 'cGy', sign: 'cGy' },
    { unit: 'uGy', sign: 'µGy' },
  ],
  'kerma-area-product': [
    { unit: 'Gy.cm2', sign: 'Gy·cm²' },
    { unit: 'dGy.cm2', sign: 'dGy·cm²' },
    { unit: 'cGy.cm2', sign: 'cGy·cm²' },
    { unit: 'mGy.cm2', sign: 'mGy·cm²' },
    { unit: 'uGy.m2', sign: 'µGy·m²' },
    { unit: 'mGy.m2', sign: 'mGy·m²' },
    { unit: 'Gy.m2', sign: 'Gy·m²' },
  ],
  'fluoroscopy-time': [
    { unit: minutesAndSeconds, sign: 'min:s' },
    { unit: 'min', sign: 'min' },
    { unit: 's', sign: 's' },
  ],
  'frame-count': [{ unit: '1', sign: 'frames' }],
};

/** The kind of quantity whose factors convert it to its canonical unit. */
export const kindOfTyped: Record<TypedQuantityName, QuantityKind> = {
  'reference-air-kerma': 'airKerma',
  'kerma-area-product': 'kermaAreaProduct',
  'fluoroscopy-time': 'time',
  'frame-count': 'count',
};

/** "uGy.m2" → "µGy·m²"; a code that nobody could have chosen stays as it is. */
export const signOfUnit = (quantity: TypedQuantityName, unit: string): string =>
  typedUnits[quantity].find((one) => one.unit === unit)?.sign ?? unit;
