import type { Vec } from '@/lib/geometry/vec';
import { FIGURE_FONT, LETTER_FONT, ON_WOOD, type Palette } from './palette';

type Context = CanvasRenderingContext2D;

/** How the section lies on the screen: pixels a millimetre along and up, and where its lower left corner is. */
export interface SectionScale {
  readonly along: number;
  readonly up: number;
  readonly x: number;
  readonly y: number;
}

/** What the section shows: heights are above the bed, mm; `s` runs along the section line. */
export interface SectionDrawing {
  readonly length: number;
  readonly thickness: number;
  /** Outlines of the wood, x = s, y = height. */
  readonly wood: readonly (readonly Vec[])[];
  readonly tabs: readonly SectionTab[];
}

/** A tab that the line crosses. */
export interface SectionTab {
  readonly from: number;
  readonly to: number;
  readonly bottom: number;
  readonly top: number;
  readonly label: string;
  readonly holds: boolean;
}

/** Spacing of the hatch, px: cut wood is hatched at 45° whatever the scale (ISO 128). */
const HATCH = 7;

/** Wood hatched, its edge in wide ink, tabs in marigold, faces lettered, thickness given. */
export function drawSection(
  context: Context,
  scale: SectionScale,
  drawing: SectionDrawing,
  words: { readonly up: string; readonly down: string; readonly thickness: string },
  palette: Palette,
): void {
  const place = (p: Vec): Vec => ({ x: scale.x + p.x * scale.along, y: scale.y - p.y * scale.up });
  traceBoard(context, scale, drawing, palette);
  const wood = woodPath(drawing, place);
  context.fillStyle = palette.board;
  context.fill(wood, 'evenodd');
  context.save();
  context.clip(wood, 'evenodd');
  hatch(context, scale, drawing, palette);
  context.restore();
  context.strokeStyle = palette.boardEdge;
  context.lineWidth = 1.75;
  context.stroke(wood);
  for (const tab of drawing.tabs) drawTab(context, place, tab, palette);
  drawLetters(context, scale, drawing, words, palette);
}

function woodPath({ wood }: SectionDrawing, place: (p: Vec) => Vec): Path2D {
  const path = new Path2D();
  for (const ring of wood) {
    ring.forEach((point, i) => {
      const { x, y } = place(point);
      if (i === 0) path.moveTo(x, y);
      else path.lineTo(x, y);
    });
    path.closePath();
  }
  return path;
}

/** Where the whole board was: a thin broken line, so that what is cut away is seen. */
function traceBoard(
  context: Context,
  scale: SectionScale,
  { length, thickness }: SectionDrawing,
  palette: Palette,
): void {
  context.strokeStyle = palette.graphite;
  context.lineWidth = 1;
  context.setLineDash([4, 4]);
  context.strokeRect(scale.x, scale.y - thickness * scale.up, length * scale.along, thickness * scale.up);
  context.setLineDash([]);
}

function hatch(
  context: Context,
  scale: SectionScale,
  { length, thickness }: SectionDrawing,
  palette: Palette,
): void {
  const width = length * scale.along;
  const height = thickness * scale.up;
  context.strokeStyle = palette.boardDeep;
  context.globalAlpha = 0.35;
  context.lineWidth = 1;
  context.beginPath();
  // The hatch is laid out from the board's own corner, so that it does not swim while the line is dragged.
  for (let at = -height; at < width; at += HATCH) {
    context.moveTo(scale.x + at, scale.y);
    context.lineTo(scale.x + at + height, scale.y - height);
  }
  context.stroke();
  context.globalAlpha = 1;
}

function drawTab(context: Context, place: (p: Vec) => Vec, tab: SectionTab, palette: Palette): void {
  const a = place({ x: tab.from, y: tab.top });
  const b = place({ x: tab.to, y: tab.bottom });
  context.fillStyle = tab.holds ? palette.tab : palette.sheet;
  context.strokeStyle = tab.holds ? ON_WOOD : palette.error;
  context.lineWidth = tab.holds ? 1.25 : 2;
  const width = Math.max(b.x - a.x, 3);
  context.fillRect(a.x, a.y, width, b.y - a.y);
  context.strokeRect(a.x, a.y, width, b.y - a.y);
  context.font = FIGURE_FONT;
  context.textAlign = 'center';
  context.textBaseline = 'bottom';
  const middle = (a.x + b.x) / 2;
  const plate = context.measureText(tab.label).width + 8;
  context.fillStyle = palette.sheet;
  context.fillRect(middle - plate / 2, a.y - 22, plate, 17);
  context.fillStyle = tab.holds ? palette.ink : palette.error;
  context.fillText(tab.label, middle, a.y - 6);
}

function drawLetters(
  context: Context,
  scale: SectionScale,
  { length, thickness }: SectionDrawing,
  words: { readonly up: string; readonly down: string; readonly thickness: string },
  palette: Palette,
): void {
  const top = scale.y - thickness * scale.up;
  context.font = LETTER_FONT;
  context.textAlign = 'right';
  context.textBaseline = 'middle';
  for (const [face, y] of [
    [words.up, top + 2],
    [words.down, scale.y - 2],
  ] as const) {
    context.fillStyle = face === 'A' ? palette.faceA : palette.faceB;
    context.fillText(face, scale.x - 14, y);
  }
  context.font = FIGURE_FONT;
  context.textAlign = 'left';
  context.fillStyle = palette.graphite;
  context.fillText(words.thickness, scale.x + length * scale.along + 12, (top + scale.y) / 2);
}
