import type { Config } from 'tailwindcss';

/**
 * Names for the tokens of `app/globals.css`. Colours are named by what they mean on the drawing, never by hue, and the
 * stock palette is not offered: what is not a token is not used.
 */
const config: Config = {
  content: [],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      ground: 'var(--ground)',
      sheet: 'var(--sheet)',
      well: 'var(--well)',
      ink: 'var(--ink)',
      graphite: 'var(--graphite)',
      rule: 'var(--rule)',
      edge: 'var(--edge)',
      primary: { DEFAULT: 'var(--primary)', hover: 'var(--primary-hover)', on: 'var(--on-primary)' },
      bar: {
        DEFAULT: 'var(--bar)',
        on: 'var(--on-bar)',
        quiet: 'var(--on-bar-quiet)',
        rule: 'var(--bar-rule)',
      },
      face: {
        a: 'var(--face-a)',
        b: 'var(--face-b)',
        'a-fill': 'var(--face-a-fill)',
        'b-fill': 'var(--face-b-fill)',
      },
      tab: { DEFAULT: 'var(--tab)', on: 'var(--on-tab)', ink: 'var(--tab-ink)' },
      select: 'var(--select-wash)',
      ok: { DEFAULT: 'var(--ok)', wash: 'var(--ok-wash)' },
      warning: { DEFAULT: 'var(--warning)', wash: 'var(--warning-wash)' },
      error: { DEFAULT: 'var(--error)', wash: 'var(--error-wash)', on: 'var(--on-error)' },
      wood: { 0: 'var(--depth-0)', 1: 'var(--depth-1)', 2: 'var(--depth-2)', edge: 'var(--wood-edge)' },
      veil: 'var(--veil)',
      focus: 'var(--focus)',
    },
    fontFamily: {
      sans: ['Barlow', 'system-ui', 'sans-serif'],
      heading: ['Barlow Condensed', 'Barlow', 'system-ui', 'sans-serif'],
      figure: ['Spline Sans Mono', 'ui-monospace', 'monospace'],
    },
    // Nothing smaller than 14 px; the run page starts at `xl`.
    fontSize: {
      sm: ['0.875rem', '1.25rem'],
      base: ['1rem', '1.5rem'],
      lg: ['1.125rem', '1.625rem'],
      xl: ['1.375rem', '1.75rem'],
      '2xl': ['1.75rem', '2.125rem'],
      '3xl': ['2.25rem', '2.5rem'],
      '4xl': ['3rem', '3.125rem'],
      '5xl': ['4rem', '4rem'],
    },
    borderRadius: { none: '0', sm: '2px', DEFAULT: '3px', lg: '4px', full: '9999px' },
    extend: {
      // Control heights: a mouse's, a finger's, a gloved finger's.
      spacing: { control: '2.25rem', touch: '2.75rem', glove: '4rem' },
      transitionDuration: { DEFAULT: '120ms' },
    },
  },
};

export default config;
