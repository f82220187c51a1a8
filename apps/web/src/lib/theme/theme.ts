import { useSyncExternalStore } from 'react';

export const THEMES = ['system', 'light', 'dark'] as const;
export type ThemeChoice = (typeof THEMES)[number];
const KEY = 'tipward-theme';
const listeners = new Set<() => void>();
const systemDark = () => window.matchMedia('(prefers-color-scheme: dark)');

/** Storage may be shut off (private windows): then the choice lasts as long as the page. */
let remembered: ThemeChoice | null = null;

function readChoice(): ThemeChoice {
  if (remembered !== null) return remembered;
  try {
    return THEMES.find((theme) => theme === localStorage.getItem(KEY)) ?? 'system';
  } catch {
    return 'system';
  }
}

function applyTheme(): void {
  const choice = readChoice();
  const dark = choice === 'dark' || (choice === 'system' && systemDark().matches);
  document.documentElement.dataset['theme'] = dark ? 'dark' : 'light';
  listeners.forEach((listener) => {
    listener();
  });
}

export function chooseTheme(choice: ThemeChoice): void {
  remembered = choice;
  try {
    localStorage.setItem(KEY, choice);
  } catch {
    // Kept in `remembered` for this page.
  }
  applyTheme();
}

/** Follows the system and other tabs from now on. */
export function watchTheme(): void {
  systemDark().addEventListener('change', applyTheme);
  window.addEventListener('storage', (event) => {
    if (event.key !== KEY) return;
    remembered = null;
    applyTheme();
  });
  applyTheme();
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** What the person chose; 'system' follows the operating system. */
export const useThemeChoice = (): ThemeChoice => useSyncExternalStore(subscribe, readChoice);

/** The theme in force, for what is drawn outside CSS (3D). */
export const useTheme = (): 'light' | 'dark' =>
  useSyncExternalStore(subscribe, () =>
    document.documentElement.dataset['theme'] === 'dark' ? 'dark' : 'light',
  );
