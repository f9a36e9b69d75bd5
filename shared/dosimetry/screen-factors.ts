import { bodyPointZM, type BodyPoint } from './body-points';
import { tableTopBelowIsocentreM } from './scatter-geometry';

/**
 * Transmission factors of the room's screens and of glasses in practice, with their range of about
 * 95 % (our choices, leaning on published clinical averages from memory: to be confirmed by the
 * department's physicist).
 */
export const screenFactors = {
  ceilingScreen: { factor: 0.35, low: 0.05, high: 0.8 },
  tableSkirt: { factor: 0.3, low: 0.05, high: 0.5 },
  mobileScreen: { factor: 0.1, low: 0.02, high: 0.5 },
  glasses: { factor: 0.5, low: 0.3, high: 1 },
} as const;

export type Screen = keyof typeof screenFactors;
export const screens = Object.keys(screenFactors) as Screen[];

/** Below this the room's walls and the wearer's own body scatter on: the product's floor. */
export const screenProductFloor = 0.02;

/**
 * Whether a screen stands before a body point. Ceiling screen: eye and collar (the chest only where
 * its ray crosses the screen, whose place is not recorded: not counted). Table skirt: lower leg, and
 * the waist where it lies below the table top. Mobile screen: everything. Glasses: the eye.
 */
export function isBehindScreen(screen: Screen, point: BodyPoint, statureM: number): boolean {
  if (screen === 'ceilingScreen') return point === 'eye' || point === 'collar';
  if (screen === 'glasses') return point === 'eye';
  if (screen === 'mobileScreen') return true;
  if (point === 'lowerLeg') return true;
  return point === 'waist' && bodyPointZM('waist', statureM) < -tableTopBelowIsocentreM;
}

/** A product of screen factors, never below 0.02. 0.0175 → 0.02. */
export function limitScreenProduct(product: number): number {
  return Math.max(screenProductFloor, product);
}

/**
 * The transmission factor of the screens before a body point: their product, never below 0.02.
 *
 * Known value: ceiling screen 0.35 and glasses 0.5 at the eye: 0.175; with a mobile screen 0.1: 0.02.
 */
export function screenFactorAt(worn: readonly Screen[], point: BodyPoint, statureM: number): number {
  const before = worn.filter((screen) => isBehindScreen(screen, point, statureM));
  return limitScreenProduct(before.reduce((product, screen) => product * screenFactors[screen].factor, 1));
}
