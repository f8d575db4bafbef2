import type { Vec } from '@/lib/geometry/vec';
import type { SectionLine } from '@/lib/editor/session';
import type { Draft } from '@/lib/editor/tools/tool';
import type { Polyline } from '@/lib/geometry/contour';
import { LETTER_FONT, ON_WOOD, type Palette } from './palette';
import { tracePolyline } from './draw-outlines';
import { toScreen, type View } from './view';

type Context = CanvasRenderingContext2D;

/** How far the section line runs beyond its ends, px, to carry its arrows and letters. */
const OVERHANG = 16;

/** Chain line with wide ends, arrows in the direction of sight, and its letter (ISO 128). */
export function drawSectionLine(
  context: Context,
  view: View,
  { from, to }: SectionLine,
  board: { x: number; y: number },
  palette: Palette,
): void {
  const a = toScreen(view, from);
  const b = toScreen(view, to);
  const length = Math.hypot(b.x - a.x, b.y - a.y);
  if (length < 1) return;
  const ux = (b.x - a.x) / length;
  const uy = (b.y - a.y) / length;
  // Sight runs to the left of the line on the board: towards the back for a line drawn to the right.
  const sight = { x: uy, y: -ux };
  context.strokeStyle = palette.ink;
  context.fillStyle = palette.ink;
  context.lineWidth = 1.25;
  context.setLineDash([18, 4, 3, 4]);
  stroke(context, a, b);
  // On the board itself in the ink that stands out on wood, in either theme.
  const corner = toScreen(view, { x: 0, y: board.y });
  context.save();
  context.beginPath();
  context.rect(corner.x, corner.y, board.x * view.scale, board.y * view.scale);
  context.clip();
  context.strokeStyle = ON_WOOD;
  stroke(context, a, b);
  context.restore();
  context.setLineDash([]);
  context.font = LETTER_FONT;
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  for (const [end, way] of [
    [a, -1],
    [b, 1],
  ] as const) {
    const outer = { x: end.x + way * ux * OVERHANG, y: end.y + way * uy * OVERHANG };
    context.lineWidth = 3;
    stroke(context, end, outer);
    context.lineWidth = 1.5;
    const tip = { x: outer.x + sight.x * 20, y: outer.y + sight.y * 20 };
    stroke(context, outer, tip);
    arrowHead(context, tip, sight);
    context.fillText('A', tip.x + sight.x * 14, tip.y + sight.y * 14);
    drawGrip(context, end, palette);
  }
}

/** A ring that says: this can be dragged. */
function drawGrip(context: Context, at: Vec, palette: Palette): void {
  context.fillStyle = palette.sheet;
  context.strokeStyle = palette.ink;
  context.lineWidth = 1.5;
  context.beginPath();
  context.arc(at.x, at.y, 5.5, 0, 2 * Math.PI);
  context.fill();
  context.stroke();
  context.fillStyle = palette.ink;
}

function arrowHead(context: Context, tip: Vec, way: Vec): void {
  context.beginPath();
  context.moveTo(tip.x + way.x * 3, tip.y + way.y * 3);
  context.lineTo(tip.x - way.x * 7 + way.y * 4, tip.y - way.y * 7 - way.x * 4);
  context.lineTo(tip.x - way.x * 7 - way.y * 4, tip.y - way.y * 7 + way.x * 4);
  context.closePath();
  context.fill();
}

function stroke(context: Context, a: Vec, b: Vec): void {
  context.beginPath();
  context.moveTo(a.x, a.y);
  context.lineTo(b.x, b.y);
  context.stroke();
}

/** What is being drawn: the shape in marigold, or the box that selects. */
export function drawDraft(
  context: Context,
  view: View,
  draft: Draft,
  lines: readonly Polyline[],
  palette: Palette,
): void {
  context.strokeStyle = palette.tab;
  context.lineWidth = 2;
  if (draft.kind === 'shape') {
    context.beginPath();
    for (const line of lines) tracePolyline(context, view, line);
    context.stroke();
    return;
  }
  const a = toScreen(view, draft.from);
  const b = toScreen(view, draft.to);
  context.setLineDash([5, 3]);
  context.strokeRect(Math.min(a.x, b.x), Math.min(a.y, b.y), Math.abs(b.x - a.x), Math.abs(b.y - a.y));
  context.setLineDash([]);
}

/** A cross where the pointer snapped to. */
export function drawSnap(context: Context, view: View, at: Vec, palette: Palette): void {
  const { x, y } = toScreen(view, at);
  context.strokeStyle = palette.tab;
  context.lineWidth = 1.5;
  context.strokeRect(x - 4.5, y - 4.5, 9, 9);
}

export interface Pin {
  readonly at: Vec;
  readonly kind: 'comment' | 'error' | 'warning';
  readonly label: string;
  readonly chosen: boolean;
}

/** Comments as numbered flags, findings as a triangle (warning) or a square (error): told by shape, not colour alone. */
export function drawPins(context: Context, view: View, pins: readonly Pin[], palette: Palette): void {
  context.font = '600 13px "Barlow", sans-serif';
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  for (const pin of pins) {
    const { x, y } = toScreen(view, pin.at);
    const colour =
      pin.kind === 'comment' ? palette.faceA : pin.kind === 'error' ? palette.error : palette.warning;
    context.fillStyle = colour;
    context.strokeStyle = pin.chosen ? palette.tab : palette.sheet;
    context.lineWidth = pin.chosen ? 3 : 1.5;
    context.beginPath();
    if (pin.kind === 'comment') {
      context.moveTo(x, y);
      context.lineTo(x, y - 26);
      context.lineTo(x + 24, y - 26);
      context.lineTo(x + 24, y - 8);
      context.lineTo(x + 6, y - 8);
    } else if (pin.kind === 'warning') {
      context.moveTo(x, y - 12);
      context.lineTo(x + 11, y + 8);
      context.lineTo(x - 11, y + 8);
    } else context.rect(x - 9, y - 9, 18, 18);
    context.closePath();
    context.stroke();
    context.fill();
    context.fillStyle = palette.sheet;
    if (pin.kind === 'comment') context.fillText(pin.label, x + 12, y - 16.5);
    else context.fillText('!', x, y + 1);
  }
}
