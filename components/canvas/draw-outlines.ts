import type { Polyline } from '@/lib/geometry/contour';
import type { Vec } from '@/lib/geometry/vec';
import type { Scene, SceneOutline } from '@/lib/editor/scene';
import { ON_WOOD, type Palette } from './palette';
import { toScreen, type View } from './view';

type Context = CanvasRenderingContext2D;

/** Outlines of the face that is up in wide ink, the far face's as hidden lines, what is selected over both. */
export function drawOutlines(
  context: Context,
  view: View,
  scene: Scene,
  look: {
    readonly selected: ReadonlySet<string>;
    readonly hovered: string | null;
    readonly farFace: boolean;
  },
  palette: Palette,
): void {
  const far = scene.face === 'A' ? palette.faceBOnWood : palette.faceAOnWood;
  for (const outline of scene.outlines) {
    const isFar = outline.drawnOn !== scene.face;
    if (isFar && !look.farFace) continue;
    context.setLineDash(isFar ? [7, 4] : []);
    context.strokeStyle = isFar ? far : ON_WOOD;
    context.lineWidth = isFar ? 1 : 1.75;
    strokeOutline(context, view, outline);
  }
  context.setLineDash([]);
  for (const outline of scene.outlines) {
    const isSelected = look.selected.has(outline.id);
    if (!isSelected && outline.id !== look.hovered) continue;
    context.strokeStyle = palette.tab;
    context.globalAlpha = isSelected ? 1 : 0.55;
    context.lineWidth = isSelected ? 3.5 : 3;
    strokeOutline(context, view, outline);
    if (isSelected) drawHandles(context, view, outline, palette);
  }
  context.globalAlpha = 1;
}

function strokeOutline(context: Context, view: View, outline: SceneOutline): void {
  context.beginPath();
  for (const polyline of outline.lines) tracePolyline(context, view, polyline);
  for (const point of outline.points) traceCross(context, view, point);
  context.stroke();
}

/** Adds a polyline to the current path. */
export function tracePolyline(context: Context, view: View, { points, closed }: Polyline): void {
  points.forEach((point, i) => {
    const { x, y } = toScreen(view, point);
    if (i === 0) context.moveTo(x, y);
    else context.lineTo(x, y);
  });
  if (closed) context.closePath();
}

/** A point is drawn as a drawing marks a hole's centre. */
function traceCross(context: Context, view: View, point: Vec): void {
  const { x, y } = toScreen(view, point);
  context.moveTo(x - 6, y);
  context.lineTo(x + 6, y);
  context.moveTo(x, y - 6);
  context.lineTo(x, y + 6);
}

/** Corners of what is selected, so that its extent is seen. */
function drawHandles(context: Context, view: View, { box }: SceneOutline, palette: Palette): void {
  const corners = [
    { x: box.minX, y: box.minY },
    { x: box.maxX, y: box.minY },
    { x: box.maxX, y: box.maxY },
    { x: box.minX, y: box.maxY },
  ];
  context.fillStyle = palette.sheet;
  context.lineWidth = 1.5;
  for (const corner of corners) {
    const { x, y } = toScreen(view, corner);
    context.fillRect(x - 3.5, y - 3.5, 7, 7);
    context.strokeRect(x - 3.5, y - 3.5, 7, 7);
  }
}
