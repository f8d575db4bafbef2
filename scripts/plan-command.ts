import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { canonicalJob } from '@/lib/job/canonical';
import type { Job } from '@/lib/job/job-schema';
import { parseJobText, problemLine } from '@/lib/job/parse-job';
import { FONT_CATALOGUE } from '@/lib/outline/font-catalogue';
import type { FontBook } from '@/lib/outline/fonts';
import { planJob, type PlanResult } from '@/lib/pipeline/plan-job';
import { proveText } from '@/lib/pipeline/prove-text';
import type { Finding } from '@/lib/report/report';
import { readPlanArguments, USAGE } from './plan-arguments';

/** Where the command runs: its folders and its two outputs. */
export interface PlanHost {
  /** Folder of the catalogue's font files. */
  readonly fonts: string;
  /** Folder against which file names are taken. */
  readonly folder: string;
  readonly print: (text: string) => void;
  readonly complain: (text: string) => void;
}

/** All went well; no finding is an error. */
const PLANNED = 0;
/** Some finding is an error. */
const BLOCKED = 1;
/** The document, a file or the command line cannot be used. */
const UNUSABLE = 2;

/** What cannot be used, one line each. */
class Unusable extends Error {
  constructor(readonly lines: readonly string[]) {
    super(lines.join('\n'));
  }
}

/** The `plan` command: takes its arguments, gives its exit code. */
export function runPlan(args: readonly string[], host: PlanHost): number {
  try {
    const request = readPlanArguments(args);
    if (!request.ok) throw new Unusable([request.error, USAGE]);
    const { value } = request;
    switch (value.mode) {
      case 'canonical':
        host.print(canonicalJob(readJob(host, value.job)));
        return PLANNED;
      case 'prove':
        return prove(host, value);
      case 'plan':
        return plan(host, value);
    }
  } catch (error) {
    if (!(error instanceof Unusable)) throw error;
    host.complain(error.lines.map((line) => `${line}\n`).join(''));
    return UNUSABLE;
  }
}

function plan(host: PlanHost, request: { job: string; out: string; force: boolean }): number {
  const job = readJob(host, request.job);
  const planned = planJob(job, readFonts(host, job));
  if (!planned.ok) throw new Unusable(planned.error.map(problemLine));
  const code = exitCode(planned.value.report.findings);
  writePlan(path.resolve(host.folder, request.out), planned.value, code === PLANNED || request.force);
  return code;
}

function writePlan(folder: string, { programs, report }: PlanResult, withPrograms: boolean): void {
  try {
    mkdirSync(folder, { recursive: true });
    if (withPrograms) for (const { file, text } of programs) writeFileSync(path.join(folder, file), text);
    writeFileSync(path.join(folder, 'report.json'), `${JSON.stringify(report, null, 2)}\n`);
  } catch (error) {
    throw new Unusable([`${folder}: cannot be written (${reasonOf(error)})`]);
  }
}

function prove(
  host: PlanHost,
  request: { program: string; job: string | null; face: 'A' | 'B' | null },
): number {
  const text = readText(host, request.program);
  const job = request.job === null ? null : readJob(host, request.job);
  const file = path.basename(request.program);
  const proof = proveText({ file, text, job, face: request.face }, job ? readFonts(host, job) : new Map());
  if (!proof.ok) throw new Unusable(proof.error.map(problemLine));
  host.print(`${JSON.stringify(proof.value, null, 2)}\n`);
  return exitCode(proof.value);
}

function exitCode(findings: readonly Finding[]): number {
  return findings.some(({ severity }) => severity === 'error') ? BLOCKED : PLANNED;
}

function readJob(host: PlanHost, file: string): Job {
  const job = parseJobText(readText(host, file));
  if (!job.ok) throw new Unusable(job.error.map(problemLine));
  return job.value;
}

function readText(host: PlanHost, file: string): string {
  try {
    return readFileSync(path.resolve(host.folder, file), 'utf8');
  } catch (error) {
    throw new Unusable([`${file}: cannot be read (${reasonOf(error)})`]);
  }
}

/** The files of the fonts that the job's texts name, and no others: a plan without text reads none. */
function readFonts(host: PlanHost, job: Job): FontBook {
  const wanted = new Set(job.outlines.flatMap(({ shape }) => (shape.type === 'text' ? [shape.font] : [])));
  const fonts = new Map<string, ArrayBuffer>();
  for (const { id, file } of FONT_CATALOGUE) {
    if (!wanted.has(id)) continue;
    const bytes = readFileSync(path.join(host.fonts, file));
    fonts.set(id, bytes.buffer.slice(bytes.byteOffset, bytes.byteOffset + bytes.byteLength) as ArrayBuffer);
  }
  return fonts;
}

function reasonOf(error: unknown): string {
  return error instanceof Error && 'code' in error ? String(error.code) : String(error);
}
