import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

// Contrast after WCAG 2.2, 1.4.3 (text 4.5:1) and 1.4.11 (graphics and the edges of controls 3:1).
const TEXT = 4.5;
const GRAPHIC = 3;

const pairs: readonly (readonly [front: string, back: string, least: number])[] = [
  ...['ink', 'graphite', 'primary', 'face-a', 'face-b', 'tab-ink', 'ok', 'warning', 'error'].flatMap(
    (front) => ['ground', 'sheet', 'well'].map((back) => [front, back, TEXT] as const),
  ),
  ...['ok', 'warning', 'error'].map((tone) => [tone, `${tone}-wash`, TEXT] as const),
  ...['ok-wash', 'warning-wash', 'error-wash', 'select-wash'].map((back) => ['ink', back, TEXT] as const),
  ['tab-ink', 'select-wash', TEXT],
  ['on-primary', 'primary', TEXT],
  ['on-primary', 'primary-hover', TEXT],
  ['on-bar', 'bar', TEXT],
  ['on-bar', 'bar-rule', TEXT],
  ['on-bar-quiet', 'bar', TEXT],
  ['on-bar', 'face-a-fill', TEXT],
  ['on-bar', 'face-b-fill', TEXT],
  ['on-tab', 'tab', TEXT],
  ['on-error', 'error', TEXT],
  ['sheet', 'ink', TEXT],
  ...['edge', 'focus'].flatMap((front) =>
    ['ground', 'sheet', 'well'].map((back) => [front, back, GRAPHIC] as const),
  ),
  ['tab', 'bar', GRAPHIC],
  ['wood-edge', 'sheet', GRAPHIC],
];

const themes = readThemes();

describe.each(Object.entries(themes))('contrast of the %s tokens', (_, tokens) => {
  it.each(pairs)('%s on %s is at least %s : 1', (front, back, least) => {
    expect(contrast(tokens[front], tokens[back])).toBeGreaterThanOrEqual(least);
  });
});

it('gives every token in both themes', () => {
  expect(Object.keys(themes.dark)).toEqual(Object.keys(themes.light));
});

/** Reads `--name: #rrggbb` before and within the dark block of the style sheet. */
function readThemes(): Record<'light' | 'dark', Record<string, string>> {
  const css = readFileSync(new URL('../../app/globals.css', import.meta.url), 'utf8');
  const [light, dark] = css.split('@variant dark');
  return { light: tokensOf(light), dark: tokensOf(dark) };
}

function tokensOf(css = ''): Record<string, string> {
  return Object.fromEntries(
    [...css.matchAll(/--([a-z0-9-]+): (#[0-9a-f]{6});/g)].map(([, name, hex]) => [name, hex]),
  );
}

function contrast(front = '', back = ''): number {
  const [a, b] = [luminance(front), luminance(back)];
  return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
}

/** Relative luminance of `#rrggbb`, WCAG 2.2. */
function luminance(hex: string): number {
  const [r = NaN, g = NaN, b = NaN] = [1, 3, 5].map((at) => {
    const channel = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
    return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}
