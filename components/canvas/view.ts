import type { Vec } from '@/lib/geometry/vec';

/** How the board lies on the screen: pixels a millimetre, and where its lower left corner is. Screen y runs down. */
export interface View {
  readonly scale: number;
  readonly x: number;
  readonly y: number;
}

export interface Size {
  readonly width: number;
  readonly height: number;
}

/** Nearest and farthest that anyone plans from, pixels a millimetre. */
const SMALLEST_SCALE = 0.02;
const LARGEST_SCALE = 400;

export function toScreen(view: View, { x, y }: Vec): Vec {
  return { x: view.x + x * view.scale, y: view.y - y * view.scale };
}

export function toBoard(view: View, { x, y }: Vec): Vec {
  return { x: (x - view.x) / view.scale, y: (view.y - y) / view.scale };
}

/** The view that shows a board of this size whole, with room around it for figures and marks. */
export function fitView(board: { x: number; y: number }, { width, height }: Size, margin = 56): View {
  const scale = clampScale(Math.min((width - 2 * margin) / board.x, (height - 2 * margin) / board.y));
  return { scale, x: (width - board.x * scale) / 2, y: (height + board.y * scale) / 2 };
}

/** Zooms by `factor`; what lies under the screen point `at` stays there. */
export function zoomAt(view: View, at: Vec, factor: number): View {
  const scale = clampScale(view.scale * factor);
  const real = scale / view.scale;
  return { scale, x: at.x + (view.x - at.x) * real, y: at.y + (view.y - at.y) * real };
}

export function panBy(view: View, dx: number, dy: number): View {
  return { ...view, x: view.x + dx, y: view.y + dy };
}

function clampScale(scale: number): number {
  return Math.min(LARGEST_SCALE, Math.max(SMALLEST_SCALE, scale));
}

/** Pitch of grid lines, mm, that stand at least `apart` pixels from one another: 1, 2, 5, 10, 20, 50… (or inches' parts). */
export function gridPitch(scale: number, unit: 'mm' | 'in', apart = 9): number {
  const least = apart / scale;
  if (unit === 'in') {
    const inch = 25.4;
    for (let part = inch / 64; part < 1000 * inch; part *= 2) if (part >= least) return part;
    return 1000 * inch;
  }
  for (let decade = 0.01; decade < 1e5; decade *= 10) {
    for (const step of [1, 2, 5]) if (decade * step >= least) return decade * step;
  }
  return 1e5;
}
