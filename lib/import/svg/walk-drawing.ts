import { checkCancelled, type WorkControl } from '@/lib/base/cancel';
import type { Contour } from '@/lib/geometry/contour';
import { multiply, transformContour, type Matrix } from '@/lib/geometry/transform';
import { DRAWN_ELEMENTS, shapeElementContours } from './basic-shapes';
import { INITIAL_STYLE, readStyleSheet, styleOf, type StyleSheet, type SvgStyle } from './style-sheet';
import { userLength } from './svg-length';
import type { SvgElement } from './svg-tree';
import { readTransform } from './svg-transform';
import { innerViewport } from './view-box';

/** A drawn element, carried through all transforms above it. */
export interface DrawnElement {
  readonly name: string;
  readonly contours: readonly Contour[];
  readonly fillRule: 'nonzero' | 'evenodd';
}

/** Something of the file that no outline can say. */
export interface LeftOutItem {
  readonly line: number;
  /** What it is and why it was left out, in a few words. */
  readonly what: string;
}

export interface WalkedDrawing {
  readonly drawn: readonly DrawnElement[];
  readonly leftOut: readonly LeftOutItem[];
}

const MOST_OUTLINES = 20_000;
/** Uses within uses: deeper ones are circles or tricks. */
const DEEPEST_USE = 20;
/** Elements that draw nothing where they stand, and whose absence changes no outline. */
const SILENT: ReadonlySet<string> = new Set([
  'defs',
  'title',
  'desc',
  'metadata',
  'style',
  'linearGradient',
  'radialGradient',
  'pattern',
  'marker',
  'symbol',
  'view',
  'animate',
  'animateTransform',
  'set',
  'filter',
  'cursor',
  'font',
  'color-profile',
]);
const LEFT_OUT: Readonly<Record<string, string>> = {
  text: 'a text: turn it into outlines in the drawing program, or write it on the bench',
  image: 'a picture: trace it first',
  foreignObject: 'embedded content of another kind',
  clipPath: 'a clipping path: outlines come in unclipped',
  mask: 'a mask: outlines come in unmasked',
};
const CONTAINERS: ReadonlySet<string> = new Set(['svg', 'g', 'a', 'switch']);

interface Place {
  readonly matrix: Matrix;
  readonly viewport: { readonly width: number; readonly height: number };
  readonly style: SvgStyle;
  /** Ids of the uses that led here. */
  readonly uses: readonly string[];
  readonly label: string | null;
}

/** Draws out every visible element under `root`; `base` maps the root's user units to where they shall be. */
export function walkDrawing(
  root: SvgElement,
  base: Matrix,
  viewport: { width: number; height: number },
  control?: WorkControl,
): WalkedDrawing {
  const all = [...everyElement(root)];
  const byId = new Map(all.flatMap((element) => entryOf(element)));
  const sheet = readStyleSheet(all.filter(({ name }) => name === 'style').map(({ text }) => text));
  const walk = new Walk(byId, sheet, control);
  const style = styleOf(root, sheet, INITIAL_STYLE);
  const place: Place = { matrix: base, viewport, style, uses: [], label: null };
  for (const child of root.children) walk.visit(child, place);
  return { drawn: walk.drawn, leftOut: walk.leftOut };
}

class Walk {
  readonly drawn: DrawnElement[] = [];
  readonly leftOut: LeftOutItem[] = [];

  constructor(
    private readonly byId: ReadonlyMap<string, SvgElement>,
    private readonly sheet: StyleSheet,
    private readonly control: WorkControl | undefined,
  ) {}

  visit(element: SvgElement, above: Place): void {
    if (SILENT.has(element.name)) return;
    const style = styleOf(element, this.sheet, above.style);
    if (style.display === 'none') return;
    const said = LEFT_OUT[element.name];
    if (said !== undefined) return this.leave(element, said);
    const transform = readTransform(element.attributes.get('transform'));
    if (!transform) return this.leave(element, 'its transform cannot be read');
    if (element.attributes.has('clip-path'))
      this.leave(element, 'is clipped in the drawing: it comes in whole');
    const place: Place = {
      ...above,
      style,
      matrix: multiply(above.matrix, transform),
      label: labelOf(element) ?? above.label,
    };
    if (element.name === 'use') this.use(element, place);
    else if (CONTAINERS.has(element.name)) this.enter(element, place);
    else if (DRAWN_ELEMENTS.has(element.name)) this.draw(element, place);
    else this.leave(element, `'${element.name}' is not an outline`);
  }

  private enter(element: SvgElement, place: Place): void {
    checkCancelled(this.control);
    let inside = { ...place, label: element.name === 'g' ? labelOf(element) : null };
    if (element.name === 'svg') {
      const { matrix, viewport } = innerViewport(element, place.viewport);
      inside = { ...inside, matrix: multiply(place.matrix, matrix), viewport };
    }
    for (const child of element.children) this.visit(child, inside);
  }

  /** SVG 2, section 5.6: the used element as a child, moved by x and y; a symbol opens a viewport of its own. */
  private use(element: SvgElement, place: Place): void {
    const id = /^#(.+)$/.exec(element.attributes.get('href')?.trim() ?? '')?.[1];
    const target = id === undefined ? undefined : this.byId.get(id);
    if (id === undefined || !target) return this.leave(element, 'uses something that is not in the file');
    if (place.uses.includes(id) || place.uses.length >= DEEPEST_USE)
      return this.leave(element, 'uses itself');
    const x = userLength(element.attributes.get('x'), place.viewport.width) ?? 0;
    const y = userLength(element.attributes.get('y'), place.viewport.height) ?? 0;
    const inside: Place = {
      ...place,
      matrix: multiply(place.matrix, [1, 0, 0, 1, x, y]),
      uses: [...place.uses, id],
    };
    if (target.name !== 'symbol') return this.visit(target, inside);
    const width = userLength(element.attributes.get('width'), place.viewport.width);
    const height = userLength(element.attributes.get('height'), place.viewport.height);
    const { matrix, viewport } = innerViewport(target, place.viewport, {
      ...(width === null ? {} : { width }),
      ...(height === null ? {} : { height }),
    });
    for (const child of target.children)
      this.visit(child, { ...inside, matrix: multiply(inside.matrix, matrix), viewport });
  }

  private draw(element: SvgElement, place: Place): void {
    checkCancelled(this.control);
    if (place.style.visibility !== 'visible') return;
    const contours = shapeElementContours(element, place.viewport);
    if (!contours.ok) return this.leave(element, contours.error);
    if (contours.value.length === 0) return;
    if (this.drawn.length >= MOST_OUTLINES) return this.leave(element, `more than ${MOST_OUTLINES} outlines`);
    this.drawn.push({
      name: place.label ?? element.name,
      contours: contours.value.map((contour) => transformContour(contour, place.matrix)),
      fillRule: place.style.fillRule === 'evenodd' ? 'evenodd' : 'nonzero',
    });
  }

  private leave({ line, name }: SvgElement, why: string): void {
    const what =
      why.startsWith('a ') || why.startsWith('embedded') || why.startsWith("'") ? why : `${name}: ${why}`;
    this.leftOut.push({ line, what });
  }
}

/** The name that the drawing gives an element: a label, a title, or its id. */
function labelOf({ attributes, children }: SvgElement): string | null {
  const title = children.find(({ name }) => name === 'title')?.text.trim();
  const label = [...attributes].find(([name]) => name.endsWith(':label'))?.[1];
  const name = (label ?? attributes.get('aria-label') ?? title ?? attributes.get('id') ?? '')
    .replace(/\s+/g, ' ')
    .trim();
  return name === '' ? null : name;
}

function entryOf(element: SvgElement): [string, SvgElement][] {
  const id = element.attributes.get('id');
  return id === undefined ? [] : [[id, element]];
}

function* everyElement(element: SvgElement): Generator<SvgElement> {
  yield element;
  for (const child of element.children) yield* everyElement(child);
}
