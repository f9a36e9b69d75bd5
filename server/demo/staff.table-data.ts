import type { Job } from '../../shared/contract/person';
import type { DemoStaffMember } from './demo-types';

const group = (job: Job, staturesM: Record<string, number>, isMonitored = true): DemoStaffMember[] =>
  Object.entries(staturesM).map(([code, statureM]) => ({ code, job, statureM, isMonitored }));

/** 34 monitored members of staff, by role code only, and three who sign in without a badge. */
export const demoStaff: readonly DemoStaffMember[] = [
  ...group('neuro-interventionalist', { 'INR-1': 1.82, 'INR-2': 1.71, 'INR-3': 1.66 }),
  ...group('interventional-radiologist', {
    'IR-1': 1.79,
    'IR-2': 1.68,
    'IR-3': 1.85,
    'IR-4': 1.63,
    'IR-5': 1.76,
  }),
  ...group('interventional-cardiologist', { 'IC-1': 1.8, 'IC-2': 1.74, 'IC-3': 1.69 }),
  ...group('electrophysiologist', { 'EP-1': 1.77 }),
  ...group('technologist', {
    'T-01': 1.72,
    'T-02': 1.65,
    'T-03': 1.81,
    'T-04': 1.6,
    'T-05': 1.77,
    'T-06': 1.69,
    'T-07': 1.74,
    'T-08': 1.63,
    'T-09': 1.84,
    'T-10': 1.7,
  }),
  ...group('nurse', {
    'N-01': 1.64,
    'N-02': 1.7,
    'N-03': 1.58,
    'N-04': 1.75,
    'N-05': 1.67,
    'N-06': 1.62,
    'N-07': 1.8,
    'N-08': 1.66,
  }),
  ...group('anaesthetist', { 'A-01': 1.78, 'A-02': 1.68, 'A-03': 1.73, 'A-04': 1.61 }),
  ...group('physicist', { 'P-01': 1.75 }, false),
  ...group('other-physician', { 'Q-01': 1.7 }, false),
  ...group('administration', { 'AD-01': 1.68 }, false),
];

/** Operators and the share of their specialty's procedures that each does. */
export const operatorShares: Readonly<
  Record<'NEU' | 'IR' | 'CA' | 'CA-CTO' | 'CA-TAVI' | 'EP', readonly (readonly [string, number])[]>
> = {
  NEU: [
    ['INR-1', 45],
    ['INR-2', 35],
    ['INR-3', 20],
  ],
  IR: [
    ['IR-1', 26],
    ['IR-2', 24],
    ['IR-3', 20],
    ['IR-4', 17],
    ['IR-5', 13],
  ],
  CA: [
    ['IC-1', 40],
    ['IC-2', 35],
    ['IC-3', 25],
  ],
  'CA-CTO': [
    ['IC-1', 55],
    ['IC-2', 45],
  ],
  'CA-TAVI': [
    ['IC-1', 60],
    ['IC-3', 40],
  ],
  EP: [['EP-1', 1]],
};

/** The month from which IC-2 works at 7.5 instead of 15 pulses per second. */
export const pulseRateReviewMonth = 13;

/** An operator's fluoroscopy time relative to peers; IR-4 learns over the 24 months. */
export function fluoroscopyTimeFactor(operatorCode: string, month: number): number {
  if (operatorCode === 'IR-4') return 1.35 - (0.3 * (month - 1)) / 23;
  const factors: Record<string, number> = {
    'INR-1': 0.92,
    'INR-3': 1.15,
    'IR-1': 0.9,
    'IR-3': 1.02,
    'IC-1': 0.95,
    'IC-3': 1.08,
  };
  return factors[operatorCode] ?? 1;
}

/** An operator's air kerma per minute of fluoroscopy relative to peers. */
export function kermaRateFactor(operatorCode: string, month: number): number {
  if (operatorCode === 'IC-2') return month < pulseRateReviewMonth ? 1.4 : 1;
  const factors: Record<string, number> = { 'INR-3': 0.95, 'IR-1': 0.95, 'IR-4': 1.05, 'IC-1': 0.95 };
  return factors[operatorCode] ?? 1;
}
