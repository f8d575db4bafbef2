import { IDENTITY, type Matrix } from '@/lib/geometry/transform';
import type { SvgElement } from './svg-tree';
import { userLength } from './svg-length';

export interface ViewBox {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** The four numbers of a `viewBox`, or null where there is none that has a size. */
export function readViewBox(text: string | undefined): ViewBox | null {
  const [x, y, width, height, ...rest] = (text ?? '')
    .trim()
    .split(/[\s,]+/)
    .map(Number);
  if (rest.length > 0 || x === undefined || y === undefined || width === undefined || height === undefined)
    return null;
  const box = { x, y, width, height };
  return Object.values(box).every(Number.isFinite) && width > 0 && height > 0 ? box : null;
}

/**
 * From a viewBox's units to a viewport of this size, by `preserveAspectRatio` (SVG 2, section 8.2): xMidYMid meet where
 * nothing is said, each axis by itself with `none`.
 */
export function viewBoxMatrix(
  box: ViewBox,
  viewport: { width: number; height: number },
  aspect: string | undefined,
): Matrix {
  let sx = viewport.width / box.width;
  let sy = viewport.height / box.height;
  const [align = 'xMidYMid', fit = 'meet'] = (aspect ?? '').trim().split(/\s+/).filter(Boolean);
  if (align !== 'none') sx = sy = fit === 'slice' ? Math.max(sx, sy) : Math.min(sx, sy);
  const share = (word: string): number => (word === 'Min' ? 0 : word === 'Max' ? 1 : 0.5);
  const found = /^x(Min|Mid|Max)Y(Min|Mid|Max)$/.exec(align);
  const dx = align === 'none' ? 0 : (viewport.width - box.width * sx) * share(found?.[1] ?? 'Mid');
  const dy = align === 'none' ? 0 : (viewport.height - box.height * sy) * share(found?.[2] ?? 'Mid');
  return [sx, 0, 0, sy, dx - box.x * sx, dy - box.y * sy];
}

/** The viewport that a nested `svg` or a used `symbol` opens, and the map of its inside to its parent's units. */
export function innerViewport(
  element: SvgElement,
  parent: { width: number; height: number },
  given: { width?: number; height?: number } = {},
): { matrix: Matrix; viewport: { width: number; height: number } } {
  const { attributes } = element;
  const width = given.width ?? userLength(attributes.get('width'), parent.width) ?? parent.width;
  const height = given.height ?? userLength(attributes.get('height'), parent.height) ?? parent.height;
  const x = element.name === 'svg' ? (userLength(attributes.get('x'), parent.width) ?? 0) : 0;
  const y = element.name === 'svg' ? (userLength(attributes.get('y'), parent.height) ?? 0) : 0;
  const box = readViewBox(attributes.get('viewBox'));
  const [a, b, c, d, e, f] = box
    ? viewBoxMatrix(box, { width, height }, attributes.get('preserveAspectRatio'))
    : IDENTITY;
  return {
    matrix: [a, b, c, d, e + x, f + y],
    viewport: box ? { width: box.width, height: box.height } : { width, height },
  };
}
