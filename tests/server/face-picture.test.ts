import { describe, expect, it } from 'vitest';
import { parseJob } from '@/lib/job/parse-job';
import { resolveOutlines } from '@/lib/outline/resolve-outlines';
import { facePicture } from '@/lib/server/planning/face-picture';
import { sampleJob, withValue } from '../helpers/sample-job';

function picture(face: 'A' | 'B', value = sampleJob()): string {
  const parsed = parseJob(value);
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.error));
  const outlines = resolveOutlines(parsed.value, new Map());
  if (!outlines.ok) throw new Error(JSON.stringify(outlines.error));
  return facePicture(parsed.value, outlines.value, face);
}

const count = (svg: string, pattern: RegExp) => svg.match(pattern)?.length ?? 0;

describe('the picture of a face', () => {
  it('shows the face’s cuts whole and the other’s as hidden lines', () => {
    // Face B: pocket and chamfer; face A: profile.
    expect(count(picture('B'), /stroke-dasharray/g)).toBe(1);
    expect(count(picture('B'), /<path/g)).toBe(3);
    expect(count(picture('A'), /stroke-dasharray/g)).toBe(2);
  });

  it('leaves out cuts that are switched off', () => {
    const value = withValue(sampleJob(), 'cuts.0.enabled', false);
    expect(count(picture('B', value), /<path/g)).toBe(2);
  });

  it('tones a deeper pocket darker, from the pale face to the dark far side', () => {
    const fillOf = (depth: unknown) =>
      /<path [^>]*fill="(#[0-9a-f]{6})"/.exec(
        picture('B', withValue(sampleJob(), 'cuts.0.depth', depth)),
      )![1]!;
    expect(fillOf(9)).toBe('#b9814a'); // half way: the ramp's middle
    expect(fillOf('through')).toBe('#4b2a16');
    expect(parseInt(fillOf(3).slice(1), 16)).toBeGreaterThan(parseInt(fillOf(9).slice(1), 16));
  });

  it('carries arcs over as arcs through the points of the circle', () => {
    const shape = { type: 'ellipse', cx: 60, cy: 50, rx: 20, ry: 20 };
    const svg = picture('B', withValue(sampleJob(), 'outlines.1.shape', shape));
    const d = /<path d="(M80 50[^"]*)"/.exec(svg)![1]!;
    const ends = [...d.matchAll(/A20 20 0 0 1 (-?[\d.]+) (-?[\d.]+)/g)].map(([, x, y]) => [
      Number(x),
      Number(y),
    ]);
    expect(ends.length).toBeGreaterThan(1);
    for (const [x, y] of ends) expect(Math.hypot(x! - 60, y! - 50)).toBeCloseTo(20, 1);
    expect(ends.at(-1)).toEqual([80, 50]);
  });

  it('holds no text of the document', () => {
    const value = withValue(sampleJob(), 'name', '</svg><script>alert(1)</script>');
    expect(picture('A', value)).not.toContain('script');
  });
});
