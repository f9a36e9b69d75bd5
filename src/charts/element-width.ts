import { useEffect, useState, type RefObject } from 'react';

/** The width of an element in px, followed; 0 before the first measurement. */
export function useElementWidth(element: RefObject<Element | null>): number {
  const [width, setWidth] = useState(0);
  useEffect(() => {
    if (!element.current) return;
    const observer = new ResizeObserver(([entry]) => setWidth(Math.round(entry?.contentRect.width ?? 0)));
    observer.observe(element.current);
    return () => observer.disconnect();
  }, [element]);
  return width;
}
