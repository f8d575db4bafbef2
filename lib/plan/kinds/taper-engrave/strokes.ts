import type { Skeleton, SkeletonNode } from './skeleton';

/** A continuous run over the skeleton. */
export type Stroke = readonly SkeletonNode[];

/**
 * The skeleton where it is nearer to the boundary than `limit`, as few continuous strokes: each goes on through
 * junctions as straight as it can until nothing is left ahead. Edges that cross the limit end exactly on it.
 */
export function strokesWithin(skeleton: Skeleton, limit: number): Stroke[] {
  const { nodes, edges } = clipped(skeleton, limit);
  const around = new Map<number, number[]>();
  edges.forEach(([a, b], i) => {
    around.set(a, [...(around.get(a) ?? []), i]);
    around.set(b, [...(around.get(b) ?? []), i]);
  });
  const used = new Uint8Array(edges.length);
  const strokes: Stroke[] = [];
  const walkFrom = (start: number): void => {
    for (;;) {
      const run = walk(start, nodes, edges, around, used);
      if (run.length < 2) return;
      strokes.push(run);
    }
  };
  // Free ends first, then junctions, then what is left: rings.
  const starts = [...around.keys()].sort((a, b) => rank(around, a) - rank(around, b) || a - b);
  starts.forEach(walkFrom);
  return strokes;
}

function rank(around: ReadonlyMap<number, readonly number[]>, node: number): number {
  const degree = around.get(node)!.length;
  return degree === 1 ? 0 : degree === 2 ? 2 : 1;
}

function walk(
  start: number,
  nodes: readonly SkeletonNode[],
  edges: readonly (readonly [number, number])[],
  around: ReadonlyMap<number, readonly number[]>,
  used: Uint8Array,
): SkeletonNode[] {
  const run = [nodes[start]!];
  let at = start;
  for (;;) {
    const free = around.get(at)!.filter((edge) => used[edge] === 0);
    if (free.length === 0) return run;
    const from = run.at(-2);
    const here = nodes[at]!;
    const other = (edge: number) => (edges[edge]![0] === at ? edges[edge]![1] : edges[edge]![0]);
    const next = free.reduce((best, edge) =>
      straightness(from, here, nodes[other(edge)]!) > straightness(from, here, nodes[other(best)]!)
        ? edge
        : best,
    );
    used[next] = 1;
    at = other(next);
    run.push(nodes[at]!);
  }
}

/** Cosine of the turn at a node; 0 where there is no way behind. */
function straightness(from: SkeletonNode | undefined, at: SkeletonNode, to: SkeletonNode): number {
  if (!from) return 0;
  const [ax, ay, bx, by] = [at.x - from.x, at.y - from.y, to.x - at.x, to.y - at.y];
  const size = Math.hypot(ax, ay) * Math.hypot(bx, by);
  return size > 0 ? (ax * bx + ay * by) / size : 0;
}

function clipped({ nodes, edges }: Skeleton, limit: number): Skeleton {
  const outNodes = [...nodes];
  const outEdges: [number, number][] = [];
  for (const [a, b] of edges) {
    const da = nodes[a]!.distance;
    const db = nodes[b]!.distance;
    if (a === b || (da > limit && db > limit)) continue;
    if (da <= limit && db <= limit) outEdges.push([a, b]);
    else {
      const [inner, outer] = da <= limit ? [a, b] : [b, a];
      const p = nodes[inner]!;
      const q = nodes[outer]!;
      const t = (limit - p.distance) / (q.distance - p.distance);
      const cut = { x: p.x + (q.x - p.x) * t, y: p.y + (q.y - p.y) * t, distance: limit };
      outEdges.push([inner, outNodes.push(cut) - 1]);
    }
  }
  return { nodes: outNodes, edges: outEdges };
}
