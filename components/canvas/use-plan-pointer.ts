'use client';

import { useEffect, useRef, type PointerEvent as ReactPointerEvent, type RefObject } from 'react';
import { segmentDistance } from '@/lib/editor/pick';
import type { SectionLine } from '@/lib/editor/session';
import type { Snapped } from '@/lib/editor/snap';
import type { Target, ToolEvent, ToolPointer } from '@/lib/editor/tools/tool';
import { distance, type Vec } from '@/lib/geometry/vec';
import { panBy, toBoard, toScreen, zoomAt, type View } from './view';

/** How near a pointer must come to a handle, px: a mouse's, a finger's. */
const REACH = { mouse: 7, pen: 9, touch: 22 } as const;

export interface PlanPointerHost {
  readonly view: View;
  onView(view: View): void;
  onTool(event: ToolEvent): void;
  onHover(at: Vec | null, snapped: Snapped | null, target: Target): void;
  snap(at: Vec, reach: number): Snapped;
  pickLine(at: Vec, reach: number): string | null;
  pickFilled(at: Vec): string | null;
  readonly section: SectionLine;
  /** Space, the middle button or two fingers pan instead of drawing. */
  readonly panning: boolean;
}

interface Finger {
  readonly at: Vec;
  readonly type: string;
}

/**
 * Turns what hands do over the plan into tool events in mm. One pointer draws; two fingers pan and zoom about the point
 * between them, and a gesture that they interrupt is dropped; a wheel zooms to the cursor; while a pen is down, palms
 * do nothing.
 */
export function usePlanPointer(ref: RefObject<HTMLElement | null>, host: PlanPointerHost) {
  const latest = useRef(host);
  useEffect(() => {
    latest.current = host;
  });
  const fingers = useRef(new Map<number, Finger>());
  const mode = useRef<'none' | 'tool' | 'pan' | 'pinch'>('none');

  useEffect(() => {
    const element = ref.current;
    if (!element) return;
    const onWheel = (event: WheelEvent): void => {
      event.preventDefault();
      const { view, onView } = latest.current;
      if (event.shiftKey) return onView(panBy(view, -(event.deltaX || event.deltaY), 0));
      const at = placeIn(element, event);
      onView(zoomAt(view, at, Math.exp(-event.deltaY * (event.ctrlKey ? 0.01 : 0.0015))));
    };
    element.addEventListener('wheel', onWheel, { passive: false });
    return () => element.removeEventListener('wheel', onWheel);
  }, [ref]);

  const pointerOf = (event: ReactPointerEvent): ToolPointer => {
    const { view, snap } = latest.current;
    const screen = placeIn(event.currentTarget, event);
    const at = toBoard(view, screen);
    const reach = reachOf(event.pointerType);
    const snapped = event.altKey ? at : snap(at, Math.max(reach, 9) / view.scale).at;
    return { at, snapped, target: targetAt(latest.current, screen, at, reach), shift: event.shiftKey };
  };

  const onPointerDown = (event: ReactPointerEvent<HTMLElement>): void => {
    const isPenDown = [...fingers.current.values()].some(({ type }) => type === 'pen');
    if (event.pointerType === 'touch' && isPenDown) return;
    event.currentTarget.setPointerCapture(event.pointerId);
    fingers.current.set(event.pointerId, {
      at: placeIn(event.currentTarget, event),
      type: event.pointerType,
    });
    const { onTool, panning } = latest.current;
    if (fingers.current.size === 2) {
      if (mode.current === 'tool') onTool({ type: 'key', key: 'Escape' });
      mode.current = 'pinch';
    } else if (event.button === 1 || panning) {
      event.preventDefault();
      mode.current = 'pan';
    } else if (event.button === 0) {
      mode.current = 'tool';
      onTool({ type: 'down', pointer: pointerOf(event) });
    }
  };

  const onPointerMove = (event: ReactPointerEvent<HTMLElement>): void => {
    const { view, onView, onTool, onHover, snap } = latest.current;
    const here = placeIn(event.currentTarget, event);
    const before = fingers.current.get(event.pointerId);
    if (before) {
      if (mode.current === 'pan') onView(panBy(view, here.x - before.at.x, here.y - before.at.y));
      if (mode.current === 'pinch') pinch(view, onView, fingers.current, event.pointerId, here);
      fingers.current.set(event.pointerId, { ...before, at: here });
    }
    if (mode.current === 'pan' || mode.current === 'pinch') return;
    const pointer = pointerOf(event);
    const near = event.altKey ? null : snap(pointer.at, 9 / view.scale);
    onHover(pointer.at, near, pointer.target);
    onTool({ type: 'move', pointer });
  };

  const onPointerUp = (event: ReactPointerEvent<HTMLElement>): void => {
    if (!fingers.current.delete(event.pointerId)) return;
    if (mode.current === 'tool') latest.current.onTool({ type: 'up', pointer: pointerOf(event) });
    if (fingers.current.size === 0) mode.current = 'none';
  };

  const onPointerCancel = (event: ReactPointerEvent<HTMLElement>): void => {
    fingers.current.delete(event.pointerId);
    if (mode.current === 'tool') latest.current.onTool({ type: 'key', key: 'Escape' });
    if (fingers.current.size === 0) mode.current = 'none';
  };

  return {
    onPointerDown,
    onPointerMove,
    onPointerUp,
    onPointerCancel,
    onPointerLeave: () => latest.current.onHover(null, null, { kind: 'board' }),
    onDoubleClick: (event: React.MouseEvent<HTMLElement>) =>
      latest.current.onTool({ type: 'double', pointer: pointerOf(event as unknown as ReactPointerEvent) }),
  };
}

function placeIn(element: Element, event: { clientX: number; clientY: number }): Vec {
  const box = element.getBoundingClientRect();
  return { x: event.clientX - box.left, y: event.clientY - box.top };
}

function reachOf(type: string): number {
  return type === 'touch' ? REACH.touch : type === 'pen' ? REACH.pen : REACH.mouse;
}

/** Lines before areas, or the section line could not be taken hold of where it crosses a part. */
function targetAt({ view, section, ...scene }: PlanPointerHost, screen: Vec, at: Vec, reach: number): Target {
  for (const part of ['from', 'to'] as const) {
    if (distance(toScreen(view, section[part]), screen) < reach + 3) return { kind: 'section', part };
  }
  const line = scene.pickLine(at, reach / view.scale);
  if (line !== null) return { kind: 'outline', id: line };
  const away = segmentDistance(toScreen(view, section.from), toScreen(view, section.to), screen);
  if (away < reach - 2) return { kind: 'section', part: 'line' };
  const area = scene.pickFilled(at);
  return area === null ? { kind: 'board' } : { kind: 'outline', id: area };
}

/** Two fingers: what was under each stays under it, as far as a turn-free view can. */
function pinch(
  view: View,
  onView: (view: View) => void,
  fingers: ReadonlyMap<number, Finger>,
  moved: number,
  to: Vec,
): void {
  const from = fingers.get(moved)?.at;
  const other = [...fingers].find(([id]) => id !== moved)?.[1].at;
  if (!from || !other) return;
  const before = distance(from, other);
  const after = distance(to, other);
  const middle = { x: (to.x + other.x) / 2, y: (to.y + other.y) / 2 };
  const panned = panBy(view, (to.x - from.x) / 2, (to.y - from.y) / 2);
  onView(before > 8 && after > 8 ? zoomAt(panned, middle, after / before) : panned);
}
