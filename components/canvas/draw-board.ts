import type { Face } from '@/lib/job/numbers';
import type { Board } from '@/lib/job/board-schema';
import { FIGURE_FONT, type Palette } from './palette';
import { gridPitch, toScreen, type Size, type View } from './view';

type Context = CanvasRenderingContext2D;

/** The board, its grain, and the picture of what is cut from it where there is one. */
export function drawBoard(
  context: Context,
  view: View,
  board: Board,
  picture: CanvasImageSource | null,
  palette: Palette,
): void {
  const top = toScreen(view, { x: 0, y: board.y });
  const width = board.x * view.scale;
  const height = board.y * view.scale;
  context.fillStyle = palette.board;
  context.fillRect(top.x, top.y, width, height);
  if (picture) {
    context.imageSmoothingEnabled = true;
    context.drawImage(picture, top.x, top.y, width, height);
  }
  drawGrain(context, { x: top.x, y: top.y, width, height }, board.grain, palette);
  context.strokeStyle = palette.boardEdge;
  context.lineWidth = 1.25;
  context.strokeRect(top.x, top.y, width, height);
}

/** A few quiet lines that say which way the fibres run. */
function drawGrain(
  context: Context,
  box: { x: number; y: number; width: number; height: number },
  grain: 'x' | 'y',
  palette: Palette,
): void {
  context.save();
  context.beginPath();
  context.rect(box.x, box.y, box.width, box.height);
  context.clip();
  context.globalAlpha = 0.12;
  context.strokeStyle = palette.boardDeep;
  context.lineWidth = 1;
  context.beginPath();
  const across = grain === 'x' ? box.height : box.width;
  const along = grain === 'x' ? box.width : box.height;
  const count = 14;
  for (let i = 1; i < count; i++) {
    // Uneven on purpose, but the same each time: a golden-ratio spread.
    const at = across * ((i * 0.61803) % 1);
    const sway = across * 0.012 * ((i % 3) - 1);
    for (let step = 0; step <= 24; step++) {
      const run = (along * step) / 24;
      const drift = at + sway * Math.sin((step / 24) * Math.PI * 2 + i);
      const x = grain === 'x' ? box.x + run : box.x + drift;
      const y = grain === 'x' ? box.y + drift : box.y + run;
      if (step === 0) context.moveTo(x, y);
      else context.lineTo(x, y);
    }
  }
  context.stroke();
  context.restore();
}

/** Grid lines over the whole sheet, every fifth (or inch) a little stronger. */
export function drawGrid(
  context: Context,
  view: View,
  size: Size,
  unit: 'mm' | 'in',
  palette: Palette,
): void {
  const pitch = gridPitch(view.scale, unit);
  const strong = unit === 'in' ? 8 : 5;
  context.strokeStyle = palette.graphite;
  context.lineWidth = 1;
  const first = {
    x: Math.ceil(-view.x / view.scale / pitch),
    y: Math.ceil((view.y - size.height) / view.scale / pitch),
  };
  for (let i = first.x; ; i++) {
    const x = Math.round(view.x + i * pitch * view.scale) + 0.5;
    if (x > size.width) break;
    line(context, x, 0, x, size.height, i % strong === 0);
  }
  for (let i = first.y; ; i++) {
    const y = Math.round(view.y - i * pitch * view.scale) + 0.5;
    if (y < 0) break;
    line(context, 0, y, size.width, y, i % strong === 0);
  }
  context.globalAlpha = 1;
}

function line(context: Context, x1: number, y1: number, x2: number, y2: number, isStrong: boolean): void {
  context.globalAlpha = isStrong ? 0.14 : 0.06;
  context.beginPath();
  context.moveTo(x1, y1);
  context.lineTo(x2, y2);
  context.stroke();
}

/** Length and width as a drawing gives them: extension lines, arrows, the figure in the gap. */
export function drawDimensions(
  context: Context,
  view: View,
  board: { x: number; y: number },
  figure: (mm: number) => string,
  palette: Palette,
): void {
  const topLeft = toScreen(view, { x: 0, y: board.y });
  const bottomRight = toScreen(view, { x: board.x, y: 0 });
  context.strokeStyle = palette.graphite;
  context.fillStyle = palette.graphite;
  context.lineWidth = 1;
  context.font = FIGURE_FONT;
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  dimension(context, topLeft.x, bottomRight.x, topLeft.y - 22, figure(board.x), palette);
  context.save();
  context.translate(bottomRight.x + 22, 0);
  context.rotate(Math.PI / 2);
  dimension(context, topLeft.y, bottomRight.y, 0, figure(board.y), palette);
  context.restore();
}

function dimension(
  context: Context,
  from: number,
  to: number,
  at: number,
  text: string,
  palette: Palette,
): void {
  const gap = context.measureText(text).width / 2 + 7;
  const middle = (from + to) / 2;
  context.beginPath();
  for (const end of [from, to]) {
    context.moveTo(end, at - 6);
    context.lineTo(end, at + 14);
  }
  if (to - from > 2 * gap + 16) {
    context.moveTo(from, at);
    context.lineTo(middle - gap, at);
    context.moveTo(middle + gap, at);
    context.lineTo(to, at);
  }
  context.stroke();
  arrow(context, from, at, 1);
  arrow(context, to, at, -1);
  context.fillStyle = palette.graphite;
  context.fillText(text, middle, at);
}

function arrow(context: Context, x: number, y: number, way: 1 | -1): void {
  context.beginPath();
  context.moveTo(x, y);
  context.lineTo(x + way * 8, y - 2.6);
  context.lineTo(x + way * 8, y + 2.6);
  context.closePath();
  context.fill();
}

/** Where X0 Y0 of the face's programs is. */
export function drawZero(
  context: Context,
  view: View,
  at: { x: number; y: number },
  face: Face,
  palette: Palette,
): void {
  const { x, y } = toScreen(view, at);
  const colour = face === 'A' ? palette.faceA : palette.faceB;
  context.fillStyle = palette.sheet;
  context.strokeStyle = colour;
  context.lineWidth = 1.5;
  context.beginPath();
  context.arc(x, y, 7, 0, 2 * Math.PI);
  context.fill();
  context.stroke();
  context.fillStyle = colour;
  for (const quarter of [0, 2]) {
    context.beginPath();
    context.moveTo(x, y);
    context.arc(x, y, 7, (quarter * Math.PI) / 2, ((quarter + 1) * Math.PI) / 2);
    context.closePath();
    context.fill();
  }
}
