/** The number nearest to `value` inside [low, high]. clamp(170, 30, 165) = 165. */
export function clamp(value: number, low: number, high: number): number {
  return Math.min(high, Math.max(low, value));
}
