import type { ToggleEvent } from 'react';

/** Puts a popover that is about to open right below the button that opens it, wherever the bar stands. */
export function dropBelow(event: ToggleEvent<HTMLElement>): void {
  if (event.newState !== 'open') return;
  const menu = event.currentTarget;
  const opener = document.querySelector(`[popovertarget="${menu.id}"]`);
  if (opener) menu.style.top = `${Math.round(opener.getBoundingClientRect().bottom + 8)}px`;
}
