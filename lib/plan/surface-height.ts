import type { Surface } from '@/lib/job/board-schema';
import type { Vec } from '@/lib/geometry/vec';
import type { BoardSize } from './shared/run-out';

type Measured = NonNullable<Surface>;

/** Height of the measured surface over a place of its face, mm against the nominal face. */
export function surfaceHeight(surface: Measured, board: BoardSize, p: Vec): number {
  if (surface.kind === 'cup') {
    const [first, middle, last] = surface.readings;
    const t = surface.across === 'y' ? p.y / board.y : p.x / board.x;
    return parabola(first, middle, last, Math.min(1, Math.max(0, t)));
  }
  const column = cell(surface.x, p.x);
  const row = cell(surface.y, p.y);
  const at = (r: number, c: number) => surface.z[r]?.[c] ?? 0;
  const low = mix(at(row.index, column.index), at(row.index, column.next), column.t);
  const high = mix(at(row.next, column.index), at(row.next, column.next), column.t);
  return mix(low, high, row.t);
}

/** The greatest height that was measured, never below the nominal face. */
export function highestOf(surface: Measured, board: BoardSize): number {
  const heights =
    surface.kind === 'grid'
      ? surface.z.flat()
      : Array.from({ length: 65 }, (_, i) =>
          surfaceHeight(surface, board, { x: (board.x * i) / 64, y: (board.y * i) / 64 }),
        );
  return Math.max(0, ...heights);
}

/** Through (0, first), (½, middle) and (1, last), by Lagrange's formula. */
function parabola(first: number, middle: number, last: number, t: number): number {
  return first * (2 * t - 1) * (t - 1) + middle * 4 * t * (1 - t) + last * t * (2 * t - 1);
}

/** The grid cell that holds a coordinate; beyond the outermost nodes the height stays what it is there. */
function cell(nodes: readonly number[], at: number): { index: number; next: number; t: number } {
  const last = nodes.length - 1;
  if (at <= nodes[0]!) return { index: 0, next: 0, t: 0 };
  if (at >= nodes[last]!) return { index: last, next: last, t: 0 };
  const next = nodes.findIndex((node) => node > at);
  const [a, b] = [nodes[next - 1]!, nodes[next]!];
  return { index: next - 1, next, t: (at - a) / (b - a) };
}

function mix(a: number, b: number, t: number): number {
  return a + (b - a) * t;
}
