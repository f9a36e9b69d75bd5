import type { DemoBooking, DemoProcedureType } from './demo-types';
import { type DemoDay, listDemoDays, spreadOverDays } from './calendar';
import { demoProcedureTypes } from './procedure-types.table-data';
import { createRandom, type Random } from './random';
import { operatorShares } from './staff.table-data';

/** Share of procedures at night or on a weekend; stroke does not wait. Invented. */
const outOfHoursShare = (typeKey: string): number => (typeKey === 'NEU-THR' ? 0.45 : 0.06);

function sharesOf(typeKey: string): readonly (readonly [string, number])[] {
  if (typeKey === 'CA-AFA' || typeKey === 'CA-PM') return operatorShares.EP;
  if (typeKey === 'CA-CTO') return operatorShares['CA-CTO'];
  if (typeKey === 'CA-TAVI') return operatorShares['CA-TAVI'];
  if (typeKey.startsWith('NEU')) return operatorShares.NEU;
  return typeKey.startsWith('IR') ? operatorShares.IR : operatorShares.CA;
}

/** How often a second operator scrubs in. Invented. */
const secondOperatorShare: Readonly<Record<string, number>> = {
  'NEU-ANE': 0.6,
  'NEU-AVM': 0.8,
  'NEU-THR': 0.25,
  'IR-TIPS': 0.6,
  'IR-PAE': 0.25,
  'CA-CTO': 0.5,
  'CA-TAVI': 1,
};

function chooseSecond(typeKey: string, operatorCode: string, month: number, random: Random): string | null {
  // The learning consultant's first year is accompanied in one case of three.
  const isLearning = operatorCode === 'IR-4' && month <= 12;
  const share = isLearning ? 0.33 : (secondOperatorShare[typeKey] ?? 0.04);
  const others = sharesOf(typeKey).filter(([code]) => code !== operatorCode);
  if (others.length === 0 || !random.chance(share)) return null;
  return isLearning ? 'IR-1' : random.pickWeighted(others);
}

/** The two who are still learning stand beside the busiest operator of their specialty. */
function chooseTrainee(operatorCode: string, month: number, random: Random): string | null {
  if (operatorCode === 'IR-1' && month <= 8 && random.chance(0.1)) return 'IR-4';
  return operatorCode === 'INR-1' && random.chance(0.12) ? 'INR-3' : null;
}

/** Share of procedures whose patient has been here for the same kind of procedure before. */
const returnShare = 0.15;

/** Log-normal, median 27.5 kg/m², log-σ 0.19; the ends of the scale are cut. Invented. */
const drawBodyMassIndex = (patientNumber: number): number =>
  Math.min(55, Math.max(16, 27.5 * Math.exp(0.19 * createRandom('body-mass-index', patientNumber).normal())));

function bookType(
  type: DemoProcedureType,
  days: readonly DemoDay[],
  firstPatientNumber: number,
): DemoBooking[] {
  const calendar = createRandom('calendar', type.key);
  const count = 2 * type.proceduresPerYear;
  const outOfHoursCount = Math.round(count * outOfHoursShare(type.key));
  const jitter = () => calendar.uniform();
  const regular = spreadOverDays(
    days,
    (day) => (day.isWeekend ? 0 : day.load),
    count - outOfHoursCount,
    jitter,
  );
  const outOfHours = spreadOverDays(
    days,
    (day) => (day.isWeekend ? 2.5 : 1) * day.load,
    outOfHoursCount,
    jitter,
  );
  const slots = [
    ...regular.map((day) => ({ day, isOutOfHours: false })),
    ...outOfHours.map((day) => ({ day, isOutOfHours: true })),
  ].sort((a, b) => (a.day.date < b.day.date ? -1 : a.day.date > b.day.date ? 1 : 0));
  const patientNumbers: number[] = [];
  return slots.map(({ day, isOutOfHours }, index) => {
    const random = createRandom('booking', type.key, index);
    const earlier = patientNumbers[index - random.integer(1, 60)];
    const patientNumber = earlier && random.chance(returnShare) ? earlier : firstPatientNumber + index;
    patientNumbers.push(patientNumber);
    const operatorCode = random.pickWeighted(sharesOf(type.key));
    const secondOperatorCode = chooseSecond(type.key, operatorCode, day.month, random);
    return {
      typeKey: type.key,
      index,
      month: day.month,
      day: day.date,
      isOutOfHours,
      operatorCode,
      secondOperatorCode,
      traineeCode: secondOperatorCode ? null : chooseTrainee(operatorCode, day.month, random),
      patientNumber,
      bodyMassIndex: drawBodyMassIndex(patientNumber),
    };
  });
}

/** All 7,356 procedures of the 24 months before the anchor, by type and day, without clock time. */
export function bookProcedures(anchor: Date): DemoBooking[] {
  const days = listDemoDays(anchor);
  let firstPatientNumber = 1;
  return demoProcedureTypes.flatMap((type) => {
    const bookings = bookType(type, days, firstPatientNumber);
    firstPatientNumber += bookings.length;
    return bookings;
  });
}
