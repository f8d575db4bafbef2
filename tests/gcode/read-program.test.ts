import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { ProgramEvent } from '@/lib/gcode/read/program-event';
import { ProgramError } from '@/lib/gcode/read/program-error';
import { readProgram } from '@/lib/gcode/read/read-program';

const read = (text: string): ProgramEvent[] => [...readProgram(text)];
const motion = (text: string): string[] =>
  read(text).flatMap((event) =>
    'to' in event ? [`${event.kind} ${event.to.x} ${event.to.y} ${event.to.z}`] : [],
  );

/** A small program in the common subset; a controller's own interpreter reads it without an error. */
const SAMPLE = `(SIGN FACE A - ZERO LOWER LEFT CORNER, TOP OF BOARD)
(STOCK 600 x 140 x 19 MM - TOOL 1 FLAT 6 MM)
G21
G17
G90
G94
G40
G49
G80
G54
G0 Z10.0
T1 M6
S18000 M3
G4 P3
G0 X20.0 Y20.0
G1 Z-2.0 F600
G1 X60.0 F1800
G3 X60.0 Y40.0 I0.0 J10.0
G1 X20.0
G3 X20.0 Y20.0 I0.0 J-10.0
G0 Z10.0
M5
M9
G0 X0.0 Y0.0
M30
`;

describe('a whole program', () => {
  it('is read as what the machine does', () => {
    expect(read(SAMPLE).map(({ kind }) => kind)).toEqual([
      'comment',
      'comment',
      'tool',
      'spindle',
      'dwell',
      'rapid',
      'feed',
      'feed',
      'arc',
      'feed',
      'arc',
      'rapid',
      'spindle',
      'rapid',
      'end',
    ]);
    expect(motion(SAMPLE).slice(0, 3)).toEqual(['rapid 20 20 10', 'feed 20 20 -2', 'feed 60 20 -2']);
  });

  it('means the same in inches: 1 in = 25.4 mm, 100 in/min = 2540 mm/min (NIST RS274NGC, G20)', () => {
    const [, feed] = read('G20\nG0 X1 Y0 Z0.5\nG1 X2 F100\nM2\n');
    expect(feed).toMatchObject({ kind: 'feed', feed: 2540, to: { x: 50.8, y: 0, z: 12.7 } });
  });

  it('takes small letters, blanks within numbers, line numbers and comments anywhere (NIST 3.3)', () => {
    expect(motion('n10 g0 x1 (there) y 2 z+3.\nN20g1x-.5f1 00;on\nm2\n')).toEqual([
      'rapid 1 2 3',
      'feed -0.5 2 3',
    ]);
  });

  it('keeps G91 increments, and reads nothing after the end', () => {
    expect(motion('G0 X1 Y1 Z1\nG91\nG0 X2\nG0 X2\nM30\nG99 nonsense (\n')).toEqual([
      'rapid 1 1 1',
      'rapid 3 1 1',
      'rapid 5 1 1',
    ]);
  });

  it('writes drilling cycles out: down to Z, back to the initial level or to R (NIST RS274NGC 3.5.16)', () => {
    expect(motion('G0 X1 Y2 Z3\nG98 G81 X4 Y5 Z1.5 R2.8 F100\nG80\nM2\n')).toEqual([
      'rapid 1 2 3',
      'rapid 4 5 3',
      'rapid 4 5 2.8',
      'feed 4 5 1.5',
      'rapid 4 5 3',
    ]);
    expect(motion('G0 X1 Y2 Z3\nG99 G81 X4 Y5 Z1.5 R2.8 F100\nX6\nG80\nM2\n').slice(-3)).toEqual([
      'rapid 6 5 2.8',
      'feed 6 5 1.5',
      'rapid 6 5 2.8',
    ]);
  });

  it('reads the lines of a file as they come', () => {
    function* lines(): Generator<string> {
      yield 'G0 X0 Y0 Z1';
      for (let i = 0; i < 100_000; i++) yield `G1 X${i % 7} F100`;
      yield 'M2';
    }
    let count = 0;
    for (const _ of readProgram(lines())) count++;
    expect(count).toBe(100_002);
  });

  it('never does anything but read or refuse, whatever it is given', () => {
    const piece = fc.constantFrom(
      'G0',
      'G1',
      'G2',
      'G81',
      'G20',
      'X1',
      'Y-2.5',
      'Z',
      'I3',
      'J',
      'R5',
      'F100',
      '(',
      ')',
      'M3',
      'S',
      ' ',
      '\n',
      '%',
      '/',
      ';',
      '.',
      '1e9',
      'N5',
    );
    fc.assert(
      fc.property(fc.array(piece, { maxLength: 60 }), (pieces) => {
        try {
          for (const _ of readProgram(pieces.join('')));
        } catch (error) {
          return error instanceof ProgramError && error.line > 0 && error.column > 0;
        }
        return true;
      }),
      { seed: 274, numRuns: 2000 },
    );
  });
});
