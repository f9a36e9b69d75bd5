import type { DateTime } from 'luxon';
import type { DemoBooking, DemoPatient, DemoProcedureType } from './demo-types';
import { startOfAnchorDay } from './calendar';
import { createRandom } from './random';

/** Mean age and its spread where a type's patients differ from the hospital's. Invented. */
const ages: Readonly<Record<string, readonly [meanYears: number, spreadYears: number]>> = {
  'NEU-DSA': [57, 14],
  'NEU-ANE': [56, 12],
  'NEU-AVM': [46, 14],
  'NEU-THR': [71, 13],
  'CA-TAVI': [80, 6],
  'CA-PM': [75, 10],
  'IR-PAE': [69, 7],
};

const clamp = (value: number, low: number, high: number) => Math.min(high, Math.max(low, value));

/** Numbers in no visible order: multiplication modulo a prime visits every number once. */
const patientCode = (patientNumber: number): string =>
  String(1000 + ((patientNumber * 3571) % 8009)).padStart(6, '0');

/** A fictional adult, the same at every visit. The name is a code, not a name. */
export function makePatient(type: DemoProcedureType, booking: DemoBooking, anchor: Date): DemoPatient {
  const random = createRandom('patient', booking.patientNumber);
  const sex = type.key === 'IR-PAE' || random.chance(0.58) ? 'M' : 'F';
  const [meanYears, spreadYears] = ages[type.key] ?? [65, 12];
  const ageDays = Math.round(365.25 * clamp(meanYears + spreadYears * random.normal(), 21, 97));
  const birth: DateTime = startOfAnchorDay(anchor).minus({ days: ageDays });
  const heightM = clamp((sex === 'M' ? 1.76 : 1.63) + 0.068 * random.normal(), 1.42, 2.02);
  const code = patientCode(booking.patientNumber);
  return {
    id: `MC-P-${code}`,
    name: `Demo^Patient ${Number(code)}`,
    birthDate: birth.toFormat('yyyy-MM-dd'),
    sex,
    heightM: Number(heightM.toFixed(2)),
    weightKg: Math.round(booking.bodyMassIndex * heightM ** 2),
  };
}
