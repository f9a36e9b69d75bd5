import {
  formatFluoroscopyTime,
  formatKermaAreaProduct,
  formatReferenceAirKerma,
  type DisplayedFigure,
} from '../../../shared/units';
import { QuantitySign } from '../../ui/quantity-sign';
import type { TotalQuantity } from './combine-planes';

export const quantityNames: Record<TotalQuantity, string> = {
  'fluoroscopy-time': 'Fluoroscopy time',
  'reference-air-kerma': 'Reference air kerma',
  'kerma-area-product': 'Air kerma–area product',
};

const signs = {
  'fluoroscopy-time': 'fluoroscopyTime',
  'reference-air-kerma': 'referenceAirKerma',
  'kerma-area-product': 'kermaAreaProduct',
} as const;

export const TotalSign = ({ of }: { of: TotalQuantity }) => <QuantitySign of={signs[of]} />;

/** A total as it is printed: minutes, mGy (Gy from ten on), Gy·cm². */
export function formatTotal(value: number | null, quantity: TotalQuantity): DisplayedFigure {
  if (quantity === 'reference-air-kerma') return formatReferenceAirKerma(value);
  return quantity === 'fluoroscopy-time'
    ? { value: formatFluoroscopyTime(value), unit: 'min' }
    : { value: formatKermaAreaProduct(value), unit: 'Gy·cm²' };
}

export const writeTotal = (value: number | null, quantity: TotalQuantity): string => {
  const figure = formatTotal(value, quantity);
  return `${figure.value} ${figure.unit}`;
};

/** The unit of the rulers' scale marks: minutes, mGy, Gy·cm². */
export const toScale = (value: number, quantity: TotalQuantity): number =>
  quantity === 'fluoroscopy-time' ? value / 60 : quantity === 'reference-air-kerma' ? value * 1000 : value;
