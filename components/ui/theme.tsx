'use client';

import {
  createContext,
  useCallback,
  useContext,
  useMemo,
  useState,
  useSyncExternalStore,
  type ReactNode,
} from 'react';
import { THEME_COOKIE, type ThemeChoice } from './theme-choice';

interface Theme {
  /** What this device was told to use. */
  readonly choice: ThemeChoice;
  setChoice(choice: ThemeChoice): void;
}

const ThemeContext = createContext<Theme | null>(null);

/**
 * Holds the choice of light or dark. The choice lies in a cookie of this device, so that the server already sends the
 * right one and nothing flashes; without a choice the device's own setting rules, in CSS alone.
 */
export function ThemeProvider({ initial, children }: { initial: ThemeChoice; children: ReactNode }) {
  const [choice, remember] = useState(initial);
  const setChoice = useCallback((next: ThemeChoice) => {
    remember(next);
    store(next);
  }, []);
  const value = useMemo(() => ({ choice, setChoice }), [choice, setChoice]);
  return <ThemeContext.Provider value={value}>{children}</ThemeContext.Provider>;
}

export function useTheme(): Theme {
  const theme = useContext(ThemeContext);
  if (!theme) throw new Error('useTheme needs a ThemeProvider above it');
  return theme;
}

/**
 * The values of tokens of `globals.css` (without the leading dashes) for what is drawn on a canvas, read again when the
 * theme changes. All are empty text on the server.
 */
export function useTokens<Name extends string>(names: readonly Name[]): Record<Name, string> {
  const key = names.join(' ');
  // One string, so that React can see that nothing has changed.
  const values = useSyncExternalStore(
    watchTheme,
    () => readTokens(key.split(' ')).join(';'),
    () => '',
  );
  return useMemo(() => {
    const list = values.split(';');
    return Object.fromEntries(key.split(' ').map((name, i) => [name, list[i] ?? ''])) as Record<Name, string>;
  }, [key, values]);
}

function readTokens(names: readonly string[]): string[] {
  const style = getComputedStyle(document.documentElement);
  return names.map((name) => style.getPropertyValue(`--${name}`).trim());
}

function watchTheme(changed: () => void): () => void {
  const device = window.matchMedia('(prefers-color-scheme: dark)');
  const attribute = new MutationObserver(changed);
  device.addEventListener('change', changed);
  attribute.observe(document.documentElement, { attributeFilter: ['data-theme'] });
  return () => {
    device.removeEventListener('change', changed);
    attribute.disconnect();
  };
}

function store(choice: ThemeChoice): void {
  if (choice === 'device') {
    delete document.documentElement.dataset.theme;
    document.cookie = `${THEME_COOKIE}=; path=/; max-age=0; samesite=lax`;
  } else {
    document.documentElement.dataset.theme = choice;
    document.cookie = `${THEME_COOKIE}=${choice}; path=/; max-age=31536000; samesite=lax`;
  }
}
