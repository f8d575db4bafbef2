import type { Vec } from '@/lib/geometry/vec';
import { FIGURE_FONT, ON_WOOD, type Palette } from './palette';
import { toScreen, type View } from './view';

type Context = CanvasRenderingContext2D;

/** A tab as the plan shows it: a lozenge across the kerf, with the wood that is left beside it. */
export interface DrawnTab {
  readonly center: Vec;
  /** Unit vector along the kerf. */
  readonly along: Vec;
  /** mm along and across the kerf. */
  readonly length: number;
  readonly across: number;
  /** Wood left, ready to read, or null while the proof is under way. */
  readonly wood: string | null;
  readonly holds: boolean;
}

export function drawTabs(context: Context, view: View, tabs: readonly DrawnTab[], palette: Palette): void {
  context.font = FIGURE_FONT;
  for (const tab of tabs) {
    const { x, y } = toScreen(view, tab.center);
    context.save();
    context.translate(x, y);
    context.rotate(-Math.atan2(tab.along.y, tab.along.x));
    const long = Math.max(tab.length * view.scale, 9);
    const wide = Math.max(tab.across * view.scale, 9);
    context.fillStyle = tab.holds ? palette.tab : palette.sheet;
    context.strokeStyle = tab.holds ? ON_WOOD : palette.error;
    context.lineWidth = tab.holds ? 1 : 2;
    lozenge(context, long, wide);
    context.fill();
    context.stroke();
    if (!tab.holds) {
      context.beginPath();
      context.moveTo(-long / 3, -wide / 3);
      context.lineTo(long / 3, wide / 3);
      context.stroke();
    }
    context.restore();
    if (tab.wood) label(context, x, y, tab, palette, view);
  }
}

function lozenge(context: Context, long: number, wide: number): void {
  const cut = Math.min(long, wide) / 4;
  context.beginPath();
  context.moveTo(-long / 2 + cut, -wide / 2);
  context.lineTo(long / 2 - cut, -wide / 2);
  context.lineTo(long / 2, -wide / 2 + cut);
  context.lineTo(long / 2, wide / 2 - cut);
  context.lineTo(long / 2 - cut, wide / 2);
  context.lineTo(-long / 2 + cut, wide / 2);
  context.lineTo(-long / 2, wide / 2 - cut);
  context.lineTo(-long / 2, -wide / 2 + cut);
  context.closePath();
}

/** Beside the tab, off the kerf, on a plate of its own so that no line runs through the figure. */
function label(context: Context, x: number, y: number, tab: DrawnTab, palette: Palette, view: View): void {
  const text = tab.wood ?? '';
  const away = Math.max(tab.across * view.scale, 9) / 2 + 12;
  const width = context.measureText(text).width + 8;
  const px = x - tab.along.y * (away + (width / 2) * Math.abs(tab.along.y));
  const py = y - tab.along.x * away;
  context.fillStyle = palette.sheet;
  context.strokeStyle = tab.holds ? palette.rule : palette.error;
  context.lineWidth = 1;
  context.fillRect(px - width / 2, py - 9, width, 18);
  context.strokeRect(px - width / 2, py - 9, width, 18);
  context.fillStyle = tab.holds ? palette.ink : palette.error;
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  context.fillText(text, px, py + 0.5);
}
