import type { SVGProps } from 'react';

/** Pictograms of our own on a 24 × 24 grid, drawn with a 1.75 line as a draughtsman would. */
const strokes = {
  plus: 'M12 5v14M5 12h14',
  close: 'M6 6l12 12M18 6L6 18',
  check: 'M4.5 12.5l5 5L19.5 7',
  search: 'M10.5 4.5a6 6 0 1 0 0 12a6 6 0 1 0 0-12M15 15l5 5',
  'chevron-down': 'M6 9.5l6 6 6-6',
  'chevron-right': 'M9.5 6l6 6-6 6',
  'arrow-left': 'M19 12H5M11 6l-6 6 6 6',
  'arrow-right': 'M5 12h14M13 6l6 6-6 6',
  more: 'M5 12h.01M12 12h.01M19 12h.01',
  warning: 'M12 4l9 16H3zM12 10v5M12 17.5v.01',
  error: 'M8 3.5h8l4.5 4.5v8L16 20.5H8L3.5 16V8zM12 8v5.5M12 16.5v.01',
  info: 'M12 3.5a8.5 8.5 0 1 0 0 17a8.5 8.5 0 1 0 0-17M12 11v5.5M12 7.5v.01',
  lock: 'M6 11h12v9H6zM8.5 11V8a3.5 3.5 0 0 1 7 0v3',
  person: 'M12 4a4 4 0 1 0 0 8a4 4 0 1 0 0-8M4.5 20.5c1-4 4-5.5 7.5-5.5s6.5 1.5 7.5 5.5',
  people:
    'M9 4.500a3.5 3.5 0 1 0 0 7a3.5 3.5 0 1 0 0-7M2.5 19.500c.7-3.6 3.2-5 6.5-5s5.8 1.4 6.5 5M15.5 5a3.3 3.3 0 0 1 0 6.300M17.5 14.800c2.3.6 3.6 2.1 4 4.7',
  board: 'M3 7h18v10H3zM3 12.500c4-1.5 6 1 9 0s5-1 9 0',
  file: 'M6 3.500h8l4.5 4.500v12.500H6zM14 3.500V8h4.5',
  copy: 'M8.5 8.500h12v12h-12zM15.5 5V3.500h-12v12H5',
  trash: 'M4 6.500h16M9 6.500V4h6v2.500M6.5 6.500l1 13.500h9l1-13.500M10 10.500v6M14 10.500v6',
  pencil: 'M4 20l1-4.500L16 4.500l3.5 3.500L8.5 19zM13.5 7l3.5 3.5',
  undo: 'M8.5 4.500L4 9l4.5 4.500M4 9h10a5.5 5.5 0 0 1 0 11H9',
  redo: 'M15.5 4.500L20 9l-4.5 4.500M20 9H10a5.5 5.5 0 0 0 0 11h5',
  sun: 'M12 8a4 4 0 1 0 0 8a4 4 0 1 0 0-8M12 2.500v2M12 19.500v2M2.5 12h2M19.5 12h2M5.3 5.300l1.4 1.400M17.3 17.300l1.4 1.400M5.3 18.700l1.4-1.400M17.3 6.700l1.4-1.4',
  moon: 'M19.5 14.500A8 8 0 0 1 9.5 4.500a8 8 0 1 0 10 10z',
  device: 'M3 5h18v11H3zM8 20h8M12 16v4',
  download: 'M12 4v11M7 10.500l5 5 5-5M4.5 20h15',
  share: 'M4 12.500V20h16v-7.500M12 15.500V4M7.5 8.500L12 4l4.5 4.5',
  comment: 'M4 4.500h16v11.500h-9L6.5 20v-4H4z',
  turn: 'M4 14c0-4 3.5-6 8-6s8 2 8 6M16.5 12l3.5 2.500L22 11M3 19h18',
  out: 'M13 4H5v16h8M10 12h10.500M16.5 8l4 4-4 4',
} as const;

export type IconName = keyof typeof strokes;

interface IconProps extends Omit<SVGProps<SVGSVGElement>, 'name'> {
  readonly name: IconName;
  readonly size?: number;
}

/** A decorative pictogram; the words beside it (or the button's label) say what it means. */
export function Icon({ name, size = 20, ...rest }: IconProps) {
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 24 24"
      fill="none"
      stroke="currentColor"
      strokeWidth={name === 'more' ? 3 : 1.75}
      strokeLinecap={name === 'more' ? 'round' : 'square'}
      strokeLinejoin="miter"
      aria-hidden
      focusable={false}
      {...rest}
    >
      <path d={strokes[name]} />
    </svg>
  );
}
