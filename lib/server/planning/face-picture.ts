import { assertNever } from '@/lib/base/assert-never';
import type { Contour, Segment } from '@/lib/geometry/contour';
import type { Vec } from '@/lib/geometry/vec';
import type { Cut } from '@/lib/job/cut-schema';
import { cutFloor } from '@/lib/job/cut-values';
import type { Job } from '@/lib/job/job-schema';
import type { Face } from '@/lib/job/numbers';
import type { ResolvedOutline, ResolvedOutlines } from '@/lib/outline/resolve-outlines';

/** Depth as tone, from pale birch at the face to walnut at the far one. */
const DEPTH_RAMP = [
  [0xf0, 0xdf, 0xc0],
  [0xb9, 0x81, 0x4a],
  [0x4b, 0x2a, 0x16],
] as const;
const INK = '#17221D';

/** Longest drawing, characters: a picture the size of a card gains nothing from more. */
const LONGEST = 300_000;

/**
 * A drawing of one face of the job as SVG: what is cut there, toned by depth, and the other face's cuts as hidden
 * lines. Without outlines it shows the board alone. Holds numbers only, no text of the document.
 */
export function facePicture(job: Job, outlines: ResolvedOutlines | null, face: Face): string {
  const { x, y } = job.board;
  const margin = 0.03 * Math.max(x, y);
  const cuts = outlines ? job.cuts.filter(({ enabled }) => enabled) : [];
  const hidden = cuts.filter((cut) => cut.face !== face).map((cut) => hiddenLines(cut, outlines!, face));
  const seen = cuts.filter((cut) => cut.face === face).map((cut) => drawCut(job, cut, outlines!));
  const box = [-margin, -margin, x + 2 * margin, y + 2 * margin].map(short).join(' ');
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" viewBox="${box}">`,
    `<g transform="matrix(1 0 0 -1 0 ${short(y)})" fill="none" stroke="${INK}" stroke-linejoin="round" stroke-linecap="round">`,
    `<rect width="${short(x)}" height="${short(y)}" fill="${tone(0)}" stroke-width="1" vector-effect="non-scaling-stroke"/>`,
    ...upToLongest([...hidden, ...seen]),
    '</g></svg>',
  ].join('');
}

function upToLongest(parts: readonly string[]): string[] {
  let length = 0;
  return parts.filter((part) => (length += part.length) <= LONGEST);
}

function drawCut(job: Job, cut: Cut, outlines: ResolvedOutlines): string {
  const drawn = cut.outlines.map((id) => outlines.get(id, cut.face));
  const floor = () => tone(cutFloor(job, cut) / job.board.z);
  switch (cut.kind) {
    case 'pocket':
    case 'taper-engrave':
      return together(drawn, floor());
    case 'bore':
      return drawn.map((outline) => area(outline, floor())).join('');
    case 'surface':
      return drawn.length > 0
        ? drawn.map((outline) => area(outline, floor())).join('')
        : `<rect width="${short(job.board.x)}" height="${short(job.board.y)}" fill="${floor()}" stroke="none"/>`;
    case 'profile':
      return drawn.map((outline) => line(outline, 1.6)).join('');
    case 'chamfer':
    case 'engrave':
      return drawn.map((outline) => line(outline, 0.8)).join('');
    case 'drill':
      return drawn.map((outline) => holes(job, cut, outline, floor())).join('');
    default:
      return assertNever(cut, 'cut');
  }
}

function hiddenLines(cut: Cut, outlines: ResolvedOutlines, face: Face): string {
  return cut.outlines
    .map((id) =>
      pathElement(outlines.get(id, face), 'stroke-width="0.7" stroke-dasharray="3 2" opacity="0.55"'),
    )
    .join('');
}

/** Outlines of one cut combined even-odd, as they are cut: one inside another is an island. */
function together(drawn: readonly ResolvedOutline[], fill: string): string {
  const [only] = drawn;
  if (drawn.length === 1 && only) return area(only, fill);
  const contours = drawn.flatMap((outline) => outline.contours);
  return pathElement({ contours }, `fill="${fill}" fill-rule="evenodd" stroke-width="0.8"`);
}

function area(outline: ResolvedOutline, fill: string): string {
  return pathElement(outline, `fill="${fill}" fill-rule="${outline.fillRule}" stroke-width="0.8"`);
}

function line(outline: ResolvedOutline, width: number): string {
  return pathElement(outline, `stroke-width="${width}"`);
}

function holes(job: Job, cut: Cut, outline: ResolvedOutline, fill: string): string {
  const radius = (job.cutters.find(({ id }) => id === cut.cutter)?.diameter ?? 0) / 2;
  const circles = outline.points.map(
    (at) =>
      `<circle cx="${short(at.x)}" cy="${short(at.y)}" r="${short(radius)}" fill="${fill}" stroke="none"/>`,
  );
  return circles.join('') + area(outline, fill);
}

function pathElement({ contours }: Pick<ResolvedOutline, 'contours'>, attributes: string): string {
  if (contours.length === 0) return '';
  return `<path d="${contours.map(pathData).join('')}" ${attributes} vector-effect="non-scaling-stroke"/>`;
}

function pathData({ start, segments, closed }: Contour): string {
  let from = start;
  let data = `M${place(start)}`;
  for (const segment of segments) {
    data += segmentData(from, segment);
    from = segment.to;
  }
  return closed ? `${data}Z` : data;
}

function segmentData(from: Vec, segment: Segment): string {
  switch (segment.kind) {
    case 'line':
      return `L${place(segment.to)}`;
    case 'cubic':
      return `C${place(segment.control1)} ${place(segment.control2)} ${place(segment.to)}`;
    case 'arc':
      return arcData(from, segment);
    default:
      return assertNever(segment, 'segment');
  }
}

/** As two halves: one arc command can show neither a full circle nor, after rounding, one that is nearly full. */
function arcData(from: Vec, { to, center, ccw }: Extract<Segment, { kind: 'arc' }>): string {
  const radius = Math.hypot(from.x - center.x, from.y - center.y);
  const first = Math.atan2(from.y - center.y, from.x - center.x);
  const last = Math.atan2(to.y - center.y, to.x - center.x);
  const turn = ((ccw ? last - first : first - last) + 2 * Math.PI) % (2 * Math.PI) || 2 * Math.PI;
  const half = first + (ccw ? turn : -turn) / 2;
  const middle = { x: center.x + radius * Math.cos(half), y: center.y + radius * Math.sin(half) };
  const arcTo = (end: Vec) => `A${short(radius)} ${short(radius)} 0 0 ${ccw ? 1 : 0} ${place(end)}`;
  return arcTo(middle as Vec) + arcTo(to);
}

function place({ x, y }: Vec): string {
  return `${short(x)} ${short(y)}`;
}

function short(value: number): string {
  return String(Number(value.toFixed(2)));
}

/** The ramp's colour for a depth that is this share of the board's. */
function tone(share: number): string {
  const at = Math.min(Math.max(share, 0), 1) * (DEPTH_RAMP.length - 1);
  const index = Math.min(Math.floor(at), DEPTH_RAMP.length - 2);
  const [from, to] = [DEPTH_RAMP[index]!, DEPTH_RAMP[index + 1]!];
  const mixed = from.map((value, channel) => Math.round(value + (to[channel]! - value) * (at - index)));
  return `#${mixed.map((value) => value.toString(16).padStart(2, '0')).join('')}`;
}
