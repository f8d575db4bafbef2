import { fail, ok, type Result } from '@/lib/base/result';
import { ProgramError } from '@/lib/gcode/read/program-error';
import { readProgram } from '@/lib/gcode/read/read-program';
import { writePrograms } from '@/lib/gcode/write/write-programs';
import type { Job } from '@/lib/job/job-schema';
import type { FontBook } from '@/lib/outline/fonts';
import { proveJob } from '@/lib/proof/prove-programs';
import type { ProgramIntent } from '@/lib/report/intent';
import type { Problem } from '@/lib/report/problem';
import type { FaceName, Finding } from '@/lib/report/report';
import { planPaths } from './plan-paths';

/** A program as it lies in a file, and the job that it is held against, if any. */
export interface ProgramToProve {
  readonly file: string;
  readonly text: string;
  readonly job: Job | null;
  /** Null: as the file's name or the program's own comment says. */
  readonly face: FaceName | null;
}

/**
 * Proves a program's text. Alone, it only has to be readable. Against a job it stands in for the job's own program of
 * that name (or that it resembles most), and the findings are those of the whole job cut with it in that one's place:
 * what a tab holds by depends on both faces.
 */
export function proveText(program: ProgramToProve, fonts: FontBook): Result<readonly Finding[], Problem[]> {
  const unreadable = readingProblem(program);
  if (unreadable) return fail([unreadable]);
  const { job } = program;
  if (!job) return ok([]);
  const paths = planPaths(job, fonts);
  if (!paths.ok) return paths;
  const { steps, tabs, outlines, jobHash } = paths.value;
  const own = writePrograms(paths.value.job, steps, { jobHash });
  const face = program.face ?? statedFace(program) ?? onlyFace(job);
  if (!face) return fail([{ path: program.file, message: 'say by --face which face it cuts.' }]);
  const replaced = mostAlike(own, program, face);
  const intent = intentOf(program, face, replaced, job);
  if (!intent) return fail([{ path: program.file, message: 'cannot tell which cutter it is for.' }]);
  const programs = replaced
    ? own.map((candidate) => (candidate === replaced ? intent : candidate))
    : [...own, intent];
  return ok(proveJob(paths.value.job, outlines, programs, tabs).findings);
}

function readingProblem({ file, text }: ProgramToProve): Problem | null {
  try {
    const events = readProgram(text)[Symbol.iterator]();
    while (!events.next().done);
    return null;
  } catch (error) {
    if (!(error instanceof ProgramError)) throw error;
    return { path: `${file}:${error.line}:${error.column}`, message: error.sentence };
  }
}

/** The face that a program file's name or head comment states. */
function statedFace({ file, text }: ProgramToProve): FaceName | null {
  const stated = /^\d+-([AB])[-.]/.exec(file)?.[1] ?? /\(Face: ([AB])\b/i.exec(text)?.[1];
  return stated === 'A' || stated === 'B' ? stated : null;
}

function onlyFace({ order }: Job): FaceName | null {
  return order.length === 1 ? (order[0] ?? null) : null;
}

/** The job's own program of that face with the same name, or else the one that shares most lines. */
function mostAlike(
  own: readonly ProgramIntent[],
  { file, text }: ProgramToProve,
  face: FaceName,
): ProgramIntent | null {
  const onFace = own.filter((program) => program.face === face);
  const named = onFace.find((program) => program.file === file);
  if (named) return named;
  const lines = new Set(text.split(/\r?\n/));
  const shared = (program: ProgramIntent) =>
    program.text.split('\n').reduce((count, line) => count + (lines.has(line) ? 1 : 0), 0);
  return onFace.reduce<ProgramIntent | null>(
    (best, program) => (!best || shared(program) > shared(best) ? program : best),
    null,
  );
}

/**
 * What each line works for: as in the program that it stands for, where it has as many lines; else one cutter, and one
 * cut where that program has only one.
 */
function intentOf(
  { file, text }: ProgramToProve,
  face: FaceName,
  like: ProgramIntent | null,
  job: Job,
): ProgramIntent | null {
  const cutter = like?.cutters[0] ?? (job.cutters.length === 1 ? job.cutters[0]!.id : undefined);
  if (cutter === undefined) return null;
  const sameLines = like !== null && countLines(like.text) === countLines(text);
  const cut = like?.cuts.length === 1 ? (like.cuts[0] ?? null) : null;
  return {
    file,
    face,
    cutters: like?.cutters ?? [cutter],
    cuts: like?.cuts ?? [],
    text,
    lineMap: sameLines ? like.lineMap : [{ line: 1, cut, cutter }],
  };
}

function countLines(text: string): number {
  return text.split('\n').length;
}
