import { describe, expect, it } from 'vitest';
import { parseJob, parseJobText, problemLine } from '@/lib/job/parse-job';
import { sampleJob, withValue } from '../helpers/sample-job';

function problemsOf(value: unknown): string[] {
  const result = parseJob(value);
  return result.ok ? [] : result.error.map(problemLine);
}

describe('a right document', () => {
  it('is read, with its plain defaults filled in', () => {
    const result = parseJob(sampleJob());
    expect(result).toMatchObject({
      ok: true,
      value: {
        display: 'mm',
        turn: { axis: 'x' },
        board: { grain: 'x', surface: { A: null, B: null } },
        machine: { controller: { units: 'mm', arcs: true, toolChange: 'split' } },
        cuts: [{ pattern: 'contour', direction: 'climb', entry: { type: 'ramp', angle: 5 } }, {}, {}],
      },
    });
  });

  it('may name one face alone, without a set-up for the other', () => {
    const job = sampleJob();
    job.order = ['B'];
    job.cuts = job.cuts.slice(0, 2);
    delete job.setups.A;
    expect(problemsOf(job)).toEqual([]);
  });

  it('may hold a disabled cut on a face that is not cut', () => {
    const job = sampleJob();
    job.order = ['B'];
    job.cuts[2]!.enabled = false;
    expect(problemsOf(job)).toEqual([]);
  });
});

describe('what is refused, by path and sentence', () => {
  it.each<[string, string, unknown, RegExp]>([
    ['an unknown key', 'machine.colour', 'red', /^machine\.colour: there is no 'colour'/],
    ['a missing set-up', 'setups.B', undefined, /^setups\.B: is missing/],
    ['a missing key', 'board.x', undefined, /^board\.x: is missing/],
    ['a cutter that is not there', 'cuts.1.cutter', 'flat9', /^cuts\[1\]\.cutter: no cutter 'flat9'/],
    [
      'an outline that is not there',
      'cuts.0.outlines.0',
      'gone',
      /^cuts\[0\]\.outlines\[0\]: no outline 'gone'/,
    ],
    ['an id with a slash', 'cuts.0.id', '../etc', /^cuts\[0\]\.id: must be 1 to 40 letters/],
    ['an empty board', 'board.z', 0, /^board\.z: must be above 0, not 0/],
    ['NaN', 'board.x', Number.NaN, /^board\.x: must be a number, not NaN/],
    ['infinity', 'board.y', Number.POSITIVE_INFINITY, /^board\.y: must be/],
    ['a text for a number', 'cuts.0.depth', '6', /^cuts\[0\]\.depth: must be a number or "through", not "6"/],
    ['a depth of nothing', 'cuts.0.depth', 0, /^cuts\[0\]\.depth: must be above 0/],
    ['a doubled id', 'cutters.1.id', 'flat6', /^cutters\[1\]\.id: 'flat6' is already the id of cutters\[0\]/],
    ['a doubled number', 'cutters.1.number', 1, /^cutters\[1\]\.number: 1 is already the number of 'flat6'/],
    [
      'a wide step-over',
      'cutters.0.speeds.stepover',
      0.96,
      /^cutters\[0\]\.speeds\.stepover: must be at most 0\.95/,
    ],
    ['another version', 'version', 99, /^version: /],
    ['another format', 'format', 'else', /^format: /],
    [
      'a font that is not there',
      'outlines.0.shape',
      { type: 'text', text: 'a', font: 'quill', size: 9, x: 0, y: 0 },
      /^outlines\[0\]\.shape\.font: no font 'quill'/,
    ],
    ['an unknown kind', 'cuts.0.kind', 'carve', /^cuts\[0\]\.kind: /],
    ['a chamfer with a flat cutter', 'cuts.1.cutter', 'flat6', /^cuts\[1\]\.cutter: a chamfer needs a V-bit/],
    ['a face twice', 'order', ['A', 'A'], /^order\[1\]: face A is named twice/],
    ['a cut on a face not cut', 'order', ['A'], /^cuts\[0\]\.face: face B is not in the order/],
  ])('%s', (_what, path, to, line) => {
    expect(problemsOf(withValue(sampleJob(), path, to)).join('\n')).toMatch(line);
  });

  it('a rest pocket after nothing', () => {
    expect(problemsOf(withValue(sampleJob(), 'cuts.0.rest', 'c2'))).toEqual([
      "cuts[0].rest: 'c2' is not a pocket.",
    ]);
  });

  it.each([
    ['broken JSON', '{"format":', /^\$: is not JSON/],
    ['a list', '[]', /^\$: must be a job document/],
    ['nothing', 'null', /^\$: must be a job document/],
  ])('%s', (_what, text, line) => {
    const result = parseJobText(text);
    expect(result.ok ? '' : result.error.map(problemLine).join('\n')).toMatch(line);
  });

  it('every problem of a document at once', () => {
    const job = withValue(withValue(sampleJob(), 'board.x', -1), 'cuts.0.depth', 'deep');
    expect(problemsOf(job)).toHaveLength(2);
  });
});
