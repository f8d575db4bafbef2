/** What an arc's line says, mm, absolute but for the centre's offsets. */
export interface ArcWords {
  readonly from: { readonly x: number; readonly y: number };
  readonly to: { readonly x: number; readonly y: number };
  readonly ccw: boolean;
  /** Centre from I and J, or the radius from R. */
  readonly by:
    | { readonly kind: 'center'; readonly center: { readonly x: number; readonly y: number } }
    | { readonly kind: 'radius'; readonly radius: number };
  /** Greatest difference of the radii at both ends, mm. */
  readonly radiusLimit: number;
  /** Whole turns asked for with P, 1 for a plain arc. */
  readonly turns: number;
}

export interface ResolvedArc {
  readonly center: { readonly x: number; readonly y: number };
  /** Signed radians, counter-clockwise positive. */
  readonly sweep: number;
}

/** Ends nearer than this are one point: a full circle, mm. */
const SAME = 1e-9;

/**
 * Centre and turn of an arc by NIST RS274NGC 3.5.3: with I and J the end equal to the start is a full circle; R above 0
 * takes the shorter way, below 0 the longer. Gives a sentence where there is no such arc.
 */
export function resolveArc(words: ArcWords): ResolvedArc | string {
  const { from, to, ccw, by, turns } = words;
  const isClosed = Math.hypot(to.x - from.x, to.y - from.y) < SAME;
  if (by.kind === 'radius' && isClosed) return 'An arc by radius cannot end where it starts.';
  const center = by.kind === 'center' ? by.center : centerOfRadius(words, by.radius);
  if (typeof center === 'string') return center;
  const start = Math.hypot(from.x - center.x, from.y - center.y);
  const end = Math.hypot(to.x - center.x, to.y - center.y);
  if (start < SAME) return 'The centre of the arc lies on its start.';
  if (Math.abs(start - end) > words.radiusLimit)
    return `The radius is ${start.toFixed(4)} mm at the start of the arc and ${end.toFixed(4)} mm at its end.`;
  const full = 2 * Math.PI;
  let sweep = Math.atan2(to.y - center.y, to.x - center.x) - Math.atan2(from.y - center.y, from.x - center.x);
  if (isClosed) sweep = ccw ? full : -full;
  else if (ccw && sweep <= 0) sweep += full;
  else if (!ccw && sweep >= 0) sweep -= full;
  return { center, sweep: sweep + Math.sign(sweep) * full * (turns - 1) };
}

function centerOfRadius(
  { from, to, ccw, radiusLimit }: ArcWords,
  radius: number,
): { x: number; y: number } | string {
  const chord = Math.hypot(to.x - from.x, to.y - from.y);
  const size = Math.abs(radius);
  if (chord / 2 > size + radiusLimit / 2)
    return `Radius ${size} mm is too small to reach the end of the arc.`;
  const height = Math.sqrt(Math.max(0, size * size - (chord * chord) / 4));
  // The shorter way of a clockwise arc has its centre to the right of the chord.
  const side = (ccw ? 1 : -1) * (radius > 0 ? 1 : -1);
  const ux = (to.x - from.x) / chord;
  const uy = (to.y - from.y) / chord;
  return { x: (from.x + to.x) / 2 - uy * height * side, y: (from.y + to.y) / 2 + ux * height * side };
}
