/** The drawing's colours as the theme has them; a canvas cannot read CSS variables by itself. */
export interface Palette {
  readonly ground: string;
  readonly sheet: string;
  readonly ink: string;
  readonly graphite: string;
  readonly rule: string;
  readonly faceA: string;
  readonly faceB: string;
  /** The faces' colours where they must stand out on wood, which is pale in both themes. */
  readonly faceAOnWood: string;
  readonly faceBOnWood: string;
  readonly tab: string;
  readonly tabInk: string;
  readonly board: string;
  readonly boardDeep: string;
  readonly boardEdge: string;
  readonly select: string;
  readonly error: string;
  readonly warning: string;
}

/** Reads the tokens of `app/globals.css` as they hold for `element`. */
export function readPalette(element: Element): Palette {
  const style = getComputedStyle(element);
  const token = (name: string): string => style.getPropertyValue(`--${name}`).trim();
  return {
    ground: token('ground'),
    sheet: token('sheet'),
    ink: token('ink'),
    graphite: token('graphite'),
    rule: token('rule'),
    faceA: token('face-a'),
    faceB: token('face-b'),
    faceAOnWood: token('face-a-fill'),
    faceBOnWood: token('face-b-fill'),
    tab: token('tab'),
    tabInk: token('tab-ink'),
    board: token('depth-0'),
    boardDeep: token('depth-2'),
    boardEdge: token('wood-edge'),
    select: token('select-wash'),
    error: token('error'),
    warning: token('warning'),
  };
}

export const FIGURE_FONT = '13px "Spline Sans Mono", ui-monospace, monospace';
export const LETTER_FONT = '600 18px "Barlow Condensed", "Barlow", sans-serif';
/** Ink for what is written or drawn on wood, which is pale in both themes. */
export const ON_WOOD = '#2a1d10';
