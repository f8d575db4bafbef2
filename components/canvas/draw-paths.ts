import type { DrawnPath } from '@/lib/moves/drawn-path';
import { ON_WOOD, type Palette } from './palette';
import type { View } from './view';

type Context = CanvasRenderingContext2D;

/** Cutter paths of one face as thin lines, rapids dashed and faint, entries as dots; the selected cut's stronger. */
export function drawPaths(
  context: Context,
  view: View,
  paths: readonly DrawnPath[],
  look: { readonly cut: string | null; readonly rapids: boolean; readonly dimmed: boolean },
  palette: Palette,
): void {
  context.lineJoin = 'round';
  for (const path of paths) {
    const isChosen = path.cut === look.cut;
    const quiet = look.dimmed ? 0.35 : 1;
    const ink = path.face === 'A' ? palette.faceAOnWood : palette.faceBOnWood;
    if (look.rapids) {
      context.globalAlpha = 0.3 * quiet;
      context.setLineDash([3, 4]);
      strokeRuns(context, view, path.rapids, ON_WOOD, 1);
      context.setLineDash([]);
    }
    context.globalAlpha = (look.cut === null ? 0.75 : isChosen ? 1 : 0.28) * quiet;
    strokeRuns(context, view, path.feeds, ink, isChosen ? 1.5 : 1);
    context.fillStyle = ink;
    for (let i = 0; i + 1 < path.entries.length; i += 2) {
      const x = view.x + path.entries[i]! * view.scale;
      const y = view.y - path.entries[i + 1]! * view.scale;
      context.fillRect(x - 2, y - 2, 4, 4);
    }
  }
  context.globalAlpha = 1;
}

function strokeRuns(
  context: Context,
  view: View,
  runs: readonly Float32Array[],
  colour: string,
  width: number,
): void {
  context.strokeStyle = colour;
  context.lineWidth = width;
  context.beginPath();
  for (const run of runs) {
    for (let i = 0; i + 1 < run.length; i += 2) {
      const x = view.x + run[i]! * view.scale;
      const y = view.y - run[i + 1]! * view.scale;
      if (i === 0) context.moveTo(x, y);
      else context.lineTo(x, y);
    }
  }
  context.stroke();
}
