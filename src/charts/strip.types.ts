/** A block of a strip: from–to along, height up (or down), shade by class, pattern by kind. */
export type StripBlock = {
  from: number;
  to: number;
  height: number;
  /** 0 (palest) to 4 (deepest); null where the shaded quantity is missing. */
  shade: number | null;
  side: 'above' | 'below';
  /** The second kind: hatched, with a cap. */
  isPatterned: boolean;
};

export const shadeFills = [
  'fill-ramp-1',
  'fill-ramp-2',
  'fill-ramp-3',
  'fill-ramp-4',
  'fill-ramp-5',
] as const;

export const findShadeFill = (shade: number | null): string =>
  shade === null ? 'fill-transparent' : (shadeFills[Math.min(4, Math.max(0, shade))] ?? 'fill-transparent');
