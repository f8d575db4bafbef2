import { execFileSync, spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Report } from '@/lib/report/report';
import { runPlan } from '../../scripts/plan-command';
import { sampleJob, withValue } from '../helpers/sample-job';

const root = path.resolve(import.meta.dirname, '../..');
let folder: string;

beforeAll(() => {
  folder = mkdtempSync(path.join(os.tmpdir(), 'plan-command-'));
  run(save('good.json', sampleJob()), '--out', 'good');
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

interface Outcome {
  readonly code: number;
  readonly out: string;
  readonly err: string;
}

function run(...args: string[]): Outcome {
  let out = '';
  let err = '';
  const code = runPlan(args, {
    fonts: path.join(root, 'public', 'fonts'),
    folder,
    print: (text) => void (out += text),
    complain: (text) => void (err += text),
  });
  return { code, out, err };
}

function save(name: string, job: unknown): string {
  writeFileSync(path.join(folder, name), typeof job === 'string' ? job : JSON.stringify(job));
  return name;
}

function report(dir: string): Report {
  return JSON.parse(readFileSync(path.join(folder, dir, 'report.json'), 'utf8')) as Report;
}

function thinTabs() {
  return withValue(sampleJob(), 'cuts.2.tabs.height', 1);
}

describe('plan', () => {
  it('writes programs and a report, exit code 0', () => {
    const { code, err } = run('good.json', '--out', 'good');
    expect({ code, err }).toEqual({ code: 0, err: '' });
    expect(readdirSync(path.join(folder, 'good')).sort()).toEqual([
      '01-B-flat6.nc',
      '02-B-v60.nc',
      '03-A-flat6.nc',
      'report.json',
    ]);
    const { job, programs, cuts, seconds } = report('good');
    expect(job).toMatch(/^[0-9a-f]{64}$/);
    expect(cuts.map(({ id }) => id)).toEqual(['c1', 'c2', 'c3']);
    expect(seconds).toBeCloseTo(
      programs.reduce((sum, program) => sum + program.seconds, 0),
      9,
    );
    for (const program of programs) {
      const text = readFileSync(path.join(folder, 'good', program.file));
      expect(program.sha256).toBe(createHash('sha256').update(text).digest('hex'));
      expect(program.lines).toBe(text.toString().split('\n').length - 1);
    }
    expect(cuts[2]!.tabs).toHaveLength(4);
    expect(cuts[2]!.tabs.every(({ holds }) => holds)).toBe(true);
  });

  it('gives the same bytes each time', () => {
    const name = save('same.json', sampleJob());
    run(name, '--out', 'first');
    run(name, '--out', 'second');
    for (const file of readdirSync(path.join(folder, 'first'))) {
      expect(readFileSync(path.join(folder, 'second', file))).toEqual(
        readFileSync(path.join(folder, 'first', file)),
      );
    }
  });

  it('keeps programs back when a finding is an error, exit code 1, unless forced', () => {
    const name = save('thin.json', thinTabs());
    expect(run(name, '--out', 'thin')).toMatchObject({ code: 1, err: '' });
    expect(readdirSync(path.join(folder, 'thin'))).toEqual(['report.json']);
    expect(report('thin').findings.map(({ code }) => code)).toContain('tab-without-wood');
    expect(run(name, '--out', 'forced', '--force').code).toBe(1);
    expect(readdirSync(path.join(folder, 'forced'))).toContain('03-A-flat6.nc');
  });

  it.each<[string, unknown, RegExp]>([
    ['broken JSON', '{ "format": ', /^\$: is not JSON/],
    [
      'an unknown cutter',
      withValue(sampleJob(), 'cuts.2.cutter', 'flat9'),
      /^cuts\[2\]\.cutter: no cutter 'flat9'/,
    ],
    ['an unknown key', withValue(sampleJob(), 'machine.colour', 'red'), /^machine\.colour: /],
    ['a missing set-up', withValue(sampleJob(), 'setups.B', undefined), /^setups\.B: /],
    [
      'an open path where a closed one is needed',
      withValue(sampleJob(), 'outlines.0.shape', { type: 'path', d: 'M0 0 H50 V50' }),
      /^cuts\[1\]\.outlines\[0\]: 'Part' is an open path/m,
    ],
    [
      'broken path data',
      withValue(sampleJob(), 'outlines.0.shape', { type: 'path', d: 'M0 0 H50 V5O Z' }),
      /^outlines\[0\]\.shape\.d: /,
    ],
    [
      'a bore of a rectangle',
      withValue(sampleJob(), 'cuts.0', {
        id: 'b',
        kind: 'bore',
        face: 'B',
        outlines: ['part'],
        cutter: 'flat6',
        depth: 3,
      }),
      /^cuts\[0\]\.outlines\[0\]: 'Part' is not a circle/,
    ],
  ])('refuses %s with a line for each problem, exit code 2, nothing written', (what, job, line) => {
    const dir = `refused ${what}`;
    const { code, err } = run(save('refused.json', job), '--out', dir);
    expect(code).toBe(2);
    expect(err).toMatch(line);
    expect(existsSync(path.join(folder, dir))).toBe(false);
  });

  it.each<[string[], RegExp]>([
    [[], /No job document/],
    [['missing.json', '--out', 'x'], /^missing\.json: cannot be read/],
    [['good.json'], /--out DIR/],
    [['good.json', '--out'], /--out needs a value/],
    [['good.json', '--out', 'x', '--fast'], /no option --fast/],
  ])('explains %j, exit code 2', (args, line) => {
    const { code, err } = run(...args);
    expect(code).toBe(2);
    expect(err).toMatch(line);
  });

  it('counts and plans no disabled cut', () => {
    const { code } = run(
      save('disabled.json', withValue(sampleJob(), 'cuts.0.enabled', false)),
      '--out',
      'disabled',
    );
    expect(code).toBe(0);
    expect(report('disabled').cuts.map(({ id }) => id)).toEqual(['c2', 'c3']);
    expect(report('disabled').programs[0]!.file).toBe('01-B-v60.nc');
  });
});

describe('plan --canonical', () => {
  it('prints the same text whether defaults are left out or written down', () => {
    const short = run('--canonical', save('short.json', sampleJob()));
    expect(short.code).toBe(0);
    const whole = run('--canonical', save('whole.json', short.out));
    expect(whole.out).toBe(short.out);
    expect(createHash('sha256').update(short.out).digest('hex')).toBe(report('good').job);
    expect(JSON.parse(short.out)).toMatchObject({
      cuts: [{ entry: { type: 'ramp', angle: 5 } }, {}, { below: 0.3 }],
    });
  });
});

describe('plan --prove', () => {
  it('finds nothing in the job’s own programs', () => {
    const { code, out } = run('--prove', 'good/03-A-flat6.nc', '--job', 'good.json');
    expect(code).toBe(0);
    expect(JSON.parse(out)).toEqual([]);
  });

  it('finds a tab that was cut away by hand, and a dive into the spoilboard', () => {
    const text = readFileSync(path.join(folder, 'good', '03-A-flat6.nc'), 'utf8');
    save('deeper.nc', text.replaceAll('Z-18.3', 'Z-19.5'));
    const deeper = run('--prove', 'deeper.nc', '--job', 'good.json', '--face', 'A');
    expect(deeper.code).toBe(1);
    expect((JSON.parse(deeper.out) as { code: string }[]).map(({ code }) => code)).toContain('below-bed');
    const top = `Z-${(18 - report('good').cuts[2]!.tabs[0]!.height).toFixed(4)}`;
    expect(text).toContain(top);
    save('no-tabs.nc', text.replaceAll(top, 'Z-18.3'));
    const without = run('--prove', 'no-tabs.nc', '--job', 'good.json', '--face', 'A');
    expect((JSON.parse(without.out) as { code: string }[]).map(({ code }) => code)).toContain(
      'tab-without-wood',
    );
  });

  it('says where a text is no program, exit code 2', () => {
    save('bad.nc', 'G21 G90\nG1 X10 F100 Q\n');
    const { code, err } = run('--prove', 'bad.nc');
    expect(code).toBe(2);
    expect(err).toMatch(/^bad\.nc:2:\d+: /);
  });
});

describe('npm run plan', () => {
  it('starts from the sources as they are, by its own name', { timeout: 60_000 }, () => {
    const name = save('cli.json', sampleJob());
    const script = path.join(root, 'scripts', 'plan.mjs');
    execFileSync(process.execPath, [script, name, '--out', 'cli'], { cwd: folder });
    expect(readdirSync(path.join(folder, 'cli'))).toContain('report.json');
    const refused = spawnSync(process.execPath, [script, 'none.json', '--out', 'none'], {
      cwd: folder,
      encoding: 'utf8',
    });
    expect(refused.status).toBe(2);
    expect(refused.stderr).toMatch(/^none\.json: cannot be read/);
  });
});
