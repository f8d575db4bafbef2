import type { WorkControl } from '@/lib/base/cancel';
import { ok, type Result } from '@/lib/base/result';
import { sha256Hex } from '@/lib/base/sha256';
import { writePrograms } from '@/lib/gcode/write/write-programs';
import type { Job } from '@/lib/job/job-schema';
import type { CutMoves } from '@/lib/moves/cut-moves';
import type { FontBook } from '@/lib/outline/fonts';
import type { BoardModel } from '@/lib/proof/board-model';
import { proveJob, type Proof } from '@/lib/proof/prove-programs';
import type { ProgramIntent, TabPlace } from '@/lib/report/intent';
import type { Problem } from '@/lib/report/problem';
import type { CutReport, Finding, ProgramReport, Report } from '@/lib/report/report';
import { planPaths, type PlannedPaths } from './plan-paths';

/** A plan with its proof: what the machine is given, what was found, and the board as it will be. */
export interface PlanResult {
  readonly programs: readonly ProgramIntent[];
  readonly report: Report;
  readonly steps: readonly CutMoves[];
  readonly tabs: readonly TabPlace[];
  readonly board: BoardModel;
}

/** Job → outlines → moves → program text → read back → board model → report. Takes a checked job (see `parseJob`). */
export function planJob(job: Job, fonts: FontBook, control?: WorkControl): Result<PlanResult, Problem[]> {
  const paths = planPaths(job, fonts, control);
  return paths.ok ? ok(proveAndReport(paths.value, control)) : paths;
}

/** The slow half of planning: writes the programs, proves their text and reports. */
export function proveAndReport(paths: PlannedPaths, control?: WorkControl): PlanResult {
  const programs = writePrograms(paths.job, paths.steps, { jobHash: paths.jobHash });
  const proof = proveJob(paths.job, paths.outlines, programs, paths.tabs, control);
  return {
    programs,
    report: reportOf(paths, programs, proof),
    steps: paths.steps,
    tabs: paths.tabs,
    board: proof.board,
  };
}

function reportOf(paths: PlannedPaths, programs: readonly ProgramIntent[], proof: Proof): Report {
  const reports = programs.map((program): ProgramReport => programReport(program, proof));
  return {
    job: paths.jobHash,
    seconds: reports.reduce((sum, { seconds }) => sum + seconds, 0),
    programs: reports,
    cuts: cutsInOrder(paths.job, proof.cuts),
    findings: withoutDoubles([...paths.findings, ...proof.findings]),
  };
}

function programReport({ file, face, cutters, cuts, text }: ProgramIntent, proof: Proof): ProgramReport {
  const proven = proof.programs.find((program) => program.file === file);
  if (!proven) throw new Error(`Program ${file} was not proven`);
  const { seconds, lines, bounds } = proven;
  return { file, face, cutters, cuts, seconds, lines, sha256: sha256Hex(text), bounds };
}

/** One entry for every enabled cut, in the order in which they are cut; a cut without moves has figures of nothing. */
function cutsInOrder(job: Job, cuts: readonly CutReport[]): CutReport[] {
  return job.order.flatMap((face) =>
    job.cuts
      .filter((cut) => cut.enabled && cut.face === face)
      .map(({ id }) => cuts.find((cut) => cut.id === id) ?? emptyCut(id)),
  );
}

function emptyCut(id: string): CutReport {
  return { id, seconds: 0, cutLength: 0, travelLength: 0, removed: 0, minZ: null, tabs: [] };
}

/** Plan and proof may notice the same thing; it is said once for each cut and place. */
function withoutDoubles(findings: readonly Finding[]): Finding[] {
  const seen = new Set<string>();
  return findings.filter(({ code, cut, at, message }) => {
    const key = JSON.stringify([code, cut, at ?? message]);
    return seen.has(key) ? false : seen.add(key);
  });
}
