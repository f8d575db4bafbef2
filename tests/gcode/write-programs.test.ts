import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readProgram } from '@/lib/gcode/read/read-program';
import { checkCode } from '@/lib/gcode/write/check-code';
import { commentLines } from '@/lib/gcode/write/comment';
import { coordinateWord, toSteps } from '@/lib/gcode/write/number-word';
import { writePrograms } from '@/lib/gcode/write/write-programs';
import type { Job, JobInput } from '@/lib/job/job-schema';
import { parseJob } from '@/lib/job/parse-job';
import { resolveJob } from '@/lib/job/resolve-job';
import type { CutMoves } from '@/lib/moves/cut-moves';
import type { Move } from '@/lib/moves/move';
import { sampleJob } from '../helpers/sample-job';

type Controller = Partial<JobInput['machine']['controller']>;

function jobFor(controller: Controller): Job {
  const job = sampleJob();
  const parsed = parseJob({
    ...job,
    machine: { ...job.machine, controller: { dialect: 'grbl', ...controller } },
  });
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.error));
  return resolveJob(parsed.value);
}

const MOVES: readonly Move[] = [
  { kind: 'rapid', to: { x: 20, y: 30, z: 6 } },
  { kind: 'rapid', to: { x: 20, y: 30, z: 1.5 } },
  { kind: 'feed', to: { x: 20, y: 30, z: -2 }, feed: 500 },
  { kind: 'feed', to: { x: 60, y: 30, z: -2 }, feed: 1800 },
  { kind: 'arc', to: { x: 60, y: 50, z: -2 }, cx: 60, cy: 40, ccw: true, feed: 1800 },
  { kind: 'arc', to: { x: 60, y: 50, z: -3 }, cx: 60, cy: 40, ccw: false, feed: 1800 },
  { kind: 'dwell', seconds: 0.5 },
  { kind: 'rapid', to: { x: 60, y: 50, z: 6 } },
];
const STEPS: readonly CutMoves[] = [
  { cut: 'c1', cutter: 'flat6', face: 'B', moves: MOVES },
  { cut: 'c2', cutter: 'v60', face: 'B', moves: MOVES },
  { cut: 'c3', cutter: 'flat6', face: 'A', moves: MOVES },
];
const write = (controller: Controller) =>
  writePrograms(jobFor(controller), STEPS, { jobHash: 'ab'.repeat(32) });
const words = (text: string): string[] =>
  text.split('\n').filter((line) => line !== '' && !/^(N\d+ )?\(/.test(line));

describe('programs by the rules of RS-274/NGC (NIST version 3; Grbl 1.1)', () => {
  const all: readonly Controller[] = (['grbl', 'linuxcnc', 'iso'] as const).flatMap((dialect) =>
    (['mm', 'in'] as const).flatMap((units) =>
      [true, false].flatMap((arcs) =>
        (['split', 'pause'] as const).map((toolChange) => ({
          dialect,
          units,
          arcs,
          toolChange,
          lineNumbers: !arcs,
        })),
      ),
    ),
  );

  it.each(all)('%j: is read without an error by the rules of its own controller', (controller) => {
    for (const { text } of write(controller)) {
      const events = [...readProgram(text, { dialect: controller.dialect ?? 'any' })];
      expect(events.at(-1)?.kind).toBe('end');
      const kinds = events.map(({ kind }) => kind);
      expect(kinds.indexOf('spindle')).toBeLessThan(kinds.indexOf('feed'));
      expect(kinds.lastIndexOf('spindle')).toBeGreaterThan(kinds.lastIndexOf('feed'));
    }
  });

  it.each(all)(
    '%j: holds plain characters, one comment a line, no exponent, no −0, short lines',
    (controller) => {
      for (const { text } of write(controller)) {
        expect(text).toMatch(/^[ -~\n]*\n$/);
        for (const line of text.split('\n')) {
          if (controller.dialect === 'grbl') expect(line.length).toBeLessThanOrEqual(70);
          const comment = /\((.*)\)/.exec(line)?.[1];
          if (comment !== undefined) expect(comment).not.toMatch(/[()?!~$%]/);
          else expect(line).not.toMatch(/-0\.0\b|[0-9]e/i);
        }
      }
    },
  );

  it('state units, plane, distance, feed mode and offset before anything moves, and retract alone', () => {
    const [program] = write({});
    const head = words(program!.text).slice(0, 10);
    expect(head).toEqual(['G21', 'G17', 'G90', 'G91.1', 'G94', 'G40', 'G49', 'G80', 'G54', 'G0 Z6.0']);
    expect(words(program!.text).slice(-2)).toEqual(['M5', 'M30']);
  });

  it('iso: % first and last, a program number, N by tens, no G91.1', () => {
    const lines = write({ dialect: 'iso', lineNumbers: true })[0]!.text.trimEnd().split('\n');
    expect([lines[0], lines[1], lines.at(-1)]).toEqual(['%', 'O0001', '%']);
    expect(lines.slice(2, 5).map((line) => line.split(' ')[0])).toEqual(['N10', 'N20', 'N30']);
    expect(lines.join('\n')).not.toMatch(/G91\.1/);
  });

  it('linuxcnc: G64 after the first block; with m6, Tn M6 and then G43 Hn', () => {
    const text = write({ dialect: 'linuxcnc', toolChange: 'm6' })[0]!.text;
    expect(text).toMatch(/G54\nG64 P0\.01\nG0 Z6\.0\nT1 M6\nG43 H1\nG0 Z6\.0\n/);
  });

  it('split: a program at each change of face or cutter; pause: one a face, no stop before the first cutter', () => {
    expect(write({}).map(({ file }) => file)).toEqual(['01-B-flat6.nc', '02-B-v60.nc', '03-A-flat6.nc']);
    const paused = write({ toolChange: 'pause' });
    expect(paused.map(({ file, cutters }) => [file, ...cutters])).toEqual([
      ['01-B.nc', 'flat6', 'v60'],
      ['02-A.nc', 'flat6'],
    ]);
    expect(paused[0]!.text.match(/^M0$/gm)).toHaveLength(1);
    expect(paused[0]!.text).toMatch(/G0 Z6\.0\nM5\n\(Put in: T2 .*\)\nM0\nG0 Z6\.0\nS18000 M3\nG4 P3\n/);
  });

  it('say the place against the zero: back-left of face B is y = 0, towards the front negative', () => {
    const feed = [...readProgram(write({})[0]!.text)].find((event) => event.kind === 'feed');
    expect(feed).toMatchObject({ to: { x: 20, y: 30 - 100, z: -2 } });
  });

  it('the same moves come back, in mm and in inches, as arcs and as chords', () => {
    for (const controller of [{}, { units: 'in' as const }, { arcs: false }, { decimals: 3 }]) {
      const stops = [...readProgram(write(controller)[0]!.text)].flatMap((event) =>
        'to' in event ? [event.to] : [],
      );
      for (const move of MOVES) {
        if (move.kind === 'dwell') continue;
        const near = Math.min(
          ...stops.map((to) => Math.hypot(to.x - move.to.x, to.y - (move.to.y - 100), to.z - move.to.z)),
        );
        expect(near).toBeLessThan(0.001);
      }
    }
  });

  it('a full circle is written in halves, so that rounding never makes nothing of it or a circle of nothing', () => {
    const arcs = [...readProgram(write({})[0]!.text)].flatMap((event) =>
      event.kind === 'arc' ? [event.sweep] : [],
    );
    expect(arcs.map((sweep) => Math.round((sweep / Math.PI) * 100) / 100)).toEqual([1, -1, -1]);
  });

  it('the same document gives the same bytes, and the check code is that of the text', () => {
    const [first] = write({});
    expect(write({})[0]!.text).toBe(first!.text);
    const code = /\(Check: ([0-9A-Z]{6}),/.exec(first!.text)?.[1];
    expect(checkCode(first!.text.replace(code!, '------'))).toBe(code);
  });
});

describe('words', () => {
  it('are the number, rounded once, with a point and without an exponent', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -20_000, max: 20_000, noNaN: true }),
        fc.integer({ min: 3, max: 6 }),
        (mm, decimals) => {
          const format = { decimals, unit: 1 };
          const word = coordinateWord('X', toSteps(mm, format), format);
          expect(word).toMatch(/^X-?\d+\.\d+$/);
          expect(Math.abs(Number(word.slice(1)) - mm)).toBeLessThanOrEqual(0.5 * 10 ** -decimals + 1e-9);
          expect(word).not.toBe('X-0.0');
        },
      ),
      { seed: 9, numRuns: 500 },
    );
  });

  it('of people never begin a comment, never hold what a controller acts on, and are cut into short lines', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 200 }), (text) => {
        for (const line of commentLines('Job', text, 70, false)) {
          expect(line).toMatch(/^\(Job:[^()?!~$%]*\)$/);
          expect(line.length).toBeLessThanOrEqual(70);
          expect(line).toMatch(/^[ -~]*$/);
        }
      }),
      { seed: 10, numRuns: 500 },
    );
  });
});
