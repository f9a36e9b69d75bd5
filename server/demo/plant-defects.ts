import type { DemoDefect } from './demo-types';
import { demoMonths } from './hospital';
import { createRandom } from './random';

const planted: readonly (readonly [DemoDefect, number])[] = [
  ['missing-weight', 147],
  ['wrong-operator-corrected', 110],
  ['manual-entry', 37],
  ['duplicate-report', 29],
  ['superseded-report', 29],
  ['kap-unit-slip', 29],
  ['clock-offset', 22],
  ['kerma-not-reset', 15],
  ['no-report', 12],
  ['combined-procedure', 9],
  ['split-study', 6],
  ['merged-patient', 4],
];

/** No file of these reached the archive, so they can't be among the newest, which are real files. */
const fileless: readonly DemoDefect[] = ['manual-entry', 'no-report'];

/** A few spoilt totals would bend the distribution of a type with few procedures. */
const spoiling: readonly DemoDefect[] = [...fileless, 'kap-unit-slip', 'kerma-not-reset'];
const rareBelowPerYear = 140;

interface DefectCarrier {
  month: number;
  isNewest: boolean;
  proceduresPerYear: number;
}

function canCarry({ isNewest, proceduresPerYear }: DefectCarrier, defect: DemoDefect): boolean {
  if (isNewest && fileless.includes(defect)) return false;
  return proceduresPerYear >= rareBelowPerYear || !spoiling.includes(defect);
}

/** Share of records that nobody completed: from 6 % in the first month to 1 % in the last. */
const incompleteShare = (month: number): number => 0.06 - (0.05 * (month - 1)) / (demoMonths - 1);

/**
 * Which procedures carry which planted fault. Counts are fixed (2 % missing weight, 1.5 % wrong
 * operator …); unfinished records follow a share that falls over the months.
 */
export function plantDefects(procedures: readonly DefectCarrier[]): (DemoDefect | null)[] {
  const random = createRandom('defects');
  const defects: (DemoDefect | null)[] = procedures.map(() => null);
  const free = random.shuffle(procedures.map((_, index) => index));
  for (const [defect, count] of planted) {
    const isFitting = (index: number) => canCarry(procedures[index] as DefectCarrier, defect);
    for (let placed = 0; placed < count; placed++) {
      const position = free.findLastIndex(isFitting);
      const [index] = free.splice(position, 1);
      if (index !== undefined) defects[index] = defect;
    }
  }
  for (const index of free) {
    const { month, isNewest } = procedures[index] as DefectCarrier;
    if (!isNewest && random.chance(incompleteShare(month))) defects[index] = 'record-incomplete';
  }
  return defects;
}
