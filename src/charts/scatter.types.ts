export type ScatterPoint = {
  x: number;
  y: number;
  /** Class of the third quantity, 0 (least) to 4 (most): tone and size. */
  tone: number;
  /** Lines of the tooltip. */
  text: string;
};

/** A stretch of both axes, in the points' own units. */
export type ScatterArea = { xFrom: number; xTo: number; yFrom: number; yTo: number };

export type ScatterGuide = { name: string; points: readonly { x: number; y: number }[] };

export const isInArea = (point: { x: number; y: number }, area: ScatterArea): boolean =>
  point.x >= area.xFrom && point.x <= area.xTo && point.y >= area.yFrom && point.y <= area.yTo;
