'use client';

import { useEffect, useMemo, useRef, useState } from 'react';
import { PlanCanvas } from '@/components/canvas/plan-canvas';
import type { DrawnTab } from '@/components/canvas/draw-tabs';
import type { Pin } from '@/components/canvas/draw-marks';
import { fitView, toScreen, zoomAt, type Size, type View } from '@/components/canvas/view';
import { IconButton } from '@/components/ui/button';
import { useComments } from '@/lib/client/use-comments';
import { seenJob } from '@/lib/editor/editor-store';
import { outlinesWithin } from '@/lib/editor/pick';
import { createSceneMaker } from '@/lib/editor/scene';
import type { Snapped } from '@/lib/editor/snap';
import { createToolRunner } from '@/lib/editor/tool-runner';
import type { Draft, ToolEvent } from '@/lib/editor/tools/tool';
import { flattenContour } from '@/lib/geometry/flatten';
import type { Vec } from '@/lib/geometry/vec';
import { cutterOf } from '@/lib/job/cut-values';
import { formatLength, lengthWithUnit } from '@/lib/job/format-length';
import type { Job } from '@/lib/job/job-schema';
import type { Face } from '@/lib/job/numbers';
import { turnPoint } from '@/lib/job/turn';
import { shapeContours } from '@/lib/outline/shape-contours';
import { useBench, useEditorState } from './bench-context';
import { useCommentFocus } from './comment-focus';
import { LiveSizes } from './live-sizes';
import { useElementSize } from './use-element-size';
import { useFacePicture } from './use-face-picture';
import { usePalette } from './use-palette';
import { useSpaceHeld } from './use-space-held';

/** The plan: the face that is up, with its tools, at any zoom. */
export function PlanView({ view, onView }: { view: View | null; onView: (view: View) => void }) {
  const { editor, fonts, planning, readOnly, openPanel } = useBench();
  const frame = useRef<HTMLDivElement>(null);
  const size = useElementSize(frame);
  const palette = usePalette(frame);
  const job = useEditorState(seenJob);
  const session = useEditorState((state) => state.session);
  const makeScene = useMemo(() => createSceneMaker(fonts), [fonts]);
  const scene = useMemo(() => makeScene(job, session.face), [makeScene, job, session.face]);
  const picture = useFacePicture(planning.pictures[session.face]);
  const [draft, setDraft] = useState<Draft | null>(null);
  const [pointer, setPointer] = useState<{ at: Vec; snapped: Snapped | null } | null>(null);
  const { setPin } = useCommentFocus();
  const panning = useSpaceHeld();
  const runner = useMemo(() => {
    const made = createToolRunner(editor, {
      readOnly,
      outlinesWithin(a, b) {
        const state = editor.store.getState();
        return outlinesWithin(makeScene(seenJob(state), state.session.face), a, b);
      },
      onComment(at) {
        const { face } = editor.store.getState().session;
        setPin({ kind: 'spot', face, x: round(at.x), y: round(at.y) });
        openPanel('comments');
      },
      onChange: () => setDraft(made.draft()),
    });
    return made;
  }, [editor, makeScene, readOnly, setPin, openPanel]);
  useToolKeys(runner.send);

  useEffect(() => {
    if (!view && size) onView(fitView(job.board, size));
  }, [view, size, job.board, onView]);

  const paths = useMemo(
    () => planning.paths.filter(({ face }) => face === session.face),
    [planning.paths, session.face],
  );
  const tabs = useMemo(() => drawnTabs(job, session.face, planning), [job, session.face, planning]);
  const pins = usePins(job, session.face);
  const drawnDraft = useMemo(() => (draft ? { draft, lines: linesOf(draft, fonts) } : null), [draft, fonts]);

  return (
    <div
      ref={frame}
      className="relative h-full min-h-40 w-full overflow-hidden"
      role="application"
      aria-label={planWords(job, session.face)}
      data-view={view ? `${view.scale} ${view.x} ${view.y}` : ''}
    >
      {size && palette && view ? (
        <>
          <PlanCanvas
            job={job}
            scene={scene}
            session={session}
            view={view}
            size={size}
            palette={palette}
            paths={paths}
            tabs={tabs}
            pins={pins}
            picture={picture}
            dimmed={!planning.current}
            draft={drawnDraft}
            panning={panning}
            onView={onView}
            onTool={(event: ToolEvent) => runner.send(event)}
            onPointer={(at, snapped) => setPointer(at ? { at, snapped } : null)}
          />
          {draft?.kind === 'shape' ? (
            <LiveSizes
              draft={draft}
              at={toScreen(view, draft.at)}
              unit={job.display}
              onSizes={(values) => runner.send({ type: 'sizes', values })}
            />
          ) : null}
          <ZoomButtons view={view} size={size} board={job.board} onView={onView} />
          <p className="figure pointer-events-none absolute bottom-2 left-2 rounded-sm bg-sheet/85 px-1.5 text-sm text-graphite max-sm:hidden">
            {pointer
              ? `${formatLength(round(pointer.at.x), job.display)}, ${formatLength(round(pointer.at.y), job.display)} ${job.display}`
              : ' '}
            {pointer?.snapped?.name && session.tool !== 'select' ? ` · ${pointer.snapped.name}` : ''}
          </p>
        </>
      ) : null}
    </div>
  );
}

function ZoomButtons({
  view,
  size,
  board,
  onView,
}: {
  view: View;
  size: Size;
  board: { x: number; y: number };
  onView: (view: View) => void;
}) {
  const middle = { x: size.width / 2, y: size.height / 2 };
  const sign = (d: string) => (
    <svg
      width="20"
      height="20"
      viewBox="0 0 24 24"
      fill="none"
      stroke="currentColor"
      strokeWidth="2"
      aria-hidden
    >
      <path d={d} />
    </svg>
  );
  return (
    <div className="absolute right-2 bottom-2 flex rounded border border-rule bg-sheet">
      <IconButton
        size="small"
        icon={sign('M5 12h14')}
        label="Zoom out"
        tooltip="top"
        onClick={() => onView(zoomAt(view, middle, 1 / 1.4))}
      />
      <IconButton
        size="small"
        icon={sign('M4 9V4h5M20 9V4h-5M4 15v5h5M20 15v5h-5')}
        label="Show the whole board"
        tooltip="top"
        onClick={() => onView(fitView(board, size))}
      />
      <IconButton
        size="small"
        icon={sign('M5 12h14M12 5v14')}
        label="Zoom in"
        tooltip="top"
        onClick={() => onView(zoomAt(view, middle, 1.4))}
      />
    </div>
  );
}

/** Enter, Escape and Backspace go to the tool in hand, unless something is being typed. */
function useToolKeys(send: (event: ToolEvent) => void): void {
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent): void => {
      if (isTyping(event.target)) return;
      const { key } = event;
      if (key === 'Enter' || key === 'Escape' || key === 'Backspace') send({ type: 'key', key });
    };
    window.addEventListener('keydown', onKeyDown);
    return () => window.removeEventListener('keydown', onKeyDown);
  }, [send]);
}

export function isTyping(target: EventTarget | null): boolean {
  return (
    target instanceof HTMLElement &&
    target.closest('input, textarea, select, [contenteditable], [role="dialog"], [role="menu"]') !== null
  );
}

function linesOf(draft: Draft | null, fonts: Parameters<typeof shapeContours>[1]) {
  if (draft?.kind !== 'shape') return [];
  const drawn = shapeContours(draft.shape, fonts);
  return drawn.ok ? drawn.value.contours.map((contour) => flattenContour(contour)) : [];
}

/** The tabs of the face that is up, each with the wood that the proof found in it. */
function drawnTabs(job: Job, face: Face, planning: ReturnType<typeof useBench>['planning']): DrawnTab[] {
  const counts = new Map<string, number>();
  return planning.tabs.flatMap((place) => {
    const cut = job.cuts.find(({ id }) => id === place.cut);
    const index = counts.get(place.cut) ?? 0;
    counts.set(place.cut, index + 1);
    if (cut?.face !== face) return [];
    const proven = planning.report?.cuts.find(({ id }) => id === place.cut)?.tabs[index];
    return [
      {
        center: { x: place.center[0], y: place.center[1] },
        along: { x: place.along[0], y: place.along[1] },
        length: place.length,
        across: cutterOf(job, cut).diameter,
        wood: proven ? lengthWithUnit(Number(proven.wood.height.toFixed(1)), job.display) : null,
        holds: proven?.holds ?? true,
      },
    ];
  });
}

/** Findings and open comments of the face that is up. */
function usePins(job: Job, face: Face): readonly Pin[] {
  const { project, planning } = useBench();
  const comments = useComments(project.id);
  const { focus, pin } = useCommentFocus();
  return useMemo(() => {
    const findings = (planning.report?.findings ?? []).flatMap((finding): Pin[] => {
      if (!finding.at || !finding.face) return [];
      const own = { x: finding.at[0], y: finding.at[1] };
      const at = finding.face === face ? own : turnPoint(job.board, job.turn.axis, own);
      return [{ at, kind: finding.severity, label: '!', chosen: false }];
    });
    const threads = (comments.data?.items ?? []).flatMap((thread, index): Pin[] => {
      if (thread.pin.kind !== 'spot' || thread.pin.face !== face || thread.resolvedAt !== null) return [];
      return [
        {
          at: { x: thread.pin.x, y: thread.pin.y },
          kind: 'comment',
          label: String(index + 1),
          chosen: thread.id === focus,
        },
      ];
    });
    const coming: Pin[] =
      pin?.kind === 'spot' && pin.face === face
        ? [{ at: { x: pin.x, y: pin.y }, kind: 'comment', label: '+', chosen: true }]
        : [];
    return [...findings, ...threads, ...coming];
  }, [planning.report, comments.data, face, focus, pin, job.board, job.turn.axis]);
}

function planWords({ board, outlines, display }: Job, face: Face): string {
  return `Plan of face ${face}: board ${lengthWithUnit(board.x, display)} by ${lengthWithUnit(board.y, display)}, ${outlines.length} outlines. The page Outlines lists them.`;
}

function round(value: number): number {
  return Number(value.toFixed(2));
}
