import type { Polyline, Ring } from './contour';
import { pointsBox } from './measure';
import type { Vec } from './vec';

/** The nearest place on a set of lines. */
export interface NearestPlace {
  readonly point: Vec;
  readonly distance: number;
  /** Which of the given lines, and which of its edges (from that point of it). */
  readonly line: number;
  readonly edge: number;
}

export interface DistanceQuery {
  /** Distance to the nearest line, mm; infinite where there are none. */
  distance(p: Vec): number;
  nearest(p: Vec): NearestPlace | null;
}

/** The closed rings of a region as lines to ask about. */
export function ringLines(region: readonly Ring[]): Polyline[] {
  return region.map((points) => ({ points, closed: true }));
}

/**
 * Answers exact distances to polylines and rings (a point alone is a line without length). Edges lie in a square grid of about
 * one edge a cell; a query looks at rings of cells outwards until none can be nearer.
 */
export function createDistanceQuery(shapes: readonly (Polyline | Ring)[]): DistanceQuery {
  const lines = shapes.map((shape): Polyline =>
    'points' in shape ? shape : { points: shape, closed: true },
  );
  const edges = collectEdges(lines);
  if (edges.count === 0) return { distance: () => Number.POSITIVE_INFINITY, nearest: () => null };
  const grid = createGrid(edges, lines);
  const nearest = (p: Vec): NearestPlace => {
    const best = grid.search(p);
    return {
      point: { x: best.x, y: best.y },
      distance: Math.sqrt(best.squared),
      line: edges.line[best.edge]!,
      edge: edges.index[best.edge]!,
    };
  };
  return { distance: (p) => Math.sqrt(grid.search(p).squared), nearest };
}

interface Edges {
  readonly count: number;
  /** x1, y1, x2, y2 of each. */
  readonly at: Float64Array;
  readonly line: Int32Array;
  readonly index: Int32Array;
}

function collectEdges(lines: readonly Polyline[]): Edges {
  const at: number[] = [];
  const line: number[] = [];
  const index: number[] = [];
  lines.forEach(({ points, closed }, which) => {
    const count = points.length === 1 ? 1 : closed ? points.length : points.length - 1;
    for (let i = 0; i < count; i++) {
      const a = points[i]!;
      const b = points[(i + 1) % points.length]!;
      at.push(a.x, a.y, b.x, b.y);
      line.push(which);
      index.push(i);
    }
  });
  return {
    count: line.length,
    at: Float64Array.from(at),
    line: Int32Array.from(line),
    index: Int32Array.from(index),
  };
}

interface Best {
  squared: number;
  x: number;
  y: number;
  edge: number;
}

function createGrid(edges: Edges, lines: readonly Polyline[]): { search(p: Vec): Best } {
  const box = pointsBox(lines.flatMap(({ points }) => points));
  const width = Math.max(box.maxX - box.minX, 1e-9);
  const height = Math.max(box.maxY - box.minY, 1e-9);
  const cell = Math.max(Math.sqrt((width * height) / edges.count), Math.max(width, height) / 2048, 1e-9);
  const columns = Math.floor(width / cell) + 1;
  const rows = Math.floor(height / cell) + 1;
  const column = (x: number): number => Math.min(columns - 1, Math.max(0, Math.floor((x - box.minX) / cell)));
  const row = (y: number): number => Math.min(rows - 1, Math.max(0, Math.floor((y - box.minY) / cell)));
  const { starts, items } = fillCells(edges, columns, rows, column, row);
  const seen = new Int32Array(edges.count);
  let query = 0;

  function visit(c: number, r: number, p: Vec, best: Best): void {
    const key = r * columns + c;
    for (let i = starts[key]!; i < starts[key + 1]!; i++) {
      const edge = items[i]!;
      if (seen[edge] === query) continue;
      seen[edge] = query;
      compare(edges.at, edge, p, best);
    }
  }

  return {
    search(p) {
      query++;
      const best: Best = { squared: Number.POSITIVE_INFINITY, x: 0, y: 0, edge: 0 };
      const c0 = column(p.x);
      const r0 = row(p.y);
      const most = Math.max(c0, columns - 1 - c0, r0, rows - 1 - r0);
      for (let ring = 0; ring <= most; ring++) {
        // Nothing in this ring of cells or beyond can be nearer than its inner edge is.
        const inner = ringDistance(p, box, cell, c0, r0, ring);
        if (inner > 0 && inner * inner > best.squared) break;
        eachCellOfRing(c0, r0, ring, columns, rows, (c, r) => visit(c, r, p, best));
      }
      return best;
    },
  };
}

/** Least distance of p from cells `ring` cells away from its own: 0 for the first. */
function ringDistance(
  p: Vec,
  box: { minX: number; minY: number },
  cell: number,
  c: number,
  r: number,
  ring: number,
): number {
  if (ring === 0) return 0;
  const left = p.x - (box.minX + (c - ring + 1) * cell);
  const right = box.minX + (c + ring) * cell - p.x;
  const below = p.y - (box.minY + (r - ring + 1) * cell);
  const above = box.minY + (r + ring) * cell - p.y;
  return Math.min(left, right, below, above);
}

function eachCellOfRing(
  c0: number,
  r0: number,
  ring: number,
  columns: number,
  rows: number,
  visit: (c: number, r: number) => void,
): void {
  const left = Math.max(0, c0 - ring);
  const right = Math.min(columns - 1, c0 + ring);
  for (let r = Math.max(0, r0 - ring); r <= Math.min(rows - 1, r0 + ring); r++) {
    if (Math.abs(r - r0) === ring) for (let c = left; c <= right; c++) visit(c, r);
    else {
      if (c0 - ring >= 0) visit(c0 - ring, r);
      if (ring > 0 && c0 + ring < columns) visit(c0 + ring, r);
    }
  }
}

function fillCells(
  { count, at }: Edges,
  columns: number,
  rows: number,
  column: (x: number) => number,
  row: (y: number) => number,
): { starts: Int32Array; items: Int32Array } {
  const cells: number[][] = Array.from({ length: columns * rows }, () => []);
  for (let edge = 0; edge < count; edge++) {
    const [x1, y1, x2, y2] = [at[4 * edge]!, at[4 * edge + 1]!, at[4 * edge + 2]!, at[4 * edge + 3]!];
    const top = row(Math.max(y1, y2));
    const last = column(Math.max(x1, x2));
    for (let r = row(Math.min(y1, y2)); r <= top; r++)
      for (let c = column(Math.min(x1, x2)); c <= last; c++) cells[r * columns + c]!.push(edge);
  }
  const starts = new Int32Array(cells.length + 1);
  cells.forEach((list, i) => (starts[i + 1] = starts[i]! + list.length));
  return { starts, items: Int32Array.from(cells.flat()) };
}

function compare(at: Float64Array, edge: number, p: Vec, best: Best): void {
  const x1 = at[4 * edge]!;
  const y1 = at[4 * edge + 1]!;
  const dx = at[4 * edge + 2]! - x1;
  const dy = at[4 * edge + 3]! - y1;
  const size = dx * dx + dy * dy;
  const t = size > 0 ? Math.min(1, Math.max(0, ((p.x - x1) * dx + (p.y - y1) * dy) / size)) : 0;
  const x = x1 + t * dx;
  const y = y1 + t * dy;
  const squared = (p.x - x) ** 2 + (p.y - y) ** 2;
  if (squared >= best.squared) return;
  best.squared = squared;
  best.x = x;
  best.y = y;
  best.edge = edge;
}
