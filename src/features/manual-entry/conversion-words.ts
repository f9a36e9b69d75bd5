import type { TypedQuantity, TypedQuantityName } from '../../../shared/contract/manual-entry';
import { readTypedQuantity } from '../../../shared/read-typed-quantity';
import { signOfUnit } from '../../../shared/typed-units';
import { groupThousands, THIN_SPACE } from '../../../shared/units';

export const quantityNames: Record<TypedQuantityName, string> = {
  'reference-air-kerma': 'Reference air kerma',
  'kerma-area-product': 'Air kerma–area product',
  'fluoroscopy-time': 'Fluoroscopy time',
  'frame-count': 'Number of frames',
};

/** How a canonical value stands in the product's lists, and the typed unit that needs no conversion. */
const shown: Record<TypedQuantityName, { unit: string; sign: string; perCanonical: number; digits: number }> =
  {
    'reference-air-kerma': { unit: 'mGy', sign: 'mGy', perCanonical: 1000, digits: 6 },
    'kerma-area-product': { unit: 'Gy.cm2', sign: 'Gy·cm²', perCanonical: 1, digits: 6 },
    'fluoroscopy-time': { unit: 'min', sign: 'min', perCanonical: 1 / 60, digits: 3 },
    'frame-count': { unit: '1', sign: 'frames', perCanonical: 1, digits: 12 },
  };

/** No zeros at the end, and no digits that only the division made: 12.5, 0.01, 1.67. */
const write = (value: number, digits: number) =>
  groupThousands(
    new Intl.NumberFormat('en', { maximumSignificantDigits: digits, useGrouping: false }).format(value),
  );

/** "12.5 Gy·cm²" for 1250 µGy·m²; null where nothing readable is typed or nothing needs converting. */
export function writeConverted(figure: Pick<TypedQuantity, 'quantity' | 'text' | 'unit'>): string | null {
  const { value } = readTypedQuantity(figure);
  const { unit, sign, perCanonical, digits } = shown[figure.quantity];
  if (value === undefined || figure.unit === unit) return null;
  return `${write(value * perCanonical, digits)}${THIN_SPACE}${sign}`;
}

/** "1250 µGy·m²": to the letter. */
export const writeTyped = ({
  quantity,
  text,
  unit,
}: Pick<TypedQuantity, 'quantity' | 'text' | 'unit'>): string =>
  `${text}${THIN_SPACE}${signOfUnit(quantity, unit)}`;

/** What stands below a figure while it is typed: "1250 µGy·m² is 12.5 Gy·cm²"; null for what cannot be read. */
export function describeTyped(figure: Pick<TypedQuantity, 'quantity' | 'text' | 'unit'>): string | null {
  if (figure.text.trim() === '' || figure.unit === '' || figure.quantity === 'frame-count') return null;
  const typed = writeTyped({ ...figure, text: figure.text.trim() });
  const { fault } = readTypedQuantity(figure);
  if (fault) return null;
  const converted = writeConverted(figure);
  return converted === null ? `${typed}, taken as typed` : `${typed} is ${converted}`;
}
