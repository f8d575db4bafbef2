import { EDGE_REACH } from '@/lib/base/tolerances';
import { intersectRegions, unionRegions } from '@/lib/geometry/boolean';
import type { Box, Region, Ring } from '@/lib/geometry/contour';
import { pointsBox } from '@/lib/geometry/measure';
import { regionPieces } from '@/lib/geometry/pieces';

/** A board's size in a face's view: both faces see the same. */
export interface BoardSize {
  readonly x: number;
  readonly y: number;
}

/**
 * The region extended straight out over the edges of the board that it reaches (within {@link EDGE_REACH}) by `reach`,
 * at a corner of the board over both edges.
 */
export function runOutRegion(region: Region, board: BoardSize, reach: number): Region {
  const strips = edgeStrips(board).flatMap(({ strip, extend }) =>
    regionPieces(intersectRegions(region, [rectangle(strip)])).map((piece) =>
      extend(pointsBox(piece[0] ?? []), reach, board),
    ),
  );
  return strips.length === 0 ? region : unionRegions([region, ...strips.map((box) => [rectangle(box)])]);
}

interface EdgeStrip {
  readonly strip: Box;
  /** The rectangle that carries what touches this edge out over it. */
  readonly extend: (touch: Box, reach: number, board: BoardSize) => Box;
}

/** A strip just inside each edge of the board. */
function edgeStrips({ x, y }: BoardSize): EdgeStrip[] {
  const e = EDGE_REACH;
  return [
    {
      strip: { minX: 0, maxX: e, minY: 0, maxY: y },
      extend: (t, r, b) => ({ ...alongY(t, r, b), minX: -r, maxX: e }),
    },
    {
      strip: { minX: x - e, maxX: x, minY: 0, maxY: y },
      extend: (t, r, b) => ({ ...alongY(t, r, b), minX: x - e, maxX: x + r }),
    },
    {
      strip: { minX: 0, maxX: x, minY: 0, maxY: e },
      extend: (t, r, b) => ({ ...alongX(t, r, b), minY: -r, maxY: e }),
    },
    {
      strip: { minX: 0, maxX: x, minY: y - e, maxY: y },
      extend: (t, r, b) => ({ ...alongX(t, r, b), minY: y - e, maxY: y + r }),
    },
  ];
}

function alongY({ minY, maxY }: Box, reach: number, { y }: BoardSize): Pick<Box, 'minY' | 'maxY'> {
  return { minY: minY <= EDGE_REACH ? -reach : minY, maxY: maxY >= y - EDGE_REACH ? y + reach : maxY };
}

function alongX({ minX, maxX }: Box, reach: number, { x }: BoardSize): Pick<Box, 'minX' | 'maxX'> {
  return { minX: minX <= EDGE_REACH ? -reach : minX, maxX: maxX >= x - EDGE_REACH ? x + reach : maxX };
}

/** A rectangle as a counter-clockwise ring. */
export function rectangle({ minX, minY, maxX, maxY }: Box): Ring {
  return [
    { x: minX, y: minY },
    { x: maxX, y: minY },
    { x: maxX, y: maxY },
    { x: minX, y: maxY },
  ];
}
