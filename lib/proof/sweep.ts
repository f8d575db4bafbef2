import type { CutterShape } from './cutter-shape';
import type { HeightField } from './height-field';
import type { MotionPoint } from './motion';
import { planSegment, type Segment } from './sweep-segment';

/** What bounds the wood of a field from beneath, so that only wood counts as removed. */
export interface FarSide {
  /** Board thickness, mm. */
  readonly thickness: number;
  /** The far face's heights, cell by cell. */
  readonly z: Float32Array;
}

export interface SweepOptions {
  readonly far?: FarSide;
  /** Look how deep the cutter would go into the surface, and leave it as it is. */
  readonly probe?: boolean;
}

/** Slack of a boundary between two parts of a sweep: a cell on it belongs to both, never to neither. mm. */
const SEAM = 1e-9;

/**
 * Sweeps one cutter along chains of straight motions through a height field. Exact at every cell's centre: a cell gets
 * the lowest height of the cutter's edge over all positions along the motion, sloping ones too. Along a segment only the
 * cells whose lowest position lies on it are visited, and at a joint only the wedge between the two ends, so that short
 * segments do not stamp whole discs.
 */
export class Sweeper {
  /** Wood taken so far, mm³. */
  removed = 0;
  /** Deepest that the cutter went into the surface, mm, and the cell; of a probe only. */
  deepest = 0;
  deepestCell = -1;
  /** Cells looked at, for measuring speed. */
  visited = 0;

  private readonly area: number;
  private at: MotionPoint | null = null;
  private last: Segment | null = null;

  constructor(
    private readonly field: HeightField,
    private readonly shape: CutterShape,
    private readonly options: SweepOptions = {},
  ) {
    this.area = field.stepX * field.stepY;
  }

  /** Ends the chain and begins another at a place. */
  moveTo(p: MotionPoint): void {
    this.finish();
    this.at = p;
  }

  /** Cuts straight from the last place to `p`. Throws without one. */
  lineTo(p: MotionPoint): void {
    const from = this.at;
    if (!from) throw new Error('A sweep needs a place to begin');
    const segment = planSegment(from, p, this.shape);
    if (!segment) {
      // Straight up or down: the lower end is all that matters.
      this.finish();
      this.cap(p.z < from.z ? p : from, null, null);
    } else {
      this.cap(from, this.last, segment);
      this.strip(segment);
      this.last = segment;
    }
    this.at = p;
  }

  /** Ends the chain: cuts the round end of its last segment. */
  finish(): void {
    if (this.at && this.last) this.cap(this.at, this.last, null);
    this.last = null;
  }

  /** The disc at a point, less what the segments before and after it visit themselves. */
  private cap(p: MotionPoint, before: Segment | null, after: Segment | null): void {
    const { field, shape } = this;
    const { radius } = shape;
    const first = this.firstRow(p.y - radius);
    const last = this.lastRow(p.y + radius);
    for (let row = first; row <= last; row++) {
      const y = field.y + (row + 0.5) * field.stepY;
      const dy = y - p.y;
      const half = Math.sqrt(Math.max(0, radius * radius - dy * dy));
      let from = p.x - half;
      let to = p.x + half;
      if (before) {
        // Beyond the end of the segment before: along ≥ length + shift.
        const rest = before.length + before.shift - SEAM - (y - before.y) * before.dy;
        if (before.dx > 0) from = Math.max(from, before.x + rest / before.dx);
        else if (before.dx < 0) to = Math.min(to, before.x + rest / before.dx);
        else if (rest > 0) continue;
      }
      if (after) {
        // Before the start of the segment after: along ≤ −shift.
        const rest = -after.shift + SEAM - (y - after.y) * after.dy;
        if (after.dx > 0) to = Math.min(to, after.x + rest / after.dx);
        else if (after.dx < 0) from = Math.max(from, after.x + rest / after.dx);
        else if (rest < 0) continue;
      }
      this.capRow(p, dy, row, from, to);
    }
  }

  private capRow(p: MotionPoint, dy: number, row: number, from: number, to: number): void {
    const { field, shape } = this;
    const first = this.firstColumn(from);
    const last = this.lastColumn(to);
    if (first > last) return;
    const base = row * field.columns;
    if (shape.kind === 'flat') return this.level(base + first, base + last, p.z);
    const { radius, tip, steepness, kind } = shape;
    this.visited += last - first + 1;
    for (let column = first; column <= last; column++) {
      const dx = field.x + (column + 0.5) * field.stepX - p.x;
      const square = dx * dx + dy * dy;
      const rise =
        kind === 'ball'
          ? radius - Math.sqrt(Math.max(0, radius * radius - square))
          : Math.max(0, Math.sqrt(square) - tip) * steepness;
      this.lower(base + column, p.z + rise);
    }
  }

  /** The rectangle along a segment, widened by as far as its slope shifts a cell's lowest position. */
  private strip(segment: Segment): void {
    const { field, shape } = this;
    const { radius } = shape;
    const { x, y, dx, dy, length, shift } = segment;
    const low = -shift;
    const high = length + shift;
    const reachY = Math.abs(dx) * radius;
    const first = this.firstRow(y + Math.min(low * dy, high * dy) - reachY);
    const last = this.lastRow(y + Math.max(low * dy, high * dy) + reachY);
    for (let row = first; row <= last; row++) {
      const oy = field.y + (row + 0.5) * field.stepY - y;
      let from = -Infinity;
      let to = Infinity;
      // low ≤ ox·dx + oy·dy ≤ high
      if (dx !== 0) {
        const a = (low - oy * dy) / dx;
        const b = (high - oy * dy) / dx;
        from = Math.max(from, Math.min(a, b));
        to = Math.min(to, Math.max(a, b));
      } else if (oy * dy < low - SEAM || oy * dy > high + SEAM) continue;
      // −radius ≤ oy·dx − ox·dy ≤ radius
      if (dy !== 0) {
        const a = (oy * dx - radius) / dy;
        const b = (oy * dx + radius) / dy;
        from = Math.max(from, Math.min(a, b));
        to = Math.min(to, Math.max(a, b));
      } else if (Math.abs(oy * dx) > radius) continue;
      const firstColumn = this.firstColumn(x + from - SEAM);
      const lastColumn = this.lastColumn(x + to + SEAM);
      if (firstColumn > lastColumn) continue;
      const base = row * field.columns;
      if (shape.kind === 'flat' && segment.slope === 0)
        this.level(base + firstColumn, base + lastColumn, segment.z);
      else this.stripRow(segment, oy, base, firstColumn, lastColumn);
    }
  }

  private stripRow(segment: Segment, oy: number, base: number, first: number, last: number): void {
    const { field, shape } = this;
    const { x, z, dx, dy, length, slope } = segment;
    const { kind, radius, tip, steepness } = shape;
    const rising = slope >= 0 ? 1 : -1;
    const ballShift = slope / Math.sqrt(1 + slope * slope);
    const steeper = steepness * steepness - slope * slope;
    const coneShift = steeper > 0 ? Math.abs(slope) / Math.sqrt(steeper) : Infinity;
    const square = radius * radius;
    this.visited += last - first + 1;
    for (let column = first; column <= last; column++) {
      const ox = field.x + (column + 0.5) * field.stepX - x;
      const along = ox * dx + oy * dy;
      const across = oy * dx - ox * dy;
      const reach = Math.max(0, square - across * across);
      const wide = Math.sqrt(reach);
      // How far behind the cell (seen along the slope) the cutter stands when its edge is lowest over the cell.
      let behind: number;
      if (slope === 0) behind = 0;
      else if (kind === 'flat') behind = rising * wide;
      else if (kind === 'ball') behind = ballShift * wide;
      else {
        const side = Math.abs(across);
        const overTip = side < tip ? Math.sqrt(tip * tip - side * side) : 0;
        const onCone = coneShift === Infinity ? wide : coneShift * side;
        behind = rising * Math.min(wide, Math.max(overTip, onCone));
      }
      const stand = Math.min(length, Math.max(0, along - behind));
      const away = along - stand;
      const left = reach - away * away;
      if (left < -SEAM) continue;
      const distanceSquare = across * across + away * away;
      let rise = 0;
      if (kind === 'ball') rise = radius - Math.sqrt(Math.max(0, left));
      else if (kind === 'cone') rise = Math.max(0, Math.sqrt(distanceSquare) - tip) * steepness;
      this.lower(base + column, z + slope * stand + rise);
    }
  }

  private level(first: number, last: number, z: number): void {
    this.visited += last - first + 1;
    const { z: heights } = this.field;
    const rounded = Math.fround(z);
    for (let cell = first; cell <= last; cell++) if (rounded < heights[cell]!) this.lower(cell, rounded);
  }

  private lower(cell: number, z: number): void {
    const { z: heights } = this.field;
    const old = heights[cell]!;
    if (z >= old) return;
    if (this.options.probe) {
      if (old - z > this.deepest) {
        this.deepest = old - z;
        this.deepestCell = cell;
      }
      return;
    }
    const { far } = this.options;
    if (far) {
      const floor = -far.thickness - far.z[cell]!;
      const taken = Math.max(old, floor) - Math.max(z, floor);
      this.removed += taken * this.area;
    } else this.removed += (old - z) * this.area;
    heights[cell] = z;
  }

  private firstRow(y: number): number {
    return Math.max(0, Math.ceil((y - this.field.y) / this.field.stepY - 0.5));
  }

  private lastRow(y: number): number {
    return Math.min(this.field.rows - 1, Math.floor((y - this.field.y) / this.field.stepY - 0.5));
  }

  private firstColumn(x: number): number {
    return Math.max(0, Math.ceil((x - this.field.x) / this.field.stepX - 0.5));
  }

  private lastColumn(x: number): number {
    return Math.min(this.field.columns - 1, Math.floor((x - this.field.x) / this.field.stepX - 0.5));
  }
}
