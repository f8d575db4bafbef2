/**
 * The rail of the landing page's drawing, as a small model of its own: a board of 480 × 140 × 19 mm, cut from both
 * faces. All in mm in face A's view, x right, y up; heights are above face B.
 */
export const BOARD = { x: 480, y: 140, z: 19 } as const;
export const KERF = 6;
export const GROOVE = { from: 68, to: 86, depth: 6 } as const;
export const TAB = { length: 8, wood: 4 } as const;

const BEVEL = 2;
/** How far a 60° point goes down for each mm sideways. */
const SLOPE = Math.tan(Math.PI / 3);
const POINT_BENEATH = 0.5;
/** The point's path outside the outline, and its depth, for a bevel cut 0.5 mm beneath its lower edge. */
const POINT_OFFSET = POINT_BENEATH / SLOPE;
const POINT_DEPTH = BEVEL * SLOPE + POINT_BENEATH;
const LEAF_DEPTH = 7;
const [LEFT, RIGHT, BOTTOM] = [18, 462, 20];

export type Point = readonly [x: number, y: number];

/** The part's outline, counter-clockwise. */
export const RAIL: readonly Point[] = railOutline();
export const LEAVES: readonly (readonly Point[])[] = leafPlaces().map(leafOutline);
export const STEM: readonly Point[] = Array.from({ length: 49 }, (_, i) => stemPoint(i / 48));
/** Middle of each tab, at the middle of the kerf, with the direction of the edge there in degrees. */
export const TABS: readonly { readonly at: Point; readonly angle: number }[] = [
  { at: [LEFT - KERF / 2, 77], angle: 90 },
  { at: [240, BOTTOM - KERF / 2], angle: 0 },
  { at: [RIGHT + KERF / 2, 77], angle: 90 },
  { at: [240, archAt(240) + KERF / 2], angle: 0 },
];

/** Wood at a place: from `bottom` to `top`, or null where it is cut through. */
export interface Wood {
  readonly bottom: number;
  readonly top: number;
  readonly isTab: boolean;
}

/** What is left of the board at (x, y) after both faces have been cut. */
export function woodAt(x: number, y: number): Wood | null {
  const outside = signedDistance(RAIL, x, y);
  const inKerf = outside > 0 && outside < KERF;
  const isTab = inKerf && TABS.some(({ at }) => Math.hypot(at[0] - x, at[1] - y) < TAB.length / 2 + 1.5);
  if (inKerf && !isTab) return null;
  const bevel = bevelDepth(outside);
  const bottom = Math.max(bevel, y > GROOVE.from && y < GROOVE.to ? GROOVE.depth : 0);
  // A tab is raised clear of what the other face loses over its whole width.
  const top = isTab
    ? Math.max(POINT_DEPTH, y > GROOVE.from && y < GROOVE.to ? GROOVE.depth : 0) + TAB.wood
    : BOARD.z - Math.max(bevel, leafDepth(x, y));
  return top > bottom ? { bottom, top, isTab } : null;
}

/** Depth of a chamfer's cut at a distance from the outline (positive outside): the bevel, and the point's other flank. */
function bevelDepth(outside: number): number {
  return Math.max(0, POINT_DEPTH - Math.abs(outside - POINT_OFFSET) * SLOPE);
}

function leafDepth(x: number, y: number): number {
  let deepest = 0;
  for (const leaf of LEAVES) {
    const inside = -signedDistance(leaf, x, y);
    if (inside > 0) deepest = Math.max(deepest, Math.min(LEAF_DEPTH, inside * SLOPE));
  }
  return deepest;
}

/** Distance to a closed ring, negative inside. */
function signedDistance(ring: readonly Point[], x: number, y: number): number {
  let least = Infinity;
  let inside = false;
  let [px, py] = ring[ring.length - 1] ?? [0, 0];
  for (const [qx, qy] of ring) {
    const [dx, dy] = [qx - px, qy - py];
    const along = Math.min(1, Math.max(0, ((x - px) * dx + (y - py) * dy) / (dx * dx + dy * dy)));
    least = Math.min(least, Math.hypot(x - px - along * dx, y - py - along * dy));
    if (qy > y !== py > y && x < px + ((y - py) / dy) * dx) inside = !inside;
    [px, py] = [qx, qy];
  }
  return inside ? -least : least;
}

function railOutline(): Point[] {
  const radius = 14;
  const points: Point[] = [];
  const corner = (cx: number, cy: number, from: number) => {
    for (let i = 0; i <= 8; i++) {
      const angle = ((from + (i * 90) / 8) * Math.PI) / 180;
      points.push([cx + radius * Math.cos(angle), cy + radius * Math.sin(angle)]);
    }
  };
  corner(LEFT + radius, BOTTOM + radius, 180);
  corner(RIGHT - radius, BOTTOM + radius, 270);
  corner(RIGHT - radius, archAt(RIGHT) - radius, 0);
  for (let x = RIGHT - radius - 12; x > LEFT + radius + 6; x -= 10) points.push([x, archAt(x)]);
  corner(LEFT + radius, archAt(LEFT) - radius, 90);
  return points;
}

/** The rail's upper edge: a low arch, a raised cosine. */
function archAt(x: number): number {
  const across = (x - 240) / 190;
  return Math.abs(across) < 1 ? 112 + 5 * (1 + Math.cos(Math.PI * across)) : 112;
}

function stemPoint(t: number): Point {
  return [96 + 288 * t, 48 + 26 * Math.sin(Math.PI * (0.1 + 0.82 * t))];
}

interface LeafPlace {
  readonly at: Point;
  readonly angle: number;
  readonly length: number;
}

function leafPlaces(): LeafPlace[] {
  const leaves = [
    [0.08, 62, 42],
    [0.2, -38, 40],
    [0.3, 48, 46],
    [0.45, -30, 42],
    [0.54, 36, 46],
    [0.7, -48, 40],
    [0.78, 24, 44],
    [1, -18, 46],
  ] as const;
  return leaves.map(([t, angle, length]) => ({ at: stemPoint(t), angle, length }));
}

/** A leaf from its stalk along `angle`: two arcs of equal bend. */
function leafOutline({ at, angle, length }: LeafPlace): Point[] {
  const turn = (angle * Math.PI) / 180;
  const side = (sign: number, backwards: boolean) =>
    Array.from({ length: 12 }, (_, i) => {
      const t = backwards ? 1 - i / 12 : i / 12;
      const bend = sign * length * 0.22 * Math.sin(Math.PI * t) ** 0.9;
      return [
        at[0] + t * length * Math.cos(turn) - bend * Math.sin(turn),
        at[1] + t * length * Math.sin(turn) + bend * Math.cos(turn),
      ] as const;
    });
  return [...side(-1, false), ...side(1, true)];
}
