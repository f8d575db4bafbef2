import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import { endpointHref } from '@/lib/contracts/endpoint';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import type { PlanReport, ProgramList } from '@/lib/contracts/plan';
import type { ProjectAccess } from '../access/project-access';
import { ApiError, notFound } from '../http/api-error';
import { archiveParts, byteSlices, downloadResponse } from '../http/download';
import { readJob } from '../projects/saved-job';
import type { PlannedJob } from './planning-task';
import { planningService } from './planning-service';

interface PlannedProject extends PlannedJob {
  readonly name: string;
  readonly version: number;
  readonly hash: string;
}

/** The programs of the saved document with what was found. */
export async function listPrograms(
  em: EntityManager,
  access: ProjectAccess,
  signal: AbortSignal,
): Promise<ProgramList> {
  const { report, programs, version, hash } = await planProject(em, access, signal);
  const { projectId } = access;
  const bytes = new Map(programs.map((program) => [program.file, program.bytes.byteLength]));
  return {
    version,
    jobHash: hash,
    blocked: isBlocked(report),
    seconds: report.seconds,
    programs: report.programs.map((program) => ({
      ...program,
      bytes: bytes.get(program.file) ?? 0,
      href: endpointHref(ENDPOINTS.getProgram, { projectId, file: program.file }),
    })),
    findings: report.findings,
    archive: endpointHref(ENDPOINTS.getArchive, { projectId }),
  };
}

export async function readReport(
  em: EntityManager,
  access: ProjectAccess,
  signal: AbortSignal,
): Promise<PlanReport> {
  return (await planProject(em, access, signal)).report;
}

/** One program as a download, in slices. */
export async function downloadProgram(
  em: EntityManager,
  access: ProjectAccess,
  file: string,
  signal: AbortSignal,
): Promise<Response> {
  const planned = await planProject(em, access, signal);
  const program = planned.programs.find((one) => one.file === file);
  if (!program) throw notFound('The program');
  refuseBlocked(planned.report);
  return downloadResponse(byteSlices(program.bytes), {
    file,
    mediaType: 'text/plain; charset=utf-8',
    length: program.bytes.byteLength,
  });
}

/** Every program and `report.json` in one archive, packed while it is sent; the same plan gives the same bytes. */
export async function downloadArchive(
  em: EntityManager,
  access: ProjectAccess,
  signal: AbortSignal,
): Promise<Response> {
  const { report, programs, name } = await planProject(em, access, signal);
  refuseBlocked(report);
  const json = new TextEncoder().encode(`${JSON.stringify(report, null, 2)}\n`);
  const files = [...programs, { file: 'report.json', bytes: json }];
  return downloadResponse(archiveParts(files), {
    file: `${fileName(name)}.zip`,
    mediaType: 'application/zip',
  });
}

async function planProject(
  em: EntityManager,
  access: ProjectAccess,
  signal: AbortSignal,
): Promise<PlannedProject> {
  const { job, version, hash } = await readJob(em, access);
  const planned = await planningService().plan(job, hash, signal);
  return { ...planned, name: job.name, version, hash };
}

function isBlocked({ findings }: PlannedJob['report']): boolean {
  return findings.some(({ severity }) => severity === 'error');
}

/** A program with an error in its findings is never handed out. */
function refuseBlocked(report: PlannedJob['report']): void {
  const errors = report.findings.filter(({ severity }) => severity === 'error');
  const [first] = errors;
  if (!first) return;
  const more = errors.length > 1 ? ` There are ${errors.length - 1} more.` : '';
  throw new ApiError('programs-blocked', `${first.message}${more} Mend this before cutting.`, {
    problems: errors.map(({ cut, message }) => ({ path: cut ?? '$', message })),
  });
}

/** A project's name as a file may be called on any system. */
function fileName(name: string): string {
  const plain = name
    .normalize('NFKD')
    .replace(/[^A-Za-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .toLowerCase();
  return plain.slice(0, 60) || 'programs';
}
