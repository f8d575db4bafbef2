import { describe, expect, it } from 'vitest';
import { ProgramError } from '@/lib/gcode/read/program-error';
import type { ReadDialect } from '@/lib/gcode/read/profile';
import { readProgram } from '@/lib/gcode/read/read-program';

/** The refusal of `line`, read after a start that knows its place and feed; it is line 3 of the program. */
function refusal(line: string, dialect: ReadDialect = 'any'): ProgramError | null {
  const text = `G21 G90 G17 G94\nG0 X0 Y0 Z5\n${line}\nM30\n`;
  try {
    for (const _ of readProgram(text, { dialect }));
    return null;
  } catch (error) {
    if (error instanceof ProgramError) return error;
    throw error;
  }
}

/** Rules of NIST RS274NGC version 3 (sections 3.3, 3.5, tables 4 and 8) and of Grbl 1.1's error list. */
const BAD: readonly (readonly [line: string, column: number, sentence: RegExp])[] = [
  ['G', 2, /'G' needs a number/],
  ['G1 X F500', 6, /'X' needs a number/],
  ['X1e3', 3, /'E' needs a number|E is not a word/],
  ['G1 X1.2.3 F500', 8, /'\.' cannot stand here/],
  ['G1 X--1 F500', 5, /needs a number/],
  ['(open', 1, /comment is not closed/],
  ['(a (b) c)', 4, /comment within a comment|comment stands within/i],
  ['G1 X10 #5', 8, /'#' cannot stand here/],
  ['G1 X[2+3]', 5, /needs a number/],
  ['O100 SUB', 7, /'S' needs a number/],
  ['G1 X1 N10 F5', 7, /line number must come first/],
  ['% hello', 2, /Nothing may follow/],
  ['é', 1, /cannot stand here/],
  ['G1 G0 X1 F5', 4, /exclude one another/],
  ['G20 G21', 5, /exclude one another/],
  ['G90 G91', 5, /exclude one another/],
  ['M3 M5', 4, /exclude one another/],
  ['M0 M30', 4, /exclude one another/],
  ['G54 G55', 5, /exclude one another/],
  ['G2 G3 X1 Y1 I1 F5', 4, /exclude one another/],
  ['G1 X1 X2 F5', 7, /X stands twice/],
  ['G1 X1 F5 F6', 10, /F stands twice/],
  ['G5 X1', 1, /G5 is not a word/],
  ['G12.5', 1, /G12\.5 is not a word/],
  ['G18', 1, /XY plane/],
  ['G19', 1, /XY plane/],
  ['G28', 1, /only the machine knows/],
  ['G30', 1, /only the machine knows/],
  ['G53 G0 Z0', 1, /only the machine knows/],
  ['G92 X0', 1, /outlasts the program/],
  ['G93', 1, /inverse time/],
  ['G10 L2 P1 X0', 1, /kept in the machine/],
  ['G41 D1', 1, /tool table/],
  ['G42', 1, /tool table/],
  ['M6', 1, /without a T/],
  ['M98 P100', 1, /M98 is not a word/],
  ['M3.5 S100', 1, /M3\.5 is not a word/],
  ['A90', 1, /three-axis/],
  ['G1 X1', 1, /No feed/],
  ['G1 X1 F0', 7, /above 0/],
  ['G1 X1 F-100', 7, /above 0/],
  ['S-1 M3', 1, /must not be negative/],
  ['T1.5', 1, /whole number/],
  ['T-1', 1, /whole number/],
  ['G4', 1, /needs P/],
  ['G4 P-1', 4, /less than no time/],
  ['P5', 1, /Nothing on this line uses P/],
  ['G1 X1 I2 F5', 7, /Nothing on this line uses I/],
  ['H1', 1, /Nothing on this line uses H/],
  ['G80 X1', 1, /G80 moves nothing/],
  ['G2 I5 J0 F500', 1, /where to go/],
  ['G2 X10 F500', 1, /centre .* or its radius/],
  ['G2 X10 Y0 R10 I5 F500', 11, /not by both/],
  ['G2 X0 Y0 R5 F500', 10, /cannot end where it starts/],
  ['G2 X10 Y0 R4 F500', 11, /too small/],
  ['G2 X10 Y0 I3 J0 F500', 11, /radius is 3\.0000 mm at the start/],
  ['G2 X10 Y0 I0 J0 F500', 11, /centre of the arc lies on its start/],
  ['G2 X10 Y0 I5 J0 K1 F500', 17, /K belongs to another plane/],
  ['G2 X10 Y0 I5 J0 P0 F500', 17, /whole turns/],
  ['G81 X1 Y1 F100', 1, /needs Z and R/],
  ['G83 X1 Y1 Z-5 R1 F100', 1, /needs Q/],
  ['G81 X1 Y1 Z5 R1 F100', 14, /below the bottom/],
  ['G38.2 Z5 F50', 1, /goes nowhere/],
  ['M3 M7 M48 M0 M6 T1', 14, /at most 4 M words/],
];

describe('lines that must be refused, with place and reason', () => {
  it.each(BAD)('%s', (line, column, sentence) => {
    const error = refusal(line);
    expect(error).not.toBeNull();
    expect(error?.sentence).toMatch(sentence);
    expect([error?.line, error?.column]).toEqual([3, column]);
  });

  it.each<[string, ReadDialect]>([
    ['T1 M6', 'grbl'],
    ['G81 X1 Y1 Z-5 R1 F100', 'grbl'],
    ['G64 P0.01', 'grbl'],
    ['%', 'grbl'],
    ['O0001', 'grbl'],
    ['O0001', 'linuxcnc'],
    ['G91.1', 'iso'],
    ['G1 X1.0000000000000000000000000000000000000000000000000000000000000000000000000000001 F100', 'grbl'],
  ])('%s for %s, though another controller may know it', (line, dialect) => {
    expect(refusal(line, dialect)).not.toBeNull();
  });

  it('a feed before the place is known, and a file that was cut short', () => {
    expect(() => [...readProgram('G21\nG0 Z5\nG1 X5 F100\nM30\n')]).toThrow(/not known: name X, Y and Z/);
    expect(() => [...readProgram('G21\nG0 X0 Y0 Z5\n')]).toThrow(/no end/);
    expect(() => [...readProgram('G91\nG0 X5\nM30\n')]).toThrow(/relative to a place that is not known/);
  });
});
