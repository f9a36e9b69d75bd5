import { useSyncExternalStore } from 'react';

export type Toast = {
  id: number;
  text: string;
  /** A problem stays until it is closed. */
  isProblem: boolean;
  link?: { to: string; text: string };
};

let toasts: readonly Toast[] = [];
let lastId = 0;
const listeners = new Set<() => void>();

function replace(next: readonly Toast[]): void {
  toasts = next;
  listeners.forEach((notify) => notify());
}

/** Tells the outcome of a deed at the edge of the screen: "Room NR1 saved". */
export function showToast(toast: { text: string; isProblem?: boolean; link?: Toast['link'] }): void {
  lastId += 1;
  replace([...toasts, { isProblem: false, ...toast, id: lastId }].slice(-4));
}

export const closeToast = (id: number): void => replace(toasts.filter((toast) => toast.id !== id));

export const useToasts = (): readonly Toast[] =>
  useSyncExternalStore(
    (notify) => {
      listeners.add(notify);
      return () => listeners.delete(notify);
    },
    () => toasts,
  );
