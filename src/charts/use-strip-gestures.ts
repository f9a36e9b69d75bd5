import { useEffect, useRef, useState, type PointerEvent, type RefObject } from 'react';
import type { StripScale } from './strip-scale';
import type { StripWindow } from './strip-window';

type Drag = { startPx: number; nowPx: number };
type GestureInput = {
  surface: RefObject<HTMLDivElement | null>;
  scale: StripScale;
  onZoom: (factor: number, anchor: number) => void;
  onWindow: (window: StripWindow) => void;
  onPoint: (px: number, py: number) => void;
  onPick: (px: number, py: number) => void;
  onLeave: () => void;
};

const leastDragPx = 6;

/**
 * Pointer gestures of the large strip: dragging marks a stretch to zoom into, a press picks a block.
 * The wheel zooms with Ctrl (also a pinch on a touchpad) or while the strip has the focus, so that it
 * never takes the page's scrolling by surprise.
 */
export function useStripGestures(input: GestureInput) {
  const { surface, scale, onWindow, onPoint, onPick, onLeave } = input;
  const [drag, setDrag] = useState<Drag | null>(null);
  useWheelZoom(input);

  const locate = (event: PointerEvent): [number, number] => {
    const box = surface.current?.getBoundingClientRect();
    return [event.clientX - (box?.left ?? 0), event.clientY - (box?.top ?? 0)];
  };
  const handlers = {
    onPointerDown: (event: PointerEvent) => {
      if (event.button !== 0) return;
      const [px] = locate(event);
      event.currentTarget.setPointerCapture(event.pointerId);
      setDrag({ startPx: px, nowPx: px });
    },
    onPointerMove: (event: PointerEvent) => {
      const [px, py] = locate(event);
      if (drag) setDrag({ ...drag, nowPx: px });
      else onPoint(px, py);
    },
    onPointerUp: (event: PointerEvent) => {
      const [px, py] = locate(event);
      if (drag && Math.abs(px - drag.startPx) >= leastDragPx) {
        const ends = [scale.readX(drag.startPx), scale.readX(px)].sort((one, other) => one - other);
        onWindow({ from: ends[0]!, to: ends[1]! });
      } else if (drag) onPick(px, py);
      setDrag(null);
    },
    onPointerCancel: () => setDrag(null),
    onPointerLeave: onLeave,
  };
  const isDragging = drag !== null && Math.abs(drag.nowPx - drag.startPx) >= leastDragPx;
  return { handlers, drag: isDragging ? drag : null };
}

function useWheelZoom({ surface, scale, onZoom }: GestureInput): void {
  const latest = useRef({ scale, onZoom });
  useEffect(() => {
    latest.current = { scale, onZoom };
  });
  useEffect(() => {
    const element = surface.current;
    if (!element) return;
    const zoom = (event: WheelEvent) => {
      if (!event.ctrlKey && !event.metaKey && !element.contains(document.activeElement)) return;
      event.preventDefault();
      const px = event.clientX - element.getBoundingClientRect().left;
      latest.current.onZoom(Math.exp(event.deltaY * 0.0022), latest.current.scale.readX(px));
    };
    // React listens passively to wheels; only a listener of one's own may keep the page still.
    element.addEventListener('wheel', zoom, { passive: false });
    return () => element.removeEventListener('wheel', zoom);
  }, [surface]);
}
