import { fail, ok, type Result } from '@/lib/base/result';
import type { Contour, Segment } from '@/lib/geometry/contour';
import { parseSvgPath } from '@/lib/geometry/svg-path';
import { svgArcSegments } from '@/lib/geometry/svg-arc';
import type { Vec } from '@/lib/geometry/vec';
import { userLength } from './svg-length';
import type { SvgElement } from './svg-tree';

type Viewport = { readonly width: number; readonly height: number };

/** Elements that draw an outline. */
export const DRAWN_ELEMENTS: ReadonlySet<string> = new Set([
  'path',
  'rect',
  'circle',
  'ellipse',
  'line',
  'polyline',
  'polygon',
]);

/**
 * What a shape element draws, in its own user units with y down (SVG 2, chapter 10). Empty where it draws nothing; fails
 * with a sentence where its data cannot be read.
 */
export function shapeElementContours(
  element: SvgElement,
  viewport: Viewport,
): Result<readonly Contour[], string> {
  const diagonal = Math.hypot(viewport.width, viewport.height) / Math.SQRT2;
  const length = (name: string, whole: number): number | null =>
    userLength(element.attributes.get(name), whole);
  const x = (name: string): number => length(name, viewport.width) ?? 0;
  const y = (name: string): number => length(name, viewport.height) ?? 0;
  switch (element.name) {
    case 'path':
      return pathContours(element.attributes.get('d') ?? '');
    case 'rect':
      return ok(
        rect(
          x('x'),
          y('y'),
          x('width'),
          y('height'),
          length('rx', viewport.width),
          length('ry', viewport.height),
        ),
      );
    case 'circle':
      return ok(ellipse(x('cx'), y('cy'), length('r', diagonal) ?? 0, length('r', diagonal) ?? 0));
    case 'ellipse': {
      const rx = length('rx', viewport.width);
      const ry = length('ry', viewport.height);
      return ok(ellipse(x('cx'), y('cy'), rx ?? ry ?? 0, ry ?? rx ?? 0));
    }
    case 'line':
      return ok(
        polyline(
          [
            { x: x('x1'), y: y('y1') },
            { x: x('x2'), y: y('y2') },
          ],
          false,
        ),
      );
    case 'polyline':
    case 'polygon':
      return pointsContours(element.attributes.get('points') ?? '', element.name === 'polygon');
    default:
      return ok([]);
  }
}

function pathContours(d: string): Result<readonly Contour[], string> {
  const parsed = parseSvgPath(d);
  return parsed.ok
    ? parsed
    : fail(`its path data end in an error at character ${parsed.error.offset + 1}: ${parsed.error.message}`);
}

function pointsContours(text: string, closed: boolean): Result<readonly Contour[], string> {
  const numbers =
    text.trim() === ''
      ? []
      : text
          .trim()
          .split(/[\s,]+/)
          .map(Number);
  if (!numbers.every(Number.isFinite)) return fail('its points cannot be read.');
  const points: Vec[] = [];
  for (let i = 0; i + 1 < numbers.length; i += 2) points.push({ x: numbers[i]!, y: numbers[i + 1]! });
  return ok(polyline(points, closed));
}

function polyline([start, ...rest]: readonly Vec[], closed: boolean): Contour[] {
  if (!start || rest.length === 0) return [];
  const segments: Segment[] = rest.map((to) => ({ kind: 'line', to }));
  return [{ start, segments: closed ? [...segments, { kind: 'line', to: start }] : segments, closed }];
}

/** Corner radii by SVG 2, section 10.2: one given serves both, neither is more than half a side. */
function rect(
  x: number,
  y: number,
  width: number,
  height: number,
  rx: number | null,
  ry: number | null,
): Contour[] {
  if (!(width > 0) || !(height > 0)) return [];
  const a = Math.min(Math.max(0, rx ?? ry ?? 0), width / 2);
  const b = Math.min(Math.max(0, ry ?? rx ?? 0), height / 2);
  const start = { x: x + a, y };
  const segments: Segment[] = [];
  let at: Vec = start;
  const lineTo = (to: Vec): void => {
    if (to.x !== at.x || to.y !== at.y) segments.push({ kind: 'line', to });
    at = to;
  };
  const cornerTo = (to: Vec): void => {
    if (a > 0 && b > 0)
      segments.push(...svgArcSegments(at, { rx: a, ry: b, rotation: 0, largeArc: false, sweep: true, to }));
    at = to;
  };
  lineTo({ x: x + width - a, y });
  cornerTo({ x: x + width, y: y + b });
  lineTo({ x: x + width, y: y + height - b });
  cornerTo({ x: x + width - a, y: y + height });
  lineTo({ x: x + a, y: y + height });
  cornerTo({ x, y: y + height - b });
  lineTo({ x, y: y + b });
  cornerTo(start);
  lineTo(start);
  return [{ start, segments, closed: true }];
}

function ellipse(cx: number, cy: number, rx: number, ry: number): Contour[] {
  if (!(rx > 0) || !(ry > 0)) return [];
  const right = { x: cx + rx, y: cy };
  const left = { x: cx - rx, y: cy };
  const half = { rx, ry, rotation: 0, largeArc: false, sweep: true };
  const segments = [
    ...svgArcSegments(right, { ...half, to: left }),
    ...svgArcSegments(left, { ...half, to: right }),
  ];
  return [{ start: right, segments, closed: true }];
}
