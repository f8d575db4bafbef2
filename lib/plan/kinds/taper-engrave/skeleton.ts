import Delaunator from 'delaunator';
import type { Region } from '@/lib/geometry/contour';
import { createDistanceQuery, type DistanceQuery } from '@/lib/geometry/distance-query';
import { regionContains } from '@/lib/geometry/measure';
import { cross, distance, lerp, subtract, type Vec } from '@/lib/geometry/vec';
import { sampleBoundary, type BoundarySamples } from './boundary-samples';

/** A place on the skeleton with its distance from the boundary, mm. */
export interface SkeletonNode {
  readonly x: number;
  readonly y: number;
  readonly distance: number;
}

/** The middle lines of a region: nodes, and edges between them by index. */
export interface Skeleton {
  readonly nodes: readonly SkeletonNode[];
  readonly edges: readonly (readonly [number, number])[];
}

/** Distance of boundary samples, mm; finer than any detail that a V-bit shows. */
const SAMPLE_STEP = 0.1;

/**
 * Two samples belong to two sides of the region when the way between them along the boundary is this much longer than
 * straight, mm; else their bisector is only an artefact of sampling one smooth side.
 */
const LEAST_DETOUR = 0.01;

/** How far a straight joint into a corner may claim more room than there is, mm. */
const JOINT_ERROR = 0.003;

/** The room between two nodes is taken to change evenly within this, mm, and edges shorter than this are not divided. */
const ROOM_ERROR = 0.001;
const SHORTEST_EDGE = 0.01;

/**
 * The skeleton (medial axis) of a region's inside, by the Voronoi diagram of boundary samples (dual of their Delaunay
 * triangulation), pruned by how much longer the boundary between an edge's two samples is than their chord. Distances
 * are exact, to the boundary itself and not to its samples; branches are led on into sharp corners where a straight
 * joint fits.
 */
export function skeletonOf(region: Region): Skeleton {
  const samples = sampleBoundary(region, SAMPLE_STEP);
  if (samples.ring.length < 3) return { nodes: [], edges: [] };
  const edge = createDistanceQuery(region);
  const isInside = insideTest(region, edge);
  const { triangles, halfedges } = new Delaunator(samples.at);
  const centers = new Map<number, number>();
  const nodes: SkeletonNode[] = [];
  const edges: [number, number][] = [];

  const nodeOf = (triangle: number): number => {
    const known = centers.get(triangle);
    if (known !== undefined) return known;
    const center = circumcenter(samples, triangles, triangle);
    const index =
      center && isInside(center) ? nodes.push({ ...center, distance: edge.distance(center) }) - 1 : -1;
    centers.set(triangle, index);
    return index;
  };

  for (let e = 0; e < halfedges.length; e++) {
    const opposite = halfedges[e]!;
    if (opposite < e) continue;
    if (detour(samples, triangles[e]!, triangles[opposite]!) < LEAST_DETOUR) continue;
    const a = nodeOf(Math.floor(e / 3));
    const b = nodeOf(Math.floor(opposite / 3));
    if (a >= 0 && b >= 0) edges.push([a, b]);
  }
  joinCorners(nodes, edges, samples.corners, edge);
  return { nodes, edges: edges.flatMap(([a, b]) => divided(nodes, a, b, edge)) };
}

/**
 * An edge in parts on which the room changes almost evenly: between two corners that point inward a bisector runs far
 * without a sample of its own, and its room is least in its middle.
 */
function divided(nodes: SkeletonNode[], a: number, b: number, edge: DistanceQuery): [number, number][] {
  const [p, q] = [nodes[a]!, nodes[b]!];
  const middle = lerp(p, q, 0.5);
  const room = edge.distance(middle);
  const isEven = Math.abs(room - (p.distance + q.distance) / 2) <= ROOM_ERROR;
  if (isEven || distance(p, q) < SHORTEST_EDGE) return [[a, b]];
  const m = nodes.push({ ...middle, distance: room }) - 1;
  return [...divided(nodes, a, m, edge), ...divided(nodes, m, b, edge)];
}

/** How much longer the way between two samples along their ring is than straight; infinite between two rings. */
function detour(samples: BoundarySamples, p: number, q: number): number {
  if (samples.ring[p] !== samples.ring[q]) return Infinity;
  const whole = samples.ringLengths[samples.ring[p]!]!;
  const way = Math.abs(samples.along[p]! - samples.along[q]!);
  const dx = samples.at[2 * p]! - samples.at[2 * q]!;
  const dy = samples.at[2 * p + 1]! - samples.at[2 * q + 1]!;
  return Math.min(way, whole - way) - Math.hypot(dx, dy);
}

function circumcenter(samples: BoundarySamples, triangles: Uint32Array, t: number): Vec | null {
  const [i, j, k] = [triangles[3 * t]!, triangles[3 * t + 1]!, triangles[3 * t + 2]!];
  const ax = samples.at[2 * i]!;
  const ay = samples.at[2 * i + 1]!;
  const bx = samples.at[2 * j]! - ax;
  const by = samples.at[2 * j + 1]! - ay;
  const cx = samples.at[2 * k]! - ax;
  const cy = samples.at[2 * k + 1]! - ay;
  const d = 2 * (bx * cy - by * cx);
  if (Math.abs(d) < 1e-12) return null;
  const b2 = bx * bx + by * by;
  const c2 = cx * cx + cy * cy;
  return { x: ax + (cy * b2 - by * c2) / d, y: ay + (bx * c2 - cx * b2) / d };
}

/** Whether a place is inside: by the side of the nearest edge, which only at a vertex needs the whole region. */
function insideTest(region: Region, edge: DistanceQuery): (p: Vec) => boolean {
  return (p) => {
    const near = edge.nearest(p);
    if (!near) return false;
    const ring = region[near.line]!;
    const at = (i: number) => ring[(i + ring.length) % ring.length]!;
    const side = (i: number) => cross(subtract(at(i + 1), at(i)), subtract(p, at(i))) > 0;
    const inside = side(near.edge);
    const atStart = distance(near.point, at(near.edge)) < 1e-9;
    const atEnd = distance(near.point, at(near.edge + 1)) < 1e-9;
    if (!atStart && !atEnd) return inside;
    const other = side(atStart ? near.edge - 1 : near.edge + 1);
    return other === inside ? inside : regionContains(region, p);
  };
}

/** Leads the ends of branches on into the sharp corners beside them, where the room shrinks evenly to nothing. */
function joinCorners(
  nodes: SkeletonNode[],
  edges: [number, number][],
  corners: readonly Vec[],
  edge: DistanceQuery,
): void {
  const degrees = new Map<number, number>();
  for (const pair of edges) for (const node of pair) degrees.set(node, (degrees.get(node) ?? 0) + 1);
  const ends = [...degrees].filter(([, degree]) => degree === 1).map(([node]) => node);
  for (const corner of corners) {
    const near = ends
      .map((index) => ({ index, away: distance(nodes[index]!, corner) }))
      .filter(({ index, away }) => away < 8 * nodes[index]!.distance + 4 * SAMPLE_STEP)
      .sort((a, b) => a.away - b.away || a.index - b.index)
      .find(({ index }) => shrinksEvenly(nodes[index]!, corner, edge));
    if (near) edges.push([near.index, nodes.push({ x: corner.x, y: corner.y, distance: 0 }) - 1]);
  }
}

function shrinksEvenly(node: SkeletonNode, corner: Vec, edge: DistanceQuery): boolean {
  return [0.2, 0.4, 0.6, 0.8, 0.95].every(
    (t) => node.distance * (1 - t) <= edge.distance(lerp(node, corner, t)) + JOINT_ERROR,
  );
}
