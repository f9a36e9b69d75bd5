import type { KeyboardEvent } from 'react';

const steps: Record<string, (place: number, last: number) => number> = {
  ArrowDown: (place) => place + 1,
  ArrowUp: (place) => place - 1,
  Home: () => 0,
  End: (_place, last) => last,
};

/** Arrow keys, Home and End walk the row links of the table body that hears the key. */
export function moveAlongRows(event: KeyboardEvent<HTMLElement>): void {
  const step = steps[event.key];
  if (!step || event.altKey || event.ctrlKey || event.metaKey) return;
  const links = [...event.currentTarget.querySelectorAll<HTMLElement>('a[data-row-link]')];
  const place = links.findIndex((link) => link === event.target);
  if (place < 0) return;
  event.preventDefault();
  // Beyond the ends there is no link, and the focus stays.
  links[step(place, links.length - 1)]?.focus();
}
