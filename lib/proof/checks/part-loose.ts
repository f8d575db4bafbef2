import { regionContains } from '@/lib/geometry/measure';
import { cutFloor, cutterOf } from '@/lib/job/cut-values';
import type { Cut } from '@/lib/job/cut-schema';
import { makeFinding } from '@/lib/report/make-finding';
import { modelPoint } from '../board-model';
import { cellCentre } from '../height-field';
import { woodPieces, type Piece } from '../loose-pieces';
import { cutTitle, mm, type Check, type ProofContext } from '../proof-context';

/** Thinner wood holds nothing together, mm. */
const NO_WOOD = 0.05;

/**
 * Pieces of what is left that hang together with nothing that is held. Pieces no larger than two cutter diameters, and
 * slivers, are chips.
 */
export const partLoose: Check = (context) => {
  const { job, board } = context;
  const cutting = job.cuts.filter((cut) => cut.enabled && hasWorked(context, cut));
  if (cutting.length === 0) return [];
  const { A, B } = board.fields;
  const pieces = woodPieces(A, (cell) => job.board.z + A.z[cell]! + B.z[cell]! > NO_WOOD);
  const held = heldPieces(pieces);
  return pieces.flatMap((piece) => {
    if (held.has(piece)) return [];
    const cut = cutAround(context, cutting, piece);
    const { diameter } = cutterOf(job, cut);
    const [width, height] = [piece.maxX - piece.minX, piece.maxY - piece.minY];
    const area = piece.cells * A.stepX * A.stepY;
    if (Math.max(width, height) <= 2 * diameter || area < diameter * diameter) return [];
    const { x, y } = modelPoint(board, cut.face, cellCentre(A, piece.cell));
    const message = `${cutTitle(cut)} cuts a piece of ${mm(width)} by ${mm(height)} free; nothing holds it.`;
    return [makeFinding('part-loose', message, { cut: cut.id, face: cut.face, at: [x, y] })];
  });
};

/** What reaches an edge of the board is taken as held there; where nothing does, the largest piece is. */
function heldPieces(pieces: readonly Piece[]): ReadonlySet<Piece> {
  const atEdge = pieces.filter(({ touchesEdge }) => touchesEdge);
  if (atEdge.length > 0) return new Set(atEdge);
  return new Set([...pieces].sort((a, b) => b.cells - a.cells).slice(0, 1));
}

/** Whether the programs did anything for the cut. */
function hasWorked({ cuts }: ProofContext, { id }: Cut): boolean {
  return cuts.some((cut) => cut.id === id);
}

/** The last cut-out round the piece; else the last that goes through the board, else the last of all. */
function cutAround({ job, outlines, board }: ProofContext, cutting: readonly Cut[], piece: Piece): Cut {
  const middle = cellCentre(board.fields.A, piece.cell);
  const inOrder = job.order.flatMap((face) => cutting.filter((cut) => cut.face === face)).reverse();
  const around = inOrder.find((cut) => {
    const p = modelPoint(board, cut.face, middle);
    return (
      cut.kind === 'profile' &&
      cut.outlines.some((id) => regionContains(outlines.get(id, cut.face).region, p))
    );
  });
  const through = inOrder.find((cut) => cut.kind !== 'chamfer' && cutFloor(job, cut) >= job.board.z);
  return around ?? through ?? inOrder[0]!;
}
