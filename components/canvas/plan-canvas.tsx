'use client';

import type Konva from 'konva';
import { useCallback, useMemo, useRef, useState } from 'react';
import { Layer, Shape, Stage } from 'react-konva';
import { pickFilled, pickLine } from '@/lib/editor/pick';
import type { Scene } from '@/lib/editor/scene';
import type { Session } from '@/lib/editor/session';
import { boardSnapPoints, contourSnapPoints, snapTo, type Snapped } from '@/lib/editor/snap';
import type { Draft, ToolEvent } from '@/lib/editor/tools/tool';
import type { Polyline } from '@/lib/geometry/contour';
import type { Vec } from '@/lib/geometry/vec';
import { drawingLength } from '@/lib/job/format-length';
import type { Job } from '@/lib/job/job-schema';
import { zeroOf } from '@/lib/job/cut-values';
import type { DrawnPath } from '@/lib/moves/drawn-path';
import { drawBoard, drawDimensions, drawGrid, drawZero } from './draw-board';
import { drawDraft, drawPins, drawSectionLine, drawSnap, type Pin } from './draw-marks';
import { drawOutlines } from './draw-outlines';
import { drawPaths } from './draw-paths';
import { drawTabs, type DrawnTab } from './draw-tabs';
import type { Palette } from './palette';
import { usePlanPointer } from './use-plan-pointer';
import { gridPitch, type Size, type View } from './view';

export interface PlanCanvasProps {
  readonly job: Job;
  readonly scene: Scene;
  readonly session: Session;
  readonly view: View;
  readonly size: Size;
  readonly palette: Palette;
  readonly paths: readonly DrawnPath[];
  readonly tabs: readonly DrawnTab[];
  readonly pins: readonly Pin[];
  readonly picture: CanvasImageSource | null;
  /** The paths are of an older document; a newer plan is on its way. */
  readonly dimmed: boolean;
  readonly draft: { readonly draft: Draft; readonly lines: readonly Polyline[] } | null;
  readonly panning: boolean;
  readonly onView: (view: View) => void;
  readonly onTool: (event: ToolEvent) => void;
  /** Where the pointer is, mm, and what it snaps to; null when it leaves. */
  readonly onPointer: (at: Vec | null, snapped: Snapped | null) => void;
}

/** The face that is up, seen from above, with all that is drawn on it. Drawing order is depth order. */
export function PlanCanvas(props: PlanCanvasProps) {
  const { job, scene, session, view, size, palette, draft } = props;
  const frame = useRef<HTMLDivElement>(null);
  const [hover, setHover] = useState<{ snapped: Snapped | null; outline: string | null }>(NO_HOVER);
  const points = useSnapPoints(job, scene, session.selection.outlines);
  const isDrawing = session.tool !== 'select' && session.tool !== 'comment';

  const snap = (at: Vec, reach: number): Snapped =>
    snapTo(at, points, job.board, {
      reach,
      grid: session.show.grid ? gridPitch(view.scale, job.display) : 0,
    });
  const handlers = usePlanPointer(frame, {
    view,
    section: session.section,
    panning: props.panning,
    snap,
    pickLine: (at, reach) => pickLine(scene, at, reach),
    pickFilled: (at) => pickFilled(scene, at),
    onView: props.onView,
    onTool: props.onTool,
    onHover(at, snapped, target) {
      setHover({ snapped, outline: target.kind === 'outline' ? target.id : null });
      props.onPointer(at, snapped);
    },
  });

  // One callback a layer: Konva draws a layer anew only when its own things have changed, not on every move of a pointer.
  const { picture, paths, tabs, pins, dimmed } = props;
  const { show, selection, section, face } = session;
  const hovered = session.tool === 'select' ? hover.outline : null;
  const drawSheet = useCallback(
    (context: Context) => {
      drawBoard(context, view, job.board, picture, palette);
      if (show.grid) drawGrid(context, view, size, job.display, palette);
      drawDimensions(context, view, job.board, (mm) => drawingLength(mm, job.display), palette);
    },
    [view, size, job.board, job.display, picture, show.grid, palette],
  );
  const drawShapes = useCallback(
    (context: Context) => {
      const look = { selected: new Set(selection.outlines), hovered, farFace: show.farFace };
      drawOutlines(context, view, scene, look, palette);
    },
    [view, scene, selection.outlines, hovered, show.farFace, palette],
  );
  const drawCuts = useCallback(
    (context: Context) => {
      if (show.paths) {
        drawPaths(context, view, paths, { cut: selection.cut, rapids: show.rapids, dimmed }, palette);
        drawTabs(context, view, tabs, palette);
      }
      if (job.setups[face]) drawZero(context, view, zeroOf(job, face), face, palette);
    },
    [view, paths, tabs, selection.cut, show.paths, show.rapids, dimmed, job, face, palette],
  );
  const snapped = isDrawing && hover.snapped?.name ? hover.snapped.at : null;
  const drawOver = useCallback(
    (context: Context) => {
      drawSectionLine(context, view, section, job.board, palette);
      drawPins(context, view, pins, palette);
      if (draft) drawDraft(context, view, draft.draft, draft.lines, palette);
      if (snapped) drawSnap(context, view, snapped, palette);
    },
    [view, section, job.board, pins, draft, snapped, palette],
  );

  return (
    <div
      ref={frame}
      className="absolute inset-0 touch-none overflow-hidden select-none"
      style={{ cursor: cursorOf(session.tool, hover.outline !== null, props.panning) }}
      {...handlers}
    >
      <Stage width={size.width} height={size.height} listening={false}>
        {[drawSheet, drawShapes, drawCuts, drawOver].map((draw, index) => (
          <Layer key={index} listening={false}>
            <Drawing draw={draw} />
          </Layer>
        ))}
      </Stage>
    </div>
  );
}

type Context = CanvasRenderingContext2D;

const NO_HOVER = { snapped: null, outline: null };

/** One custom shape that draws straight into its layer's canvas. */
function Drawing({ draw }: { draw: (context: Context) => void }) {
  const sceneFunc = useCallback((context: Konva.Context) => draw(context._context), [draw]);
  return <Shape listening={false} perfectDrawEnabled={false} sceneFunc={sceneFunc} />;
}

/** What a pointer may snap to; what is being moved does not snap to itself. */
function useSnapPoints(job: Job, scene: Scene, selected: readonly string[]) {
  return useMemo(() => {
    const still = scene.outlines.filter(({ id }) => !selected.includes(id));
    const marks = still.flatMap(({ points }) => points.map((at) => ({ at, name: 'centre' as const })));
    return [
      ...boardSnapPoints(job.board),
      ...contourSnapPoints(still.flatMap(({ contours }) => contours)),
      ...marks,
    ];
  }, [job.board, scene, selected]);
}

function cursorOf(tool: Session['tool'], isOverOutline: boolean, panning: boolean): string {
  if (panning) return 'grab';
  if (tool === 'select') return isOverOutline ? 'pointer' : 'default';
  return tool === 'comment' ? 'copy' : 'crosshair';
}
