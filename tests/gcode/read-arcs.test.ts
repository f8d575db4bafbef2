import { describe, expect, it } from 'vitest';
import { readProgram } from '@/lib/gcode/read/read-program';
import type { ArcEvent } from '@/lib/gcode/read/program-event';

function arcOf(line: string, from: [number, number] = [0, 0]): ArcEvent {
  const text = `G21\nG0 X${from[0]} Y${from[1]} Z0\n${line}\nM30\n`;
  const arc = [...readProgram(text)].find((event) => event.kind === 'arc');
  if (arc?.kind !== 'arc') throw new Error('no arc');
  return arc;
}

/** Seen with the interpreter of an open-source motion controller (`rs274`, metric); see also NIST RS274NGC v3, 3.5.3. */
describe('arcs as a controller reads them', () => {
  it.each<[string, [number, number], [number, number], 1 | -1]>([
    ['G2 X10 Y0 R10 F500', [0, 0], [5, -8.6603], -1],
    ['G2 X10 Y0 R-10 F500', [0, 0], [5, 8.6603], -1],
    ['G3 X10 Y0 R10 F500', [0, 0], [5, 8.6603], 1],
    ['G3 X10 Y0 R-10 F500', [0, 0], [5, -8.6603], 1],
    ['G3 X0 Y10 I-10 J0 F500', [10, 0], [0, 0], 1],
    ['G2 X0 Y10 I-10 J0 F500', [10, 0], [0, 0], -1],
    ['G2 X10 Y0 I-10 J0 F500', [10, 0], [0, 0], -1],
    ['G2 X10 Y16 I3 J4 Z9 F500', [7, 7], [10, 11], -1],
    ['G3 X0 Y0 Z-1 I-2.5 J0 F500', [0, 0], [-2.5, 0], 1],
    ['G2 X10 Y0 R5 F500', [0, 0], [5, 0], -1],
  ])('%s from %j', (line, from, center, way) => {
    const arc = arcOf(line, from);
    expect(arc.center.x).toBeCloseTo(center[0], 4);
    expect(arc.center.y).toBeCloseTo(center[1], 4);
    expect(Math.sign(arc.sweep)).toBe(way);
  });

  it('ends where it starts: a whole circle, 62.8319 mm long at radius 10 (NIST RS274NGC 3.5.3.2)', () => {
    const { sweep } = arcOf('G2 X10 Y0 I-10 J0 F500', [10, 0]);
    expect(Math.abs(sweep) * 10).toBeCloseTo(62.8319, 4);
  });

  it('270 degrees of a helix of radius 10 that falls by 3 are 47.2193 mm (elementary geometry)', () => {
    const arc = arcOf('G2 X0 Y10 I-10 J0 Z-3 F500', [10, 0]);
    expect(Math.hypot(arc.sweep * 10, -3)).toBeCloseTo(47.2193, 4);
  });
});
