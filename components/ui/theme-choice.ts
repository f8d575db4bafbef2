/** Light, dark, or what the device asks for. */
export type ThemeChoice = 'light' | 'dark' | 'device';

export const THEME_COOKIE = 'theme';

/** Reads the cookie's value; anything unknown means the device's own setting. */
export function themeChoiceOf(cookie: string | undefined): ThemeChoice {
  return cookie === 'light' || cookie === 'dark' ? cookie : 'device';
}
