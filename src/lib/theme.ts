import { useSyncExternalStore } from 'react';
import { useMediaQuery } from './media-query';

export const themeChoices = ['system', 'sheet', 'dim'] as const;
export type ThemeChoice = (typeof themeChoices)[number];

export const themeNames: Record<ThemeChoice, string> = {
  system: 'As the system',
  sheet: 'Sheet',
  dim: 'Dim',
};

// The same key is read by public/theme-first.js before the first paint.
const storageKey = 'leeward-theme';
const listeners = new Set<() => void>();

function readChoice(): ThemeChoice {
  const theme = document.documentElement.dataset.theme;
  return theme === 'sheet' || theme === 'dim' ? theme : 'system';
}

/** Sets and remembers the theme; `system` forgets the choice. */
export function chooseTheme(choice: ThemeChoice): void {
  if (choice === 'system') delete document.documentElement.dataset.theme;
  else document.documentElement.dataset.theme = choice;
  try {
    if (choice === 'system') localStorage.removeItem(storageKey);
    else localStorage.setItem(storageKey, choice);
  } catch {
    // Closed storage: the choice holds until the page is left.
  }
  listeners.forEach((notify) => notify());
}

function subscribe(notify: () => void): () => void {
  listeners.add(notify);
  return () => listeners.delete(notify);
}

export const useThemeChoice = (): ThemeChoice => useSyncExternalStore(subscribe, readChoice);

/** Which of the two themes is on the screen now. */
export function useShownTheme(): 'sheet' | 'dim' {
  const choice = useThemeChoice();
  const prefersDim = useMediaQuery('(prefers-color-scheme: dark)');
  if (choice !== 'system') return choice;
  return prefersDim ? 'dim' : 'sheet';
}
