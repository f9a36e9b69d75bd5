import type { ReactNode } from 'react';
import { dutyNames, duties } from '../../../shared/contract/record';
import { periodNames, periods } from '../../../shared/contract/procedure-row';
import {
  exposureQuantities,
  type ExposureDuty,
  type ExposureQuantity,
} from '../../../shared/contract/staff-exposure';
import { QuantitySign } from '../../ui/quantity-sign';

type QuantityWords = {
  /** In the sentence: "Estimated collar exposure of …". */
  phrase: string;
  /** In a table's head. */
  short: string;
  sign: ReactNode;
  /** The same on a canvas, which sets no subscripts. */
  plainSign: string;
  meaning: string;
};

export const quantityWords: Record<ExposureQuantity, QuantityWords> = {
  collarHp10USv: {
    phrase: 'collar exposure',
    short: 'Collar',
    sign: <QuantitySign of="hp10" />,
    plainSign: 'Hp(10) at the collar',
    meaning: 'at the collar, over the garment and behind the room’s screens: what a collar badge would read',
  },
  eyeHp3USv: {
    phrase: 'eye exposure',
    short: 'Eye',
    sign: <QuantitySign of="hp3" />,
    plainSign: 'Hp(3) at the eye',
    meaning: 'at the eye, behind glasses and screens',
  },
  underGarmentHp10USv: {
    phrase: 'exposure under the garment',
    short: 'Under garment',
    sign: <QuantitySign of="hp10" />,
    plainSign: 'Hp(10) under the garment',
    meaning: 'at the waist, under the garment that was worn',
  },
  effectiveDoseUSv: {
    phrase: 'effective dose',
    short: 'Effective',
    sign: <QuantitySign of="effectiveDose" />,
    plainSign: 'effective dose E',
    meaning: 'for the whole body, by the formula 0.5 Hw + 0.025 Hn (NCRP 122), which may be 30 % low',
  },
};

const dutyPhrases: Record<ExposureDuty, string> = {
  any: 'the most exposed person',
  'primary-operator': 'the operator',
  'second-operator': 'the second operator',
  trainee: 'the trainee',
  scrub: 'the scrub staff',
  anaesthesia: 'the anaesthesia staff',
  circulating: 'the circulating staff',
  technologist: 'the technologist',
  other: 'other staff',
};

export const quantityChoices = exposureQuantities.map((value) => ({
  value,
  label: quantityWords[value].phrase,
}));
export const dutyChoices = [...duties, 'any' as const].map((value) => ({ value, label: dutyPhrases[value] }));
/** For a page about one person. */
export const ownDutyChoices = [
  { value: 'any', label: 'in any duty' },
  ...duties.map((value) => ({ value, label: `as ${dutyNames[value].toLowerCase()}` })),
];
export const periodChoices = periods.map((value) => ({ value, label: periodNames[value] }));
