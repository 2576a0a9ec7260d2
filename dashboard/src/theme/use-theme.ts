import { useSyncExternalStore } from 'react';

export type ThemeChoice = 'day' | 'night' | 'auto';
export type Theme = 'day' | 'night';

const STORAGE_KEY = 'ampkeep.theme';
const systemIsDark = () => window.matchMedia('(prefers-color-scheme: dark)');
const listeners = new Set<() => void>();

function readChoice(): ThemeChoice {
  try {
    const stored = localStorage.getItem(STORAGE_KEY);
    return stored === 'day' || stored === 'night' ? stored : 'auto';
  } catch {
    return 'auto';
  }
}

function apply(): void {
  const choice = readChoice();
  const night = choice === 'night' || (choice === 'auto' && systemIsDark().matches);
  document.documentElement.dataset.theme = night ? 'night' : 'day';
  listeners.forEach((listener) => listener());
}

export function chooseTheme(choice: ThemeChoice): void {
  try {
    if (choice === 'auto') localStorage.removeItem(STORAGE_KEY);
    else localStorage.setItem(STORAGE_KEY, choice);
  } catch {
    // Without storage the choice cannot be kept.
  }
  apply();
}

function subscribe(listener: () => void): () => void {
  const system = systemIsDark();
  listeners.add(listener);
  system.addEventListener('change', apply);
  return () => {
    listeners.delete(listener);
    system.removeEventListener('change', apply);
  };
}

const shownTheme = (): Theme => (document.documentElement.dataset.theme === 'night' ? 'night' : 'day');

/** The theme on screen, for what cannot read CSS variables by itself (charts). */
export const useTheme = (): Theme => useSyncExternalStore(subscribe, shownTheme);

/** What the person chose; `auto` follows the system. */
export const useThemeChoice = (): ThemeChoice => useSyncExternalStore(subscribe, readChoice);
